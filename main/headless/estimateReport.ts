import type { Problem } from '../../core/errors';
import type { Estimate } from '../../core/estimation';
import type { Prediction, PredictionOutcome } from '../../core/prediction';

const numberOf = ({ value, sigma, route, unit }: Estimate) => ({ value, sigma, unit, route });

const colourOf = (colour: Prediction['colour']) =>
  colour === null ? null : { srgb: colour.srgb, lab: colour.lab, words: colour.words };

/** Nothing to show: no field and no band of any kind. */
function whyNot(prediction: Prediction): Problem | null {
  if (prediction.tenDq.value !== null || prediction.bands.length > 0) return null;
  if (prediction.dElectrons === 0 || prediction.dElectrons === 10) return null;
  return {
    code: 'not-estimated',
    message: prediction.tenDq.reasons[0]?.text ?? 'not estimated',
    field: 'tenDq',
  };
}

function estimated(prediction: Prediction) {
  const { spin } = prediction;
  return {
    id: prediction.id,
    formula: prediction.formula,
    dElectrons: prediction.dElectrons,
    tenDq: numberOf(prediction.tenDq),
    racahB: numberOf(prediction.racahB),
    racahC: numberOf(prediction.racahC),
    zeta: numberOf(prediction.zeta),
    spin: {
      state: spin.state,
      probabilityHigh: spin.probabilityHigh,
      words: spin.words,
      multiplicity: spin.multiplicity,
      nearCrossover: spin.nearCrossover,
      gap_cm1: spin.gap === null ? null : { value: spin.gap.value, sigma: spin.gap.sigma },
      crossoverTenDqOverB: spin.crossoverTenDqOverB,
      momentSpinOnly_BM: spin.momentSpinOnly_BM,
      momentRange_BM: spin.momentRange_BM,
    },
    groundTerm: prediction.groundTerm,
    bands: prediction.bands.map((band) => ({
      energy_cm1: band.energy_cm1,
      sigma_cm1: band.sigma_cm1,
      wavelength_nm: band.wavelength_nm,
      multiplicity: band.multiplicity,
      label: band.label,
      kind: band.kind,
      molarAbsorptivity: band.molarAbsorptivity,
      molarAbsorptivityRange: band.molarAbsorptivityRange,
      width_cm1: band.width_cm1,
    })),
    colour: colourOf(prediction.colour),
    conditions: prediction.conditions,
    flags: prediction.flags,
    leftOut: prediction.leftOut,
    cautions: prediction.cautions.map(({ id, about, text, codes }) => ({ id, about, text, codes })),
    why: {
      tenDq: prediction.tenDq.reasons,
      racahB: prediction.racahB.reasons,
      racahC: prediction.racahC.reasons,
    },
    madeWith: prediction.madeWith,
  };
}

const refusal = (id: string, problems: readonly Problem[]) => {
  const [{ code, message, field, remedy }] = problems as [Problem];
  return { id, error: { code, message, field, ...(remedy === undefined ? {} : { remedy }) }, problems };
};

/** One entry of the answer: the estimate, or what is wrong with the input. */
export function reportEntry(outcome: PredictionOutcome, id: string) {
  if (!outcome.ok) return refusal(id, outcome.problems);
  const problem = whyNot(outcome.prediction);
  return problem === null ? estimated(outcome.prediction) : refusal(id, [problem]);
}
