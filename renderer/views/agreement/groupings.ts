import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import type { Composition } from '../../../core/record/composition';

export const groupings = [
  { id: 'metal', label: 'metal' },
  { id: 'ligands', label: 'ligands' },
  { id: 'geometry', label: 'geometry' },
  { id: 'oxidation', label: 'oxidation state' },
] as const;
export type Grouping = (typeof groupings)[number]['id'];

/** The group that a complex falls into; unlike ligands are named together. */
export function groupName(composition: Composition, grouping: Grouping, library: ParameterLibrary): string {
  const { metal, oxidationState, geometry, ligands } = composition;
  switch (grouping) {
    case 'metal':
      return metal;
    case 'geometry':
      return geometry.replaceAll('-', ' ');
    case 'oxidation':
      return `${oxidationState}+`;
    case 'ligands':
      return Object.keys(ligands)
        .map((id) => library.ligands.get(id)?.abbreviation ?? id)
        .sort()
        .join(', ');
  }
}
