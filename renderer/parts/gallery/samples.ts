/** Data for looking at the parts: invented, of plausible size, and named so. */
import { type SeenColour } from '../../../core/colour/types';
import { type Flag, type Reason } from '../../../core/estimation/types';
import { type Caution } from '../../../core/prediction/types';
import { type Band } from '../../../core/transitions/types';

/** A repeatable stream of numbers in [0, 1) (Park and Miller, minimal standard). */
export function stream(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
}

/** Nearly normal: sum of twelve. */
export const normal = (random: () => number): number =>
  Array.from({ length: 12 }, random).reduce((sum, value) => sum + value, -6);

/** L*a*b* (D65) to sRGB, clipped; enough for a sample. */
function srgbOf([L, a, b]: readonly [number, number, number]): { srgb: string; inGamut: boolean } {
  const fy = (L + 16) / 116;
  const f = (t: number): number => (t > 6 / 29 ? t ** 3 : 3 * (6 / 29) ** 2 * (t - 4 / 29));
  const [X, Y, Z] = [0.95047 * f(fy + a / 500), f(fy), 1.08883 * f(fy - b / 200)];
  const linear = [
    3.2406 * X - 1.5372 * Y - 0.4986 * Z,
    -0.9689 * X + 1.8758 * Y + 0.0415 * Z,
    0.0557 * X - 0.204 * Y + 1.057 * Z,
  ];
  const encode = (v: number): number => 255 * (v <= 0.0031308 ? 12.92 * v : 1.055 * v ** (1 / 2.4) - 0.055);
  const hex = linear
    .map((v) =>
      Math.round(encode(Math.max(0, Math.min(1, v))))
        .toString(16)
        .padStart(2, '0'),
    )
    .join('');
  return { srgb: `#${hex}`, inGamut: linear.every((v) => v > -0.005 && v < 1.005) };
}

export const colourOf = (lab: readonly [number, number, number], words: string): SeenColour => ({
  ...srgbOf(lab),
  lab,
  words,
  XYZ: [0, 0, 0],
  illuminant: 'D65',
  observer: 'CIE 1931 2°',
});

export const violet = colourOf([46, 34, -36], 'violet');
export const paleViolet = colourOf([78, 14, -16], 'pale violet');
export const darkViolet = colourOf([20, 38, -42], 'dark violet');
export const beyond = colourOf([75, -70, -30], 'turquoise');

const hueName = (a: number, b: number): string => {
  const hue = (Math.atan2(b, a) * 180) / Math.PI;
  return hue > -20 && hue < 60
    ? 'pink'
    : hue >= 60
      ? 'yellow'
      : hue > -70
        ? 'violet'
        : hue > -150
          ? 'blue'
          : 'green';
};

export const cloud = (() => {
  const random = stream(7);
  const draws = Array.from({ length: 200 }, () => {
    const lab = [46 + 9 * normal(random), 30 + 14 * normal(random), -32 + 16 * normal(random)] as const;
    return colourOf(lab, hueName(lab[1], lab[2]));
  });
  const counts = new Map<string, number>();
  for (const { words } of draws) counts.set(words, (counts.get(words) ?? 0) + 1);
  const words = [...counts]
    .map(([name, count]) => ({ words: name, share: count / draws.length }))
    .sort((one, other) => other.share - one.share);
  return { draws, words };
})();

export const band = (
  part: Partial<Band> & Pick<Band, 'energy_cm1' | 'label' | 'kind' | 'molarAbsorptivity'>,
): Band => ({
  sigma_cm1: part.energy_cm1 * 0.06,
  wavelength_nm: 1e7 / part.energy_cm1,
  multiplicity: part.kind === 'LMCT' || part.kind === 'MLCT' ? null : Number(part.label[0]),
  molarAbsorptivityRange: [part.molarAbsorptivity / 3, part.molarAbsorptivity * 3],
  intensityClass: part.kind === 'spin-allowed' ? 'spin-allowed, 1-100' : part.kind,
  width_cm1: part.kind === 'spin-forbidden' ? 250 : 3_600,
  reasons: [],
  ...part,
});

