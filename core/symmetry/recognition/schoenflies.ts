import { type Operation } from '../groups/operation';
import { cross, dot, normalise, rotationToFrame, type Quaternion, type Vector3 } from '../rotation';
import { parallel, perpendicular, symmetryElements, type SymmetryElements } from './elements';

/** A point group with the way it stands: `frame` carries the standard axes onto those of the group. */
export interface StandingGroup {
  readonly name: string;
  readonly frame: Quaternion;
}

const laboratory: readonly Vector3[] = [
  [0, 0, 1],
  [1, 0, 0],
  [0, 1, 0],
];

/**
 * Schoenflies symbol and orientation of a complete set of operations. Where the group leaves a choice (which of two
 * sets of C2' is x, which of three C2 is z) the axis along the first of `preferred` directions that fits is taken, and
 * after those the laboratory's z, x, y.
 */
export function schoenflies(
  operations: readonly Operation[],
  preferred: readonly Vector3[] = [],
): StandingGroup {
  const elements = symmetryElements(operations);
  const wishes = [...preferred, ...laboratory];
  const { axes, inversion, mirrors } = elements;
  const highest = axes.reduce((most, { order }) => Math.max(most, order), 1);
  const threefold = axes.filter(({ order }) => order >= 3).length;
  if (threefold > 1) return cubicGroup(elements);
  if (highest === 1) {
    if (mirrors.length > 0) return { name: 'Cs', frame: frameWith(mirrors[0]!, [], wishes) };
    return { name: inversion ? 'Ci' : 'C1', frame: [1, 0, 0, 0] };
  }
  return axialGroup(elements, highest, wishes);
}

function cubicGroup({ axes, mirrors, inversion }: SymmetryElements): StandingGroup {
  const fourfold = axes.some(({ order }) => order === 4);
  const name = fourfold ? (inversion ? 'Oh' : 'O') : inversion ? 'Th' : mirrors.length > 0 ? 'Td' : 'T';
  const cubic = axes.filter(({ order }) => order === (fourfold ? 4 : 2)).map(({ direction }) => direction);
  const z = pick(cubic, laboratory);
  return { name, frame: frameWith(z, cubic, laboratory) };
}

function axialGroup(
  { axes, mirrors, rotoreflections, inversion }: SymmetryElements,
  highest: number,
  wishes: readonly Vector3[],
): StandingGroup {
  const candidates = axes.filter(({ order }) => order === highest).map(({ direction }) => direction);
  // In D_2d the S4 axis is the main one of three twofold axes.
  const improper = candidates.filter((c) => rotoreflections.some((s) => parallel(s, c)));
  const z = pick(improper.length > 0 && highest === 2 ? improper : candidates, laboratory);
  const twofold = axes
    .filter(({ direction, order }) => order % 2 === 0 && perpendicular(direction, z))
    .map(({ direction }) => direction);
  const horizontal = mirrors.some((m) => parallel(m, z));
  const vertical = mirrors.filter((m) => perpendicular(m, z));
  if (twofold.length > 0) {
    const suffix = horizontal ? 'h' : vertical.length > 0 ? 'd' : '';
    return { name: `D${highest}${suffix}`, frame: frameWith(z, twofold, wishes) };
  }
  if (horizontal) return { name: `C${highest}h`, frame: frameWith(z, [], wishes) };
  if (vertical.length > 0) {
    const within = vertical.map((normal) => normalise(cross(normal, z)));
    return { name: `C${highest}v`, frame: frameWith(z, within, wishes) };
  }
  const doubled = rotoreflections.some((s) => parallel(s, z));
  const name =
    doubled || (inversion && highest === 3) ? `S${2 * highest}` : inversion ? `C${highest}h` : `C${highest}`;
  return { name, frame: frameWith(z, [], wishes) };
}

/** The candidate along the first wish that is met, else the first; it points the way of the wish. */
function pick(candidates: readonly Vector3[], wishes: readonly Vector3[]): Vector3 {
  for (const wish of wishes) {
    const found = candidates.find((candidate) => parallel(candidate, wish));
    if (found !== undefined) return dot(found, wish) > 0 ? found : [-found[0], -found[1], -found[2]];
  }
  return candidates[0]!;
}

/** Frame with that z and x along one of `candidates`; with no candidate, x as near the laboratory's as can be. */
function frameWith(z: Vector3, candidates: readonly Vector3[], wishes: readonly Vector3[]): Quaternion {
  const across = candidates.filter((candidate) => perpendicular(candidate, z));
  const free = across.length > 0 ? across : [Math.abs(z[0]) < 0.9 ? laboratory[1]! : laboratory[2]!];
  const flat = wishes.map((wish) => cross(cross(z, wish), z)).filter((wish) => Math.hypot(...wish) > 1e-3);
  const rough = pick(free, flat.map(normalise));
  const y = normalise(cross(z, rough));
  return rotationToFrame(cross(y, z), y, z);
}
