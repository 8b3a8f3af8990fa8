export type BandKind = 'spin-allowed' | 'spin-forbidden' | 'LMCT' | 'MLCT' | 'intervalence' | 'ligand';

/** One predicted absorption band. */
export interface Band {
  /** Centre, cm⁻¹, and its standard deviation. */
  readonly energy_cm1: number;
  readonly sigma_cm1: number;
  readonly wavelength_nm: number;
  /** 2S + 1 of the upper level; null for charge transfer. */
  readonly multiplicity: number | null;
  /** Upper level, `4T2g`, or the kind of charge transfer, `Cl- -> Co (t2g)`. */
  readonly label: string;
  /** Which part of a band that unlike ligands split, `in the plane of 4 NH3`; absent where it is one band. */
  readonly component?: string;
  readonly kind: BandKind;
  /** Typical molar absorptivity at the centre, L mol⁻¹ cm⁻¹, and the range it should lie in. */
  readonly molarAbsorptivity: number;
  readonly molarAbsorptivityRange: readonly [number, number];
  /** Class in words, e.g. `spin-forbidden, 0.001-1`. */
  readonly intensityClass: string;
  /** Full width at half height of a Gaussian in wavenumber, cm⁻¹. */
  readonly width_cm1: number;
  /** Leading strong-field configuration of the upper level, e.g. `t2g2 eg1`; absent for charge transfer. */
  readonly configuration?: string;
  /** Number of electrons that change between t2g and eg, from the leading configurations. */
  readonly electronsMoved?: number;
  /** Derivative of the centre with respect to 10Dq (dimensionless). */
  readonly slopeTenDq?: number;
  /** Derivatives with respect to B and C, for propagating correlated draws. */
  readonly slopeB?: number;
  readonly slopeC?: number;
  readonly reasons: readonly string[];
}
