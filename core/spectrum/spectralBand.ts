/** What the shape of a band needs; every predicted or fitted band has it. */
export interface SpectralBand {
  /** Centre, cm⁻¹. */
  readonly energy_cm1: number;
  /** Full width at half height, cm⁻¹. */
  readonly width_cm1: number;
  /** At the centre, L mol⁻¹ cm⁻¹. */
  readonly molarAbsorptivity: number;
}
