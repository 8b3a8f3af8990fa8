import { jahnTellerExpectation } from '../estimation';
import type { BandLevel } from './bandInput';
import { bandWidth } from './bandWidth';
import type { DdContext } from './ddContext';

/** Unresolved Jahn-Teller splitting of the ground or upper level, cm⁻¹. */
const jahnTellerWidth = { strong: 3000, weak: 1500, none: 0 } as const;

const isOrbitalTriplet = (label: string): boolean => label.includes('T');

/** Splitting of either level that the cubic picture leaves out and an instrument shows as width, cm⁻¹. */
function hiddenSplitting({ input, ground }: DdContext, level: BandLevel): number {
  const zeta = input.zeta.value ?? 0;
  const spinOrbit = isOrbitalTriplet(level.label) || isOrbitalTriplet(input.levels[0]!.label) ? zeta / 2 : 0;
  if (input.geometry !== 'octahedral' || Math.abs(level.slope.tenDq) < 0.5) return spinOrbit;
  const expected = jahnTellerExpectation(input.dElectrons, ground.lowSpin ? 'low' : 'high');
  return Math.hypot(spinOrbit, jahnTellerWidth[expected]);
}

/** Full width at half height of the band into a level, cm⁻¹. */
export const levelWidth = (context: DdContext, level: BandLevel): number =>
  bandWidth({
    slopeTenDq: level.slope.tenDq,
    tenDq: context.input.tenDq.value ?? 0,
    splitting_cm1: hiddenSplitting(context, level),
    temperature_K: context.input.temperature_K,
  });
