import { type FieldGroup } from '../adaptation/species';
import { inStandardFrame } from '../field/fieldFrame';
import { type FieldMatrix } from '../field/tensorComponents';

/** Groups whose names the engine gives of itself: rows of O about x, y, z, of D4 about z and x, and of a free ion. */
export const labelGroups = ['SO3', 'Oh', 'Td', 'D4h', 'C4v', 'D2d'] as const;
export type LabelGroup = (typeof labelGroups)[number];

/** The rotation group whose rows carry the names; inversion and reflections act on d electrons as rotations do. */
export const rowsOf: Readonly<Record<LabelGroup, FieldGroup>> = {
  SO3: 'SO3',
  Oh: 'O',
  Td: 'O',
  D4h: 'D4',
  C4v: 'D4',
  D2d: 'D4',
};

const containing: Readonly<Record<FieldGroup, readonly FieldGroup[]>> = {
  SO3: ['SO3'],
  O: ['SO3', 'O'],
  Dinf: ['SO3', 'Dinf'],
  D4: ['SO3', 'O', 'Dinf', 'D4'],
  D3: ['SO3', 'Dinf', 'D3'],
  D2: ['SO3', 'O', 'Dinf', 'D4', 'D2'],
  C2: ['SO3', 'O', 'Dinf', 'D4', 'D2', 'C2'],
  C1: ['SO3', 'O', 'Dinf', 'D4', 'D3', 'D2', 'C2', 'C1'],
};

/** Whether the field has the symmetry of those rows in the laboratory frame. */
export const hasRows = (V: FieldMatrix, rows: FieldGroup): boolean =>
  containing[rows].includes(inStandardFrame(V).group);

/** The most symmetric naming that the field admits as it stands, or null. */
export function naturalLabelGroup(V: FieldMatrix, tetrahedral: boolean): LabelGroup | null {
  switch (inStandardFrame(V).group) {
    case 'SO3':
      return 'SO3';
    case 'O':
      return tetrahedral ? 'Td' : 'Oh';
    case 'Dinf':
    case 'D4':
      return 'D4h';
    default:
      return null;
  }
}

const termLetters = 'SPDFGHIKLMN';
const bethe: Readonly<Record<string, string>> = {
  A1: 'G1',
  A2: 'G2',
  E: 'G3',
  T1: 'G4',
  T2: 'G5',
};
const betheTetragonal: Readonly<Record<string, string>> = {
  A1: 'G1',
  A2: 'G2',
  B1: 'G3',
  B2: 'G4',
  E: 'G5',
};

/** The name of a row: `T2g`, `G8`, `F`, `J=7/2`. */
export function rowLabel(group: LabelGroup, species: string, spinOrbit: boolean): string {
  if (group === 'SO3') return spinOrbit ? `J=${species}` : termLetters[Number(species)]!;
  if (spinOrbit) return (rowsOf[group] === 'O' ? bethe : betheTetragonal)[species] ?? species;
  return group.endsWith('h') ? `${species}g` : species;
}
