import { symmetricEigensystem } from '../../numerics/eigen/symmetric';
import { cubicDimension, cubicIrreps, cubicStates } from '../adaptation/cubicSpecies';
import { fieldElement } from '../adaptation/unitElements';
import { type AdaptedVector } from '../adaptation/vector';
import { fieldTensors } from '../field/tensorComponents';
import { freeIon, type FreeIon } from '../freeIon/reducedElements';
import { type CubicIrrep } from '../types';
import { remember } from '../remember';

/**
 * One (S, irrep) of d^N in O in the strong-field basis, one component, one M_S. With e the number of e electrons of each
 * basis state, H = 10Dq (e − 2N/5) + B·repulsionB + C·repulsionC + α·orbitalSquare. Matrices are row-major.
 */
export interface CubicBlock {
  readonly S: number;
  readonly irrep: CubicIrrep;
  readonly degeneracy: number;
  readonly size: number;
  /** Number of e electrons of each basis state; the others are t2. */
  readonly eCount: readonly number[];
  readonly repulsionB: Float64Array;
  readonly repulsionC: Float64Array;
  /** L(L + 1), for the Trees correction. */
  readonly orbitalSquare: Float64Array;
}

/** 10Dq = 1 with e above t2. */
const unitSplitting = [0.6, 0.6, -0.4, -0.4, -0.4].map((value, a) =>
  [0, 1, 2, 3, 4].map((b) => (a === b ? value : 0)),
);

/** All blocks of d^N; worked out on first use (free-ion terms, subduction to O, then diagonal in the cubic field) and kept. */
export const cubicBlocks = remember((electrons: number): readonly CubicBlock[] =>
  workOut(freeIon(electrons)),
);

interface BasisState {
  readonly term: number;
  readonly vector: AdaptedVector;
}

function workOut(ion: FreeIon): CubicBlock[] {
  const spins = [...new Set(ion.terms.map((term) => term.S))];
  return spins.flatMap((S) =>
    cubicIrreps.flatMap((irrep) => {
      const basis = ion.terms.flatMap((term, index): BasisState[] =>
        term.S === S ? cubicStates(term.L, irrep).map((vector) => ({ term: index, vector })) : [],
      );
      return basis.length === 0 ? [] : [strongField(ion, S, irrep, basis)];
    }),
  );
}

function strongField(ion: FreeIon, S: number, irrep: CubicIrrep, basis: readonly BasisState[]): CubicBlock {
  const size = basis.length;
  const field = fieldTensors(unitSplitting);
  const fill = (element: (a: BasisState, b: BasisState) => number): Float64Array => {
    const matrix = new Float64Array(size * size);
    basis.forEach((a, i) => basis.forEach((b, j) => (matrix[i * size + j] = element(a, b))));
    return matrix;
  };
  const reduced = (matrix: Float64Array, a: BasisState, b: BasisState): number =>
    matrix[a.term * ion.terms.length + b.term]!;
  const cubic = fill((a, b) => {
    const [J, JPrime] = [ion.terms[a.term]!.L, ion.terms[b.term]!.L];
    return (
      fieldElement(J, a.vector, 2, field, JPrime, b.vector).re * reduced(ion.unit2, a, b) +
      fieldElement(J, a.vector, 4, field, JPrime, b.vector).re * reduced(ion.unit4, a, b)
    );
  });
  const sameState = (a: BasisState, b: BasisState): boolean =>
    ion.terms[a.term]!.L === ion.terms[b.term]!.L && overlap(a.vector, b.vector) > 0.5;
  const repulsion = (matrix: Float64Array): Float64Array =>
    fill((a, b) => (sameState(a, b) ? reduced(matrix, a, b) : 0));
  const { values, vectors } = symmetricEigensystem(cubic, size);
  return {
    S,
    irrep,
    degeneracy: (2 * S + 1) * cubicDimension[irrep],
    size,
    eCount: Array.from(values, (value) => Math.abs(Math.round(value + 0.4 * ion.electrons))),
    repulsionB: transformed(repulsion(ion.repulsionB), vectors, size),
    repulsionC: transformed(repulsion(ion.repulsionC), vectors, size),
    orbitalSquare: transformed(
      fill((a, b) => (a === b ? ion.terms[a.term]!.L * (ion.terms[a.term]!.L + 1) : 0)),
      vectors,
      size,
    ),
  };
}

function overlap(u: AdaptedVector, v: AdaptedVector): number {
  return u.M.reduce((sum, M, i) => {
    const j = v.M.indexOf(M);
    return j < 0 ? sum : sum + u.re[i]! * v.re[j]! + u.im[i]! * v.im[j]!;
  }, 0);
}

/** V M Vᵀ with the new basis in the rows of V. */
function transformed(matrix: Float64Array, vectors: Float64Array, n: number): Float64Array {
  const half = new Float64Array(n * n);
  const result = new Float64Array(n * n);
  for (let i = 0; i < n; i++)
    for (let k = 0; k < n; k++)
      for (let j = 0; j < n; j++) half[i * n + j]! += vectors[i * n + k]! * matrix[k * n + j]!;
  for (let i = 0; i < n; i++)
    for (let j = 0; j < n; j++)
      for (let k = 0; k < n; k++) result[i * n + j]! += half[i * n + k]! * vectors[j * n + k]!;
  return result;
}
