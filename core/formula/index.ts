export { readFormula } from './readFormula';
export type { FormulaProblem, FormulaReading, ReadFormula } from './types';
