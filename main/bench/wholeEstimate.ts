import { cubicLevels } from '../../core/dshell';
import { predict } from '../../core/prediction';
import { measure } from './measure';
import { atMost, figure, type Bench } from './report';

/** One complex per d count with a full shell problem; the slowest of them is what a slider feels. */
const complexes = [
  { metal: 'Cr', oxidationState: 3, ligands: { nh3: 5, cl: 1 }, dElectrons: 3 },
  { metal: 'Fe', oxidationState: 3, ligands: { ox: 3 }, dElectrons: 5 },
  { metal: 'Fe', oxidationState: 2, ligands: { phen: 3 }, dElectrons: 6 },
  { metal: 'Ni', oxidationState: 2, ligands: { en: 3 }, dElectrons: 8 },
];

export const wholeEstimate: Bench = {
  name: 'whole-estimate',
  group: 'engine',
  run({ quick }) {
    let step = 0;
    const timings = complexes.flatMap(({ dElectrons, ligands, metal, oxidationState }) => {
      const candidate = { id: 'x', metal, oxidationState, geometry: 'octahedral', ligands };
      return measure(
        [
          {
            what: `engine call, d${dElectrons}`,
            // A new field each time: nothing of the last answer can be kept.
            run: () => {
              cubicLevels({ dElectrons, geometry: 'octahedral', tenDq: 14_000 + step++, B: 700, C: 3000 });
            },
            batch: 100,
          },
          {
            what: `estimate with 200 draws, d${dElectrons}`,
            run: () => {
              predict({ ...candidate, concentration_mM: 10 + (step++ % 50) }, { draws: 200 });
            },
            batch: 5,
          },
        ],
        quick ? 2 : 8,
      );
    });
    const engine = Math.max(...timings.filter((_, i) => i % 2 === 0).map(({ milliseconds }) => milliseconds));
    const whole = Math.max(...timings.filter((_, i) => i % 2 === 1).map(({ milliseconds }) => milliseconds));
    return {
      title: '(e) a whole estimate, 200 draws of its colour included, against one engine call',
      timings,
      figures: [figure('slowest estimate over slowest engine call', whole / engine, 'times', atMost(30))],
      skipped: [],
    };
  },
};
