import { wavelength_nm } from '../units';
import type { BandLevel } from './bandInput';
import type { DdContext } from './ddContext';
import { propagatedSigma, smallestSigma_cm1 } from './bandSigma';
import { configurationText, electronsMoved } from './intensity/electronsMoved';
import { absorptivityRange, intensityWords, roundAbsorptivity } from './intensity/intensityClass';
import type { Band } from './types';

export interface LevelStrength {
  readonly kind: 'spin-allowed' | 'spin-forbidden';
  readonly molarAbsorptivity: number;
  readonly width_cm1: number;
  /** The selection rule in words. */
  readonly rule: string;
  readonly reasons: readonly string[];
}

/** The band from the ground level into one level. */
export function levelBand({ input, doubts }: DdContext, level: BandLevel, strength: LevelStrength): Band {
  const { kind, molarAbsorptivity, width_cm1, rule, reasons } = strength;
  const ground = input.levels[0]!;
  const range = absorptivityRange(molarAbsorptivity, kind);
  const even = /[gu]$/.test(level.label) ? 'g' : '';
  const configuration = configurationText(level.configurations, even);
  return {
    energy_cm1: level.energy,
    sigma_cm1: Math.max(smallestSigma_cm1, propagatedSigma(level.slope, doubts)),
    wavelength_nm: wavelength_nm(level.energy),
    multiplicity: level.multiplicity,
    label: level.label,
    kind,
    molarAbsorptivity: roundAbsorptivity(molarAbsorptivity),
    molarAbsorptivityRange: range,
    intensityClass: intensityWords(rule, range),
    width_cm1: Math.round(width_cm1 / 10) * 10,
    ...(configuration === undefined ? {} : { configuration }),
    electronsMoved: electronsMoved(ground.configurations, level.configurations),
    slopeTenDq: level.slope.tenDq,
    slopeB: level.slope.B,
    slopeC: level.slope.C,
    reasons,
  };
}
