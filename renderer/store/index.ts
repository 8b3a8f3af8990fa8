export { keptInBin_days, type BinContent, type BinRecord } from './bin';
export { drafts } from './drafts';
export type { EstimateCache } from './estimateCache';
export { exportProject, fileNameFor, projectContent } from './exchange/exportProject';
export {
  bringIn,
  bringInAsCopy,
  planImport,
  type ImportPlan,
  type TablePlan,
} from './exchange/importProject';
export { askForLastingStorage, type StorageState } from './persistence';
export { type AnalysisFields } from './repositories/analyses';
export { blankCandidate, type CandidateFields, type NewCandidate } from './repositories/candidates';
export { type AddedMeasurements, type Correction, type NewMeasurements } from './repositories/measurements';
export { type ProjectFields } from './repositories/projects';
export { type NamedBatch, type Phase, type SampleFields } from './repositories/samples';
export { defaultSettings, type Settings } from './repositories/settings';
export { type ShortlistEntry } from './repositories/shortlist';
export { type Change, type Edit, type NewRow, type RecordTable, type RowOf } from './rows';
export { openStore, type Store, type StoreOptions } from './store';
export { asStoreError, StoreError, type StoreErrorCode } from './storeError';
export { counted } from './words';
