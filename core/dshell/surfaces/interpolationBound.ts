import { type CurvePoint, type LevelCurve } from './curves';

/**
 * How far cubic Hermite interpolation between two points can be from the truth, per curve, in units of B.
 *
 * H is linear in 10Dq/B, so the sum S of the lowest k eigenvalues of a block is concave (K. Fan, Proc. Natl. Acad. Sci. 35,
 * 652, 1949): between the points it lies above the chord and below both tangents. With a and b the slopes lost on either side,
 * that leaves a gap of at most h ab/(a + b), and the interpolant rises above the chord by at most h max(a, b)/4. A single
 * eigenvalue is the difference of two such sums. No derivative beyond the first is needed and nothing is assumed.
 */
export function interpolationBound(
  curves: readonly LevelCurve[],
  left: CurvePoint,
  right: CurvePoint,
  out: Float32Array | Float64Array,
  at: number,
): void {
  const h = right.x - left.x;
  let before = 0;
  let energy0 = 0;
  let energy1 = 0;
  let slope0 = 0;
  let slope1 = 0;
  for (let c = 0; c < curves.length; c++) {
    if (curves[c]!.order === 0) {
      before = 0;
      energy0 = 0;
      energy1 = 0;
      slope0 = 0;
      slope1 = 0;
    }
    energy0 += left.energy[c]!;
    energy1 += right.energy[c]!;
    slope0 += left.slope[c]!;
    slope1 += right.slope[c]!;
    const chord = (energy1 - energy0) / h;
    const a = Math.max(0, slope0 - chord);
    const b = Math.max(0, chord - slope1);
    const gap = a + b === 0 ? 0 : (a * b) / (a + b);
    const sum = h * Math.max(gap, Math.max(a, b) / 4);
    out[at + c] = sum + before;
    before = sum;
  }
}
