import type { LigandRecord, ParameterLibrary } from '../library';

/** What donor classes are grouped into when a ligand's own value is wanting. */
export function donorGroup(ligand: LigandRecord): string {
  const atoms = [...new Set(ligand.donorAtoms)].sort().join('');
  const chelate = ligand.denticity > 1 ? 'chelate' : 'single';
  return `${atoms}/${ligand.piCharacter}/${chelate}`;
}

/** Groups from narrow to wide: same donors, π character and chelation; then less and less in common. */
function groupsOf(ligand: LigandRecord): ((other: LigandRecord) => boolean)[] {
  const atoms = (record: LigandRecord): string => [...new Set(record.donorAtoms)].sort().join('');
  const chelating = (record: LigandRecord): boolean => record.denticity > 1;
  return [
    (other) => other.class === ligand.class && chelating(other) === chelating(ligand),
    (other) => other.class === ligand.class,
    (other) => donorGroup(other) === donorGroup(ligand),
    (other) => atoms(other) === atoms(ligand) && other.piCharacter === ligand.piCharacter,
    (other) => atoms(other) === atoms(ligand),
  ];
}

const hardDonors = new Set(['F', 'O', 'N']);
const isHard = ({ donorAtoms }: LigandRecord): boolean => donorAtoms.every((atom) => hardDonors.has(atom));

export interface ClassMean {
  readonly mean: number;
  /** Standard deviation of the members about the mean; null for one member. */
  readonly spread: number | null;
  readonly members: readonly string[];
}

type Quantity = (ligand: LigandRecord) => number | null;

function meanOf(members: readonly LigandRecord[], quantity: Quantity): ClassMean {
  const values = members.map((member) => quantity(member)!);
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  const variance = values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1 || 1);
  return {
    mean,
    spread: values.length > 1 ? Math.sqrt(variance) : null,
    members: members.map(({ id }) => id),
  };
}

const membersOf = (
  ligand: LigandRecord,
  library: ParameterLibrary,
  quantity: Quantity,
  belongs: (other: LigandRecord) => boolean,
): LigandRecord[] =>
  [...library.ligands.values()].filter(
    (other) => other.id !== ligand.id && belongs(other) && quantity(other) !== null,
  );

/**
 * Mean of a published ligand quantity over the nearest donor class that has at least `fewest` members with a value;
 * null where no class reaches that.
 */
export function classMean(
  ligand: LigandRecord,
  library: ParameterLibrary,
  quantity: Quantity,
  fewest = 2,
): ClassMean | null {
  for (const belongs of groupsOf(ligand)) {
    const members = membersOf(ligand, library, quantity, belongs);
    if (members.length >= fewest) return meanOf(members, quantity);
  }
  return null;
}

/** The same over all hard (F, O, N) or all soft donors: the last resort for covalency, which follows softness. */
export function softnessMean(
  ligand: LigandRecord,
  library: ParameterLibrary,
  quantity: Quantity,
): ClassMean | null {
  const members = membersOf(ligand, library, quantity, (other) => isHard(other) === isHard(ligand));
  return members.length === 0 ? null : meanOf(members, quantity);
}
