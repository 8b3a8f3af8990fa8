import { spannedDimension } from '../../symmetry';
import { opposite, type VertexFrame } from './frame';
import { type Pattern } from './site';
import { uprightRotation } from './upright';

/** One way to place every ligand. */
export interface Placement {
  /** Pattern (ligand kind) at each vertex. */
  readonly site: readonly number[];
  /** Donor number within the ligand at each vertex. */
  readonly donor: readonly number[];
  /** Vertices of each multidentate ligand, in the order of its donors. */
  readonly chelates: readonly (readonly number[])[];
}

/** A placement up to rotation and reflection. */
export interface Distinct extends Placement {
  readonly chiral: boolean;
  /** Permutations of the vertices that leave it as it is. */
  readonly stabiliser: readonly (readonly number[])[];
}

const donorLabels = ({ site, donor }: Placement, patterns: readonly Pattern[]): number[] =>
  site.map((s, vertex) => s * 16 + patterns[s]!.donorClass[donor[vertex]!]!);

/** The placement after a permutation of the vertices. */
function moved({ site, donor, chelates }: Placement, p: readonly number[]): Placement {
  const [sites, donors] = [[...site], [...donor]];
  p.forEach((to, from) => {
    sites[to] = site[from]!;
    donors[to] = donor[from]!;
  });
  return { site: sites, donor: donors, chelates: chelates.map((vertices) => vertices.map((v) => p[v]!)) };
}

/** Text that is the same for placements that look the same: like donors are alike, and rings are pairs of vertices. */
function signature(placement: Placement, patterns: readonly Pattern[], p: readonly number[]): string {
  const { site, chelates } = placement;
  const letters = new Array<number>(site.length);
  donorLabels(placement, patterns).forEach((label, i) => (letters[p[i]!] = label));
  if (chelates.length === 0) return letters.join();
  const rings = chelates.flatMap((vertices) =>
    patterns[site[vertices[0]!]!]!.rings.map(([a, b]) => {
      const [u, v] = [p[vertices[a]!]!, p[vertices[b]!]!];
      return u < v ? u * 16 + v : v * 16 + u;
    }),
  );
  return `${letters.join()}|${rings.sort((a, b) => a - b).join()}`;
}

/** All placements that differ by more than a rotation or reflection of the polyhedron. */
export function distinctPlacements(frame: VertexFrame, patterns: readonly Pattern[]): Distinct[] {
  const seen = new Set<string>();
  const found: Distinct[] = [];
  const identity = frame.permutations[0]!.map((_, i) => i);
  place(frame, patterns, (first) => {
    if (seen.has(signature(first, patterns, identity))) return;
    const placement = moved(first, uprightRotation(frame, donorLabels(first, patterns)));
    const own = signature(placement, patterns, identity);
    const images = frame.permutations.map((p) => signature(placement, patterns, p));
    for (const image of images) seen.add(image);
    const turnedInto = new Set(frame.rotations.map((p) => signature(placement, patterns, p)));
    const stabiliser = frame.permutations.filter((_, i) => images[i] === own);
    found.push({ ...placement, chiral: images.some((image) => !turnedInto.has(image)), stabiliser });
  });
  return found;
}

/** Runs through all ways to put the ligands on the vertices, widest ligands first. */
function place(
  frame: VertexFrame,
  patterns: readonly Pattern[],
  visit: (placement: Placement) => void,
): void {
  const n = frame.polyhedron.coordinationNumber;
  const site = new Array<number>(n).fill(-1);
  const donor = new Array<number>(n).fill(0);
  const chelates: number[][] = [];
  const queue = patterns
    .flatMap(({ count, denticity }, s) => Array.from({ length: count }, () => ({ s, denticity })))
    .sort((a, b) => b.denticity - a.denticity || a.s - b.s);

  const put = (next: number, after: number): void => {
    const ligand = queue[next];
    if (ligand === undefined) {
      visit({ site: [...site], donor: [...donor], chelates: chelates.map((vertices) => [...vertices]) });
      return;
    }
    // Like ligands are put in the order of their first vertex, so that no set is listed twice.
    const start = next > 0 && queue[next - 1]!.s === ligand.s ? after : 0;
    for (let vertex = start; vertex < n; vertex++) {
      if (site[vertex] === -1) grow(next, ligand.s, [vertex], vertex);
    }
  };

  const grow = (next: number, s: number, vertices: number[], first: number): void => {
    const pattern = patterns[s]!;
    const d = vertices.length - 1;
    const vertex = vertices[d]!;
    const fits = pattern.rings.every(([a, b]) => {
      const other = a === d ? b : b === d ? a : -1;
      return other < 0 || other >= d || frame.angles[vertices[other]!]![vertex]! <= pattern.reach;
    });
    if (!fits) return;
    site[vertex] = s;
    donor[vertex] = d;
    if (vertices.length < pattern.denticity) {
      for (let v = 0; v < n; v++) if (site[v] === -1) grow(next, s, [...vertices, v], first);
    } else if (pattern.denticity === 1) {
      put(next + 1, first + 1);
    } else if (lies(frame, vertices, pattern)) {
      chelates.push(vertices);
      put(next + 1, first);
      chelates.pop();
    }
    site[vertex] = -1;
  };
  put(0, 0);
}

/** Whether the donors lie as the ligand must: all in one plane with the metal (meridional), or none opposite another (facial). */
function lies(
  { angles, polyhedron }: VertexFrame,
  donors: readonly number[],
  { arrangement, denticity }: Pattern,
): boolean {
  if (arrangement === 'any' || denticity < 3) return true;
  if (arrangement === 'meridional') return spannedDimension(donors.map((d) => polyhedron.vertices[d]!)) < 3;
  return donors.every((a) => donors.every((b) => angles[a]![b]! < opposite));
}
