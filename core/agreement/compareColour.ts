import { chromaAndHue, colourBulk, colourOfSolution, hueDistance, hueSpread } from '../colour';
import { estimateDraws, type Prediction } from '../prediction';
import type { MeasuredBand, MeasuredComplex } from './measuredSet';

export interface ColourComparison {
  /** Hue angles in L*a*b*, degrees. */
  readonly measuredHue: number;
  readonly predictedHue: number;
  readonly difference: number;
  readonly insideCloud: boolean;
  /** Hue within 30 degrees, or inside the cloud. */
  readonly right: boolean;
  readonly measuredWords: string;
  readonly predictedWords: string;
}

type SpectralBand = Parameters<typeof colourOfSolution>[0][number];

/** Below this chroma a colour has no hue to speak of. */
const leastChroma = 8;
const visible_cm1 = [13_000, 26_500] as const;

/** Published bands have centres and heights but hardly ever widths: the usual ones (common practice). */
const usualWidth = ({ kind }: MeasuredBand): number =>
  kind === 'spin-allowed' ? 3800 : kind === 'spin-forbidden' ? 800 : 5000;

const spectrumOf = (bands: readonly MeasuredBand[]): SpectralBand[] =>
  bands.flatMap((band) =>
    band.epsilon === null
      ? []
      : [
          {
            energy_cm1: band.energy_cm1,
            width_cm1: usualWidth(band),
            molarAbsorptivity: band.epsilon,
          },
        ],
  );

/** Concentration at which the strongest visible band absorbs 1 in a cell of 1 cm, mmol/L; null without such a band. */
function concentrationFor(bands: readonly SpectralBand[]): number | null {
  const seen = bands.filter(({ energy_cm1 }) => energy_cm1 >= visible_cm1[0] && energy_cm1 <= visible_cm1[1]);
  const strongest = Math.max(0, ...seen.map(({ molarAbsorptivity }) => molarAbsorptivity));
  return strongest > 0 ? 1000 / strongest : null;
}

const isSolution = (medium: string | null): boolean =>
  medium !== null && !/solid|crystal|lattice|glass|powder|host|doped|mull|salt$/i.test(medium);

function inArc(hue: number, { from, to }: { from: number; to: number }): boolean {
  const width = (to - from + 360) % 360;
  return (hue - from + 360) % 360 <= width;
}

/**
 * Colour from the published spectrum beside the predicted one, both with the strongest visible band at an absorbance of
 * one. Null where no solution spectrum with molar absorptivities is given or the solution has no hue.
 */
export function compareColour(measured: MeasuredComplex, prediction: Prediction): ColourComparison | null {
  if (!isSolution(measured.medium)) return null;
  const found = spectrumOf(measured.bands);
  const c = concentrationFor(found);
  const own = concentrationFor(prediction.bands);
  if (c === null) return null;
  const seen = colourOfSolution(found, { concentration_mM: c, path_cm: 1 });
  const hue = chromaAndHue(seen.lab);
  if (hue.chroma < leastChroma) return null;
  const conditions = { concentration_mM: own ?? prediction.conditions.concentration_mM, path_cm: 1 };
  const expected = colourOfSolution(prediction.bands, conditions);
  const predicted = chromaAndHue(expected.lab);
  const spread = hueSpread(colourBulk(estimateDraws(prediction, 200), conditions));
  const difference = hueDistance(hue.hue, predicted.hue);
  const insideCloud = spread !== null && inArc(hue.hue, spread);
  return {
    measuredHue: hue.hue,
    predictedHue: predicted.hue,
    difference,
    insideCloud,
    right: difference <= 30 || insideCloud,
    measuredWords: seen.words,
    predictedWords: expected.words,
  };
}
