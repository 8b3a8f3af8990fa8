export { bundleExtension, bundleFormat, bundleLimits, bundleVersion, type BundleLimits } from './format';
export {
  bundleTables,
  emptyContent,
  tableNames,
  type BundleContent,
  type TableName,
  type TableRow,
} from './tables';
export { mergeBundles, type Choose, type MergeConflict, type MergeResult, type Side } from './merge';
export { readBundle, type BundleReading } from './read';
export { bundlePieces, contentChecksum, writeBundle } from './write';
