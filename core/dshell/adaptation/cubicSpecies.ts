import { type CubicIrrep } from '../types';
import { withThreefold } from './cubicStates';
import { cosineState, plainState, sineState, type AdaptedVector } from './vector';

/** Dimension of each species of O. */
export const cubicDimension: Readonly<Record<CubicIrrep, number>> = { A1: 1, A2: 1, E: 2, T1: 3, T2: 3 };
export const cubicIrreps = ['A1', 'A2', 'E', 'T1', 'T2'] as const;

function tetragonalRow(J: number, remainder: 0 | 2, kind: 'cosine' | 'sine'): AdaptedVector[] {
  const states: AdaptedVector[] = [];
  for (let M = remainder; M <= J; M += 4) {
    const state = kind === 'cosine' ? cosineState(J, M) : sineState(J, M);
    if (state !== null) states.push(state);
  }
  return states;
}

/**
 * One component of every occurrence of a cubic species among the 2J + 1 states of integer J: the tetragonal rows a1, a2,
 * b1, b2 under the turns about z hold A1 + E, T1, A2 + E and T2, and the threefold turn tells A from E.
 */
export function cubicStates(J: number, irrep: CubicIrrep): AdaptedVector[] {
  switch (irrep) {
    case 'A1':
      return withThreefold(J, tetragonalRow(J, 0, 'cosine'), 1);
    case 'E':
      return withThreefold(J, tetragonalRow(J, 0, 'cosine'), -0.5);
    case 'A2':
      return withThreefold(J, tetragonalRow(J, 2, 'cosine'), 1);
    case 'T1':
      return tetragonalRow(J, 0, 'sine');
    case 'T2':
      return tetragonalRow(J, 2, 'sine');
  }
}

/** |J M⟩ with M ≡ remainder (mod 4), one row of a tetragonal spinor species. */
function spinorRow(J: number, remainder: 0.5 | 2.5): AdaptedVector[] {
  const states: AdaptedVector[] = [];
  for (let M = -J; M <= J; M++) if ((((M - remainder) % 4) + 4) % 4 === 0) states.push(plainState(M));
  return states;
}

/**
 * Rows of the spinor species of O in Bethe's numbering. The tetragonal row of M ≡ ½ holds Γ6 and Γ8, that of M ≡ −3/2 holds
 * Γ7 and Γ8; the symmetrised threefold turn has ½ = cos 60° on Γ6 and Γ7, −¼ on each row of Γ8.
 */
export const cubicSpinorSpecies: readonly {
  readonly name: string;
  readonly degeneracy: number;
  readonly states: (J: number) => AdaptedVector[];
}[] = [
  { name: 'G6', degeneracy: 2, states: (J) => withThreefold(J, spinorRow(J, 0.5), 0.5) },
  { name: 'G7', degeneracy: 2, states: (J) => withThreefold(J, spinorRow(J, 2.5), 0.5) },
  { name: 'G8', degeneracy: 4, states: (J) => withThreefold(J, spinorRow(J, 0.5), -0.25) },
];
