/** A colour that is wished for. */
export interface ColourTarget {
  readonly lab: readonly [number, number, number];
  /** Largest colour difference that still counts, in the measure of `difference`. */
  readonly tolerance: number;
  readonly name?: string;
}
