import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { termLetters } from '../../symmetry';
import { type FreeIon } from '../freeIon/reducedElements';
import { type Amplitudes } from '../states/amplitudes';

/** A free-ion term with its share in a level. */
export interface FreeIonWeight {
  /** `3F`. */
  readonly label: string;
  /** 1 for the lowest term of that name in the free ion, 2 for the next (a 3F, b 3F). */
  readonly rank: number;
  /** How many terms of that name d^N has. */
  readonly of: number;
  /** 0 to 1. */
  readonly weight: number;
}

/** Terms of one S and L as combinations of seniority, lowest energy first. */
interface TermSet {
  readonly label: string;
  readonly terms: readonly number[];
  /** Row r holds the coefficients of the r-th term over `terms`. */
  readonly vectors: Float64Array;
}

/** The free-ion terms for the given repulsion; seniority alone where there is none (C = 4B stands in). */
function termSets(ion: FreeIon, B: number, C: number): TermSet[] {
  const [b, c] = B === 0 && C === 0 ? [1, 4] : [B, C];
  const n = ion.terms.length;
  const groups = new Map<string, number[]>();
  ion.terms.forEach(({ S, L }, term) => {
    const label = `${2 * S + 1}${termLetters[L]!}`;
    groups.set(label, [...(groups.get(label) ?? []), term]);
  });
  return [...groups].map(([label, terms]) => {
    const matrix = terms.flatMap((i) =>
      terms.map((j) => b * ion.repulsionB[i * n + j]! + c * ion.repulsionC[i * n + j]!),
    );
    const { vectors } = symmetricEigensystem(Float64Array.from(matrix), terms.length);
    return { label, terms, vectors };
  });
}

/** Gives the free-ion shares of orbital states (whose norms add up to the number of states `count`), largest first. */
export function freeIonReader(ion: FreeIon, B: number, C: number) {
  const sets = termSets(ion, B, C);
  return (parts: readonly Amplitudes[], count: number): FreeIonWeight[] => {
    const weights = sets.map(({ terms }) => terms.map(() => 0));
    for (const { multiplets, re, im } of parts) {
      sets.forEach(({ terms, vectors }, s) => {
        const places = terms.map((term) => multiplets.findIndex((multiplet) => multiplet.term === term));
        const size = re[places.find((place) => place >= 0) ?? -1]?.length ?? 0;
        terms.forEach((_, r) => {
          for (let at = 0; at < size; at++) {
            let [x, y] = [0, 0];
            places.forEach((place, k) => {
              x += vectors[r * terms.length + k]! * (re[place]?.[at] ?? 0);
              y += vectors[r * terms.length + k]! * (im[place]?.[at] ?? 0);
            });
            weights[s]![r]! += (x * x + y * y) / count;
          }
        });
      });
    }
    return sets
      .flatMap(({ label, terms }, s) =>
        weights[s]!.map((weight, r) => ({ label, rank: r + 1, of: terms.length, weight })),
      )
      .filter(({ weight }) => weight > 1e-9)
      .sort((a, b) => b.weight - a.weight);
  };
}
