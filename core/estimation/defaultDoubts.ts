/**
 * Relative standard deviations of the estimates, in one place. They are fractions of the quantity unless the name says
 * otherwise. First sizes from C. K. Jorgensen's statement that f and g are good to some 5 % for complexes like those they
 * were fitted to; then made smaller until the 68 % ranges of the complexes that may inform parameters no longer held far
 * more than 68 % of their bands.
 */
export const defaultDoubts = {
  /** 10Dq measured on the same complex, by how well the number is remembered or read. */
  anchor: { high: 0.01, medium: 0.02, low: 0.04 },
  publishedF: 0.018,
  acceptorF: 0.05,
  publishedG: 0.018,
  /** g whose source calls it soft, or that is the band of a Jahn-Teller ion. */
  softG: 0.035,
  analogyG: 0.1,
  donorClassF: 0.07,
  seriesPlaceF: 0.1,
  /** That 10Dq factorises into f and g at all. */
  factorisation: 0.018,
  /** That a mixed set is the mean of its ligands; times 2 sqrt(x (1 - x)) for the share x of the main ligand. */
  additivity: 0.02,
  /** 4/9 of the octahedral splitting: bond lengths and covalency change with the coordination number. */
  tetrahedral: 0.07,
  publishedH: 0.1,
  classH: 0.22,
  analogyK: 0.2,
  publishedK: 0.08,
  /** B = B0 (1 - h k) itself, as a fraction of B. */
  nephelauxetic: 0.03,
  freeIonB: 0.02,
  /** C beside what the covalency of B already says, as a fraction of C. */
  racahC: 0.045,
  /** The further loss of B and C in a tetrahedron, as a fraction of B. */
  tetrahedralB: 0.05,
  zeta: 0.15,
} as const;
