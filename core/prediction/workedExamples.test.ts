import { describe, expect, it } from 'vitest';
import { predict, type Prediction } from '.';

/**
 * Band positions and field parameters of well-known complexes, recalled from the works named and not looked up. None
 * of them is among the measurements kept for testing only.
 */
const figgis =
  'B. N. Figgis and M. A. Hitchman, Ligand Field Theory and its Applications (2000), from memory';
const lever = 'A. B. P. Lever, Inorganic Electronic Spectroscopy, 2nd ed. (1984), from memory';
const jorgensen = 'C. K. Jorgensen, Absorption Spectra and Chemical Bonding in Complexes (1962), from memory';

interface Example {
  readonly name: string;
  readonly source: string;
  readonly candidate: Entry;
  readonly ground: string;
  /** Spin-allowed bands, cm⁻¹, by the name of the upper term, ascending where a name occurs twice. */
  readonly bands: readonly (readonly [string, number])[];
  readonly tenDq?: number;
  readonly B?: number;
}

interface Entry {
  metal: string;
  oxidationState: number;
  ligands: Record<string, number>;
  geometry?: string;
  isomer?: string;
}
const entry = (given: Entry) => ({ id: 'x', geometry: 'octahedral', ...given });

const examples: readonly Example[] = [
  {
    name: '[Ti(H2O)6]3+',
    source: figgis,
    candidate: { metal: 'Ti', oxidationState: 3, ligands: { h2o: 6 } },
    ground: '2T2g',
    bands: [['2Eg', 20_300]],
    tenDq: 20_300,
  },
  {
    name: '[V(H2O)6]2+',
    source: lever,
    candidate: { metal: 'V', oxidationState: 2, ligands: { h2o: 6 } },
    ground: '4A2g',
    bands: [
      ['4T2g', 12_350],
      ['4T1g', 18_500],
      ['4T1g', 27_900],
    ],
    tenDq: 12_350,
  },
  {
    name: '[V(H2O)6]3+',
    source: lever,
    candidate: { metal: 'V', oxidationState: 3, ligands: { h2o: 6 } },
    ground: '3T1g',
    bands: [
      ['3T2g', 17_800],
      ['3T1g', 25_700],
    ],
    tenDq: 19_100,
    B: 620,
  },
  {
    name: '[Cr(H2O)6]3+',
    source: figgis,
    candidate: { metal: 'Cr', oxidationState: 3, ligands: { h2o: 6 } },
    ground: '4A2g',
    bands: [
      ['4T2g', 17_400],
      ['4T1g', 24_600],
      ['4T1g', 37_800],
    ],
    tenDq: 17_400,
    B: 725,
  },
  {
    name: '[Cr(NH3)6]3+',
    source: jorgensen,
    candidate: { metal: 'Cr', oxidationState: 3, ligands: { nh3: 6 } },
    ground: '4A2g',
    bands: [
      ['4T2g', 21_550],
      ['4T1g', 28_500],
    ],
    tenDq: 21_550,
    B: 650,
  },
  {
    name: '[Cr(en)3]3+',
    source: jorgensen,
    candidate: { metal: 'Cr', oxidationState: 3, ligands: { en: 3 } },
    ground: '4A2g',
    bands: [
      ['4T2g', 21_900],
      ['4T1g', 28_500],
    ],
    tenDq: 21_900,
  },
  {
    name: '[Cr(CN)6]3-',
    source: jorgensen,
    candidate: { metal: 'Cr', oxidationState: 3, ligands: { cn: 6 } },
    ground: '4A2g',
    bands: [
      ['4T2g', 26_600],
      ['4T1g', 32_600],
    ],
    tenDq: 26_600,
    B: 530,
  },
  {
    name: '[CrF6]3-',
    source: jorgensen,
    candidate: { metal: 'Cr', oxidationState: 3, ligands: { f: 6 } },
    ground: '4A2g',
    bands: [
      ['4T2g', 14_900],
      ['4T1g', 22_700],
      ['4T1g', 34_400],
    ],
    tenDq: 14_900,
    B: 827,
  },
  {
    name: '[Rh(NH3)6]3+',
    source: jorgensen,
    candidate: { metal: 'Rh', oxidationState: 3, ligands: { nh3: 6 } },
    ground: '1A1g',
    bands: [
      ['1T1g', 32_800],
      ['1T2g', 39_200],
    ],
    tenDq: 34_100,
    B: 430,
  },
  {
    name: '[Co(H2O)6]2+',
    source: lever,
    candidate: { metal: 'Co', oxidationState: 2, ligands: { h2o: 6 } },
    ground: '4T1g',
    bands: [
      ['4T2g', 8100],
      ['4A2g', 16_000],
      ['4T1g', 19_400],
    ],
    tenDq: 9200,
  },
  {
    name: '[Ni(H2O)6]2+',
    source: figgis,
    candidate: { metal: 'Ni', oxidationState: 2, ligands: { h2o: 6 } },
    ground: '3A2g',
    bands: [
      ['3T2g', 8500],
      ['3T1g', 13_800],
      ['3T1g', 25_300],
    ],
    tenDq: 8500,
    B: 907,
  },
  {
    name: '[Ni(NH3)6]2+',
    source: figgis,
    candidate: { metal: 'Ni', oxidationState: 2, ligands: { nh3: 6 } },
    ground: '3A2g',
    bands: [
      ['3T2g', 10_750],
      ['3T1g', 17_500],
      ['3T1g', 28_200],
    ],
    tenDq: 10_750,
  },
  {
    name: '[Ni(en)3]2+',
    source: figgis,
    candidate: { metal: 'Ni', oxidationState: 2, ligands: { en: 3 } },
    ground: '3A2g',
    bands: [
      ['3T2g', 11_200],
      ['3T1g', 18_350],
      ['3T1g', 29_000],
    ],
    tenDq: 11_200,
  },
  {
    name: '[Cu(H2O)6]2+',
    source: lever,
    candidate: { metal: 'Cu', oxidationState: 2, ligands: { h2o: 6 } },
    ground: '2Eg',
    bands: [['2T2g', 12_600]],
    tenDq: 12_600,
  },
  {
    name: 'trans-[Cr(en)2Cl2]+ split by its axis',
    source: 'W. A. Baker and M. G. Phillips, Inorg. Chem. 5 (1966) 1042, from memory',
    candidate: { metal: 'Cr', oxidationState: 3, ligands: { en: 2, cl: 2 }, isomer: 'trans' },
    ground: '4A2g',
    bands: [
      ['4T2g', 17_300],
      ['4T2g', 22_100],
    ],
  },
];

function predicted(candidate: Entry): Prediction {
  const outcome = predict(entry(candidate));
  if (!outcome.ok) throw new Error(outcome.problems[0]!.message);
  return outcome.prediction;
}

describe('worked examples of the literature', () => {
  it.each(examples.map((example) => [example.name, example] as const))('%s', (_, example) => {
    const prediction = predicted(example.candidate);
    expect(prediction.groundTerm).toBe(example.ground);
    const used = new Map<string, number>();
    for (const [label, energy] of example.bands) {
      const before = used.get(label) ?? 0;
      used.set(label, before + 1);
      const band = prediction.bands.filter((each) => each.label === label)[before];
      expect(band, label).toBeDefined();
      expect(Math.abs(band!.energy_cm1 / energy - 1), `${label} ${energy}`).toBeLessThan(0.08);
      expect(Math.abs(band!.energy_cm1 - energy)).toBeLessThan(3 * band!.sigma_cm1);
    }
    if (example.tenDq !== undefined) {
      expect(Math.abs(prediction.tenDq.value! / example.tenDq - 1)).toBeLessThan(0.05);
    }
    if (example.B !== undefined) {
      expect(Math.abs(prediction.racahB.value! / example.B - 1)).toBeLessThan(0.12);
    }
  });
});
