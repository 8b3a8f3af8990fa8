import { isomersOf, type Isomer } from '../geometry';
import { siteOf } from '../geometry/ligandSites';
import type { LigandRecord } from '../library';
import type { GeometryId } from '../record/composition';

/** Schoenflies groups that contain an inversion centre. */
const withInversion = /^(Ci|S6|S10|Th|Oh|Ih|D∞h|C[246]h|D[246]h|D[35]d)$/;

export const hasInversion = (pointGroup: string): boolean => withInversion.test(pointGroup);

export interface CoordinationSymmetry {
  /** Of donors and chelate rings in the ideal polyhedron; null where the isomer is open and the groups differ. */
  readonly pointGroup: string | null;
  readonly centrosymmetric: boolean;
  /** All donors of one kind and no lower than the polyhedron but for chelate rings. */
  readonly mixed: boolean;
  /** The isomers that the composition may stand for. */
  readonly isomers: readonly Isomer[];
}

interface Coordination {
  readonly geometry: GeometryId;
  readonly isomer?: string | null;
  readonly ligands: readonly { readonly ligand: LigandRecord; readonly count: number }[];
}

const kept = new Map<string, CoordinationSymmetry>();

function named(isomers: readonly Isomer[], isomer: string | null | undefined): readonly Isomer[] {
  if (isomer == null) return isomers;
  const wanted = isomers.filter(({ name }) => name === isomer);
  return wanted.length > 0 ? wanted : isomers;
}

function find({ geometry, isomer, ligands }: Coordination): CoordinationSymmetry {
  const isomers = named(
    isomersOf(
      geometry,
      ligands.map(({ ligand, count }) => siteOf(ligand, count)),
    ),
    isomer,
  );
  const groups = [...new Set(isomers.map(({ pointGroup }) => pointGroup))];
  return {
    pointGroup: groups.length === 1 ? groups[0]! : null,
    centrosymmetric: groups.length > 0 && groups.every(hasInversion),
    mixed: new Set(ligands.flatMap(({ ligand }) => ligand.id)).size > 1,
    isomers,
  };
}

/** Actual symmetry of the donor set and its rings: it, not the name of the polyhedron, decides the selection rules. */
export function coordinationSymmetry(coordination: Coordination): CoordinationSymmetry {
  const { geometry, isomer, ligands } = coordination;
  const set = ligands.map(({ ligand, count }) => `${ligand.id}*${count}`).join(',');
  const key = `${geometry};${set};${isomer ?? ''}`;
  const known = kept.get(key);
  if (known !== undefined) return known;
  if (kept.size > 5000) kept.clear();
  const found = find(coordination);
  kept.set(key, found);
  return found;
}
