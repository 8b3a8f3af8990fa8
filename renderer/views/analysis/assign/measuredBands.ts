import type { MeasuredBand } from '../../../../core/measured/assignment/assignBands';
import type { Analysis } from '../../../../core/record/analysis';
import type { MeasurementContent } from '../../../../core/record/measurement';

export interface NamedBand extends MeasuredBand {
  /** `fitted centre`, `maximum`, `shoulder`. */
  readonly feature: string;
}

/** A reading of a broad maximum is hardly better than this, cm⁻¹ (common practice). */
const usualReading_cm1 = 100;

/** Bands that can be assigned: centres of the fit, or what was typed. Shoulders stay in, with their name. */
export function measuredBands(content: MeasurementContent, analysis: Analysis | null): NamedBand[] {
  if (content.kind === 'band list')
    return content.bands.map(({ energy_cm1, molarAbsorptivity, feature }) => ({
      energy_cm1: energy_cm1.value,
      u_cm1: energy_cm1.u ?? usualReading_cm1,
      molarAbsorptivity: molarAbsorptivity?.value ?? null,
      feature,
    }));
  if (content.kind !== 'spectrum' || !analysis?.bandFit) return [];
  const isMolar = analysis.treatment.some(({ op }) => op === 'to molar absorptivity');
  return analysis.bandFit.bands
    .map(({ centre_cm1, height, se }) => ({
      energy_cm1: centre_cm1,
      u_cm1: se.centre_cm1 ?? usualReading_cm1,
      molarAbsorptivity: isMolar ? height : null,
      feature: 'fitted centre',
    }))
    .sort((one, other) => one.energy_cm1 - other.energy_cm1);
}
