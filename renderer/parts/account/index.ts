export { CautionList } from './CautionList';
export { FlagList, FlagMark } from './FlagList';
export { SourceNote, type SourceStatus } from './SourceNote';
export { Why } from './Why';
