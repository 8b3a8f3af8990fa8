import type { BandKind } from '../types';

/** Two significant figures at most: these are orders of magnitude. */
export function roundAbsorptivity(value: number): number {
  if (!(value > 0)) return 0;
  const figures = value < 0.1 ? 1 : 2;
  const power = figures - 1 - Math.floor(Math.log10(value));
  return power >= 0
    ? Math.round(value * 10 ** power) / 10 ** power
    : Math.round(value / 10 ** -power) * 10 ** -power;
}

/** Factor by which the absorptivity may be off either way, 95 %. */
export const absorptivityFactor: Readonly<Record<BandKind, number>> = {
  'spin-allowed': 4,
  'spin-forbidden': 10,
  LMCT: 4,
  MLCT: 3,
  intervalence: 5,
  ligand: 4,
};

/** Range (L mol⁻¹ cm⁻¹) that should hold 95 % of such bands. */
export function absorptivityRange(typical: number, kind: BandKind): readonly [number, number] {
  const factor = absorptivityFactor[kind];
  return [roundAbsorptivity(typical / factor), roundAbsorptivity(typical * factor)];
}

const number = (value: number): string => String(value).replace(/(\d)(?=(\d{3})+$)/g, '$1 ');

/** `spin-allowed, vibronic, 3-50` */
export const intensityWords = (rule: string, [low, high]: readonly [number, number]): string =>
  `${rule}, ${number(low)}-${number(high)}`;

/** Above this a band is hardly d-d, cm⁻¹ M⁻¹ in an octahedron and a tetrahedron. */
const mostOfDd = { octahedral: 500, tetrahedral: 2000 };

/**
 * A doubt about an assignment: a band of 8000 is not d-d, one of 5 is not charge transfer. Null where nothing speaks
 * against it.
 */
export function assignmentDoubt(kind: BandKind, molarAbsorptivity: number, geometry: string): string | null {
  const most = geometry === 'tetrahedral' ? mostOfDd.tetrahedral : mostOfDd.octahedral;
  if (kind === 'spin-allowed' && molarAbsorptivity > most) {
    return `${number(molarAbsorptivity)} L/mol/cm is too strong for a d-d band; look for charge transfer`;
  }
  if (kind === 'spin-forbidden' && molarAbsorptivity > 50) {
    return `${number(molarAbsorptivity)} L/mol/cm is too strong for a spin-forbidden band`;
  }
  if ((kind === 'LMCT' || kind === 'MLCT') && molarAbsorptivity < 100) {
    return `${number(molarAbsorptivity)} L/mol/cm is too weak for charge transfer; look for a d-d band`;
  }
  return null;
}
