import { demoCandidates, type DemoCandidate } from './demoCandidates';

export interface DemoProject {
  readonly name: string;
  readonly notes: string;
  /** Colour the workshop is after, CIE L*a*b* under D65, 2 degrees. */
  readonly targetLab: readonly [number, number, number];
  readonly candidates: readonly DemoCandidate[];
}

/**
 * A made-up task to try the program on: no real workshop, people or order. Compositions are well-known kinds of
 * complexes; no measured value is stored with them.
 */
export const demoProject: DemoProject = {
  name: 'Demo: a filter for 540 to 580 nm',
  notes:
    'Made-up example. A small optics workshop wants a liquid filter, 2 cm thick, that takes out the yellow-green from ' +
    '540 to 580 nm and lets blue and red through, so the light that comes out looks violet. Two conditions: no cobalt ' +
    'and no chromium(VI). About forty candidates are entered; rank them by colour distance to the target or by first ' +
    'band, look at the ranges, and see which ones need a caution before anybody orders a salt.',
  // Light left of D65 by one Gaussian band at 560 nm (17 860 cm-1), 3200 cm-1 wide, absorbance 0.5 at its centre.
  targetLab: [73.8, 28.1, -41.8],
  candidates: demoCandidates,
};
