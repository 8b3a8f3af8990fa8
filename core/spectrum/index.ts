export type { SpectralBand } from './spectralBand';
export { bandArea, gaussian, molarAbsorptivityAt, oscillatorStrength } from './gaussian';
export {
  absorptionCurve,
  bandCurve,
  spectrumFrom_nm,
  spectrumGrid,
  spectrumTo_nm,
  type AbsorptionCurve,
} from './absorptionCurve';
export { absorbance, molesPerLitre, percentTransmittance, transmittance } from './beerLambert';
export { kubelkaMunk, reflectanceOf } from './kubelkaMunk';
export {
  molarAbsorptivityAtWavelength,
  visibleCount,
  visibleReflectance,
  visibleTransmission,
  visibleWavenumbers_cm1,
} from './visibleTransmission';
export { findSolvent, hiddenBySolvent, solventWindows, type SolventWindow } from './solventWindow';
export { emissionMaximum_nm, perWavelength, perWavenumber } from './emissionShape';
export { apparentMaximum_cm1 } from './apparentMaximum';
