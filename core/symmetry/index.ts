export { pointGroup, pointGroupNames, isPointGroupName, irrepNamed } from './pointGroup';
export type { PointGroup, Irrep, OperationClass } from './pointGroup';
export { directProduct, multiplicities, reduce, writeSum, type Component } from './representations/character';
export { antisymmetrisedPower, symmetrisedPower } from './representations/powers';
export { descend, restrictCharacter } from './representations/branching';
export {
  angularMomentumRepresentation,
  dOrbitals,
  dRotation,
  spinRotation,
} from './representations/orbitals';
export { termsOfShells, type Shell } from './terms/shellTerms';
export * from './terms/configurationTerms';
export { freeIonTerms, termLetters, type FreeIonTerm } from './terms/freeIonTerms';
export { termsByDescent } from './terms/descentOfConfiguration';
export { splitTerm, termOrigins, type TermOrigin } from './terms/correlation';
export { binomial, countMicrostates, type Term } from './terms/term';
export * from './rotation';
export { carry, turned, type Operation } from './groups/operation';
export { schoenflies, type StandingGroup } from './recognition/schoenflies';
export { arrangementGroup, rigidPermutations, spannedDimension } from './recognition/arrangement';
