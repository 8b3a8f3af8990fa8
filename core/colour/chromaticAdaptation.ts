import type { Triple } from './tristimulus';

/**
 * Cone-like primaries of the Bradford transform (K. M. Lam, thesis, University of Bradford, 1985; as used in ICC.1:2004
 * annex E), and its inverse.
 */
const toCones = [
  [0.8951, 0.2664, -0.1614],
  [-0.7502, 1.7135, 0.0367],
  [0.0389, -0.0685, 1.0296],
] as const;

type Matrix = readonly (readonly [number, number, number])[];

function inverse(m: Matrix): Matrix {
  const minor = (r: number, c: number): number => {
    const [r1, r2] = [(r + 1) % 3, (r + 2) % 3];
    const [c1, c2] = [(c + 1) % 3, (c + 2) % 3];
    return m[r1]![c1]! * m[r2]![c2]! - m[r1]![c2]! * m[r2]![c1]!;
  };
  const determinant = m[0]![0] * minor(0, 0) + m[0]![1] * minor(0, 1) + m[0]![2] * minor(0, 2);
  return [0, 1, 2].map((r) => [0, 1, 2].map((c) => minor(c, r) / determinant) as [number, number, number]);
}

export const apply = (m: Matrix, [x, y, z]: Triple): Triple => [
  m[0]![0] * x + m[0]![1] * y + m[0]![2] * z,
  m[1]![0] * x + m[1]![1] * y + m[1]![2] * z,
  m[2]![0] * x + m[2]![1] * y + m[2]![2] * z,
];

const fromCones = inverse(toCones);

/** XYZ under another white, by the Bradford transform: how an eye that is used to `from` would need it under `to`. */
export function adapt(xyz: Triple, from: Triple, to: Triple): Triple {
  const cones = apply(toCones, xyz);
  const before = apply(toCones, from);
  const after = apply(toCones, to);
  return apply(fromCones, [
    (cones[0] * after[0]) / before[0],
    (cones[1] * after[1]) / before[1],
    (cones[2] * after[2]) / before[2],
  ]);
}
