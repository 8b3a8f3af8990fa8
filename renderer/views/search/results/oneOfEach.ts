import type { SearchResult } from '../../../../core/search';

/** The idea behind a result: metal ion and ligands, whatever their numbers, places and geometry. */
export const ideaOf = ({ metal, oxidationState, ligands }: SearchResult): string =>
  `${metal} ${oxidationState} ${Object.keys(ligands).sort().join(' ')}`;

/** The best of each idea, in their order, and how many variants each stands for. */
export function oneOfEach<T extends SearchResult>(
  results: readonly T[],
): readonly { readonly result: T; readonly variants: number }[] {
  const counts = new Map<string, number>();
  for (const result of results) counts.set(ideaOf(result), (counts.get(ideaOf(result)) ?? 0) + 1);
  const seen = new Set<string>();
  return results.flatMap((result) => {
    const idea = ideaOf(result);
    if (seen.has(idea)) return [];
    seen.add(idea);
    return [{ result, variants: counts.get(idea)! }];
  });
}
