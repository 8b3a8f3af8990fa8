import type { AngularOverlapLigand } from '../dshell';
import { ligandPositions, polyhedron } from '../geometry';
import { isomersOfComposition } from '../geometry/ligandSites';
import type { ParameterLibrary } from '../library';
import type { Composition } from '../record/composition';
import { donorOverlap, mixingShare, piRatio, type DonorOverlap } from './angularOverlap';
import type { FieldEstimate } from './estimateField';
import { octahedralOccupation } from './jahnTeller';
import type { SpinChoice } from './spinChoice';

/** Axial over equatorial interaction of an octahedron with a strong Jahn-Teller distortion; gives `strongSplittingShare`. */
const strongAxial = 0.58;
/** The same where a chemist calls an octahedron tetragonal without such a reason. */
const mildAxial = 0.85;
/**
 * Where the axial ligands are others than those of the plane they are held more loosely still, and the plane more
 * tightly: half of the way from the elongated octahedron to the square plane, as tetraamminediaquacopper(II) shows.
 */
const looseAxial = 0.35;
/** What is left of a donor opposite a terminal oxo ligand (common practice: the bond is some 20 pm longer). */
const transToOxo = 0.45;

/**
 * Terminal oxo ligand: 14 200 and 19 700 cm⁻¹ bring the bands of oxovanadium(IV) in sodium citrate to where they are
 * found; heavier metals hold it tighter (14 000 cm⁻¹ for b2 to e of oxomolybdenum(V), from memory of H. B. Gray and
 * C. R. Hare, Inorg. Chem. 1, 1962, 363).
 */
const oxoOverlap: Readonly<Record<string, DonorOverlap>> = {
  '3d': { eSigma: 19_700, ePi: 14_200 },
  '4d': { eSigma: 23_000, ePi: 17_000 },
  '5d': { eSigma: 26_000, ePi: 19_500 },
};
/** The other donors of an oxo cation see a metal whose charge the oxo ligand has largely taken up. */
export const besideOxo = 0.78;

export const isOxoCation = (composition: Composition): boolean =>
  composition.ligands.oxo === 1 && Object.keys(composition.ligands).length > 1;

/** Which ligand stands at each vertex of the polyhedron, and the name of the isomer that was taken. */
function placed(composition: Composition, library: ParameterLibrary): readonly string[] | null {
  const isomers = isomersOfComposition(composition, library);
  const shape = polyhedron(composition.geometry);
  const wanted = isomers.filter(({ name }) => name === (composition.isomer ?? null));
  const pool = wanted.length > 0 ? wanted : isomers;
  const axialOxo = pool.find(({ kinds }) => {
    const at = kinds.indexOf('oxo');
    return at >= 0 && (shape.places[at] === 'axial' || shape.places[at] === 'apical');
  });
  const trans = pool.find(({ name }) => name === 'trans');
  return (axialOxo ?? trans ?? pool[0])?.kinds ?? null;
}

/** How strongly each vertex is bound, relative to the places that the strength is known for. */
function placeFactors(
  field: FieldEstimate,
  kinds: readonly string[],
  choice: SpinChoice,
): (vertex: number) => number {
  const shape = polyhedron(field.composition.geometry);
  const oxo = kinds.indexOf('oxo');
  if (oxo >= 0 && isOxoCation(field.composition)) {
    const [x, y, z] = shape.vertices[oxo]!;
    return (vertex) => {
      const v = shape.vertices[vertex]!;
      return v[0] * x + v[1] * y + v[2] * z < -0.99 ? transToOxo : 1;
    };
  }
  const { e } = octahedralOccupation(field.dElectrons, choice);
  const strong = e % 2 === 1;
  const tetragonal = field.composition.geometry === 'tetragonal';
  const equatorial = new Set(kinds.filter((_, vertex) => shape.places[vertex] === 'equatorial'));
  const loose =
    strong && tetragonal && kinds.every((kind, i) => shape.places[i] !== 'axial' || !equatorial.has(kind));
  const { gSquarePlanar, g } = field.ion;
  if (loose) {
    const gain = gSquarePlanar.value !== null && g.value !== null ? gSquarePlanar.value / g.value - 1 : 0;
    const plane = 1 + gain * (1 - looseAxial / strongAxial);
    return (vertex) => (shape.places[vertex] === 'axial' ? looseAxial : plane);
  }
  const axial = strong ? strongAxial : tetragonal ? mildAxial : 1;
  const isAxial = (vertex: number): boolean => {
    const place = shape.places[vertex];
    return place === 'apical' || (place === 'axial' && tetragonal);
  };
  return (vertex) => (isAxial(vertex) ? axial : 1);
}

/**
 * The donors of a complex as the angular overlap model wants them: each at its vertex of the ideal polyhedron, with e_σ
 * and e_π that give the donor's own 10Dq, axial ones weakened where a distortion is expected. `scale` multiplies the
 * strengths of all but a terminal oxo ligand. Null where a chelate cannot span the polyhedron or a donor has no strength.
 */
export function overlapLigands(
  field: FieldEstimate,
  library: ParameterLibrary,
  choice: SpinChoice,
  scale: number,
): readonly AngularOverlapLigand[] | null {
  const kinds = placed(field.composition, library);
  if (kinds === null) return null;
  const factor = placeFactors(field, kinds, choice);
  const oxoCation = isOxoCation(field.composition);
  const own = new Map(
    field.donors.map(({ ligand, tenDq }): [string, DonorOverlap] => [
      ligand.id,
      donorOverlap(tenDq * scale, piRatio(ligand, field.ion, library)),
    ]),
  );
  if (oxoCation) own.set('oxo', oxoOverlap[field.ion.period]!);
  const positions = ligandPositions(polyhedron(field.composition.geometry));
  const ligands: AngularOverlapLigand[] = [];
  for (const [vertex, { theta, phi, psi }] of positions.entries()) {
    const overlap = own.get(kinds[vertex]!);
    if (overlap === undefined) return null;
    const strength = factor(vertex);
    const e_sigma = overlap.eSigma * strength;
    const e_pi = overlap.ePi * strength;
    ligands.push({ theta, phi, psi, e_sigma, e_pi_x: e_pi, e_pi_y: e_pi, e_ds: mixingShare * e_sigma });
  }
  return ligands;
}
