import { visibleTransmission } from '../../core/spectrum/visibleTransmission';
import type { Prediction } from '../../core/prediction/types';

/** Shares of light from 0 to 1 at 380, 385, ... 780 nm. */
export type Transmittance = readonly number[];

/** What gets through at the stated strength; null without bands. Three decimals, since a strip shows no more. */
export function transmittanceOf({
  bands,
  conditions,
}: Pick<Prediction, 'bands' | 'conditions'>): Transmittance | null {
  if (bands.length === 0) return null;
  const passed = visibleTransmission(bands, conditions.concentration_mM, conditions.path_cm);
  return Array.from(passed, (share) => Math.round(share * 1000) / 1000);
}
