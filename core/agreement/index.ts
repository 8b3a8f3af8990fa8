export { errorSummary, mean, median, quantile, type ErrorSummary } from './summary';
export { shareOf, wilsonInterval, type Share } from './wilson';
export { brierScore, confusionTable, type ConfusionTable, type Forecast } from './brier';
export { blandAltman, coverage, standardScore, type BlandAltman, type Pair } from './pairs';
export { readMeasuredSet, type MeasuredBand, type MeasuredComplex } from './measuredSet';
export { firstAllowed, matchBands, matchChargeTransfer, type BandPair } from './matchBands';
export {
  compareComplex,
  type BandComparison,
  type ComplexComparison,
  type SpinComparison,
  type ValuePair,
} from './compareComplex';
export { compareColour, type ColourComparison } from './compareColour';
export { agreementReport, type AgreementReport } from './report';
