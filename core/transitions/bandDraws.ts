/**
 * The same bands drawn many times from their uncertainties, as flat arrays: band `b` of draw `d` is at
 * `d * bandCount + b`.
 */
export interface BandDraws {
  readonly count: number;
  readonly bandCount: number;
  /** cm⁻¹ */
  readonly energy: Float64Array;
  /** Full width at half height, cm⁻¹. */
  readonly width: Float64Array;
  /** L mol⁻¹ cm⁻¹ */
  readonly molarAbsorptivity: Float64Array;
}

export const emptyBandDraws = (count: number, bandCount: number): BandDraws => ({
  count,
  bandCount,
  energy: new Float64Array(count * bandCount),
  width: new Float64Array(count * bandCount),
  molarAbsorptivity: new Float64Array(count * bandCount),
});
