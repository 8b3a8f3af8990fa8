import { gaussian } from '../../../../core/measured/bandFit/model';
import type { BandFitRecord } from '../../../../core/record/analysis';
import type { FittedBand } from '../../../plots';
import type { FitPoints } from '../treatment/treated';

/** Points between two wavenumbers; all of them without limits. */
export function within(points: FitPoints, limits: readonly [number, number] | null): FitPoints {
  if (limits === null) return points;
  const kept = points.wavenumber_cm1
    .map((_, index) => index)
    .filter(
      (index) => points.wavenumber_cm1[index]! >= limits[0] && points.wavenumber_cm1[index]! <= limits[1],
    );
  return {
    wavenumber_cm1: kept.map((index) => points.wavenumber_cm1[index]!),
    value: kept.map((index) => points.value[index]!),
  };
}

/** A kept fit as lines over the points. */
export function fitCurves(
  kept: BandFitRecord,
  { wavenumber_cm1 }: FitPoints,
): { readonly fit: Float64Array; readonly baseline: Float64Array | null; readonly bands: FittedBand[] } {
  const [low, high] = [wavenumber_cm1[0] ?? 0, wavenumber_cm1.at(-1) ?? 1];
  const ends = kept.baselineAt;
  const baseline =
    ends === null
      ? null
      : Float64Array.from(
          wavenumber_cm1,
          (at) => ends[0] + ((ends[1] - ends[0]) * (at - low)) / (high - low),
        );
  const bands = kept.bands.map((band, index) => ({
    name: `band ${index + 1}`,
    centre_cm1: band.centre_cm1,
    centreError_cm1: band.se.centre_cm1,
    value: Float64Array.from(wavenumber_cm1, (at) => gaussian(band, at)),
  }));
  const fit = Float64Array.from(wavenumber_cm1, (_, index) =>
    bands.reduce((sum, { value }) => sum + value[index]!, baseline?.[index] ?? 0),
  );
  return { fit, baseline, bands };
}
