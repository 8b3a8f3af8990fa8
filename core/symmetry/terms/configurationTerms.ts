import { SpinhueError } from '../../errors';
import { pointGroup } from '../pointGroup';
import { termsOfShells } from './shellTerms';
import { binomial, countMicrostates, type Term } from './term';

/** O_h writes g on everything; T_d does not. The terms are otherwise the same, d orbitals being even. */
export type CubicGroup = 'Oh' | 'Td';

export interface StrongFieldConfiguration {
  readonly t2g: number;
  readonly eg: number;
}

export interface ConfigurationTerms extends StrongFieldConfiguration {
  /** `t2g^1 eg^1`. */
  readonly label: string;
  /** Highest multiplicity first. */
  readonly terms: readonly Term[];
  /** C(6, t2g) C(4, eg); the terms add up to it. */
  readonly microstates: number;
}

export function configurationLabel({ t2g, eg }: StrongFieldConfiguration, group: CubicGroup = 'Oh'): string {
  const g = group === 'Oh' ? 'g' : '';
  const t2Part = t2g === 0 ? '' : `t2${g}^${t2g}`;
  const ePart = eg === 0 ? '' : `e${g}^${eg}`;
  const parts = group === 'Oh' ? [t2Part, ePart] : [ePart, t2Part];
  return parts.filter((part) => part !== '').join(' ');
}

const cache = new Map<string, ConfigurationTerms>();

/**
 * All terms of t2g^m eg^n with their microstates. Throws a SpinhueError (`out-of-range`) where the electrons do not fit.
 * t2g^1 eg^1 gives 3T1g + 3T2g + 1T1g + 1T2g with 24 microstates.
 */
export function termsOfConfiguration(
  configuration: StrongFieldConfiguration,
  group: CubicGroup = 'Oh',
): ConfigurationTerms {
  const { t2g, eg } = configuration;
  checkOccupation(t2g, 6, 't2g');
  checkOccupation(eg, 4, 'eg');
  const key = `${group} ${t2g} ${eg}`;
  let found = cache.get(key);
  if (found === undefined) {
    const g = group === 'Oh' ? 'g' : '';
    const terms = termsOfShells(pointGroup(group), [
      { irrep: `T2${g}`, electrons: t2g },
      { irrep: `E${g}`, electrons: eg },
    ]);
    const microstates = countMicrostates(terms);
    if (microstates !== binomial(6, t2g) * binomial(4, eg)) throw new Error('microstates do not add up');
    found = { t2g, eg, label: configurationLabel(configuration, group), terms, microstates };
    cache.set(key, found);
  }
  return found;
}

/** Every t2g^m eg^n of d^N, fewest electrons in the upper orbitals first (t2g is filled first in O_h, e in T_d). */
export function configurationsOf(dElectrons: number, group: CubicGroup = 'Oh'): ConfigurationTerms[] {
  checkOccupation(dElectrons, 10, 'dElectrons');
  const all: ConfigurationTerms[] = [];
  for (let eg = Math.max(0, dElectrons - 6); eg <= Math.min(4, dElectrons); eg++) {
    all.push(termsOfConfiguration({ t2g: dElectrons - eg, eg }, group));
  }
  return group === 'Oh' ? all : all.reverse();
}

function checkOccupation(electrons: number, most: number, field: string): void {
  if (Number.isInteger(electrons) && electrons >= 0 && electrons <= most) return;
  throw new SpinhueError({
    code: 'out-of-range',
    message: `${field} = ${String(electrons)}: a whole number from 0 to ${most} is needed`,
    field,
    remedy: `${field === 'dElectrons' ? 'the d shell' : field} holds at most ${most} electrons`,
  });
}
