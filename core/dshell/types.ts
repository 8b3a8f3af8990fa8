/** Symmetry of the pure cubic problems. In `tetrahedral`, e lies below t2. */
export type CubicGeometry = 'octahedral' | 'tetrahedral';

/** One d^N ion in a cubic field without spin-orbit coupling. All energies in cm⁻¹. */
export interface CubicProblem {
  /** 1 to 9. */
  readonly dElectrons: number;
  readonly geometry: CubicGeometry;
  /** Size of the splitting, positive in both geometries. */
  readonly tenDq: number;
  /** Racah parameters (A is a common shift and left out). */
  readonly B: number;
  readonly C: number;
  /** Trees parameter α of αL(L + 1); 0 where left out. */
  readonly alpha?: number;
}

export type CubicIrrep = 'A1' | 'A2' | 'E' | 'T1' | 'T2';

/** Weight of one strong-field configuration t2^m e^n in a level. */
export interface ConfigurationWeight {
  readonly t2: number;
  readonly e: number;
  /** 0 to 1; the weights of a level add up to 1. */
  readonly weight: number;
}

export interface CubicLevel {
  /** Relative to the ground level, cm⁻¹. */
  readonly energy: number;
  /** 2S + 1. */
  readonly multiplicity: number;
  readonly irrep: CubicIrrep;
  /** Multiplicity and irrep as the trade writes them, `4T2g` in O_h and `4T2` in T_d. */
  readonly label: string;
  /** (2S + 1) times the dimension of the irrep. */
  readonly degeneracy: number;
  /** Largest weight first. */
  readonly configurations: readonly ConfigurationWeight[];
  /** Derivatives of `energy` (relative to the ground level) with respect to 10Dq, B and C (Hellmann-Feynman). */
  readonly slope: { readonly tenDq: number; readonly B: number; readonly C: number };
}
