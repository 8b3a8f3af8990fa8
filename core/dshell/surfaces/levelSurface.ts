import { requireElectronCount, requireFinite, requireNotNegative } from '../checkProblem';
import { type CubicGeometry } from '../types';
import { curvePoint, levelCurves, type CurvePoint, type LevelCurve } from './curves';
import { interpolationBound } from './interpolationBound';

/**
 * All level energies of d^N in a cubic field for one C/B, as functions of 10Dq/B: since the Hamiltonian is linear in its
 * parameters, E(10Dq, B, C) = B · e(10Dq/B, C/B). Cubic Hermite pieces with exact values and slopes at the knots; coarse
 * steps of 1/8 are halved wherever the rigorous bound asks for it.
 */
export interface LevelSurface {
  readonly electrons: number;
  readonly geometry: CubicGeometry;
  readonly cOverB: number;
  readonly curves: readonly LevelCurve[];
  /** The table holds 10Dq/B from 0 to here. */
  readonly reach: number;
  /** Largest interpolation error of any energy anywhere in the table, in units of B (rigorous). */
  readonly largestBound: number;
  /** Piece of coarse step i: the first of `1 << halvings[i]` equal pieces. */
  readonly firstPiece: Int32Array;
  readonly halvings: Uint8Array;
  /** Left knot of each piece, and its width. */
  readonly knots: Float64Array;
  readonly widths: Float64Array;
  /** Per piece and curve the cubic c0 + c1 t + c2 t² + c3 t³, t from 0 to 1. */
  readonly coefficients: Float64Array;
  /** Per piece and curve ∂e/∂(C/B) at the left knot and its change to the right one. */
  readonly slopesC: Float64Array;
  /** Per piece and curve the rigorous error bound, units of B. */
  readonly bounds: Float32Array;
}

export interface SurfaceOptions {
  /** Largest 10Dq/B; beyond it levels are computed directly. */
  readonly reach?: number;
  /** Error to stay below, in units of B. */
  readonly tolerance?: number;
}

export const coarseStep = 1 / 8;
/** Pieces down to 1/8/2^10, about 1e-4. */
const mostHalvings = 10;

/** Builds a surface. Throws `out-of-range` or `not-finite`. */
export function buildLevelSurface(
  electrons: number,
  geometry: CubicGeometry,
  cOverB: number,
  { reach = 100, tolerance = 2e-4 }: SurfaceOptions = {},
): LevelSurface {
  requireElectronCount(electrons);
  requireNotNegative(cOverB, 'cOverB');
  requireFinite(reach, 'reach');
  const curves = levelCurves(electrons);
  const pointAt = (x: number): CurvePoint => curvePoint(electrons, geometry, cOverB, x);
  const steps = Math.max(1, Math.ceil(reach / coarseStep));
  const firstPiece = new Int32Array(steps);
  const halvings = new Uint8Array(steps);
  const pieces: { left: CurvePoint; right: CurvePoint }[] = [];
  const bound = new Float64Array(curves.length);
  let left = pointAt(0);
  for (let i = 0; i < steps; i++) {
    const right = pointAt((i + 1) * coarseStep);
    let knots = [left, right];
    for (let halved = 0; halved < mostHalvings && worstBound(curves, knots, bound) > tolerance; halved++)
      knots = knots.flatMap((knot, k) =>
        k === 0 ? [knot] : [pointAt((knots[k - 1]!.x + knot.x) / 2), knot],
      );
    firstPiece[i] = pieces.length;
    halvings[i] = Math.log2(knots.length - 1);
    for (let k = 1; k < knots.length; k++) pieces.push({ left: knots[k - 1]!, right: knots[k]! });
    left = right;
  }
  return {
    electrons,
    geometry,
    cOverB,
    curves,
    reach: steps * coarseStep,
    firstPiece,
    halvings,
    ...tabulate(curves, pieces),
  };
}

function worstBound(
  curves: readonly LevelCurve[],
  knots: readonly CurvePoint[],
  bound: Float64Array,
): number {
  let worst = 0;
  for (let k = 1; k < knots.length; k++) {
    interpolationBound(curves, knots[k - 1]!, knots[k]!, bound, 0);
    for (const value of bound) worst = Math.max(worst, value);
  }
  return worst;
}

function tabulate(curves: readonly LevelCurve[], pieces: readonly { left: CurvePoint; right: CurvePoint }[]) {
  const n = curves.length;
  const knots = new Float64Array(pieces.length);
  const widths = new Float64Array(pieces.length);
  const coefficients = new Float64Array(4 * n * pieces.length);
  const slopesC = new Float64Array(2 * n * pieces.length);
  const bounds = new Float32Array(n * pieces.length);
  pieces.forEach(({ left, right }, piece) => {
    const h = right.x - left.x;
    knots[piece] = left.x;
    widths[piece] = h;
    interpolationBound(curves, left, right, bounds, piece * n);
    for (let c = 0; c < n; c++) {
      const [e0, e1] = [left.energy[c]!, right.energy[c]!];
      const [d0, d1] = [h * left.slope[c]!, h * right.slope[c]!];
      const at = 4 * (piece * n + c);
      coefficients[at] = e0;
      coefficients[at + 1] = d0;
      coefficients[at + 2] = 3 * (e1 - e0) - 2 * d0 - d1;
      coefficients[at + 3] = 2 * (e0 - e1) + d0 + d1;
      slopesC[2 * (piece * n + c)] = left.slopeC[c]!;
      slopesC[2 * (piece * n + c) + 1] = right.slopeC[c]! - left.slopeC[c]!;
    }
  });
  return {
    knots,
    widths,
    coefficients,
    slopesC,
    bounds,
    largestBound: bounds.reduce((a, b) => Math.max(a, b), 0),
  };
}

const kept = new Map<string, LevelSurface>();
const mostKept = 24;

/** The surface for one ion, geometry and C/B; built on first use, the most recent ones kept. */
export function levelSurface(electrons: number, geometry: CubicGeometry, cOverB: number): LevelSurface {
  const key = `${electrons} ${geometry} ${cOverB}`;
  const known = kept.get(key);
  if (known !== undefined) {
    kept.delete(key);
    kept.set(key, known);
    return known;
  }
  const surface = buildLevelSurface(electrons, geometry, cOverB);
  kept.set(key, surface);
  if (kept.size > mostKept) kept.delete(kept.keys().next().value!);
  return surface;
}
