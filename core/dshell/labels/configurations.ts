import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { plainState } from '../adaptation/vector';
import { fieldElement } from '../adaptation/unitElements';
import { fieldTensors } from '../field/tensorComponents';
import { freeIon } from '../freeIon/reducedElements';
import { type Amplitudes } from '../states/amplitudes';
import { type ConfigurationWeight } from '../types';

/** Orbital states |term, M⟩ of one spin and the strong-field states as rows over them. */
interface StrongField {
  readonly basis: readonly { readonly term: number; readonly at: number }[];
  /** Row k (of the length of the basis) has `eCount[k]` electrons in e orbitals. */
  readonly vectors: Float64Array;
  readonly eCount: readonly number[];
}

/** e on, t2 off, without the trace. */
const unitSplitting = [0.6, 0.6, -0.4, -0.4, -0.4].map((value, a) =>
  [0, 1, 2, 3, 4].map((b) => (a === b ? value : 0)),
);
const known = new Map<string, StrongField>();

/** Eigenstates of the number of e electrons about the cubic axes, for one spin of d^N; kept. */
function strongField(electrons: number, S: number): StrongField {
  const key = `${electrons},${S}`;
  let found = known.get(key);
  if (found === undefined) known.set(key, (found = workOut(electrons, S)));
  return found;
}

function workOut(electrons: number, S: number): StrongField {
  const ion = freeIon(electrons);
  const field = fieldTensors(unitSplitting);
  const basis = ion.terms.flatMap((term, index) =>
    term.S === S ? Array.from({ length: 2 * term.L + 1 }, (_, at) => ({ term: index, L: term.L, at })) : [],
  );
  const n = basis.length;
  const matrix = new Float64Array(n * n);
  basis.forEach((a, i) =>
    basis.slice(0, i + 1).forEach((b, j) => {
      const reduced = ion.unit4[a.term * ion.terms.length + b.term]!;
      if (reduced === 0) return;
      const [u, v] = [plainState(a.at - a.L), plainState(b.at - b.L)];
      matrix[i * n + j] = reduced * fieldElement(a.L, u, 4, field, b.L, v).re;
    }),
  );
  const { values, vectors } = symmetricEigensystem(matrix, n);
  return { basis, vectors, eCount: Array.from(values, (value) => Math.round(value + 0.4 * electrons) || 0) };
}

/** Shares of the strong-field configurations in orbital states over the cubic axes (norms add up to `count`); largest first. */
export function configurationWeights(
  electrons: number,
  parts: readonly Amplitudes[],
  count: number,
): ConfigurationWeight[] {
  const weights = new Map<number, number>();
  for (const { multiplets, re, im } of parts) {
    const { basis, vectors, eCount } = strongField(electrons, multiplets[0]!.S);
    const places = basis.map(({ term }) => multiplets.findIndex((multiplet) => multiplet.term === term));
    const x = basis.map(({ at }, i) => re[places[i]!]?.[at] ?? 0);
    const y = basis.map(({ at }, i) => im[places[i]!]?.[at] ?? 0);
    eCount.forEach((e, k) => {
      let [p, q] = [0, 0];
      for (let i = 0; i < basis.length; i++) {
        const value = vectors[k * basis.length + i]!;
        p += value * x[i]!;
        q += value * y[i]!;
      }
      weights.set(e, (weights.get(e) ?? 0) + (p * p + q * q) / count);
    });
  }
  return [...weights]
    .map(([e, weight]) => ({ t2: electrons - e, e, weight }))
    .filter(({ weight }) => weight > 1e-9)
    .sort((a, b) => b.weight - a.weight);
}
