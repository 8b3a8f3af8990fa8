import type { CurveData } from '../curve';
import { toCsv, type CsvStyle } from './csv';

const xNames = { nm: 'Wavelength (nm)', 'cm-1': 'Wavenumber (cm-1)', unknown: 'x' } as const;
const yNames = {
  absorbance: 'Absorbance',
  transmittance: 'Transmittance',
  'percent-transmittance': '%T',
  'molar-absorptivity': 'Molar absorptivity (L mol-1 cm-1)',
  unknown: 'y',
} as const;

/** A spectrum as two columns under a heading that names quantity and unit; a missing point has an empty cell. */
export const curveCsv = (curve: CurveData, style?: CsvStyle): string =>
  toCsv([[xNames[curve.xUnit], yNames[curve.yUnit]], ...curve.x.map((x, i) => [x, curve.y[i]!])], style);
