import { complexKey, type ParameterLibrary } from '../../../core/library';
import { predict } from '../../../core/prediction';
import { checkWish, countCandidates, scoreCandidate, spaceOf } from '../../../core/search';
import { summarise } from '../estimateSummary';
import type { Question, Reply } from './protocol';

/** Answers a question about a wish; a wish or complex that makes no sense is refused with the reasons. */
export function answer(question: Question, library: ParameterLibrary): Reply {
  const checked = checkWish(question.wish, library);
  if (!checked.ok) return { kind: 'refused', problems: checked.problems };
  if (question.kind === 'count') {
    return { kind: 'counted', count: countCandidates(spaceOf(checked.value, library)) };
  }
  const candidate = { id: complexKey(question.composition), ...question.composition };
  const scored = scoreCandidate(candidate, checked.value, library);
  if (scored === null) {
    const outcome = predict(candidate, { library, draws: 0 });
    return { kind: 'refused', problems: outcome.ok ? [] : outcome.problems };
  }
  const { prediction, result } = scored;
  return {
    kind: 'scored',
    scored: {
      formula: result.formula,
      score: { probability: result.probability, parts: result.parts },
      summary: summarise({ ok: true, prediction }),
    },
  };
}
