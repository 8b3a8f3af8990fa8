import { curvePoint } from './curves';
import { coarseStep, type LevelSurface } from './levelSurface';

/**
 * Where 10Dq/B = x lies in a surface, as piece + t with 0 ≤ t ≤ 1 the place within the piece; −1 beyond the table. (One number,
 * so that bulk work makes no garbage; at a right knot t = 1 is the next piece's t = 0.)
 */
export function locate(surface: LevelSurface, x: number): number {
  if (!(x >= 0 && x < surface.reach)) return -1;
  const coarse = Math.floor(x / coarseStep);
  return surface.firstPiece[coarse]! + (x / coarseStep - coarse) * (1 << surface.halvings[coarse]!);
}

/** c0 + t (c1 + t (c2 + t c3)) from four numbers at `at`. */
export const cubicAt = (coefficients: Float64Array, at: number, t: number): number =>
  coefficients[at]! + t * (coefficients[at + 1]! + t * (coefficients[at + 2]! + t * coefficients[at + 3]!));

/** A level read from a surface: energy in cm⁻¹ (not relative), its derivatives, and how wrong it can be. */
export interface SurfaceReading {
  readonly energy: number;
  readonly slope: { readonly tenDq: number; readonly B: number; readonly C: number };
  /** Rigorous bound on the interpolation error, cm⁻¹; 0 where computed directly. */
  readonly bound: number;
}

/** One curve at 10Dq and B (both cm⁻¹; B > 0). Beyond the table the level is computed directly. */
export function readCurve(surface: LevelSurface, tenDq: number, B: number, curve: number): SurfaceReading {
  const x = tenDq / B;
  const place = locate(surface, x);
  if (place < 0) {
    const point = curvePoint(surface.electrons, surface.geometry, surface.cOverB, x);
    return reading(surface, B, x, point.energy[curve]!, point.slope[curve]!, point.slopeC[curve]!, 0);
  }
  const piece = Math.floor(place);
  const t = place - piece;
  const entry = piece * surface.curves.length + curve;
  const { coefficients, slopesC, widths, bounds } = surface;
  const [c1, c2, c3] = [
    coefficients[4 * entry + 1]!,
    coefficients[4 * entry + 2]!,
    coefficients[4 * entry + 3]!,
  ];
  const slope = (c1 + t * (2 * c2 + t * 3 * c3)) / widths[piece]!;
  const slopeC = slopesC[2 * entry]! + t * slopesC[2 * entry + 1]!;
  const energy = cubicAt(coefficients, 4 * entry, t);
  return reading(surface, B, x, energy, slope, slopeC, B * bounds[entry]!);
}

/** E = B e(x, y) with x = 10Dq/B, y = C/B, so ∂E/∂B = e − x e_x − y e_y. */
function reading(
  { cOverB }: LevelSurface,
  B: number,
  x: number,
  e: number,
  slopeX: number,
  slopeY: number,
  bound: number,
): SurfaceReading {
  return {
    energy: B * e,
    slope: { tenDq: slopeX, B: e - x * slopeX - cOverB * slopeY, C: slopeY },
    bound,
  };
}
