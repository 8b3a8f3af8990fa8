import type { LigandRecord, ParameterLibrary } from '../library';
import type { Composition } from '../record/composition';
import { isomersOf, type Isomer } from './isomers/isomersOf';
import type { Site } from './isomers/site';

type Shape = Pick<Site, 'rings' | 'arrangement'>;

/** How the donors of a ligand are joined, where it is not a chain that may lie any way (structural formulas). */
const shapes: Readonly<Record<string, Shape>> = {
  // Flat and stiff: all three donors in one plane with the metal.
  terpy: { arrangement: 'meridional' },
  ddpd: { arrangement: 'meridional' },
  dqp: { arrangement: 'meridional' },
  // A nine-membered ring is too small to lie around the metal.
  tacn: {
    arrangement: 'facial',
    rings: [
      [0, 1],
      [1, 2],
      [2, 0],
    ],
  },
  tren: {
    rings: [
      [0, 1],
      [0, 2],
      [0, 3],
    ],
  },
  cyclam: {
    rings: [
      [0, 1],
      [1, 2],
      [2, 3],
      [3, 0],
    ],
  },
  tpp: {
    arrangement: 'meridional',
    rings: [
      [0, 1],
      [1, 2],
      [2, 3],
      [3, 0],
    ],
  },
  edta: {
    rings: [
      [0, 1],
      [0, 2],
      [0, 3],
      [1, 4],
      [1, 5],
    ],
  },
};

/** A ligand of the library as the counting of isomers sees it. */
export function siteOf(ligand: LigandRecord, count: number): Site {
  const unlike = new Set(ligand.donorAtoms).size > 1;
  return {
    kind: ligand.id,
    denticity: ligand.denticity,
    count,
    ...(unlike ? { donors: ligand.donorAtoms } : {}),
    ...shapes[ligand.id],
  };
}

/** Ligands with the same key have the same isomers in the same company. */
export function shapeKey(ligand: LigandRecord): string {
  const { kind: _kind, count: _count, ...shape } = siteOf(ligand, 1);
  return ligand.denticity === 1 ? '1' : JSON.stringify(shape);
}

/**
 * Positional isomers of a composition whose ligands are in the library and fill its polyhedron. None means that a
 * chelate cannot span it.
 */
export function isomersOfComposition(
  composition: Pick<Composition, 'geometry' | 'ligands'>,
  library: ParameterLibrary,
): readonly Isomer[] {
  const sites = Object.entries(composition.ligands).flatMap(([id, count]) => {
    const ligand = library.ligands.get(id);
    return ligand === undefined ? [] : [siteOf(ligand, count)];
  });
  return isomersOf(composition.geometry, sites);
}
