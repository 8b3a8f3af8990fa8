import type { FieldSpec, LevelProblem, ZeemanTerm } from '../../core/dshell';
import { SpinhueError } from '../../core/errors';

type Entry = Record<string, unknown>;

const isObject = (value: unknown): value is Entry =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** A number, or `missing-field` / `wrong-type`. A number that is not finite passes: the core names it. */
function numberAt(entry: Entry, name: string, field: string): number {
  const value = entry[name];
  if (typeof value === 'number') return value;
  if (value === undefined || value === null) {
    throw new SpinhueError({
      code: 'missing-field',
      message: `${field} is missing`,
      field,
      remedy: `give ${field} as a number`,
    });
  }
  throw new SpinhueError({
    code: 'wrong-type',
    message: `${field} = ${JSON.stringify(value)}: a number is needed`,
    field,
  });
}

const optionalNumber = (entry: Entry, name: string, field: string): number | undefined =>
  entry[name] === undefined || entry[name] === null ? undefined : numberAt(entry, name, field);

/** Numbers that each kind of field needs. */
const needed: Readonly<Record<string, readonly string[]>> = {
  oct: ['tenDq'],
  tet: ['tenDq'],
  cube: ['tenDq'],
  tetragonal: ['tenDq', 'Ds', 'Dt'],
  trigonal: ['tenDq', 'Dsigma', 'Dtau'],
  sqp: ['e_sigma', 'e_pi_perp', 'e_pi_par'],
};

function objectAt(entry: Entry, name: string): Entry {
  const value = entry[name];
  if (isObject(value)) return value;
  throw new SpinhueError({
    code: value === undefined || value === null ? 'missing-field' : 'wrong-type',
    message: `${name} is ${value === undefined || value === null ? 'missing' : 'not an object'}`,
    field: name,
  });
}

function listAt(entry: Entry, name: string, field: string): readonly unknown[] {
  const value = entry[name];
  if (Array.isArray(value)) return value as unknown[];
  throw new SpinhueError({
    code: value === undefined || value === null ? 'missing-field' : 'wrong-type',
    message: `${field} is ${value === undefined || value === null ? 'missing' : 'not a list'}`,
    field,
  });
}

function checkLigand(ligand: unknown, field: string): void {
  if (!isObject(ligand)) {
    throw new SpinhueError({ code: 'wrong-type', message: `${field} is not an object`, field });
  }
  for (const name of ['theta', 'phi', 'e_sigma']) numberAt(ligand, name, `${field}.${name}`);
  for (const name of ['psi', 'e_pi_x', 'e_pi_y', 'e_ds']) optionalNumber(ligand, name, `${field}.${name}`);
}

function readField(entry: Entry): FieldSpec {
  const field = objectAt(entry, 'field');
  if (field.type === undefined) {
    throw new SpinhueError({ code: 'missing-field', message: 'field.type is missing', field: 'field.type' });
  }
  const names = typeof field.type === 'string' ? needed[field.type] : undefined;
  names?.forEach((name) => numberAt(field, name, `field.${name}`));
  if (field.type === 'sqp') optionalNumber(field, 'e_ds', 'field.e_ds');
  if (field.type === 'aom') {
    listAt(field, 'ligands', 'field.ligands').forEach((ligand, i) =>
      checkLigand(ligand, `field.ligands[${i}]`),
    );
  }
  if (field.type === 'matrix') listAt(field, 'matrix', 'field.matrix');
  return field as unknown as FieldSpec;
}

function readZeeman(entry: Entry): ZeemanTerm | undefined {
  if (entry.zeeman === undefined || entry.zeeman === null) return undefined;
  const zeeman = objectAt(entry, 'zeeman');
  const B_T = listAt(zeeman, 'B_T', 'zeeman.B_T');
  if (B_T.length !== 3) {
    throw new SpinhueError({
      code: 'wrong-type',
      message: `zeeman.B_T has ${B_T.length} components`,
      field: 'zeeman.B_T',
      remedy: 'give three components in tesla',
    });
  }
  const components = B_T.map((_, i) => numberAt({ ...B_T }, String(i), `zeeman.B_T[${i}]`));
  const k = optionalNumber(zeeman, 'k', 'zeeman.k');
  const ge = optionalNumber(zeeman, 'ge', 'zeeman.ge');
  return {
    B_T: components as [number, number, number],
    ...(k === undefined ? {} : { k }),
    ...(ge === undefined ? {} : { ge }),
  };
}

/** One entry of a file of level problems; values are checked by the core, their presence and kind here. */
export function readLevelProblem(entry: Entry): LevelProblem {
  const dElectrons = numberAt(entry, 'dElectrons', 'dElectrons');
  // One electron or one hole knows no repulsion.
  const repels = dElectrons !== 1 && dElectrons !== 9;
  const racah = (name: 'B' | 'C'): number =>
    repels ? numberAt(entry, name, name) : (optionalNumber(entry, name, name) ?? 0);
  const zeeman = readZeeman(entry);
  return {
    dElectrons,
    B: racah('B'),
    C: racah('C'),
    alpha: optionalNumber(entry, 'alpha', 'alpha') ?? 0,
    zeta: optionalNumber(entry, 'zeta', 'zeta') ?? 0,
    field: readField(entry),
    ...(zeeman === undefined ? {} : { zeeman }),
  };
}
