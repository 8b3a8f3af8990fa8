import type { TransitionPeriod } from '../../library';
import type { GeometryId } from '../../record/composition';

/** How a d-d transition comes by its intensity. */
export type LaporteClass = 'vibronic' | 'static' | 'tetrahedral' | 'planar';

export const laporteWords: Readonly<Record<LaporteClass, string>> = {
  vibronic: 'spin-allowed, by vibrations only (inversion centre)',
  static: 'spin-allowed, no inversion centre',
  tetrahedral: 'spin-allowed, tetrahedral',
  planar: 'spin-allowed, square-planar',
};

export interface LaporteInput {
  readonly geometry: GeometryId;
  readonly centrosymmetric: boolean;
  readonly mixed: boolean;
  readonly dElectrons: number;
  readonly oxidationState: number;
  readonly period: TransitionPeriod;
  /** Mean nephelauxetic h of the donors, 1 for water: the more covalent, the more p and ligand character. */
  readonly covalency: number;
  readonly lowSpin: boolean;
}

export const laporteClass = ({ geometry, centrosymmetric }: LaporteInput): LaporteClass =>
  geometry === 'tetrahedral'
    ? 'tetrahedral'
    : geometry === 'square-planar'
      ? 'planar'
      : centrosymmetric
        ? 'vibronic'
        : 'static';

/** Aqua ions: 2 to 5 L/mol/cm for M2+, 4 to 13 for M3+ (Ni, Co, V; Ti, Mn, Cr; usual textbook figures, from memory). */
const aqua = (oxidationState: number): number => (oxidationState <= 2 ? 3.2 : oxidationState === 3 ? 9 : 20);

/** A tenfold gain between h = 1 and h = 2: 13 in the aqua, 40 in the ammine and 86 in the cyano complex of Cr(III). */
const covalencyGain = (covalency: number): number =>
  10 ** (0.9 * Math.max(-0.3, Math.min(1.1, covalency - 1)));

function rowGain(period: TransitionPeriod): number {
  return period === '3d' ? 1 : 1.5;
}

/** One-electron jumps of a filled t2g shell and of the hole in Cu(II) are several times as strong. */
function shellGain({ dElectrons, lowSpin }: LaporteInput): number {
  if (dElectrons === 9) return 3.5;
  return dElectrons === 6 && lowSpin ? 2.5 : 1;
}

/**
 * Typical molar absorptivity (L mol⁻¹ cm⁻¹, room temperature) of a spin-allowed one-electron d-d band. Good to a factor
 * of three: 1 to 30 with an inversion centre, where only vibrations that break it help; more without one; 50 to 1000 in
 * a tetrahedron, where d and p mix (B. N. Figgis and M. A. Hitchman 2000; A. B. P. Lever 1984, from memory).
 */
export function typicalAbsorptivity(input: LaporteInput): number {
  const gain = covalencyGain(input.covalency) * rowGain(input.period);
  switch (laporteClass(input)) {
    case 'tetrahedral':
      return 60 * gain;
    case 'planar':
      return 16 * gain * (input.dElectrons === 9 ? 1.5 : 1);
    case 'static':
      return aqua(input.oxidationState) * gain * shellGain(input) * (input.mixed ? 1.2 : 1.5);
    case 'vibronic':
      return aqua(input.oxidationState) * gain * shellGain(input);
  }
}
