import { opposite, type VertexFrame } from './frame';

/**
 * The rotation of the vertices that brings the pair of opposite donors unlike the other pairs onto the z axis: B-M-B of
 * trans-MA4B2, B-M-C of trans-MA4BC, A-M-A of cis-MA4B2. A pair of like donors is
 * preferred, and a rarer one. Only octahedra are turned;
 * elsewhere the places themselves say which axis is which.
 */
export function uprightRotation(frame: VertexFrame, labels: readonly number[]): readonly number[] {
  const { rotations, angles, polyhedron } = frame;
  if (polyhedron.pointGroup !== 'Oh' || polyhedron.coordinationNumber !== 6) return rotations[0]!;
  const pairs = labels.flatMap((label, a) =>
    labels.flatMap((other, b) =>
      a < b && angles[a]![b]! > opposite ? [{ a, b, name: pairName(label, other) }] : [],
    ),
  );
  const howMany = (label: number): number => labels.filter((other) => other === label).length;
  const rank = ({ a, b, name }: (typeof pairs)[number]): number =>
    20 * pairs.filter((pair) => pair.name === name).length +
    (labels[a] === labels[b] ? 0 : 10) +
    Math.min(howMany(labels[a]!), howMany(labels[b]!));
  const best = pairs.reduce((chosen, pair) => (rank(pair) < rank(chosen) ? pair : chosen));
  return rotations.find((p) => p[best.a] === 0 && p[best.b] === 1)!;
}

const pairName = (a: number, b: number): string => `${Math.min(a, b)}-${Math.max(a, b)}`;
