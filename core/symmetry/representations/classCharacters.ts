import { EigenvalueDecomposition, Matrix } from 'ml-matrix';
import { type GroupElements } from '../groups/closure';
import { type ConjugacyClass } from '../groups/conjugacyClass';

/**
 * How a representation behaves under complex conjugation (Frobenius and Schur): real; quaternionic (characters real,
 * matrices not: the usual Kramers doublet); or complex, in which case the conjugate is joined to it here.
 */
export type Reality = 'real' | 'quaternionic' | 'complex';

export interface ClassCharacters {
  readonly dimension: number;
  /** One per class. */
  readonly characters: readonly number[];
  readonly reality: Reality;
  /** Changes sign on a turn by 2π: belongs to half-integer spin. */
  readonly spinor: boolean;
}

const tidy = (x: number): number => (Math.abs(x - Math.round(x)) < 1e-9 ? Math.round(x) || 0 : x);

/**
 * All irreducible characters from the multiplication table alone (W. Burnside 1911; J. D. Dixon, Numer. Math. 10, 446,
 * 1967): the class sums commute, and their common eigenvectors are the characters scaled by class size.
 */
export function classCharacters(group: GroupElements, classes: readonly ConjugacyClass[]): ClassCharacters[] {
  const { product, inverse, bar, elements } = group;
  const classOf = new Int32Array(elements.length);
  classes.forEach(({ members }, c) => members.forEach((member) => (classOf[member] = c)));
  const sizes = classes.map(({ members }) => members.length);

  // One combination of class sums with incommensurate weights has no accidental degeneracy.
  const weights = classes.map((_, c) => Math.sqrt(2 + c * c) - 1 / (c + Math.PI));
  const combined = Matrix.zeros(classes.length, classes.length);
  classes.forEach(({ members }, t) => {
    for (let x = 0; x < elements.length; x++) {
      const s = classOf[product[inverse[x]!]![members[0]!]!]!;
      combined.set(s, t, combined.get(s, t) + weights[classOf[x]!]! * Math.sqrt(sizes[t]! / sizes[s]!));
    }
  });
  const { eigenvectorMatrix } = new EigenvalueDecomposition(combined, { assumeSymmetric: true });
  const identityClass = classOf[0]!;
  const barClass = classOf[bar[0]!]!;

  return classes.map((_, column) => {
    const v = eigenvectorMatrix.getColumn(column);
    const scaled = (v[identityClass]! / Math.sqrt(sizes[identityClass]!)) * Math.sqrt(elements.length);
    const single = Math.abs(Math.abs(scaled) - Math.round(Math.abs(scaled))) < 1e-6;
    // |scaled| is the dimension d; for a complex pair the real parts have half the norm and it comes out as d√2.
    const norm = Math.sign(scaled) * Math.sqrt(elements.length) * (single ? 1 : Math.SQRT2);
    const characters = v.map((entry, c) => tidy((entry * norm) / Math.sqrt(sizes[c]!)));
    const indicator = elements.reduce((sum, _e, g) => sum + characters[classOf[product[g]![g]!]!]!, 0);
    return {
      dimension: characters[identityClass]!,
      characters,
      reality: !single ? 'complex' : indicator > 0 ? 'real' : 'quaternionic',
      spinor: characters[barClass]! < 0,
    };
  });
}
