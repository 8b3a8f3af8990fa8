import { identityRotation, type Quaternion } from '../../symmetry';
import { fieldComponents, type FieldGroup } from '../adaptation/species';
import { candidateFrames, turnedField } from './symmetryAxes';
import { fieldTensors, type FieldMatrix, type FieldTensors } from './tensorComponents';

/** The symmetry of a field and the frame in which it shows. */
export interface FieldFrame {
  readonly group: FieldGroup;
  /** Carries the axes of the laboratory onto those of the frame (z main axis, y twofold axis). */
  readonly rotation: Quaternion;
  /** The field seen from the frame, components foreign to the group left out. */
  readonly tensors: FieldTensors;
}

/** A foreign component up to this size (cm⁻¹, and relative to the whole field) is taken for rounding. */
const absoluteRounding = 1e-7;
const relativeRounding = 1e-11;

/** From the most to the least symmetric. */
const groups: readonly FieldGroup[] = ['SO3', 'O', 'Dinf', 'D4', 'D3', 'D2', 'C2', 'C1'];

/**
 * The largest rotation group that leaves a field unchanged, with its frame. A frame that is nearly but not exactly one of
 * symmetry is never rounded to it: the smaller group is used and the energies stay exact.
 */
export function fieldFrame(V: FieldMatrix): FieldFrame {
  const standard = fieldTensors(V);
  const scale = fieldScale(standard);
  const rounding = roundingOf(scale);
  let best = groupIn(standard, identityRotation, rounding);
  if (best.group === 'SO3' || best.group === 'O') return best;
  for (const rotation of candidateFrames(V, scale, rounding)) {
    const candidate = groupIn(fieldTensors(turnedField(V, rotation)), rotation, rounding);
    if (groups.indexOf(candidate.group) < groups.indexOf(best.group)) best = candidate;
  }
  return best;
}

/** The largest group that shows in the laboratory frame itself. */
export const inStandardFrame = (V: FieldMatrix): FieldFrame => inFrameOf(V, identityRotation);

/** The largest group that shows in the frame turned by `rotation`. */
export function inFrameOf(V: FieldMatrix, rotation: Quaternion): FieldFrame {
  const turned = rotation === identityRotation ? V : turnedField(V, rotation);
  const tensors = fieldTensors(turned);
  return groupIn(tensors, rotation, roundingOf(fieldScale(tensors)));
}

const roundingOf = (scale: number): number => Math.max(absoluteRounding, relativeRounding * scale);

/** The largest group whose components are all that the field has. */
function groupIn(tensors: FieldTensors, rotation: Quaternion, rounding: number): FieldFrame {
  const group = groups.find((each) => {
    if (each === 'O' && !isCubic(tensors, rounding)) return false;
    return foreignScale(tensors, each) <= rounding;
  })!;
  return { group, rotation, tensors: reducedTo(tensors, group) };
}

/** A cubic field on x, y, z has Re v_44 = √(5/14) v_40. */
function isCubic({ re }: FieldTensors, rounding: number): boolean {
  return Math.abs(re[4][4]! - Math.sqrt(5 / 14) * re[4][0]!) <= rounding;
}

/** For each group, part and rank whether the component q = 0 … k may differ from zero. */
const allowed = Object.fromEntries(
  groups.map((group) => {
    const table = (part: 're' | 'im', k: 2 | 4): boolean[] =>
      Array.from({ length: k + 1 }, (_, q) =>
        fieldComponents[group].some((each) => each.k === k && each.q === q && each.part === part),
      );
    return [
      group,
      { re: { 2: table('re', 2), 4: table('re', 4) }, im: { 2: table('im', 2), 4: table('im', 4) } },
    ];
  }),
) as Record<FieldGroup, Record<'re' | 'im', Record<2 | 4, boolean[]>>>;

/** Largest component that a field of the group cannot have. */
function foreignScale({ re, im }: FieldTensors, group: FieldGroup): number {
  const table = allowed[group];
  return Math.max(
    largestWhere(re[2], table.re[2]),
    largestWhere(re[4], table.re[4]),
    largestWhere(im[2], table.im[2]),
    largestWhere(im[4], table.im[4]),
  );
}

/** Largest modulus among the values that may not be. */
function largestWhere(values: readonly number[], may: readonly boolean[]): number {
  let largest = 0;
  for (let q = 0; q < values.length; q++) {
    const size = Math.abs(values[q]!);
    if (size > largest && !may[q]!) largest = size;
  }
  return largest;
}

/** The components that a field of the group can have. */
function reducedTo({ trace, re, im }: FieldTensors, group: FieldGroup): FieldTensors {
  const table = allowed[group];
  const keep = (values: readonly number[], may: readonly boolean[]): number[] =>
    values.map((value, q) => (may[q]! ? value : 0));
  return {
    trace,
    re: { 2: keep(re[2], table.re[2]), 4: keep(re[4], table.re[4]) },
    im: { 2: keep(im[2], table.im[2]), 4: keep(im[4], table.im[4]) },
  };
}

/** Largest component. */
function fieldScale({ re, im }: FieldTensors): number {
  let largest = 0;
  for (const list of [re[2], re[4], im[2], im[4]])
    for (const value of list) largest = Math.max(largest, Math.abs(value));
  return largest;
}
