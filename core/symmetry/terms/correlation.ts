import { pointGroup } from '../pointGroup';
import { reduce, type Component } from '../representations/character';
import { angularMomentumRepresentation } from '../representations/orbitals';
import { configurationsOf, type CubicGroup } from './configurationTerms';
import { freeIonTerms } from './freeIonTerms';

/** Free-ion term, and how many of them hold the term in question. */
export interface FreeIonParent {
  readonly label: string;
  readonly times: number;
}

export interface ConfigurationParent {
  readonly label: string;
  readonly t2g: number;
  readonly eg: number;
  readonly times: number;
}

/** Where a term of d^N in a cubic field comes from: both ends of the correlation diagram. */
export interface TermOrigin {
  /** `3T1g`. */
  readonly term: string;
  /** Free-ion terms that contain it (weak field): 3F and 3P for the 3T1g of d2. */
  readonly freeIon: readonly FreeIonParent[];
  /** Strong-field configurations that contain it: t2g^2 and t2g^1 eg^1. */
  readonly configurations: readonly ConfigurationParent[];
}

/** What an L term becomes in a point group, spin unchanged: F is A2g + T1g + T2g in O_h (H. Bethe 1929). */
export const splitTerm = (L: number, group: string): Component[] => {
  const target = pointGroup(group);
  return reduce(target, angularMomentumRepresentation(target, 2 * L));
};

const cache = new Map<string, readonly TermOrigin[]>();

/** All terms of d^N in O_h or T_d, each with its free-ion and its strong-field parents; both counts agree. */
export function termOrigins(dElectrons: number, group: CubicGroup = 'Oh'): readonly TermOrigin[] {
  const key = `${group} ${dElectrons}`;
  let found = cache.get(key);
  if (found === undefined) cache.set(key, (found = correlate(dElectrons, group)));
  return found;
}

function correlate(dElectrons: number, group: CubicGroup): TermOrigin[] {
  const origins = new Map<string, { freeIon: FreeIonParent[]; configurations: ConfigurationParent[] }>();
  for (const { label, t2g, eg, terms } of configurationsOf(dElectrons, group)) {
    for (const { label: termLabel, times } of terms) {
      const origin = origins.get(termLabel) ?? { freeIon: [], configurations: [] };
      origin.configurations.push({ label, t2g, eg, times });
      origins.set(termLabel, origin);
    }
  }
  for (const { label, multiplicity, L, times } of freeIonTerms(dElectrons)) {
    for (const { irrep, times: within } of splitTerm(L, group)) {
      origins.get(`${multiplicity}${irrep.mulliken}`)!.freeIon.push({ label, times: times * within });
    }
  }
  return [...origins].map(([label, origin]) => ({ term: label, ...origin }));
}
