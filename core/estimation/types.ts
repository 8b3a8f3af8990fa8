/** How a number was come by, in falling order of trust. */
export type EstimateRoute =
  | 'measured-complex'
  | 'measured-relative'
  | 'published-factors'
  | 'metal-specific'
  | 'donor-class'
  | 'series-place'
  | 'free-ion'
  | 'not-estimated';

/** One line of the account behind a number. */
export interface Reason {
  readonly kind: 'source' | 'assumption' | 'doubt' | 'settle';
  readonly text: string;
  /** Contribution to the standard deviation, in the unit of the quantity, where this line is a source of doubt. */
  readonly sigma?: number;
}

/**
 * One cause of doubt and the change it makes at one standard deviation, in the unit of the quantity. Estimates that
 * name the same cause move together: the shares of two complexes with a common ligand cancel in their difference.
 */
export interface DoubtShare {
  readonly cause: string;
  readonly sigma: number;
}

/** A number with its uncertainty and the account of both. `value` is null when it cannot be estimated. */
export interface Estimate {
  readonly value: number | null;
  /** Standard deviation (68 %), same unit. */
  readonly sigma: number | null;
  readonly unit: 'cm-1';
  readonly route: EstimateRoute;
  readonly reasons: readonly Reason[];
  /** The variance by cause; `sigma` is the root of the sum of their squares. */
  readonly shares?: readonly DoubtShare[];
}

/** A remark on the whole estimate. `invalid` means: the model is known to fail here, do not trust the number. */
export interface Flag {
  readonly code: string;
  readonly severity: 'note' | 'caution' | 'invalid';
  readonly message: string;
}
