import { type Bench } from './report';
import { againstSpinBlocks } from './withoutCoupling';

export const octahedralLevels: Bench = {
  name: 'octahedral-levels',
  group: 'engine',
  run: (options) =>
    againstSpinBlocks(
      '(a) all levels of one octahedral d5 complex, no spin-orbit coupling',
      { dElectrons: 5, B: 800, C: 3400, field: { type: 'oct', tenDq: 12_500 } },
      { overMlMatrix: 50, overLapack: 20, batch: 200 },
      options,
    ),
};
