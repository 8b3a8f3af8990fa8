import { type CubicIrrep } from '../types';
import { withThreefold } from './cubicStates';
import { cosineState, sineState, type AdaptedVector } from './vector';

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
