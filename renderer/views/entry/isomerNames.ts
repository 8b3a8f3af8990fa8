import { isomersOf } from '../../../core/geometry';
import type { ParameterLibrary } from '../../../core/library/parameterLibrary';
import { checkCandidate } from '../../../core/record/candidateCheck';
import type { Composition } from '../../../core/record/composition';

const customary = ['cis', 'trans', 'fac', 'mer'];

/** Isomers that can be told apart by name and that the estimate knows what to do with; empty where there is one only. */
export function isomerNames(composition: Composition, library: ParameterLibrary): readonly string[] {
  const names = new Set<string>([...namesByGeometry(composition, library), ...customary]);
  return [...names].filter(
    (isomer) => checkCandidate({ ...composition, id: 'draft', isomer }, { library }).ok,
  );
}

function namesByGeometry(composition: Composition, library: ParameterLibrary): readonly string[] {
  const sites = Object.entries(composition.ligands).map(([kind, count]) => {
    const ligand = library.ligands.get(kind);
    return { kind, count, denticity: ligand?.denticity ?? 1, donors: ligand?.donorAtoms ?? [] };
  });
  try {
    return isomersOf(composition.geometry, sites).flatMap(({ name }) => (name === null ? [] : [name]));
  } catch {
    // The places are not filled yet.
    return [];
  }
}
