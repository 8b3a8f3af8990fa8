import { fieldWithoutSymmetry } from './engineLevels';
import { type Bench } from './report';
import { againstSpinBlocks } from './withoutCoupling';

export const lowSymmetryLevels: Bench = {
  name: 'low-symmetry-levels',
  group: 'engine',
  run: (options) =>
    againstSpinBlocks(
      '(b) all levels of one d5 complex without symmetry, no spin-orbit coupling',
      { dElectrons: 5, B: 800, C: 3400, field: fieldWithoutSymmetry },
      { overMlMatrix: 5, overLapack: 1, batch: 20 },
      options,
    ),
};
