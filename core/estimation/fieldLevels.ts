import { cubicLevels, levels, type AngularOverlapLigand, type ConfigurationWeight } from '../dshell';
import type { ParameterLibrary } from '../library';
import type { FieldEstimate } from './estimateField';
import { overlapLigands } from './overlapField';
import type { SpinChoice } from './spinChoice';
import type { Estimate } from './types';

/** A level of the estimated field. Slopes are per unit of 10Dq (all donors scaled together), B and C. */
export interface FieldLevel {
  /** Relative to the ground level, cm⁻¹. */
  readonly energy: number;
  readonly multiplicity: number;
  readonly label: string;
  readonly degeneracy: number;
  /** Empty in fields of low symmetry, where t2 and e mix. */
  readonly configurations: readonly ConfigurationWeight[];
  readonly slope: { readonly tenDq: number; readonly B: number; readonly C: number };
}

interface Point {
  readonly tenDq: number;
  readonly B: number;
  readonly C: number;
}

interface Named {
  readonly energy: number;
  readonly multiplicity: number;
  readonly label: string;
  readonly degeneracy: number;
}

/** Levels nearer than this (cm⁻¹) with no symmetry label of their own are one band. */
const unresolved = 1;

/** One set of levels by angular overlap, each with a name that is unique among levels of its kind. */
function overlapAt(d: number, ligands: readonly AngularOverlapLigand[], B: number, C: number): Named[] {
  const { levels: found } = levels(
    { dElectrons: d, B, C, field: { type: 'aom', ligands } },
    { tolerance: unresolved },
  );
  const counts = new Map<number, number>();
  return found.map(({ energy, multiplicity, label, degeneracy }) => {
    const spin = multiplicity ?? 1;
    const number = (counts.get(spin) ?? 0) + 1;
    counts.set(spin, number);
    return {
      energy,
      multiplicity: spin,
      label: label === null ? `${spin}[${number}]` : `${spin}${label}`,
      degeneracy,
    };
  });
}

/** Follows each level by spin, name and order among its like; levels of one kind never cross. */
function follow(levelsAt: readonly Named[]): (level: Named, index: number) => number {
  const byKind = new Map<string, number[]>();
  for (const { multiplicity, label, energy } of levelsAt) {
    const kind = kindOf(multiplicity, label);
    byKind.set(kind, [...(byKind.get(kind) ?? []), energy]);
  }
  return (level, index) => byKind.get(kindOf(level.multiplicity, level.label))?.[index] ?? level.energy;
}

const kindOf = (multiplicity: number, label: string): string =>
  label.includes('[') ? `${multiplicity}` : label;

const step = 0.005;

function overlapFieldLevels(
  field: FieldEstimate,
  library: ParameterLibrary,
  choice: SpinChoice,
  at: Point,
): FieldLevel[] {
  const mean = meanOfDonors(field);
  const ligandsFor = (tenDq: number): readonly AngularOverlapLigand[] | null =>
    overlapLigands(field, library, choice, tenDq / mean);
  const ligands = ligandsFor(at.tenDq);
  const stronger = ligandsFor(at.tenDq * (1 + step));
  if (ligands === null || stronger === null) return [];
  const d = field.dElectrons;
  const base = overlapAt(d, ligands, at.B, at.C);
  const shell = d >= 2 && d <= 8;
  const moved = {
    tenDq: follow(overlapAt(d, stronger, at.B, at.C)),
    B: shell ? follow(overlapAt(d, ligands, at.B * (1 + step), at.C)) : null,
    C: shell ? follow(overlapAt(d, ligands, at.B, at.C * (1 + step))) : null,
  };
  const seen = new Map<string, number>();
  return base.map((level) => {
    const kind = kindOf(level.multiplicity, level.label);
    const index = seen.get(kind) ?? 0;
    seen.set(kind, index + 1);
    const slope = (to: ReturnType<typeof follow> | null, value: number): number =>
      to === null || value === 0 ? 0 : (to(level, index) - level.energy) / (step * value);
    return {
      ...level,
      configurations: [],
      slope: {
        tenDq: slope(moved.tenDq, at.tenDq),
        B: slope(moved.B, at.B),
        C: slope(moved.C, at.C),
      },
    };
  });
}

/** Mean 10Dq of the donors as tabulated: what `scale` of the overlap parameters is counted from. */
export const meanOfDonors = ({ donors }: FieldEstimate): number => {
  const places = donors.reduce((sum, donor) => sum + donor.places, 0);
  return donors.reduce((sum, donor) => sum + donor.tenDq * donor.places, 0) / places;
};

/** All levels of a complex in its estimated field; empty where something needed for them is not estimated. */
export function fieldLevels(
  field: FieldEstimate,
  library: ParameterLibrary,
  choice: SpinChoice,
  tenDq: Estimate,
): readonly FieldLevel[] {
  const d = field.dElectrons;
  if (d < 1 || d > 9 || tenDq.value === null || tenDq.value <= 0) return [];
  const shell = d >= 2 && d <= 8;
  if (shell && (field.racahB.value === null || field.racahC.value === null)) return [];
  // One electron or one hole feels no repulsion.
  const at = { tenDq: tenDq.value, B: field.racahB.value ?? 0, C: field.racahC.value ?? 0 };
  if (field.cubic !== null) return cubicLevels({ dElectrons: d, geometry: field.cubic, ...at });
  return overlapFieldLevels(field, library, choice, at);
}
