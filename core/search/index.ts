export { wishSchema, type BandWindow, type ClearWindow, type Wish, type WishInput } from './wish/wish';
export { checkWish } from './wish/checkWish';
export { countCandidates, spaceOf, type CandidateSpace } from './space/space';
export { candidatesIn, type SpaceCandidate } from './space/candidates';
export { scoreWish, type WishPart, type WishScore } from './score/scoreWish';
export {
  leastProbability,
  scoreCandidate,
  searchWish,
  type SearchOptions,
  type SearchProgress,
  type SearchResult,
} from './run/searchWish';
export { isAnswer, whyNot, type Exclusion, type WhyNot } from './advice/whyNot';
export { relaxations, type Relaxation } from './advice/relax';
export { neededFields, type NeededField } from './inverse/neededField';
