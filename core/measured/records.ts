import type { AssignedBand, BandFitRecord, FieldFitRecord } from '../record/analysis';
import type { BandAssignment, MeasuredBand, PredictedBand } from './assignment/assignBands';
import type { BandFit, BandFitRequest } from './bandFit/fitBands';
import type { FieldFit, FieldFitRequest, FittedParameter } from './fieldFit/fitField';

/** A band fit as it is kept: what was asked for and what came out, without the curves, which follow from both. */
export function recordBandFit(
  request: Pick<BandFitRequest, 'start' | 'baseline'>,
  fit: BandFit,
  range_cm1: readonly [number, number] | null,
): BandFitRecord {
  return {
    range_cm1: range_cm1 === null ? null : [...range_cm1],
    start: request.start.map(({ centre_cm1, fwhm_cm1, height }) => ({ centre_cm1, fwhm_cm1, height })),
    baseline: request.baseline,
    bands: fit.bands.map(({ centre_cm1, fwhm_cm1, height, se }) => ({
      centre_cm1,
      fwhm_cm1,
      height,
      se: { ...se },
    })),
    baselineAt: fit.baseline === null ? null : [fit.baseline.b0, fit.baseline.b0 + fit.baseline.b1],
    status: fit.status,
    rss: fit.rss,
    points: fit.points,
  };
}

/** An assignment as it is kept; `byPerson` marks the bands whose partner a person chose. */
export function recordAssignment(
  measured: readonly MeasuredBand[],
  predicted: readonly PredictedBand[],
  assignment: BandAssignment,
  byPerson: ReadonlySet<number>,
): AssignedBand[] {
  return assignment.pairs.map((pair, i): AssignedBand => {
    const partner = pair.predicted === null ? null : predicted[pair.predicted]!;
    return {
      energy_cm1: { value: measured[i]!.energy_cm1, u: measured[i]!.u_cm1 },
      label: partner?.label ?? null,
      multiplicity: partner?.multiplicity ?? null,
      predicted_cm1: partner?.energy_cm1 ?? null,
      by: byPerson.has(i) ? 'person' : 'matching',
    };
  });
}

const kept = ({ value, se, status }: FittedParameter) => ({ value, se, status });

export function recordFieldFit(
  request: Pick<FieldFitRequest, 'dElectrons' | 'geometry'>,
  fit: FieldFit,
): FieldFitRecord {
  return {
    dElectrons: request.dElectrons,
    geometry: request.geometry,
    tenDq: kept(fit.tenDq),
    B: kept(fit.B),
    C: kept(fit.C),
    rms_cm1: fit.rms_cm1,
    notDetermined: [...fit.notDetermined],
    warnings: [...fit.warnings],
  };
}
