/** A coordination geometry that a complex may be entered with. */
export interface GeometryRecord {
  readonly id: string;
  readonly name: string;
  readonly coordinationNumber: number;
  /** Schoenflies symbol of the ideal polyhedron with like ligands. */
  readonly pointGroup: string;
  /** An inversion centre in the ideal polyhedron decides whether d-d bands are vibronic only. */
  readonly centrosymmetric: boolean;
  /** Other spellings that are understood. */
  readonly aliases: readonly string[];
}

const geometry = (
  id: string,
  coordinationNumber: number,
  pointGroup: string,
  centrosymmetric: boolean,
  aliases: readonly string[] = [],
): GeometryRecord => ({
  id,
  name: id.replaceAll('-', ' '),
  coordinationNumber,
  pointGroup,
  centrosymmetric,
  aliases,
});

/** Ideal polyhedra; IUPAC Nomenclature of Inorganic Chemistry, Recommendations 2005, table IR-9.2. */
export const geometries: readonly GeometryRecord[] = [
  geometry('octahedral', 6, 'Oh', true, ['oh', 'octahedron']),
  geometry('tetragonal', 6, 'D4h', true, ['distorted octahedral', 'elongated octahedral']),
  geometry('tetrahedral', 4, 'Td', false, ['td', 'tetrahedron']),
  geometry('square-planar', 4, 'D4h', true, ['sp', 'd4h', 'square']),
  geometry('square-pyramidal', 5, 'C4v', false, ['spy', 'c4v']),
  geometry('trigonal-bipyramidal', 5, 'D3h', false, ['tbp', 'tbpy']),
  geometry('trigonal-planar', 3, 'D3h', false),
  geometry('linear', 2, 'D∞h', true),
  geometry('trigonal-prismatic', 6, 'D3h', false),
  geometry('pentagonal-bipyramidal', 7, 'D5h', false),
  geometry('cubic', 8, 'Oh', true, ['cube']),
  geometry('square-antiprismatic', 8, 'D4d', false),
  geometry('dodecahedral', 8, 'D2d', false),
];

const plain = (text: string): string =>
  text
    .trim()
    .toLowerCase()
    .replaceAll(/[\s_-]+/g, '-');

/** The geometry of that id or alias, whatever its case and hyphens. */
export function findGeometry(text: string): GeometryRecord | undefined {
  const wanted = plain(text);
  return geometries.find(
    ({ id, aliases }) => id === wanted || aliases.some((alias) => plain(alias) === wanted),
  );
}
