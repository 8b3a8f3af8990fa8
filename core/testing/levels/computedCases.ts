import { readFileSync } from 'node:fs';
import { type LevelProblem } from '../../dshell';

/** A susceptibility curve of a computed case. */
export interface ComputedCurve {
  readonly chi_xyz_cm3_mol: readonly (readonly [number, number, number])[];
  readonly mu_eff_iso_BM: readonly number[];
}

/** A problem with its answers by an independent program over the full determinant space; see CONVENTIONS.md beside this file. */
export interface ComputedCase extends LevelProblem {
  readonly id: string;
  readonly subkind: string;
  readonly labelGroup: string | null;
  readonly groupingTol_cm1: number;
  /** False where the tolerance does not settle which levels are one. */
  readonly groupingUnambiguous: boolean;
  readonly groundAbsolute_cm1: number;
  readonly levels: readonly {
    readonly energy_cm1: number;
    readonly degeneracy: number;
    readonly multiplicity: number | null;
    readonly label: string | null;
  }[];
  readonly magnetic?: {
    readonly k: number;
    readonly ge: number;
    readonly T_K: readonly number[];
    readonly B_T: number;
    readonly vanVleck_zeroField: ComputedCurve;
    readonly thermal_0p1T: ComputedCurve;
    readonly groundDoublet_g?: { readonly G_xyz: readonly (readonly number[])[] };
    readonly zfs?: { readonly D_cm1: number; readonly E_cm1: number; readonly levels_cm1: readonly number[] };
  };
}

/** All of them, read from `data/cases.json`. */
export function computedCases(): readonly ComputedCase[] {
  const file = new URL('./data/cases.json', import.meta.url);
  return (JSON.parse(readFileSync(file, 'utf8')) as { cases: ComputedCase[] }).cases;
}
