import { cautionsFor } from '../../../../core/library/cautions';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import type { SearchResult } from '../../../../core/search';

export type CostKind = 'new' | 'kinds' | 'cautions';

export const costNames: Readonly<Record<CostKind, string>> = {
  new: 'ligands not on the shelf',
  kinds: 'kinds of ligand',
  cautions: 'hazard statements on file',
};

/** What a candidate costs besides luck; smaller is better. A hazard that is not on file is not counted: not assessed. */
export function costOf(
  { metal, oxidationState, ligands }: SearchResult,
  kind: CostKind,
  shelf: ReadonlySet<string>,
  library: ParameterLibrary,
): number {
  const ids = Object.keys(ligands);
  if (kind === 'kinds') return ids.length;
  if (kind === 'new') return ids.filter((id) => !shelf.has(id)).length;
  const cautions = cautionsFor({ metal, oxidationState, ligands }, null, library);
  return new Set(cautions.flatMap(({ codes }) => codes)).size;
}
