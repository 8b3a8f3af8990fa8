import { type Distinct } from './arrangements';
import { opposite, type VertexFrame } from './frame';
import { type Pattern } from './site';

/** A name with `{0}`, `{1}` for the donor kinds, or null where the descriptor has nothing to say. */
type Descriptor = (
  frame: VertexFrame,
  labels: readonly number[],
  placement: Distinct,
  patterns: readonly Pattern[],
) => string | null;

const mark = (label: number): string => `{${label}}`;

/** Vertices of each donor kind, most numerous first. */
function groupsOf(labels: readonly number[]): { label: number; vertices: number[] }[] {
  const groups: { label: number; vertices: number[] }[] = [];
  labels.forEach((label, vertex) => {
    const group = groups.find((each) => each.label === label);
    if (group === undefined) groups.push({ label, vertices: [vertex] });
    else group.vertices.push(vertex);
  });
  return groups.sort((a, b) => b.vertices.length - a.vertices.length || a.label - b.label);
}

const hasOpposites = ({ angles }: VertexFrame, vertices: readonly number[]): boolean =>
  vertices.some((a) => vertices.some((b) => angles[a]![b]! > opposite));
const cisOrTrans = (frame: VertexFrame, vertices: readonly number[]): string =>
  hasOpposites(frame, vertices) ? 'trans' : 'cis';

/** cis and trans, fac and mer, as in IUPAC Recommendations 2005, IR-9.3.3, for the octahedron and the square. */
const tradeName: Descriptor = (frame, labels) => {
  const groups = groupsOf(labels);
  const sizes = groups.map(({ vertices }) => vertices.length).join();
  const singles = groups.filter(({ vertices }) => vertices.length === 1).flatMap(({ vertices }) => vertices);
  const pairs = groups.filter(({ vertices }) => vertices.length === 2);
  if (frame.polyhedron.id === 'square-planar') {
    return sizes === '2,2' || sizes === '2,1,1' ? cisOrTrans(frame, groups[0]!.vertices) : null;
  }
  if (frame.polyhedron.id !== 'octahedral') return null;
  if (sizes === '4,2') return cisOrTrans(frame, groups[1]!.vertices);
  if (sizes === '4,1,1') return cisOrTrans(frame, singles);
  if (groups[0]!.vertices.length === 3) {
    if (!hasOpposites(frame, groups[0]!.vertices)) return 'fac';
    if (pairs.length === 1) return `mer, ${cisOrTrans(frame, pairs[0]!.vertices)}(${mark(pairs[0]!.label)})`;
    return singles.length === 3 ? `mer, ${oppositeSingles(frame, labels, singles)}` : 'mer';
  }
  if (pairs.length < 2) return null;
  const trans = pairs.filter(({ vertices }) => hasOpposites(frame, vertices));
  if (trans.length === 0) return 'all-cis';
  if (trans.length === pairs.length && pairs.length === 3) return 'all-trans';
  return `trans(${trans.map(({ label }) => mark(label)).join(',')})`;
};

const oppositeSingles = (frame: VertexFrame, labels: readonly number[], singles: readonly number[]): string =>
  singles
    .filter((vertex) => isOpposed(frame, vertex, singles))
    .map((vertex) => mark(labels[vertex]!))
    .sort()
    .join('-');

/** What stands on the rarer kind of place: `axial({0},{1})`, `apical({0})`. */
const placeName: Descriptor = ({ polyhedron: { places } }, labels) => {
  const place = places[0]!;
  if (place === 'all') return null;
  const standing = labels.filter((_, vertex) => places[vertex] === place).sort((a, b) => a - b);
  return `${place}(${standing.map(mark).join(',')})`;
};

/** Shape of the widest chelates: mer or fac for three donors in a chain, α or β for four folded ones (Sargeson and Searle 1965). */
const chelateName: Descriptor = (frame, _labels, { chelates }) => {
  const wide = chelates.filter((vertices) => vertices.length >= 3);
  if (wide.length === 0 || frame.polyhedron.id !== 'octahedral') return null;
  const [first, second] = wide as [readonly number[], (readonly number[])?];
  if (first.length === 4) {
    if (first.every((a) => isOpposed(frame, a, first))) return null;
    return isOpposed(frame, first[0]!, [first[3]!]) ? 'α' : 'β';
  }
  if (first.length !== 3) return null;
  if (hasOpposites(frame, first)) return 'mer';
  if (second?.length !== 3) return 'fac';
  return isOpposed(frame, first[1]!, [second[1]!]) ? 's-fac' : 'u-fac';
};

const isOpposed = ({ angles }: VertexFrame, a: number, others: readonly number[]): boolean =>
  others.some((b) => angles[a]![b]! > opposite);

/** The pairs that stand opposite each other: `{0}-{1}, {2}-{2}` (J. C. Bailar, J. Chem. Educ. 34, 334, 1957). */
const transPairs: Descriptor = (frame, labels) => {
  if (frame.polyhedron.places.includes('axial')) return null;
  const pairs: string[] = [];
  labels.forEach((label, a) => {
    for (let b = a + 1; b < labels.length; b++) {
      if (frame.angles[a]![b]! > opposite)
        pairs.push(
          [label, labels[b]!]
            .sort((x, y) => x - y)
            .map(mark)
            .join('-'),
        );
    }
  });
  return pairs.length === 0 ? null : pairs.sort().join(' ');
};

/** Whether the members of a pair are near or far: `{1} 74°`. */
const pairAngles: Descriptor = (frame, labels) => {
  const told = groupsOf(labels).flatMap(({ label, vertices }) =>
    vertices.length === 2
      ? [`${mark(label)} ${Math.round(frame.angles[vertices[0]!]![vertices[1]!]!)}°`]
      : [],
  );
  return told.length === 0 ? null : told.join(' ');
};

const descriptors: readonly Descriptor[] = [tradeName, placeName, chelateName, transPairs, pairAngles];

/**
 * A name for each placement: the trade's where it has one, more words only where two would be called the same, and a
 * number where words run out. A single placement has no name (null).
 */
export function nameAll(
  frame: VertexFrame,
  patterns: readonly Pattern[],
  labelled: readonly { readonly labels: readonly number[]; readonly placement: Distinct }[],
): (string | null)[] {
  if (labelled.length === 1) return [null];
  let names = labelled.map(() => '');
  for (const descriptor of descriptors) {
    const shared = new Map<string, number>();
    for (const name of names) shared.set(name, (shared.get(name) ?? 0) + 1);
    names = names.map((name, i) => {
      if (shared.get(name) === 1) return name;
      const more = descriptor(frame, labelled[i]!.labels, labelled[i]!.placement, patterns);
      if (more === null || more === name) return name;
      if (name === '') return more;
      return more === 'α' || more === 'β' ? `${name}-${more}` : `${name}, ${more}`;
    });
  }
  return names.map((name, i) => {
    const before = names.slice(0, i).filter((other) => other === name).length;
    const shared = names.filter((other) => other === name).length;
    return shared === 1 ? name : `${name === '' ? 'isomer' : name} #${before + 1}`;
  });
}
