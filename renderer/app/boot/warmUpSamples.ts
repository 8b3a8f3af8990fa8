import type { CandidateInput } from '../../../core/record/composition';

const metals = [
  ['Cr', 3],
  ['Ni', 2],
  ['Co', 3],
  ['Co', 2],
  ['Fe', 3],
  ['V', 3],
  ['Mn', 3],
  ['Cu', 2],
  ['Ti', 3],
] as const;

/** One complex of each d count from 1 to 9, the usual ones first. */
export const warmUpSamples: readonly CandidateInput[] = metals.map(([metal, oxidationState]) => ({
  id: `warm-up-${metal}${oxidationState}`,
  metal,
  oxidationState,
  geometry: 'octahedral',
  ligands: { h2o: 6 },
}));
