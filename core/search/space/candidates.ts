import { isomersOfComposition } from '../../geometry/ligandSites';
import { complexKey, type ParameterLibrary } from '../../library';
import type { Composition, GeometryId } from '../../record/composition';
import { multisetsOf } from './multisets';
import { chargeAdmitted, type CandidateSpace } from './space';

/** A member of the space under its canonical name, the same on every machine and in every version. */
export interface SpaceCandidate extends Composition {
  readonly id: string;
}

/** Runs through the whole space, one candidate at a time: all ions and isomers of one ligand set stand together. */
export function* candidatesIn(space: CandidateSpace, library: ParameterLibrary): Generator<SpaceCandidate> {
  for (const { geometry, patterns } of space.geometries) {
    for (const { pattern } of patterns) {
      for (const picks of multisetsOf(pattern, space.pool)) {
        const chosen = [...picks].map((position, kind) => ({
          ligand: space.pool.ligands[position]!,
          count: pattern[kind]!.count,
        }));
        const ligands = Object.fromEntries(chosen.map(({ ligand, count }) => [ligand.id, count]));
        const charge = chosen.reduce((sum, { ligand, count }) => sum + ligand.charge * count, 0);
        const sphere = { geometry: geometry.id as GeometryId, ligands };
        const isomers = isomersOfComposition(sphere, library);
        for (const ion of space.ions) {
          if (!chargeAdmitted(space, ion.oxidationState + charge)) continue;
          for (const { name } of isomers) {
            const composition = {
              metal: ion.symbol,
              oxidationState: ion.oxidationState,
              ...sphere,
              isomer: name,
            };
            yield { id: complexKey(composition), ...composition };
          }
        }
      }
    }
  }
}
