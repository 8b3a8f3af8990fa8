import { spinOnlyMoment } from '../../../core/spin/moment';
import { spinPair } from '../../../core/spin/multiplicities';
import type { Measurement } from '../../../core/record/measurement';
import type { FrozenPrediction } from '../../../core/record/project';
import { currentContent } from '../../../core/record/revisions';

/** A measured moment beside the probability that stood predicted. */
export interface SpinPairing {
  readonly id: string;
  readonly candidateId: string;
  readonly moment_BM: number;
  readonly probabilityHigh: number;
  /** State by the moment; null where it lies between the two and says neither. */
  readonly foundHigh: boolean | null;
}

interface FrozenSpin {
  readonly dElectrons?: number;
  readonly composition?: { readonly geometry?: string };
  readonly spin?: { readonly probabilityHigh?: number | null };
}

/** The middle third between the two spin-only moments belongs to neither state. */
const undecided = 1 / 3;

/** Moments of complexes with a choice of spin state; the latest revision of each counts. */
export function spinPairsOf(
  measurements: readonly Measurement[],
  frozen: ReadonlyMap<string, FrozenPrediction>,
): SpinPairing[] {
  return measurements.flatMap((measurement) => {
    const content = currentContent(measurement);
    if (content.kind !== 'moment') return [];
    const kept = frozen.get(measurement.frozenPredictionId ?? '');
    const { dElectrons, composition, spin } = (kept?.prediction ?? {}) as FrozenSpin;
    const probabilityHigh = spin?.probabilityHigh;
    const pair = dElectrons === undefined ? null : spinPair(dElectrons, composition?.geometry ?? '');
    if (pair === null || probabilityHigh === null || probabilityHigh === undefined) return [];
    const [low, high] = [spinOnlyMoment(pair.low), spinOnlyMoment(pair.high)];
    const moment_BM = content.moment_BM.value;
    const place = (moment_BM - low) / (high - low);
    const foundHigh = Math.abs(place - 0.5) < undecided / 2 ? null : place > 0.5;
    const { id, candidateId } = measurement;
    return [{ id, candidateId, moment_BM, probabilityHigh, foundHigh }];
  });
}
