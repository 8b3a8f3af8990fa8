/**
 * Relative standard deviations of the estimates, in one place. They are fractions of the quantity unless the name says
 * otherwise. First values: needs of the trade as stated by C. K. Jorgensen (f and g are good to about 5 % for complexes
 * like those they were fitted to); the sizes in use were checked by the coverage of measured bands.
 */
export const defaultDoubts = {
  /** 10Dq measured on the same complex, by how well the number is remembered or read. */
  anchor: { high: 0.01, medium: 0.02, low: 0.04 },
  publishedF: 0.02,
  acceptorF: 0.06,
  publishedG: 0.02,
  /** g whose source calls it soft, or that is the band of a Jahn-Teller ion. */
  softG: 0.04,
  analogyG: 0.1,
  donorClassF: 0.08,
  seriesPlaceF: 0.1,
  /** That 10Dq factorises into f and g at all. */
  factorisation: 0.025,
  /** That a mixed set is the mean of its ligands; times 2 sqrt(x (1 - x)) for the share x of the main ligand. */
  additivity: 0.02,
  /** 4/9 of the octahedral splitting: bond lengths and covalency change with the coordination number. */
  tetrahedral: 0.08,
  publishedH: 0.15,
  classH: 0.3,
  analogyK: 0.3,
  publishedK: 0.1,
  /** B = B0 (1 - h k) itself, as a fraction of B. */
  nephelauxetic: 0.04,
  freeIonB: 0.02,
  /** C beside what the covalency of B already says, as a fraction of C. */
  racahC: 0.055,
  /** The further loss of B and C in a tetrahedron, as a fraction of B. */
  tetrahedralB: 0.05,
  zeta: 0.15,
} as const;
