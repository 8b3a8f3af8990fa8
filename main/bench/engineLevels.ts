import { type LevelProblem } from '../../core/dshell';
import { solveBlocks } from '../../core/dshell/levels/solveBlocks';
import { checkProblem } from '../../core/dshell/problem';

/** From the problem as a user states it to every level with its spin, species and degeneracy. */
export const engineRun = (problem: LevelProblem) => (): void => {
  solveBlocks(checkProblem(problem));
};

/** A field with no symmetry at all, of the size of a common complex. */
export const fieldWithoutSymmetry: LevelProblem['field'] = {
  type: 'matrix',
  matrix: [
    [9052, -1141, -1432, -409, -469],
    [-1141, 10409, -627, 651, -843],
    [-1432, -627, -3586, 1017, 410],
    [-409, 651, 1017, -8000, 377],
    [-469, -843, 410, 377, -7900],
  ],
};
