import {
  compose,
  dRotation,
  identityRotation,
  inverseRotation,
  isPointGroupName,
  pointGroup,
  rotationAbout,
  turned,
  type PointGroup,
  type Quaternion,
} from '../../symmetry';
import { type FieldFrame } from '../field/fieldFrame';
import { type FieldMatrix } from '../field/tensorComponents';

/**
 * The group whose representations name the levels. `axial` is D∞h, `spherical` the free ion; a finite one is a group of the
 * catalogue. `frame` carries the group's standard axes from those of the laboratory.
 */
export type NamingGroup =
  | { readonly kind: 'spherical'; readonly name: string; readonly frame: Quaternion }
  | { readonly kind: 'axial'; readonly name: string; readonly frame: Quaternion }
  | {
      readonly kind: 'finite';
      readonly name: string;
      readonly frame: Quaternion;
      readonly group: PointGroup;
    };

/** The group of that name; a star, which marks double groups in print, is left off. Null for a name that is not known. */
export function namingGroup(name: string, frame: Quaternion = identityRotation): NamingGroup | null {
  const plain = name.replace(/\*$/, '').replace('inf', '∞');
  if (plain === 'SO3' || plain === 'Kh') return { kind: 'spherical', name: plain, frame };
  if (plain === 'D∞h' || plain === 'C∞v' || plain === 'D∞') return { kind: 'axial', name: plain, frame };
  return isPointGroupName(plain) ? { kind: 'finite', name: plain, frame, group: pointGroup(plain) } : null;
}

/** Largest change of the 5×5 under a rotation, cm⁻¹. */
function changeUnder(V: FieldMatrix, rotation: Quaternion): number {
  const D = dRotation(rotation);
  let most = 0;
  for (let a = 0; a < 5; a++) {
    for (let b = 0; b < 5; b++) {
      let sum = 0;
      for (let c = 0; c < 5; c++) for (let d = 0; d < 5; d++) sum += D[c]![a]! * V[c]![d]! * D[d]![b]!;
      most = Math.max(most, Math.abs(sum - V[a]![b]!));
    }
  }
  return most;
}

/** Whether the field is left as it is by every operation of the group (a rounding of 1e-9 of its size is forgiven). */
export function isSymmetric(V: FieldMatrix, label: NamingGroup): boolean {
  const size = Math.max(...V.flat().map(Math.abs));
  const allowed = Math.max(1e-7, 1e-9 * size);
  return testRotations(label).every((rotation) => changeUnder(V, rotation) <= allowed);
}

/** Enough rotations to tell: one of each class; for continuous groups turns of no special angle. */
function testRotations(label: NamingGroup): Quaternion[] {
  const inFrame = (q: Quaternion): Quaternion =>
    compose(compose(label.frame, q), inverseRotation(label.frame));
  if (label.kind === 'spherical') return [rotationAbout([1, 2, 3], 1), rotationAbout([0, 0, 1], 0.7)];
  if (label.kind === 'axial') return [inFrame(rotationAbout([0, 0, 1], 1))];
  return label.group.elements.elements.map((operation) => turned(operation, label.frame).rotation);
}

/** Group names of fields with inversion, which every d field has. */
const fieldNames = {
  ...{ SO3: 'SO3', O: 'Oh', Dinf: 'D∞h', D4: 'D4h' },
  ...{ D3: 'D3d', D2: 'D2h', C2: 'C2h', C1: 'Ci' },
} as const;

const cyclic = rotationAbout([1, 1, 1], (2 * Math.PI) / 3);

/**
 * The largest group of a field with its axes along the laboratory's where that is possible, else those the field has. In
 * D_4h x is a C2' axis; where the laboratory does not decide, the one nearer to the ligands: x2-y2 above xy.
 */
export function fieldNamingGroup(V: FieldMatrix, { group, rotation }: FieldFrame): NamingGroup {
  const name = fieldNames[group];
  const quarter = rotationAbout([0, 0, 1], Math.PI / 2);
  const eighth = rotationAbout([0, 0, 1], Math.PI / 4);
  // Own frames have a twofold axis along y; the catalogue puts it along x.
  const own = compose(rotation, quarter);
  const frames = [
    ...[identityRotation, cyclic, inverseRotation(cyclic)],
    ...(group === 'D4' && liesBelow(V, own) ? [compose(own, eighth)] : []),
    own,
    rotation,
  ];
  for (const frame of frames) {
    const label = namingGroup(name, frame)!;
    if (isSymmetric(V, label)) return label;
  }
  return namingGroup('Ci')!;
}

/** Whether x2-y2 lies below xy in the frame. */
function liesBelow(V: FieldMatrix, frame: Quaternion): boolean {
  const D = dRotation(frame);
  const energy = (a: number): number =>
    V.reduce((sum, row, c) => sum + row.reduce((s, value, d) => s + D[c]![a]! * value * D[d]![a]!, 0), 0);
  return energy(1) < energy(2) - 1e-6;
}
