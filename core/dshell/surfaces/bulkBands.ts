import { curvePoint } from './curves';
import { cubicAt, locate } from './evaluate';
import { type LevelSurface } from './levelSurface';

/** Results for many candidates of one ion, geometry and C/B; row i belongs to candidate i. Energies in cm⁻¹. */
export interface BulkBands {
  readonly count: number;
  /** 2S + 1 of the ground level. */
  readonly groundMultiplicity: Uint8Array;
  /** Index in `surface.curves` of the ground level. */
  readonly groundCurve: Uint8Array;
  /** The multiplicities of the ion, highest first. */
  readonly multiplicities: readonly number[];
  /** Lowest level of each of them relative to the ground level: `[i * multiplicities.length + m]`. */
  readonly spinEnergies: Float64Array;
  readonly bandCount: number;
  /** Lowest spin-allowed transitions, ascending: `[i * bandCount + b]`; NaN where there are fewer. */
  readonly bands: Float64Array;
  /** Upper level of each band as an index in `surface.curves`; 255 where there is none. */
  readonly bandCurve: Uint8Array;
  /** Rigorous bound on the interpolation error of every number in the row, cm⁻¹. */
  readonly bound: Float64Array;
}

/** Room for `count` candidates; reuse it, so that memory does not grow with the number of candidates. */
export function bulkRoom(surface: LevelSurface, count: number, bandCount = 3): BulkBands {
  const multiplicities = [...new Set(surface.curves.map(({ multiplicity }) => multiplicity))];
  return {
    count,
    groundMultiplicity: new Uint8Array(count),
    groundCurve: new Uint8Array(count),
    multiplicities,
    spinEnergies: new Float64Array(count * multiplicities.length),
    bandCount,
    bands: new Float64Array(count * bandCount),
    bandCurve: new Uint8Array(count * bandCount),
    bound: new Float64Array(count),
  };
}

/**
 * Ground level, spin energies and first spin-allowed bands of `count` candidates from a surface: a table look-up and a
 * cubic per level. `tenDq` and `B` in cm⁻¹, B > 0; C = B · surface.cOverB. Beyond the table levels are computed directly.
 * Fills and returns `out`.
 */
export function bulkBands(
  surface: LevelSurface,
  tenDq: ArrayLike<number>,
  B: ArrayLike<number>,
  out: BulkBands = bulkRoom(surface, tenDq.length),
  count = out.count,
): BulkBands {
  const spins = spinSets(surface, out.multiplicities);
  const n = surface.curves.length;
  const { coefficients, bounds } = surface;
  const energy = new Float64Array(n);
  const spinCount = spins.length;
  for (let i = 0; i < count; i++) {
    const x = tenDq[i]! / B[i]!;
    const place = locate(surface, x);
    const piece = Math.floor(place);
    const t = place - piece;
    const first = 4 * piece * n;
    if (place < 0) energy.set(curvePoint(surface.electrons, surface.geometry, surface.cOverB, x).energy);
    let ground = Infinity;
    let groundCurve = 0;
    let groundSpin = 0;
    let bound = 0;
    for (let s = 0; s < spinCount; s++) {
      const { lowest } = spins[s]!;
      let least = Infinity;
      for (let l = 0; l < lowest.length; l++) {
        const c = lowest[l]!;
        if (place >= 0) {
          energy[c] = cubicAt(coefficients, first + 4 * c, t);
          bound = Math.max(bound, bounds[piece * n + c]!);
        }
        const value = energy[c]!;
        if (value >= least) continue;
        least = value;
        if (value >= ground) continue;
        ground = value;
        groundCurve = c;
        groundSpin = s;
      }
      out.spinEnergies[i * spinCount + s] = least;
    }
    for (let s = 0; s < spinCount; s++) {
      const at = i * spinCount + s;
      out.spinEnergies[at] = B[i]! * (out.spinEnergies[at]! - ground);
    }
    const { higher, curves, multiplicity } = spins[groundSpin]!;
    if (place >= 0) {
      for (let l = 0; l < higher.length; l++) {
        const c = higher[l]!;
        energy[c] = cubicAt(coefficients, first + 4 * c, t);
        bound = Math.max(bound, bounds[piece * n + c]!);
      }
    }
    out.groundMultiplicity[i] = multiplicity;
    out.groundCurve[i] = groundCurve;
    lowestBands(out, i, energy, curves, groundCurve, B[i]!);
    // A difference of two energies.
    out.bound[i] = 2 * B[i]! * bound;
  }
  return out;
}

/** Per multiplicity its curves, and which of them are the lowest of a block. */
function spinSets(surface: LevelSurface, multiplicities: readonly number[]) {
  return multiplicities.map((multiplicity) => {
    const curves = surface.curves.flatMap((curve, c) => (curve.multiplicity === multiplicity ? [c] : []));
    return {
      multiplicity,
      curves: Int32Array.from(curves),
      lowest: Int32Array.from(curves.filter((c) => surface.curves[c]!.order === 0)),
      higher: Int32Array.from(curves.filter((c) => surface.curves[c]!.order > 0)),
    };
  });
}

/** The lowest levels above the ground level among `curves`, kept in order by insertion. */
function lowestBands(
  out: BulkBands,
  i: number,
  energy: Float64Array,
  curves: Int32Array,
  groundCurve: number,
  B: number,
): void {
  const { bandCount, bands, bandCurve } = out;
  const from = i * bandCount;
  const ground = energy[groundCurve]!;
  bands.fill(Infinity, from, from + bandCount);
  bandCurve.fill(255, from, from + bandCount);
  for (let l = 0; l < curves.length; l++) {
    const c = curves[l]!;
    const band = B * (energy[c]! - ground);
    if (c === groundCurve || band >= bands[from + bandCount - 1]!) continue;
    let at = from + bandCount - 1;
    for (; at > from && bands[at - 1]! > band; at--) {
      bands[at] = bands[at - 1]!;
      bandCurve[at] = bandCurve[at - 1]!;
    }
    bands[at] = band;
    bandCurve[at] = c;
  }
  for (let b = from; b < from + bandCount; b++) if (bandCurve[b] === 255) bands[b] = Number.NaN;
}
