/**
 * Spin-pairing parameter D = 7/6 (5B/2 + C), cm⁻¹. C. K. Jorgensen, Prog. Inorg. Chem. 12, 101 (1970), from memory.
 */
export const spinPairingParameter = (B: number, C: number): number => (7 / 6) * (2.5 * B + C);

/**
 * Spin-pairing energy of a configuration d^q with total spin S in units of D: the mean of S(S + 1) over the whole
 * configuration, q(10 - q)/12, less its own. -20/3 for high-spin d5.
 */
export const spinPairing = (dElectrons: number, spin: number): number =>
  (dElectrons * (10 - dElectrons)) / 12 - spin * (spin + 1);

/** Change of that energy when one electron is added and the spin becomes `after`, in units of D. */
export const spinPairingChange = (dElectrons: number, before: number, after: number): number =>
  spinPairing(dElectrons + 1, after) - spinPairing(dElectrons, before);
