import { bulkCandidates } from './bulkCandidates';
import { candidateTable } from './candidateTable';
import { lowSymmetryLevels } from './lowSymmetryLevels';
import { octahedralLevels } from './octahedralLevels';
import { type Bench } from './report';
import { scaling } from './scaling';
import { spinOrbitLevels } from './spinOrbitLevels';
import { wholeEstimate } from './wholeEstimate';

/** Every bench, in the order they run. A new one is a file in this folder and a line here. */
export const benches: readonly Bench[] = [
  octahedralLevels,
  lowSymmetryLevels,
  spinOrbitLevels,
  bulkCandidates,
  wholeEstimate,
  scaling,
  candidateTable,
];
