import type { Estimate } from '../estimation';
import { emptyBandDraws, type BandDraws } from '../transitions/bandDraws';
import type { Band } from '../transitions/types';
import { complexKey } from '../library';
import { sharedNormals } from './sharedNormals';
import type { Prediction } from './types';

/** Widths vary by 15 % (one standard deviation), whatever the centres do. */
const widthSigma = 0.15;
const lowest_cm1 = 200;
/**
 * How much of the doubt about strengths (as a share of its variance) all bands of one kind have in common: whether a
 * complex absorbs strongly is known to a factor of three, how strongly one band does beside the next to half of itself.
 */
const commonStrength = 0.75;

export interface ParameterEstimates {
  readonly tenDq: Estimate;
  readonly B: Estimate;
  readonly C: Estimate;
}

/** What each draw adds to an estimate, through its shared causes of doubt. */
function deviations(estimate: Estimate, count: number): Float64Array {
  const sum = new Float64Array(count);
  for (const { cause, sigma } of estimate.shares ?? []) {
    const normals = sharedNormals(cause, count);
    for (let i = 0; i < count; i++) sum[i]! += sigma * normals[i]!;
  }
  return sum;
}

const sigmaThrough = (band: Band, { tenDq, B, C }: ParameterEstimates): number => {
  const byCause = new Map<string, number>();
  const parts: [Estimate, number][] = [
    [tenDq, band.slopeTenDq ?? 0],
    [B, band.slopeB ?? 0],
    [C, band.slopeC ?? 0],
  ];
  for (const [estimate, slope] of parts) {
    for (const { cause, sigma } of estimate.shares ?? []) {
      byCause.set(cause, (byCause.get(cause) ?? 0) + sigma * slope);
    }
  }
  return Math.hypot(...byCause.values());
};

/**
 * The bands of one complex drawn `count` times: centres move with 10Dq, B and C along their slopes, so that bands of one
 * draw belong together; the rest of each band's own standard deviation is drawn for itself. `id` names the draws that
 * belong to this complex alone. Bands that `wanted` turns down are left out without changing the draws of the others.
 */
export function drawBands(
  bands: readonly Band[],
  estimates: ParameterEstimates,
  count: number,
  id: string,
  wanted: (band: Band) => boolean = () => true,
): BandDraws {
  const bandCount = bands.filter(wanted).length;
  const draws = emptyBandDraws(count, bandCount);
  const tenDq = deviations(estimates.tenDq, count);
  const B = deviations(estimates.B, count);
  const C = deviations(estimates.C, count);
  let column = 0;
  bands.forEach((band, at) => {
    if (!wanted(band)) return;
    const here = column++;
    const rest = Math.sqrt(Math.max(0, band.sigma_cm1 ** 2 - sigmaThrough(band, estimates) ** 2));
    const own = sharedNormals(`band:${id}:${band.label}:${at}`, count);
    const width = sharedNormals(`width:${id}:${band.kind}`, count);
    const together = sharedNormals(`height:${id}:${band.kind}`, count);
    const apart = sharedNormals(`height:${id}:${band.kind}:${at}`, count);
    const [low, high] = band.molarAbsorptivityRange;
    // The range is meant to hold 95 % of complexes, on a logarithmic scale.
    const logSigma = low > 0 && high > low ? Math.log(high / low) / 3.92 : 0;
    const logTogether = logSigma * Math.sqrt(commonStrength);
    const logApart = logSigma * Math.sqrt(1 - commonStrength);
    const { slopeTenDq = 0, slopeB = 0, slopeC = 0 } = band;
    for (let draw = 0; draw < count; draw++) {
      const moved = slopeTenDq * tenDq[draw]! + slopeB * B[draw]! + slopeC * C[draw]! + rest * own[draw]!;
      const index = draw * bandCount + here;
      draws.energy[index] = Math.max(lowest_cm1, band.energy_cm1 + moved);
      draws.width[index] = band.width_cm1 * Math.exp(widthSigma * width[draw]!);
      const stronger = logTogether * together[draw]! + logApart * apart[draw]!;
      draws.molarAbsorptivity[index] = band.molarAbsorptivity * Math.exp(stronger);
    }
  });
  return draws;
}

/** Draws of the bands of a finished prediction, the same ones its own cloud was made of. */
export const estimateDraws = (
  prediction: Pick<Prediction, 'bands' | 'tenDq' | 'racahB' | 'racahC' | 'composition'>,
  count: number,
): BandDraws =>
  drawBands(
    prediction.bands,
    { tenDq: prediction.tenDq, B: prediction.racahB, C: prediction.racahC },
    count,
    complexKey(prediction.composition),
  );
