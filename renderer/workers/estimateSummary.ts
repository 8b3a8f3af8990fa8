import type { SeenColour } from '../../core/colour/types';
import type { Problem } from '../../core/errors';
import type { Flag } from '../../core/estimation/types';
import type { Prediction, PredictionOutcome } from '../../core/prediction/types';
import type { SpinPrediction } from '../../core/spin/types';
import { type Transmittance, transmittanceOf } from './transmittance';

export interface ValueWithSigma {
  readonly value: number;
  readonly sigma: number | null;
}

/** A band as far as a table of candidates needs it. Energies in cm⁻¹, molar absorptivity in L mol⁻¹ cm⁻¹. */
export interface BandSummary {
  readonly energy: number;
  readonly sigma: number;
  readonly label: string;
  readonly kind: Prediction['bands'][number]['kind'];
  readonly molarAbsorptivity: number;
}

/** What a row of the candidate table shows: small enough to keep tens of thousands of them. */
export interface EstimateSummary {
  readonly ok: true;
  readonly formula: string;
  readonly dElectrons: number;
  readonly groundTerm: string;
  readonly tenDq: ValueWithSigma | null;
  readonly racahB: ValueWithSigma | null;
  readonly spin: Pick<
    SpinPrediction,
    'state' | 'probabilityHigh' | 'words' | 'unpairedElectrons' | 'nearCrossover'
  >;
  readonly bands: readonly BandSummary[];
  readonly colour: SeenColour | null;
  /** Share of light passed at 380, 385, ... 780 nm. */
  readonly transmittance: Transmittance | null;
  readonly flags: readonly Flag[];
}

export interface RefusedSummary {
  readonly ok: false;
  readonly problems: readonly Problem[];
}

export type CandidateSummary = EstimateSummary | RefusedSummary;

const valueOf = (estimate: Prediction['tenDq']): ValueWithSigma | null =>
  estimate.value === null ? null : { value: estimate.value, sigma: estimate.sigma };

/** The first spin-allowed d-d band: what a chemist looks for first. */
export const firstBandOf = ({ bands }: Pick<EstimateSummary, 'bands'>): BandSummary | null =>
  bands.find(({ kind }) => kind === 'spin-allowed') ?? null;

/** Shortens an answer to what the table shows. */
export function summarise(outcome: PredictionOutcome): CandidateSummary {
  if (!outcome.ok) return { ok: false, problems: outcome.problems };
  const { prediction } = outcome;
  const { state, probabilityHigh, words, unpairedElectrons, nearCrossover } = prediction.spin;
  return {
    ok: true,
    formula: prediction.formula,
    dElectrons: prediction.dElectrons,
    groundTerm: prediction.groundTerm,
    tenDq: valueOf(prediction.tenDq),
    racahB: valueOf(prediction.racahB),
    spin: { state, probabilityHigh, words, unpairedElectrons, nearCrossover },
    bands: prediction.bands.map(({ energy_cm1, sigma_cm1, label, kind, molarAbsorptivity }) => ({
      energy: energy_cm1,
      sigma: sigma_cm1,
      label,
      kind,
      molarAbsorptivity,
    })),
    colour: prediction.colour,
    transmittance: transmittanceOf(prediction),
    flags: prediction.flags,
  };
}
