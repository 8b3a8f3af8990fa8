import { type MagneticProblem } from '../magneticProblem';
import { magnetisation, type Magnetisation } from './induced';

type Direction = readonly [number, number, number];
interface Node {
  readonly direction: Direction;
  readonly weight: number;
}

const node = (x: number, y: number, z: number, weight: number): Node => ({ direction: [x, y, z], weight });

/**
 * Half of a Lebedev grid, exact for even functions up to degree 7 (26 points; V. I. Lebedev, USSR Comput. Math. Math. Phys. 15,
 * 44, 1975): the moment along the field is even in the field, so that opposite points are one.
 */
const nodes: readonly Node[] = [
  ...(
    [
      [1, 0, 0],
      [0, 1, 0],
      [0, 0, 1],
    ] as const
  ).map(([x, y, z]) => node(x, y, z, 2 / 21)),
  ...(
    [
      [1, 1, 0],
      [1, -1, 0],
      [1, 0, 1],
      [1, 0, -1],
      [0, 1, 1],
      [0, 1, -1],
    ] as const
  ).map(([x, y, z]) => node(x, y, z, 8 / 105)),
  ...(
    [
      [1, 1, 1],
      [1, 1, -1],
      [1, -1, 1],
      [1, -1, -1],
    ] as const
  ).map(([x, y, z]) => node(x, y, z, 9 / 140)),
];

/**
 * Magnetisation of a powder in a strong field, where the mean of three axes no longer serves: the moment along the field
 * averaged over 13 directions. In a weak field it equals the mean of χ along x, y and z.
 */
export function powderMagnetisation(
  problem: MagneticProblem,
  field_T: number,
  temperatures_K: readonly number[],
): Magnetisation[] {
  const all = nodes.map(({ direction, weight }) => ({
    weight,
    points: magnetisation(problem, field_T, direction, temperatures_K),
  }));
  return temperatures_K.map((temperature_K, i) => ({
    temperature_K,
    moment_emu: all.reduce((sum, { weight, points }) => sum + weight * points[i]!.moment_emu, 0),
    moment_NAmuB: all.reduce((sum, { weight, points }) => sum + weight * points[i]!.moment_NAmuB, 0),
  }));
}
