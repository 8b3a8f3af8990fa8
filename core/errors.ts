/**
 * What can go wrong, as data. The interface switches on `code`, never on the wording.
 * Input problems name the field, the value and the remedy; several can be reported at once.
 */
export type ErrorCode =
  | 'empty-input'
  | 'malformed-json'
  | 'wrong-type'
  | 'unknown-field-value'
  | 'missing-field'
  | 'unknown-metal'
  | 'unknown-ion'
  | 'impossible-oxidation-state'
  | 'unknown-geometry'
  | 'unknown-ligand'
  | 'bad-ligand-count'
  | 'coordination-number'
  | 'unknown-isomer'
  | 'out-of-range'
  | 'not-finite'
  | 'not-symmetric'
  | 'ligands-too-close'
  | 'no-convergence'
  | 'not-estimated'
  | 'too-large'
  | 'cancelled'
  | 'unreadable-file'
  | 'newer-format'
  | 'integrity'
  | 'contradictory-wish'
  | 'usage';

export interface Problem {
  readonly code: ErrorCode;
  /** A sentence for a person: what is wrong, with the value found. */
  readonly message: string;
  /** Where, as a path into the input (`[3].ligands.nh3`), or the name of the quantity. */
  readonly field: string;
  /** What to do about it. */
  readonly remedy?: string;
}

export class SpinhueError extends Error implements Problem {
  override readonly name = 'SpinhueError';
  readonly code: ErrorCode;
  readonly field: string;
  readonly remedy?: string;

  constructor(problem: Problem) {
    super(problem.message);
    this.code = problem.code;
    this.field = problem.field;
    if (problem.remedy !== undefined) this.remedy = problem.remedy;
  }
}

/** A result that may be refused: everything wrong at once, not only the first. */
export type Checked<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly problems: readonly Problem[] };

export const accepted = <T>(value: T): Checked<T> => ({ ok: true, value });
export const refused = <T>(...problems: Problem[]): Checked<T> => ({ ok: false, problems });
