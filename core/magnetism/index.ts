export { effectiveMoment, momentSquaredPerChiT, siSusceptibility, vanVleckFactor } from './magneticUnits';
export { electronG, momentFactors, type MagneticProblem } from './magneticProblem';
export { type SusceptibilityPoint } from './susceptibility/curve';
export { vanVleckSum, vanVleckSusceptibility } from './susceptibility/vanVleck';
export { inducedSusceptibility, magnetisation, type Magnetisation } from './susceptibility/induced';
export { powderMagnetisation } from './susceptibility/powder';
export { temperatureIndependent, type TemperatureIndependent } from './susceptibility/temperatureIndependent';
export { groundDoubletG, type DoubletG } from './spinHamiltonian/groundDoublet';
export { zeroFieldSplitting, type ZeroFieldSplitting } from './spinHamiltonian/zeroFieldSplitting';
export { kotaniMoment } from './kotani';
export {
  diamagneticCorrection,
  type DiamagneticCorrection,
  type DiamagneticItem,
} from './diamagnetism/diamagneticCorrection';
