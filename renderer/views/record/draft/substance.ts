import { molarMass } from '../../../../core/library/molarMass';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { diamagneticCorrection } from '../../../../core/magnetism/diamagnetism/diamagneticCorrection';
import type { Candidate } from '../../../../core/record/project';

/** What a measured moment needs to know of the substance; null where the library cannot tell. */
export interface Substance {
  /** With counter-ion and solvate of the candidate, g/mol. */
  readonly molarMass_g_mol: number | null;
  /** Sum of Pascal constants, negative, cm3/mol. */
  readonly pascal_cm3_mol: number | null;
  /** How the sum was come by, species by species. */
  readonly account: string;
}

const routeWords = {
  table: 'table',
  atoms: 'atoms and bonds',
  'half-mass': 'half its molar mass',
  unknown: 'unknown',
};

export function substanceOf(
  { composition, counterIon, solvate }: Pick<Candidate, 'composition' | 'counterIon' | 'solvate'>,
  library: ParameterLibrary,
): Substance {
  const { chi_cm3_mol, items } = diamagneticCorrection({ ...composition, counterIon }, library);
  return {
    molarMass_g_mol: molarMass(composition, library, { counterIon, solvate }).value_g_mol,
    pascal_cm3_mol: chi_cm3_mol,
    account: items
      .map(({ species, count, route }) => `${count} ${species} (${routeWords[route]})`)
      .join(', '),
  };
}
