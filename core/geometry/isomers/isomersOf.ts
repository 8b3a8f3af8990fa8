import { type GeometryId } from '../../record/composition';
import { arrangementGroup } from '../../symmetry';
import { distinctPlacements, type Distinct } from './arrangements';
import { vertexFrame, type VertexFrame } from './frame';
import { nameAll } from './names';
import { checkSites, patternOf, type Pattern, type Site } from './site';

/** One positional isomer; its mirror image is not counted apart. */
export interface Isomer {
  /** `cis`, `trans`, `fac`, `mer`, else what tells it apart; null where there is only one. */
  readonly name: string | null;
  /** For each vertex of the polyhedron, which of the given sites stands there. */
  readonly sites: readonly number[];
  /** For each vertex, the ligand kind. */
  readonly kinds: readonly string[];
  /** For each vertex, the donor number within its ligand. */
  readonly donors: readonly number[];
  /** Vertices of each multidentate ligand, in donor order. */
  readonly chelates: readonly (readonly number[])[];
  /** Exists as a pair of mirror images (as far as donors and rings go). */
  readonly chiral: boolean;
  /** Schoenflies symbol of donors and rings in the ideal polyhedron. */
  readonly pointGroup: string;
}

interface PatternIsomer extends Distinct {
  readonly template: string | null;
  readonly pointGroup: string;
}

const patternCache = new Map<string, readonly PatternIsomer[]>();
const answerCache = new Map<string, readonly Isomer[]>();
const answersKept = 20_000;

/**
 * All positional isomers of a ligand set, one of each pair of mirror images. The answer is shared: do not change it.
 * No isomer at all means that a chelate cannot span the polyhedron.
 * Throws a SpinhueError where the donors do not add up to the coordination number.
 */
export function isomersOf(geometry: GeometryId, sites: readonly Site[]): readonly Isomer[] {
  const key = `${geometry} ${sites.map(siteKey).join(' ')}`;
  let answer = answerCache.get(key);
  if (answer === undefined) {
    if (answerCache.size >= answersKept) answerCache.clear();
    answerCache.set(key, (answer = work(geometry, sites)));
  }
  return answer;
}

const siteKey = ({ kind, denticity, count, reach, donors, rings, arrangement }: Site): string =>
  denticity === 1
    ? `${kind}*${count}`
    : `${kind}*${count}:${denticity},${reach ?? ''},${donors?.join() ?? ''},${rings?.join('/') ?? ''},${arrangement ?? ''}`;

function work(geometry: GeometryId, sites: readonly Site[]): readonly Isomer[] {
  // The isomers of a drawn-out octahedron are those of the octahedron; the axis is where the unlike pair is put.
  const frame = vertexFrame(geometry === 'tetragonal' ? 'octahedral' : geometry);
  checkSites(frame.polyhedron, sites);
  // Sorted by kind, so that the name of an isomer does not depend on the order in which ligands were given.
  const order = sites.map((_, i) => i).sort((a, b) => (sites[a]!.kind < sites[b]!.kind ? -1 : 1));
  const patterns = order.map((i) => patternOf(sites[i]!, frame.edge));
  const names = order.flatMap((i, s) => {
    const { kind, donors } = sites[i]!;
    const classes = [...new Set(patterns[s]!.donorClass)];
    return classes.map((c) => (classes.length > 1 ? `${kind}-${donors![c]!}` : kind));
  });
  return patternIsomers(frame, patterns).map(({ template, site, donor, chelates, chiral, pointGroup }) => {
    const given = site.map((s) => order[s]!);
    return {
      name: template?.replaceAll(/\{(\d+)\}/g, (_, label: string) => names[Number(label)]!) ?? null,
      sites: given,
      kinds: given.map((i) => sites[i]!.kind),
      donors: donor,
      chelates,
      chiral,
      pointGroup,
    };
  });
}

function patternIsomers(frame: VertexFrame, patterns: readonly Pattern[]): readonly PatternIsomer[] {
  const key = frame.polyhedron.id + JSON.stringify(patterns);
  let found = patternCache.get(key);
  if (found === undefined) patternCache.set(key, (found = enumerate(frame, patterns)));
  return found;
}

function enumerate(frame: VertexFrame, patterns: readonly Pattern[]): PatternIsomer[] {
  const labelOf = new Map<number, number>();
  patterns.forEach(({ donorClass }, s) => {
    for (const c of donorClass) if (!labelOf.has(s * 16 + c)) labelOf.set(s * 16 + c, labelOf.size);
  });
  const labelled = distinctPlacements(frame, patterns).map((placement) => ({
    placement,
    labels: placement.site.map((s, i) =>
      labelOf.get(s * 16 + patterns[s]!.donorClass[placement.donor[i]!]!)!,
    ),
  }));
  const names = nameAll(frame, patterns, labelled);
  return labelled.map(({ placement, labels }, i) => ({
    ...placement,
    template: names[i]!,
    pointGroup: arrangementGroup(frame.polyhedron.vertices, labels, (p) =>
      placement.stabiliser.some((kept) => kept.every((to, from) => to === p[from])),
    ).name,
  }));
}
