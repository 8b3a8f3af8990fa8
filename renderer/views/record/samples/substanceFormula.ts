import { complexFormula } from '../../../../core/library/complexFormula';
import { counterIonOf, parseCount } from '../../../../core/library/counterIons';
import { atomsOf, netCharge } from '../../../../core/library/molarMass';
import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import type { Candidate } from '../../../../core/record/project';

const times = (formula: string, count: number): string => {
  if (count === 1) return formula;
  return (atomsOf(formula)?.size ?? 2) > 1 ? `(${formula})${count}` : `${formula}${count}`;
};

/**
 * Formula of the substance, `[Ni(en)3]Cl2.2H2O`; null where counter-ion and complex do not make a neutral substance of
 * whole numbers, so that nobody reads a formula that is none.
 */
export function substanceFormula(
  composition: Candidate['composition'],
  counterIon: string | null,
  solvate: string | null,
  library: ParameterLibrary,
): string | null {
  const complex = complexFormula(composition, library).replace(/\](\d*[+-])$/, ']');
  const charge = netCharge(composition, library);
  let salt = complex;
  if (charge !== 0) {
    const ion = counterIonOf(counterIon ?? '');
    if (ion === undefined || ion.charge * charge > 0) return null;
    const count = Math.abs(charge / ion.charge);
    if (!Number.isInteger(count)) return null;
    salt = charge > 0 ? complex + times(ion.formula, count) : times(ion.formula, count) + complex;
  }
  if (solvate === null || solvate.trim() === '') return salt;
  const { count, rest } = parseCount(solvate);
  return `${salt}.${count === 1 ? '' : count}${rest}`;
}
