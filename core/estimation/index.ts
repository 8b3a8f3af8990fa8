export type { DoubtShare, Estimate, EstimateRoute, Flag, Reason } from './types';
export { covariance, differenceSigma, estimate, notEstimated, quadrature } from './uncertain';
export { defaultDoubts } from './defaultDoubts';
export { donorShares, estimateField, scaled, type FieldEstimate, type SpinFields } from './estimateField';
export { averageEnvironment, publishedProduct, type DonorField } from './fieldStrength';
export { freeIonRatio, nephelauxeticB, type DonorShare } from './racah';
export {
  jahnTellerExpectation,
  octahedralOccupation,
  strongSplittingShare,
  type JahnTellerStrength,
} from './jahnTeller';
export type { SpinChoice } from './spinChoice';
export { fieldLevels, type FieldLevel } from './fieldLevels';
export { isOxoCation, overlapLigands } from './overlapField';
export { donorOverlap, piRatio, type DonorOverlap } from './angularOverlap';
export { extraPairs, ligandFieldStabilisation } from './stabilisation';
export { distanceExponent, distanceFactor, spinDistances, type SpinDistances } from './distance';
export { doubtReasons, settlingMeasurement, withAccount } from './doubts';
