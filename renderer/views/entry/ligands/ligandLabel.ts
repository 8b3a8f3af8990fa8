import type { LigandRecord } from '../../../../core/library/ligands';
import { withoutCharge } from '../../../../core/library/molarMass';

/** How a ligand is written on a button: by its formula where that is short (`H2O`, not `aq`), else its abbreviation. */
export function ligandLabel({ formula, charge, abbreviation }: LigandRecord): string {
  const atoms = withoutCharge(formula, charge);
  return atoms !== '' && atoms.length <= 3 ? atoms : abbreviation;
}
