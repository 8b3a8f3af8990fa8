import type { Composition } from '../record/composition';

/** A complex as a formula or a name gives it. */
export interface ReadFormula {
  readonly composition: Composition;
  /** Charge of the complex ion. */
  readonly charge: number;
  /** Counter-ions as `3 Cl` would be typed; null where none is written. */
  readonly counterIon: string | null;
  /** `2 H2O`; null where none is written. */
  readonly solvate: string | null;
  /** What was taken for granted, one sentence each. */
  readonly assumed: readonly string[];
}

/** Where a formula stops making sense, counted in characters of what was typed, and what may be meant. */
export interface FormulaProblem {
  readonly at: number;
  readonly message: string;
  readonly suggestions: readonly string[];
}

export type FormulaReading =
  | { readonly ok: true; readonly value: ReadFormula }
  | { readonly ok: false; readonly problem: FormulaProblem };

/** Thrown inside the reader only; `readFormula` turns it into a problem. */
export class Unreadable extends Error {
  /** Place in the plain text. */
  readonly at: number;
  readonly suggestions: readonly string[];
  constructor(at: number, message: string, suggestions: readonly string[] = []) {
    super(message);
    this.at = at;
    this.suggestions = suggestions;
  }
}
