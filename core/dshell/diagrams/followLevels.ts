import { type BlockSolution } from './pencil';

/** Overlap squared from which a state counts as the same as before. */
const same = 0.6;

/** |⟨a|b⟩|² of two eigenvectors of one block (real, complex or quaternion: the norm of Σ conj(a) b). */
function overlap(a: BlockSolution, i: number, b: BlockSolution, j: number): number {
  const { width } = a;
  const length = a.vectors.length / a.values.length;
  const [at, bt] = [i * length, j * length];
  let [s0, s1, s2, s3] = [0, 0, 0, 0];
  for (let k = 0; k < length; k += width) {
    const a0 = a.vectors[at + k]!;
    const b0 = b.vectors[bt + k]!;
    s0 += a0 * b0;
    if (width === 1) continue;
    const a1 = a.vectors[at + k + 1]!;
    const b1 = b.vectors[bt + k + 1]!;
    s0 += a1 * b1;
    s1 += a0 * b1 - a1 * b0;
    if (width === 2) continue;
    const [a2, a3] = [a.vectors[at + k + 2]!, a.vectors[at + k + 3]!];
    const [b2, b3] = [b.vectors[bt + k + 2]!, b.vectors[bt + k + 3]!];
    s0 += a2 * b2 + a3 * b3;
    s1 += -a2 * b3 + a3 * b2;
    s2 += a0 * b2 - a2 * b0 - a3 * b1 + a1 * b3;
    s3 += a0 * b3 - a3 * b0 - a1 * b2 + a2 * b1;
  }
  return s0 * s0 + s1 * s1 + s2 * s2 + s3 * s3;
}

/** Whether every level of `b` in its place is the level of `a` in the same place. */
const keepsOrder = (a: BlockSolution, b: BlockSolution): boolean =>
  a.values.every((_, k) => overlap(a, k, b, k) >= same);

/**
 * Where the k-th level of one block at `from` has gone at `to`: `order[k]` is its place there. Levels of one row of one
 * symmetry avoid each other: while the eigenvectors turn steadily, halving the step as often as that needs, the order stays.
 * Where they still jump over a step of `finest`, the levels cross in truth or cannot be told from crossing, and each is
 * followed to the state it resembles most.
 */
export function followLevels(
  solve: (x: number) => BlockSolution,
  from: { readonly x: number; readonly solution: BlockSolution },
  to: { readonly x: number; readonly solution: BlockSolution },
  finest: number,
): number[] {
  const identity = Array.from(from.solution.values.keys());
  if (identity.length < 2 || keepsOrder(from.solution, to.solution)) return identity;
  if (to.x - from.x <= finest) return bestMatch(from.solution, to.solution);
  const x = 0.5 * (from.x + to.x);
  const middle = { x, solution: solve(x) };
  const first = followLevels(solve, from, middle, finest);
  const second = followLevels(solve, middle, to, finest);
  return first.map((place) => second[place]!);
}

/** One to one, the largest overlaps first; levels of equal energy that only mixed among themselves stay in order. */
function bestMatch(a: BlockSolution, b: BlockSolution): number[] {
  const size = a.values.length;
  const pairs = Array.from({ length: size * size }, (_, index) => {
    const [i, j] = [Math.floor(index / size), index % size];
    return { i, j, value: overlap(a, i, b, j) };
  }).sort((p, q) => q.value - p.value || Math.abs(p.i - p.j) - Math.abs(q.i - q.j));
  const order = new Array<number>(size).fill(-1);
  const taken = new Set<number>();
  for (const { i, j, value } of pairs) {
    if (value < same || order[i] !== -1 || taken.has(j)) continue;
    order[i] = j;
    taken.add(j);
  }
  const free = Array.from(b.values.keys()).filter((j) => !taken.has(j));
  return order.map((place) => (place === -1 ? free.shift()! : place));
}