/** Like a trivalent chromium ion in a field of 17 400 cm⁻¹. */
export const bands: readonly Band[] = [
  band({ energy_cm1: 14_011, label: '2Eg', kind: 'spin-forbidden', molarAbsorptivity: 0.4 }),
  band({ energy_cm1: 14_676, label: '2T1g', kind: 'spin-forbidden', molarAbsorptivity: 0.4 }),
  band({ energy_cm1: 17_400, label: '4T2g', kind: 'spin-allowed', molarAbsorptivity: 13 }),
  band({ energy_cm1: 21_000, label: '2T2g', kind: 'spin-forbidden', molarAbsorptivity: 0.5, width_cm1: 500 }),
  band({ energy_cm1: 24_574, label: '4T1g', kind: 'spin-allowed', molarAbsorptivity: 15, width_cm1: 4_200 }),
  band({
    energy_cm1: 38_501,
    label: '4T1g(P)',
    kind: 'spin-allowed',
    molarAbsorptivity: 9,
    width_cm1: 4_800,
  }),
];
export const chargeTransfer = band({
  energy_cm1: 43_000,
  label: 'H2O -> Cr (eg)',
  kind: 'LMCT',
  molarAbsorptivity: 4_000,
  width_cm1: 6_000,
});

export const grid = Float64Array.from({ length: 451 }, (_, index) => 5_000 + 100 * index);
export const sumOf = (list: readonly Band[], scale = 1, shift = 0): Float64Array =>
  grid.map((at) =>
    list.reduce(
      (sum, one) =>
        sum +
        scale *
          one.molarAbsorptivity *
          Math.exp(-4 * Math.LN2 * ((at - one.energy_cm1 - shift) / one.width_cm1) ** 2),
      0,
    ),
  );

/** 81 values from 380 to 780 nm. */
export const transmittanceOf = (list: readonly Band[], strength: number): number[] =>
  Array.from({ length: 81 }, (_, index) => {
    const at = 1e7 / (380 + 5 * index);
    const absorptivity = list.reduce(
      (sum, one) =>
        sum + one.molarAbsorptivity * Math.exp(-4 * Math.LN2 * ((at - one.energy_cm1) / one.width_cm1) ** 2),
      0,
    );
    return 10 ** (-absorptivity * strength);
  });

export const reasons: readonly Reason[] = [
  {
    kind: 'source',
    text: 'f of ammine and g of chromium(III) from a published table, read on a page that cites it.',
  },
  {
    kind: 'assumption',
    text: 'Every ligand adds its share: the average environment stands for the mixed set.',
  },
  { kind: 'doubt', text: 'One of two ligands is placed by its donor class only', sigma: 1_540 },
  { kind: 'doubt', text: 'Medium: the table holds for water, the candidate is a solid', sigma: 400 },
  { kind: 'settle', text: 'One absorption spectrum of the hexakis complex in the same solvent.' },
];

export const flags: readonly Flag[] = [
  { code: 'spin-orbit', severity: 'note', message: 'Spin-orbit coupling (ζ about 270 cm⁻¹) is left out.' },
  {
    code: 'near-crossover',
    severity: 'caution',
    message: 'Near the spin crossover: one 10Dq cannot stand for both states.',
  },
  {
    code: 'pi-acceptor',
    severity: 'invalid',
    message: 'Cyanide on a divalent ion: the factors are known to fail here.',
  },
];

export const cautions: readonly Caution[] = [
  {
    id: 'perchlorate-amine',
    about: 'Perchlorate with amine ligands',
    text: 'Such salts can explode without warning; ask whether another anion serves.',
    codes: [],
    source: 'W. R. Robinson, J. Chem. Educ. 1985, 62, 1001',
  },
  {
    id: 'nickel',
    about: 'Nickel(II) salts',
    text: 'Sensitiser; carcinogenic when inhaled. Avoid dust.',
    codes: ['H317', 'H350i', 'H372'],
    source: 'Harmonised classification, EU CLP regulation',
  },
];
