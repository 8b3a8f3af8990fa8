import {
  compose,
  cross,
  normalise,
  rotationAbout,
  rotationToFrame,
  type Quaternion,
  type Vector3,
} from '../../symmetry';
import { turnedField } from './symmetryAxes';
import { fieldTensors, type FieldMatrix, type FieldTensors } from './tensorComponents';

/** A frame whose z is the direction of a magnetic field, and what symmetry about z the ligand field has in it. */
export interface MagneticFrame {
  readonly rotation: Quaternion;
  /** Order of the axis along the magnetic field; 0 for full symmetry about it, 1 for none. */
  readonly order: 0 | 1 | 2 | 3 | 4;
  /** `real` where y can be chosen as a twofold axis of the ligand field. */
  readonly algebra: 'real' | 'complex';
  readonly tensors: FieldTensors;
}

/** Components up to this size (cm⁻¹, and relative to the whole field) are taken for rounding. */
const roundingOf = (scale: number): number => Math.max(1e-7, 1e-11 * scale);

/** The frame about a magnetic field along `direction` (any length but zero). */
export function magneticFrame(V: FieldMatrix, direction: Vector3): MagneticFrame {
  const z = normalise(direction);
  const helper: Vector3 = Math.abs(z[1]) < 0.8 ? [0, 1, 0] : [0, 0, 1];
  const x = normalise(cross(helper, z));
  const standing = rotationToFrame(x, cross(z, x), z);
  const seen = fieldTensors(turnedField(V, standing));
  const rounding = roundingOf(Math.max(...parts(seen).map(({ modulus }) => modulus)));
  const present = parts(seen).filter(({ q, modulus }) => q > 0 && modulus > rounding);
  const order = orderOf(new Set(present.map(({ q }) => q)));
  for (const turn of candidateTurns(present)) {
    const rotation = compose(standing, rotationAbout([0, 0, 1], turn));
    const tensors = fieldTensors(turnedField(V, rotation));
    if (parts(tensors).every(({ im }) => Math.abs(im) <= rounding)) {
      return { rotation, order, algebra: 'real', tensors };
    }
  }
  return { rotation: standing, order, algebra: 'complex', tensors: seen };
}

interface Part {
  readonly q: number;
  readonly re: number;
  readonly im: number;
  readonly modulus: number;
}

function parts({ re, im }: FieldTensors): Part[] {
  return ([2, 4] as const).flatMap((k) =>
    re[k].map((value, q) => ({ q, re: value, im: im[k][q]!, modulus: Math.hypot(value, im[k][q]!) })),
  );
}

/** The largest n for which a turn by 2π/n leaves components of these q alone. */
function orderOf(present: ReadonlySet<number>): MagneticFrame['order'] {
  if (present.size === 0) return 0;
  for (const order of [4, 3, 2] as const) if ([...present].every((q) => q % order === 0)) return order;
  return 1;
}

/** Turns about z that make the largest component real, one of which makes all of them real if any turn does. */
function candidateTurns(present: readonly Part[]): number[] {
  if (present.length === 0) return [0];
  const { q, re, im } = present.reduce((a, b) => (b.modulus > a.modulus ? b : a));
  const phase = Math.atan2(im, re);
  const turns = [phase, -phase].flatMap((angle) =>
    Array.from({ length: 2 * q }, (_, k) => (angle + k * Math.PI) / q),
  );
  return [0, ...turns];
}
