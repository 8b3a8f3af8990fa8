import type { Analysis } from '../../record/analysis';
import type { BundleContent } from '../../record/bundle';
import type { Measurement } from '../../record/measurement';
import type { Candidate, FrozenPrediction } from '../../record/project';
import type { Uncertain } from '../../record/uncertain';
import type { Observation } from './observations';

/** An observation without its library, which is laid over where it is used. */
export type PlainObservation = Omit<Observation, 'library'>;

/** No field fit is taken for better than this: 10Dq to 1 %, B to 3 % (common practice of repeated spectra). */
const least = { tenDq: 0.01, B: 0.03 } as const;

function usable(
  fitted: { value: number | null; se: number | null; status: string },
  share: number,
): Uncertain | null {
  if (fitted.status !== 'fitted' || fitted.value === null || !(fitted.value > 0)) return null;
  return { value: fitted.value, u: Math.max(fitted.se ?? 0, share * fitted.value) };
}

interface FrozenSpin {
  readonly spin?: { readonly state?: string };
}

/** What the field fits of the record say, one observation a measurement; fits against physics say nothing. */
export function observationsOf(
  measurements: readonly Measurement[],
  analyses: ReadonlyMap<string, Analysis>,
  frozen: ReadonlyMap<string, FrozenPrediction>,
  candidateOf: (id: string) => Candidate | undefined,
): PlainObservation[] {
  return measurements.flatMap((measurement): PlainObservation[] => {
    const fit = analyses.get(measurement.id)?.fieldFit;
    const candidate = candidateOf(measurement.candidateId);
    if (!fit || !candidate || fit.warnings.length > 0) return [];
    const tenDq = usable(fit.tenDq, least.tenDq);
    const B = usable(fit.B, least.B);
    if (tenDq === null && B === null) return [];
    const { spin } = (frozen.get(measurement.frozenPredictionId ?? '')?.prediction ?? {}) as FrozenSpin;
    const state = spin?.state === 'high' || spin?.state === 'low' ? spin.state : null;
    const { metal, oxidationState, geometry, ligands, isomer } = candidate.composition;
    return [
      {
        id: measurement.id,
        composition: { metal, oxidationState, geometry, ligands, isomer: isomer ?? null },
        spin: state,
        tenDq,
        B,
        source: 'field fit of this record',
      },
    ];
  });
}

/** The same of a whole project as exported; what lies in the bin says nothing. */
export function bundleObservations(content: BundleContent): PlainObservation[] {
  const kept = <T extends { readonly deletedAt: string | null }>(rows: readonly T[]): T[] =>
    rows.filter(({ deletedAt }) => deletedAt === null);
  const candidates = new Map(kept(content.candidates).map((each) => [each.id, each]));
  return observationsOf(
    kept(content.measurements),
    new Map(kept(content.analyses).map((each) => [each.measurementId, each])),
    new Map(content.frozenPredictions.map((each) => [each.id, each])),
    (id) => candidates.get(id),
  );
}
