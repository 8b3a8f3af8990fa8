/** n! for 0 ≤ n ≤ 40; exact up to 18!, to double precision above. */
export const factorials: readonly number[] = Array.from({ length: 41 }).reduce<number[]>(
  (list, _, n) => [...list, n === 0 ? 1 : list[n - 1]! * n],
  [],
);

export const isTriangle = (a: number, b: number, c: number): boolean =>
  a + b >= c && a + c >= b && b + c >= a && Number.isInteger(a + b + c);

/** (a + b − c)! (a − b + c)! (−a + b + c)! / (a + b + c + 1)! */
export function triangleFactor(a: number, b: number, c: number): number {
  const f = factorials;
  return (f[a + b - c]! * f[a - b + c]! * f[-a + b + c]!) / f[a + b + c + 1]!;
}

/** (−1)^n for an integer n of either sign. */
export const parity = (n: number): 1 | -1 => (Math.abs(Math.round(n)) % 2 === 0 ? 1 : -1);
