/** Marks the file; frozen for good. */
export const bundleFormat = 'spinhue-project';

/** Grows by one with each change that an older program could not read; each number ever written stays readable. */
export const bundleVersion = 1;

/** Suggested ending of a file name. */
export const bundleExtension = 'spinhue.json';

export interface BundleLimits {
  /** Of the file, bytes. */
  readonly bytes: number;
  /** Of nested arrays and objects. */
  readonly depth: number;
  /** Problems reported before reading gives up. */
  readonly problems: number;
}
export const bundleLimits: BundleLimits = { bytes: 400e6, depth: 40, problems: 100 };
