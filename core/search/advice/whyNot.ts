import { findIon, type ParameterLibrary } from '../../library';
import type { Composition } from '../../record/composition';
import { leastProbability, scoreCandidate, type SearchResult } from '../run/searchWish';
import { admittedLigands } from '../space/ligandPool';
import { admittedIons } from '../wish/contradictions';
import type { Wish } from '../wish/wish';

/** A rule of the wish that leaves a candidate out before anything is estimated. */
export interface Exclusion {
  /** Path into the wish: `ligands.maxKinds`. */
  readonly part: string;
  readonly because: string;
}

/** Why a candidate that somebody expected does not stand in the list. */
export interface WhyNot {
  readonly exclusions: readonly Exclusion[];
  /** Its score, whether it is left out or not; null where it cannot be estimated. */
  readonly score: SearchResult | null;
  /** Part with the smallest probability; null without parts. */
  readonly weakest: SearchResult['parts'][number] | null;
}

function exclusionsOf(composition: Composition, wish: Wish, library: ParameterLibrary): Exclusion[] {
  const found: Exclusion[] = [];
  const add = (part: string, because: string): void => void found.push({ part, because });
  const { metal, oxidationState, geometry, ligands } = composition;
  const ion = findIon(library, metal, oxidationState);
  if (ion === undefined || !admittedIons(wish, library).some((each) => each.ion === ion.ion)) {
    add('ions', `${ion?.ion ?? metal} is not among the ions of the wish`);
  }
  if (wish.geometries !== 'all' && !(wish.geometries as readonly string[]).includes(geometry)) {
    add('geometries', `${geometry.replaceAll('-', ' ')} is not among the geometries of the wish`);
  }
  const admitted = new Set(admittedLigands(wish, library.ligands.values()).map(({ id }) => id));
  for (const id of Object.keys(ligands)) {
    if (!admitted.has(id)) {
      const name = library.ligands.get(id)?.commonName ?? id;
      add('ligands', `${name} is left out by the choice of ligands, donors, shelf, elements or hazards`);
    }
  }
  const kinds = Object.keys(ligands).length;
  if (kinds > wish.ligands.maxKinds) {
    add(
      'ligands.maxKinds',
      `${kinds} different ligands, ${kinds - wish.ligands.maxKinds} more than the wish allows`,
    );
  }
  if (wish.charge !== undefined) {
    const charge = Object.entries(ligands).reduce(
      (sum, [id, count]) => sum + count * (library.ligands.get(id)?.charge ?? 0),
      oxidationState,
    );
    const { min, max } = wish.charge;
    const off = charge < min ? min - charge : Math.max(0, charge - max);
    if (off > 0) add('charge', `its charge ${charge} lies ${off} outside the wish`);
  }
  return found;
}

/** Which part of a wish a candidate fails, and by how much. */
export function whyNot(composition: Composition, wish: Wish, library: ParameterLibrary): WhyNot {
  const scored = scoreCandidate({ id: 'asked', ...composition }, wish, library);
  const score = scored?.result ?? null;
  const parts = [...(score?.parts ?? [])].sort((one, other) => one.probability - other.probability);
  return {
    exclusions: exclusionsOf(composition, wish, library),
    score,
    weakest: parts[0] ?? null,
  };
}

/** Whether a candidate would stand in a list of everything that counts as an answer. */
export const isAnswer = ({ exclusions, score }: WhyNot): boolean =>
  exclusions.length === 0 && score !== null && score.probability >= leastProbability;
