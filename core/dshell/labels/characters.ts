import { turned, type PointGroup, type Quaternion } from '../../symmetry';
import { type Amplitudes } from '../states/amplitudes';
import { diagonal, remembered, rotationMatrix } from './diagonal';

/** Σ over states of ⟨ψ|R|ψ⟩ for one operation of each class read: real parts, which is all that joined classes need. */
export type CharacterReader = (states: readonly Amplitudes[]) => number[];

/**
 * Reads characters of sets of states given in the laboratory, at the classes listed by their places in the group; `frame`
 * carries the group's standard axes from the laboratory's.
 */
export function characterReader(
  group: PointGroup,
  frame: Quaternion,
  classes: readonly number[],
): CharacterReader {
  const matrices = classes.map((c) => {
    const { rotation } = turned(group.classes[c]!.representative, frame);
    return remembered((J) => rotationMatrix(J, rotation));
  });
  return (states) =>
    matrices.map((matrixOf) => states.reduce((sum, state) => sum + diagonal(state, matrixOf), 0));
}
