export { readSpectrumFile } from './reading/readSpectrumFile';
export type { ReadSpectrum, ReadingWarning, SpectrumReading, TextLayout } from './reading/types';
export type { DelimitedChoices } from './delimited/read';
export { writeJcamp, type JcampHeader } from './jcamp/write';
export { stepsForFitting, treat } from './treatment/treat';
export type { Treated } from './treatment/steps';
export { absorbanceSanity, type RangeRemark } from './treatment/sanity';
export { emissionInWavenumber, inWavenumber, type WavenumberCurve } from './treatment/wavenumber';
export { findBands, type BandSighting, type FindOptions } from './bandFit/findBands';
export { fitBands, type BandFit, type BandFitRequest, type FittedBand } from './bandFit/fitBands';
export { compareCounts, type CountComparison } from './bandFit/compareCounts';
export { gaussian, type BaselineForm, type GaussianBand } from './bandFit/model';
export {
  assignBands,
  type AssignmentOptions,
  type AssignmentResult,
  type BandAssignment,
  type MeasuredBand,
  type PredictedBand,
} from './assignment/assignBands';
export { fitField, type FieldFit, type FieldFitRequest, type FittedParameter } from './fieldFit/fitField';
export {
  balanceMoment,
  chiTFromMoment,
  concentrationAt,
  evansMoment,
  momentFromChi,
  type BalanceReading,
  type EvansReading,
  type MomentResult,
} from './magnetism/moment';
export { halfMolarMass, pascalSource, pascalSum, pascalTable, type PascalSum } from './magnetism/pascal';
export {
  cooperativeShare,
  fitVantHoff,
  highSpinShare,
  hysteresisThreshold,
  mixedMoment,
  shareFromMoments,
  type VantHoffFit,
  type VantHoffPoint,
} from './magnetism/vantHoff';
export { familyTrend, type FamilyMember, type FamilyTrend } from './magnetism/family';
export { recordAssignment, recordBandFit, recordFieldFit } from './records';
