import { SpinhueError } from '../../errors';
import { requireFinite } from '../checkProblem';
import { diagramLabel } from './diagramLabel';
import { followLevels } from './followLevels';
import { lowestCurveChanges } from './groundChanges';
import { problemAlong, type DiagramParameter } from './parameter';
import { pencilAlong, type BlockSolution, type Pencil } from './pencil';
import { type LevelProblem } from '../problem';

/** One level followed along the parameter. */
export interface DiagramCurve {
  /** `4T2g` without spin-orbit coupling, `G8` with it. */
  readonly label: string;
  /** 2S + 1; null with spin-orbit coupling. */
  readonly multiplicity: number | null;
  readonly degeneracy: number;
  /** Relative to the ground level at each x, cm⁻¹. */
  readonly energies: Float64Array;
}

/** Where the ground level changes. */
export interface GroundChange {
  readonly x: number;
  /** Labels below and above x. */
  readonly from: string;
  readonly to: string;
}

/** Energies along one parameter, ready to plot. */
export interface LevelDiagram {
  readonly x: Float64Array;
  /** Ascending by energy at the first x. */
  readonly curves: readonly DiagramCurve[];
  /** Absolute energy of the ground level at each x, cm⁻¹. */
  readonly ground: Float64Array;
  readonly groundChanges: readonly GroundChange[];
}

export interface DiagramRange {
  readonly from: number;
  readonly to: number;
  /** Places to compute, ends included; 101 where left out. */
  readonly points?: number;
}

/** Ground changes are located to this, in the parameter. */
const precision = 1e-7;
/** Steps are halved down to this share of the range before a level is taken to cross another of its own kind. */
const finestShare = 1e-6;

/**
 * All levels of a problem along one parameter: 10Dq/B, an axial distortion, ζ, e_π of one ligand. Each level is followed by its
 * symmetry and, among levels of one symmetry, by its eigenvector; ground-state changes are located to better than 1e-6 in
 * the parameter. A magnetic field in the problem is left out. Throws what `levels` throws, and `out-of-range`,
 * `unknown-field-value` for the range and the parameter.
 */
export function levelDiagram(
  problem: LevelProblem,
  parameter: DiagramParameter,
  { from, to, points = 101 }: DiagramRange,
): LevelDiagram {
  checkRange(from, to, points);
  const problemAt = problemAlong(problem, parameter);
  const x = Float64Array.from({ length: points }, (_, i) => from + ((to - from) * i) / (points - 1));
  const pencil = pencilAlong(problemAt, Array.from(x));
  const absolute = pencil.blocks.flatMap((_, index) =>
    blockCurves(pencil, index, x, finestShare * (to - from)),
  );
  const ground = x.map((_, i) => Math.min(...absolute.map(({ energies }) => energies[i]!)));
  const curves = absolute
    .map(({ index, energies }) => ({
      ...nameOf(pencil, index),
      energies: energies.map((energy, i) => energy - ground[i]!),
    }))
    .sort((a, b) => a.energies[0]! - b.energies[0]!);
  return { x, curves, ground, groundChanges: groundChanges(pencil, x) };
}

function checkRange(from: number, to: number, points: number): void {
  requireFinite(from, 'from');
  requireFinite(to, 'to');
  if (to > from && Number.isInteger(points) && points >= 2 && points <= 10_000) return;
  throw new SpinhueError({
    code: 'out-of-range',
    message: `a diagram from ${from} to ${to} with ${points} places cannot be drawn`,
    field: to > from ? 'points' : 'to',
    remedy: 'give a range that ascends and 2 to 10 000 places',
  });
}

function nameOf({ blocks, group }: Pencil, index: number): Omit<DiagramCurve, 'energies'> {
  const { species, S, degeneracy } = blocks[index]!;
  const multiplicity = S === null ? null : 2 * S + 1;
  return { label: diagramLabel(group, species.name, multiplicity), multiplicity, degeneracy };
}

/** The levels of one block over all places, absolute. */
function blockCurves(
  pencil: Pencil,
  index: number,
  x: Float64Array,
  finest: number,
): { index: number; energies: Float64Array }[] {
  const solve = (at: number): BlockSolution => pencil.solve(at, index);
  let before = { x: x[0]!, solution: solve(x[0]!) };
  const curves = Array.from(before.solution.values, (value) => {
    const energies = new Float64Array(x.length);
    energies[0] = value;
    return { index, energies };
  });
  let places = Array.from(curves.keys());
  for (let i = 1; i < x.length; i++) {
    const here = { x: x[i]!, solution: solve(x[i]!) };
    const order = followLevels(solve, before, here, finest);
    places = places.map((place) => order[place]!);
    places.forEach((place, curve) => (curves[curve]!.energies[i] = here.solution.values[place]!));
    before = here;
  }
  return curves;
}

function groundChanges(pencil: Pencil, x: Float64Array): GroundChange[] {
  const lowest = (at: number): number[] =>
    pencil.blocks.map((_, index) => pencil.solve(at, index).values[0]!);
  // At the very ends several levels may be one (zero field): the ground level is read just inside.
  const inset = 1e-6 * (x.at(-1)! - x[0]!);
  const changes = Array.from(x.subarray(1)).flatMap((right, i) => {
    const left = i === 0 ? x[0]! + inset : x[i]!;
    return lowestCurveChanges(lowest, left, i === x.length - 2 ? right - inset : right, precision);
  });
  return changes.map(({ x: at, from, to }) => ({
    x: at,
    from: nameOf(pencil, from).label,
    to: nameOf(pencil, to).label,
  }));
}
