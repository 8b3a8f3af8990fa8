export type { AlternativeValue, SourcedValue, SourceStatus } from './sourced';
export { unknownValue } from './sourced';
export { ionName, type IonicRadii, type IonRecord, type TransitionPeriod } from './ions';
export {
  ligandFromFacts,
  type Anchor,
  type AngularOverlapSet,
  type ChargeTransferWarning,
  type LigandFacts,
  type LigandHazard,
  type LigandRecord,
  type PiCharacter,
} from './ligands';
export { findGeometry, geometries, type GeometryRecord } from './geometries';
export { dElectronCount, findMetal, transitionMetals, type TransitionMetal } from './elements';
export type { Series } from './series';
export {
  complexKey,
  defaultLibrary,
  findIon,
  withLigands,
  type KnownComplex,
  type ParameterLibrary,
} from './parameterLibrary';
export { withParameterSet, type ParameterValues } from './parameterOverlay';
export { atomicWeights } from './atomicWeights';
export { atomsOf, massOfFormula, molarMass, netCharge, type MolarMass } from './molarMass';
export { counterIonOf, counterIons, type CounterIon } from './counterIons';
export { complexFormula } from './complexFormula';
export { cautionsFor, standingCaution, type Caution } from './cautions';
export { ligandKind, type LigandKind } from './ligandClass';
