import type { ParameterLibrary } from '../../library';
import { predict, type Prediction } from '../../prediction';
import { scoreWish, type WishPart } from '../score/scoreWish';
import { countCandidates, spaceOf } from '../space/space';
import { candidatesIn, type SpaceCandidate } from '../space/candidates';
import type { Wish } from '../wish/wish';
import { upperBound } from './upperBound';
import { TopList, type Ranked } from './topList';

export interface SearchResult extends Ranked, SpaceCandidate {
  readonly formula: string;
  readonly parts: readonly WishPart[];
}

export interface SearchProgress {
  /** Size of the space. */
  readonly count: number;
  /** Candidates estimated in full. */
  readonly evaluated: number;
  /** Candidates that a bound showed to have no place in the list. */
  readonly skipped: number;
  readonly results: readonly SearchResult[];
}

export interface SearchOptions {
  readonly top: number;
  /** Estimate every candidate, for checking: no bound is used. */
  readonly brute?: boolean;
  /** How far a run of the same wish over the same library came: this one goes on from there. */
  readonly from?: Pick<SearchProgress, 'evaluated' | 'skipped' | 'results'>;
}

/** Below this a candidate does not count as an answer: it would only pad the list. */
export const leastProbability = 1e-6;

/** Draws behind the chance of a colour; the same seed for all, so the answer is reproducible. */
const colourDraws = 200;

/** Estimates one member of the space and scores it; `null` where it cannot be estimated at all. */
export function scoreCandidate(
  candidate: SpaceCandidate,
  wish: Wish,
  library: ParameterLibrary,
): { readonly prediction: Prediction; readonly result: SearchResult } | null {
  const conditions =
    wish.colour === undefined
      ? {}
      : { concentration_mM: wish.colour.concentration_mM, path_cm: wish.colour.path_cm };
  const outcome = predict(
    { ...candidate, ...conditions },
    { library, draws: wish.colour === undefined ? 0 : colourDraws },
  );
  if (!outcome.ok) return null;
  const { probability, parts } = scoreWish(outcome.prediction, wish);
  return {
    prediction: outcome.prediction,
    result: { ...candidate, formula: outcome.prediction.formula, probability, parts },
  };
}

/** Candidates between two reports of progress. */
const reportEvery = 50;

/**
 * The best `top` members of the space by the probability that the whole wish is met; the list is the one that estimating
 * every candidate gives. Yields progress now and then, so that the caller can show it, pause, or stop for good.
 */
export function* searchWish(
  wish: Wish,
  library: ParameterLibrary,
  { top, brute = false, from }: SearchOptions,
): Generator<SearchProgress, SearchProgress> {
  const space = spaceOf(wish, library);
  const count = countCandidates(space);
  const list = new TopList<SearchResult>(top);
  from?.results.forEach((result) => list.offer(result));
  let evaluated = from?.evaluated ?? 0;
  let skipped = from?.skipped ?? 0;
  // The order is the same in every run, so that those gone through are the first ones.
  let toPass = evaluated + skipped;
  const progress = (): SearchProgress => ({ count, evaluated, skipped, results: [...list.items] });
  for (const candidate of candidatesIn(space, library)) {
    if (toPass > 0) {
      if (--toPass % (100 * reportEvery) === 0) yield progress();
      continue;
    }
    const least = Math.max(list.threshold, leastProbability);
    if (!brute && upperBound(candidate, wish, library) < least) {
      skipped++;
    } else {
      evaluated++;
      const scored = scoreCandidate(candidate, wish, library);
      if (scored !== null && scored.result.probability >= leastProbability) list.offer(scored.result);
    }
    if ((evaluated + skipped) % reportEvery === 0) yield progress();
  }
  return progress();
}
