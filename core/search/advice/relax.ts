import type { ParameterLibrary } from '../../library';
import { scoreCandidate, type SearchResult } from '../run/searchWish';
import { candidatesIn } from '../space/candidates';
import { countCandidates, spaceOf } from '../space/space';
import type { Wish } from '../wish/wish';

/** What giving up one part of a wish would buy. */
export interface Relaxation {
  /** Path into the wish: `bands[0]`. */
  readonly part: string;
  /** Likeliest candidate without that part, and how likely it meets all the others. */
  readonly formula: string;
  readonly probability: number;
  /** How likely that candidate meets the part that was given up, and what it offers there. */
  readonly offers: string;
}

/** Candidates that are looked at: enough to see which part stands in the way. */
const most = 1500;

const withoutPart = ({ parts, probability }: SearchResult, part: string): number => {
  const own = parts.find((each) => each.part === part)!.probability;
  if (own > 0) return Math.min(1, probability / own);
  return parts.reduce((all, each) => (each.part === part ? all : all * each.probability), 1);
};

/**
 * For a wish with no answer: which part to give up, best first. Looks at candidates in even steps through the space, so
 * it shows where the trouble lies and is no search of its own.
 */
export function relaxations(wish: Wish, library: ParameterLibrary): Relaxation[] {
  const space = spaceOf(wish, library);
  const step = Math.max(1, Math.floor(countCandidates(space) / most));
  const best = new Map<string, { readonly result: SearchResult; readonly probability: number }>();
  let place = 0;
  for (const candidate of candidatesIn(space, library)) {
    if (place++ % step !== 0) continue;
    const scored = scoreCandidate(candidate, wish, library);
    if (scored === null) continue;
    for (const { part } of scored.result.parts) {
      const probability = withoutPart(scored.result, part);
      if (probability > (best.get(part)?.probability ?? 0))
        best.set(part, { result: scored.result, probability });
    }
  }
  return [...best]
    .map(([part, { result, probability }]): Relaxation => {
      const own = result.parts.find((each) => each.part === part)!;
      return { part, formula: result.formula, probability, offers: own.because };
    })
    .sort((one, other) => other.probability - one.probability);
}
