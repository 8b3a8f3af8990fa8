export { Keys } from './Keys';
export { matchOptions, type SelectOption } from './matchOptions';
export { SearchableSelect } from './SearchableSelect';
export { SegmentedChoice } from './SegmentedChoice';
