import { complexKey, type ParameterLibrary } from '../../../core/library';
import { predict } from '../../../core/prediction';
import type { Composition } from '../../../core/record/composition';
import {
  checkWish,
  countCandidates,
  neededFields,
  relaxations,
  spaceOf,
  whyNot,
  type Wish,
} from '../../../core/search';
import { summarise } from '../estimateSummary';
import type { Question, Reply } from './protocol';

/** Answers a question about a wish; a wish or complex that makes no sense is refused with the reasons. */
export function answer(question: Question, library: ParameterLibrary): Reply {
  const checked = checkWish(question.wish, library);
  if (!checked.ok) return { kind: 'refused', problems: checked.problems };
  const wish = checked.value;
  switch (question.kind) {
    case 'count':
      return { kind: 'counted', count: countCandidates(spaceOf(wish, library)) };
    case 'score':
      return held(question.composition, wish, library);
    case 'relax':
      return { kind: 'advice', relaxations: relaxations(wish, library) };
    case 'needed': {
      const window = wish.bands?.[question.band];
      const alone = { ...wish, ions: [question.ion] };
      const fields = window === undefined ? [] : neededFields(window, question.geometry, alone, library);
      return { kind: 'needed', fields };
    }
  }
}

function held(composition: Composition, wish: Wish, library: ParameterLibrary): Reply {
  const input = { id: complexKey(composition), ...composition };
  const outcome = predict(input, { library, draws: 0 });
  const { exclusions, score } = whyNot(composition, wish, library);
  if (!outcome.ok) return { kind: 'refused', problems: outcome.problems };
  if (score === null) return { kind: 'refused', problems: [] };
  return {
    kind: 'scored',
    scored: { formula: score.formula, score, exclusions, summary: summarise(outcome) },
  };
}
