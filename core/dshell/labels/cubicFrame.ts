import {
  compose,
  dRotation,
  identityRotation,
  rotationAbout,
  rotationToFrame,
  type Quaternion,
} from '../../symmetry';
import { type FieldMatrix } from '../field/tensorComponents';

/** The cubic axes that suit a field best. */
export interface CubicFrame {
  /** Carries the laboratory's axes onto the cubic ones. */
  readonly rotation: Quaternion;
  /** Mean energy of the e orbitals above that of the t2 orbitals in that frame, cm⁻¹; negative for a tetrahedron or cube. */
  readonly tenDq: number;
  /** Share of the cubic part in the square of the whole field (without its mean): 1 where nothing else is there. */
  readonly share: number;
}

/** Mean of the e orbitals less mean of the t2 orbitals about the axes of the frame. */
function splitting(V: FieldMatrix, frame: Quaternion): number {
  const D = dRotation(frame);
  const energy = (a: number): number => {
    let sum = 0;
    for (let c = 0; c < 5; c++) for (let d = 0; d < 5; d++) sum += D[c]![a]! * V[c]![d]! * D[d]![a]!;
    return sum;
  };
  return (energy(0) + energy(1)) / 2 - (energy(2) + energy(3) + energy(4)) / 3;
}

/** An octahedron on a face: [111] along z, a twofold axis along x. */
const standing: Quaternion = (() => {
  const s = Math.sqrt(2);
  const [x, y, z] = [
    [1 / s, -1 / s, 0],
    [1 / Math.sqrt(6), 1 / Math.sqrt(6), -2 / Math.sqrt(6)],
    [1 / Math.sqrt(3), 1 / Math.sqrt(3), 1 / Math.sqrt(3)],
  ] as const;
  // The inverse: the cubic axes seen from the trigonal frame.
  const [w, a, b, c] = rotationToFrame(x, y, z);
  return [w, -a, -b, -c];
})();

const starts = (fieldRotation: Quaternion): Quaternion[] => {
  const eighths = [0, Math.PI / 8, Math.PI / 4].map((angle) => rotationAbout([0, 0, 1], angle));
  const thirds = [0, 1, 2, 3].map((n) => compose(rotationAbout([0, 0, 1], (n * Math.PI) / 6), standing));
  return [identityRotation, ...[...eighths, ...thirds].map((turn) => compose(fieldRotation, turn))];
};

const smallestStep = 1e-9;

/** Turns about x, y and z in falling steps as long as the splitting grows in size. */
function climb(V: FieldMatrix, start: Quaternion): Omit<CubicFrame, 'share'> {
  let rotation = start;
  let tenDq = splitting(V, rotation);
  let step = 0.3;
  while (step > smallestStep) {
    let moved = false;
    for (const axis of [
      [1, 0, 0],
      [0, 1, 0],
      [0, 0, 1],
    ] as const) {
      for (const angle of [step, -step]) {
        const next = compose(rotation, rotationAbout(axis, angle));
        const value = splitting(V, next);
        if (Math.abs(value) > Math.abs(tenDq) * (1 + 1e-13)) {
          [rotation, tenDq, moved] = [next, value, true];
        }
      }
    }
    if (!moved) step /= 3;
  }
  return { rotation, tenDq };
}

/**
 * The cubic axes about which the field splits e from t2 most: those of the octahedron or tetrahedron the complex is derived
 * from. The laboratory's own axes are kept where none are better (within 1e-6). `fieldRotation` is a frame worth starting from.
 */
export function cubicFrame(V: FieldMatrix, fieldRotation: Quaternion = identityRotation): CubicFrame {
  const asGiven = { rotation: identityRotation, tenDq: splitting(V, identityRotation) };
  let best = asGiven;
  for (const start of starts(fieldRotation)) {
    const found = climb(V, start);
    if (Math.abs(found.tenDq) > Math.abs(best.tenDq) * (1 + 1e-6) + 1e-9) best = found;
  }
  return { ...best, share: cubicShare(V, best.tenDq) };
}

/** The square of 10Dq · diag(0.6, 0.6, −0.4, −0.4, −0.4) beside that of V without its trace. */
function cubicShare(V: FieldMatrix, tenDq: number): number {
  const mean = V.reduce((sum, row, a) => sum + row[a]!, 0) / 5;
  const whole = V.reduce(
    (sum, row, a) => sum + row.reduce((s, value, b) => s + (value - (a === b ? mean : 0)) ** 2, 0),
    0,
  );
  return whole < 1e-12 ? 1 : (1.2 * tenDq * tenDq) / whole;
}
