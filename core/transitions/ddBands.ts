import type { BandLevel } from './bandInput';
import { laporteInput, type DdContext } from './ddContext';
import { chargeTransferGain } from './intensity/chargeTransferGain';
import { electronsMoved, oneElectronShare } from './intensity/electronsMoved';
import { laporteClass, laporteWords, typicalAbsorptivity } from './intensity/laporte';
import { borrowedBand, groundMixing, type SpinAllowedIntensity } from './intensity/spinOrbitMixing';
import { dipoleAllowedInTd } from './intensity/tetrahedralSelection';
import { levelBand } from './levelBand';
import { levelWidth } from './levelWidth';
import { splitFirstBand } from './splitFirstBand';
import type { Band } from './types';
import { vibronicGain } from './vibration';

/** Levels beyond this are outside what an instrument shows through any solvent, cm⁻¹. */
const highest_cm1 = 50_000;
/** Below this a level is part of the split ground term, cm⁻¹. */
const lowest_cm1 = 1000;
/** What is left of a band that the electric dipole does not reach in a perfect tetrahedron. */
const dipoleForbidden = 0.05;
/** Middle of the 3d row, cm⁻¹; only for the strength of bands where no zeta is on file. */
const usualZeta_cm1 = 400;

function allowedIntensity(context: DdContext, level: BandLevel, typical: number): SpinAllowedIntensity {
  const { input, edge_cm1 } = context;
  const ground = input.levels[0]!;
  const forbidden = input.geometry === 'tetrahedral' && !dipoleAllowedInTd(ground.label, level.label);
  const molarAbsorptivity =
    typical *
    oneElectronShare(ground.configurations, level.configurations, level.slope.tenDq) *
    (forbidden ? dipoleForbidden : 1) *
    chargeTransferGain(level.energy, edge_cm1);
  return { level, molarAbsorptivity, width_cm1: levelWidth(context, level) };
}

function allowedBand(context: DdContext, intensity: SpinAllowedIntensity, rule: string): Band {
  const { input, symmetry } = context;
  const { level, molarAbsorptivity, width_cm1 } = intensity;
  const group = symmetry.pointGroup === null ? '' : ` in ${symmetry.pointGroup}`;
  const moved = electronsMoved(input.levels[0]!.configurations, level.configurations);
  const reasons = [`${rule}${group}`];
  if (moved > 1) reasons.push('a jump of two electrons, seen only by configuration interaction');
  return levelBand(context, level, { kind: 'spin-allowed', molarAbsorptivity, width_cm1, rule, reasons });
}

/** Bands into levels one spin flip away. */
function forbiddenBands(
  context: DdContext,
  levels: readonly BandLevel[],
  allowed: readonly SpinAllowedIntensity[],
  typical: number,
): Band[] {
  const { input } = context;
  const zeta = input.zeta.value ?? usualZeta_cm1;
  const reasons = [
    'spin-forbidden; strength borrowed from spin-allowed bands by spin-orbit coupling',
    ...(input.zeta.value === null
      ? ['zeta is not on file; a usual size was taken for the strength only']
      : []),
  ];
  const mixed = new Map<number, number>();
  return levels.map((level) => {
    const { multiplicity } = level;
    const share = mixed.get(multiplicity) ?? groundMixing(input.levels, multiplicity, zeta);
    mixed.set(multiplicity, share);
    return levelBand(context, level, {
      ...borrowedBand(level, allowed, zeta, share * typical, levelWidth(context, level)),
      kind: 'spin-forbidden',
      rule: 'spin-forbidden',
      reasons,
    });
  });
}

/**
 * Transitions from the ground level to every level of the same multiplicity or one spin flip away, with width and
 * strength from the selection rules of the actual point group. Two spin flips are left out.
 */
export function ddBands(context: DdContext): Band[] {
  const { input } = context;
  const ground = input.levels[0];
  if (ground === undefined) return [];
  const laporte = laporteInput(context);
  const how = laporteClass(laporte);
  const thermal = how === 'vibronic' || how === 'planar' ? vibronicGain(input.temperature_K) : 1;
  const typical = typicalAbsorptivity(laporte) * thermal;
  const seen = input.levels.slice(1).filter(({ energy }) => energy > lowest_cm1 && energy < highest_cm1);
  const allowed = seen
    .filter(({ multiplicity }) => multiplicity === ground.multiplicity)
    .map((level) => allowedIntensity(context, level, typical));
  const [first, ...others] = allowed.map((intensity) => allowedBand(context, intensity, laporteWords[how]));
  const flipped = seen.filter(({ multiplicity }) => Math.abs(multiplicity - ground.multiplicity) === 2);
  const forbidden = forbiddenBands(context, flipped, allowed, typical);
  return [...(first === undefined ? [] : splitFirstBand(context, first)), ...others, ...forbidden].sort(
    (a, b) => a.energy_cm1 - b.energy_cm1,
  );
}
