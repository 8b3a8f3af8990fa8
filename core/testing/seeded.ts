/** Repeatable random numbers for tests (mulberry32, T. Ettinger, public domain). */
export interface Seeded {
  /** Uniform in [0, 1). */
  next(): number;
  /** Whole number from 0 to below `n`. */
  below(n: number): number;
  /** Standard normal (Box and Muller, Ann. Math. Stat. 29, 610, 1958). */
  normal(): number;
}

export function seeded(seed: number): Seeded {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  return {
    next,
    below: (n) => Math.floor(next() * n),
    normal: () => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next()),
  };
}
