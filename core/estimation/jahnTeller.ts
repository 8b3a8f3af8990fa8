import type { SpinChoice } from './spinChoice';

export type JahnTellerStrength = 'strong' | 'weak' | 'none';

/** Electrons in t2g and eg of the strong-field ground configuration of an octahedral d^n ion. */
export function octahedralOccupation(dElectrons: number, spin: SpinChoice): { t2: number; e: number } {
  if (spin === 'low') return { t2: Math.min(6, dElectrons), e: Math.max(0, dElectrons - 6) };
  const up = Math.min(5, dElectrons);
  const down = Math.max(0, dElectrons - 5);
  return {
    t2: Math.min(3, up) + Math.min(3, down),
    e: Math.max(0, up - 3) + Math.max(0, down - 3),
  };
}

/**
 * Jahn-Teller expectation in an octahedron: strong where eg holds one or three electrons, weak where t2g is filled
 * unevenly, else none (B. N. Figgis and M. A. Hitchman, Ligand Field Theory and its Applications, 2000, from memory).
 */
export function jahnTellerExpectation(dElectrons: number, spin: SpinChoice): JahnTellerStrength {
  const { t2, e } = octahedralOccupation(dElectrons, spin);
  if (e % 2 === 1) return 'strong';
  return t2 % 3 === 0 ? 'none' : 'weak';
}

/**
 * Splitting of the eg pair of a strongly distorted ion as a share of its band energy: 9000 of 20 500 cm⁻¹ (centre of
 * 18 000 and 21 800) in hexafluoromanganate(III), from memory of A. B. P. Lever, Inorganic Electronic Spectroscopy
 * (1984). Good to a third of itself for other ions.
 */
export const strongSplittingShare = 0.42;
