import { parity } from '../angularMomentum/factorials';
import { sixJ } from '../angularMomentum/sixJ';
import { type FreeIon } from '../freeIon/reducedElements';

/** A set of 2J + 1 states of one term: J = L where the spin is left aside, else the total angular momentum. */
export interface Multiplet {
  readonly term: number;
  readonly S: number;
  readonly L: number;
  readonly J: number;
}

/** What stays of the Hamiltonian between two multiplets when the dependence on M is taken out. */
export interface MultipletElements {
  readonly multiplets: readonly Multiplet[];
  /** Diagonal in J and independent of M. */
  scalar(part: 'B' | 'C' | 'alpha' | 'zeta', a: Multiplet, b: Multiplet): number;
  /** ⟨a‖U^(k)‖b⟩. */
  field(k: 2 | 4, a: Multiplet, b: Multiplet): number;
}

/** ⟨a‖L‖b⟩ or ⟨a‖S‖b⟩ between coupled multiplets (Edmonds 1957, eqs. 7.1.7 and 7.1.8). */
export function momentElement(which: 'L' | 'S', a: Multiplet, b: Multiplet): number {
  if (a.term !== b.term) return 0;
  const { L, S } = a;
  const size = which === 'L' ? L : S;
  const width = Math.sqrt((2 * a.J + 1) * (2 * b.J + 1) * size * (size + 1) * (2 * size + 1));
  return which === 'L'
    ? parity(L + S + b.J + 1) * width * sixJ(L, a.J, S, b.J, L, 1)
    : parity(L + S + a.J + 1) * width * sixJ(S, a.J, L, b.J, S, 1);
}

/** One multiplet per term of spin S, J = L: no spin-orbit coupling. */
export function spinFreeMultiplets(ion: FreeIon, S: number): MultipletElements {
  const n = ion.terms.length;
  const multiplets = ion.terms.flatMap((term, index): Multiplet[] =>
    term.S === S ? [{ term: index, S, L: term.L, J: term.L }] : [],
  );
  return {
    multiplets,
    scalar: (part, a, b) => (a.L === b.L && part !== 'zeta' ? repulsionElement(ion, part, a, b) : 0),
    field: (k, a, b) => (k === 2 ? ion.unit2 : ion.unit4)[a.term * n + b.term]!,
  };
}

/** Every |L − S| ≤ J ≤ L + S of every term, coupled in the order (L S)J. */
export function coupledMultiplets(ion: FreeIon): MultipletElements {
  const n = ion.terms.length;
  const multiplets = ion.terms.flatMap(({ S, L }, term) => {
    const list: Multiplet[] = [];
    for (let J = L + S; J >= Math.abs(L - S); J--) list.push({ term, S, L, J });
    return list;
  });
  return {
    multiplets,
    scalar(part, a, b) {
      if (a.J !== b.J) return 0;
      if (part === 'zeta') return spinOrbitElement(ion, a, b);
      return a.L === b.L && a.S === b.S ? repulsionElement(ion, part, a, b) : 0;
    },
    field(k, a, b) {
      if (a.S !== b.S) return 0;
      const reduced = (k === 2 ? ion.unit2 : ion.unit4)[a.term * n + b.term]!;
      if (reduced === 0) return 0;
      // Edmonds, Angular Momentum in Quantum Mechanics, 1957, eq. 7.1.7.
      return (
        parity(a.L + a.S + b.J + k) *
        Math.sqrt((2 * a.J + 1) * (2 * b.J + 1)) *
        sixJ(a.L, a.J, a.S, b.J, b.L, k) *
        reduced
      );
    },
  };
}

function repulsionElement(ion: FreeIon, part: 'B' | 'C' | 'alpha', a: Multiplet, b: Multiplet): number {
  if (part === 'alpha') return a.term === b.term ? a.L * (a.L + 1) : 0;
  return (part === 'B' ? ion.repulsionB : ion.repulsionC)[a.term * ion.terms.length + b.term]!;
}

/** ⟨(LS)JM|Σ l·s|(L′S′)JM⟩; Edmonds 1957, eq. 7.1.6. */
function spinOrbitElement(ion: FreeIon, a: Multiplet, b: Multiplet): number {
  const reduced = ion.spinOrbit[a.term * ion.terms.length + b.term]!;
  if (reduced === 0) return 0;
  return parity(b.L + a.S + a.J) * sixJ(a.J, a.S, a.L, 1, b.L, b.S) * reduced;
}
