/**
 * What the core offers to whoever takes it as a whole. Renderer and main import from the folders themselves; this list
 * is the promise that does not change without notice, and a test pins it.
 */
export { SpinhueError, type Checked, type ErrorCode, type Problem } from './errors';
export { fromWavenumber, toWavenumber, wavelength_nm, widthFromWavenumber, type EnergyUnit } from './units';
export {
  cautionsFor,
  complexFormula,
  defaultLibrary,
  ligandFromFacts,
  molarMass,
  withLigands,
  withParameterSet,
  type Caution,
  type IonRecord,
  type LigandRecord,
  type ParameterLibrary,
} from './library';
export { demoProject } from './library/demo';
export { checkCandidate } from './record/candidateCheck';
export { type CandidateInput, type Composition, type GeometryId } from './record/composition';
export { readBundle, writeBundle } from './record/bundle';
export { cubicLevels, groundCrossovers, levels, type CubicLevel, type Level } from './dshell';
export { isomersOf } from './geometry';
export { estimateField, differenceSigma, type Estimate, type FieldEstimate } from './estimation';
export { crossoverRatio, spinState, type SpinPrediction } from './spin';
export { predictBands, type Band } from './transitions';
export { absorptionCurve } from './spectrum';
export { colourDifference, colourOfPowder, colourOfSolution, type SeenColour } from './colour';
export { modelVersion, predict, predictMany, type Prediction, type PredictionOutcome } from './prediction';
export { searchWish, type Wish } from './search';
export { vanVleckSusceptibility } from './magnetism';
export {
  agreementReport,
  blandAltman,
  brierScore,
  compareComplex,
  coverage,
  errorSummary,
  readMeasuredSet,
  wilsonInterval,
} from './agreement';
