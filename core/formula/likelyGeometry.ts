import { dElectronCount, findMetal } from '../library/elements';
import type { ParameterLibrary } from '../library';
import type { GeometryId } from '../record/composition';

/** Ligands strong enough that nickel(II) with four of them is planar (common practice). */
const planarDonors = new Set(['cn', 'cyclam', 'tpp', 'dtc', 'dppe']);

/**
 * The geometry that a chemist would think of first for so many donors (common practice): six octahedral; four square
 * for d8 of the second and third row, for copper(II) chelates and strong-field nickel(II), else tetrahedral.
 */
export function likelyGeometry(
  metal: string,
  oxidationState: number,
  ligands: Readonly<Record<string, number>>,
  library: ParameterLibrary,
): GeometryId | null {
  const places = Object.entries(ligands).reduce(
    (sum, [id, times]) => sum + times * (library.ligands.get(id)?.denticity ?? 1),
    0,
  );
  switch (places) {
    case 2:
      return 'linear';
    case 3:
      return 'trigonal-planar';
    case 4: {
      const found = findMetal(metal);
      const d = found === undefined ? null : dElectronCount(found, oxidationState);
      const ids = Object.keys(ligands);
      const heavy = found !== undefined && found.period !== '3d';
      const planar = d === 8 && (heavy || ids.every((id) => planarDonors.has(id)));
      const chelated = d === 9 && ids.some((id) => (library.ligands.get(id)?.denticity ?? 1) > 1);
      return planar || chelated ? 'square-planar' : 'tetrahedral';
    }
    case 5:
      return 'trigonal-bipyramidal';
    case 6:
      return 'octahedral';
    case 7:
      return 'pentagonal-bipyramidal';
    case 8:
      return 'square-antiprismatic';
    default:
      return null;
  }
}
