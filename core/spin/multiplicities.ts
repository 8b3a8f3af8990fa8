/** Unpaired electrons of the high-spin and low-spin ground configurations. */
export interface SpinPair {
  readonly high: number;
  readonly low: number;
}

const octahedral: Readonly<Record<number, SpinPair>> = {
  4: { high: 4, low: 2 },
  5: { high: 5, low: 1 },
  6: { high: 4, low: 0 },
  7: { high: 3, low: 1 },
};

const tetrahedral: Readonly<Record<number, SpinPair>> = {
  3: { high: 3, low: 1 },
  4: { high: 4, low: 0 },
  5: { high: 5, low: 1 },
  6: { high: 4, low: 2 },
};

/** Four donors in a plane push one orbital far above the rest: eight electrons pair in the other four. */
const squarePlanar: Readonly<Record<number, SpinPair>> = {
  4: { high: 4, low: 2 },
  5: { high: 5, low: 1 },
  6: { high: 4, low: 2 },
  7: { high: 3, low: 1 },
  8: { high: 2, low: 0 },
};

/** The two spin states a d^n ion may choose between; null where it has no choice. */
export function spinPair(dElectrons: number, geometry: string): SpinPair | null {
  if (geometry === 'tetrahedral') return tetrahedral[dElectrons] ?? null;
  if (geometry === 'square-planar') return squarePlanar[dElectrons] ?? null;
  return octahedral[dElectrons] ?? null;
}

/** Unpaired electrons after Hund, for ions without a choice. */
export const hundUnpaired = (dElectrons: number): number => (dElectrons <= 5 ? dElectrons : 10 - dElectrons);
