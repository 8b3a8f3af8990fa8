import type { Caution } from './cautions';

interface MetalRule {
  readonly id: string;
  readonly metals: readonly string[];
  readonly oxidationStates?: readonly number[];
  readonly text: string;
  readonly codes: readonly string[];
  readonly source: string;
}

const memory = 'from memory of CLP Annex VI entries; check the current sheet';

const rules: readonly MetalRule[] = [
  {
    id: 'nickel',
    metals: ['Ni'],
    text: 'Nickel compounds sensitise the skin; inhalable ones cause cancer. Soluble salts also harm reproduction. Avoid dust and skin contact; ask whether another metal serves.',
    codes: ['H317', 'H350i', 'H372'],
    source:
      'ECHA summary of classification, nickel monoxide (H317, H350i, H372, H413); soluble salts from memory of the CLP Regulation',
  },
  {
    id: 'cobalt',
    metals: ['Co'],
    text: 'Soluble cobalt(II) salts: carcinogen by inhalation, sensitiser of skin and airways, toxic for reproduction. Avoid dust; ask whether another metal serves.',
    codes: ['H317', 'H334', 'H341', 'H350i', 'H360F'],
    source:
      'GisChem data sheet, cobalt (H302, H317, H334, H341, H350, H360F, H413); salts from memory of the CLP Regulation',
  },
  {
    id: 'chromium-vi',
    metals: ['Cr'],
    oxidationStates: [5, 6],
    text: 'Chromium(VI): carcinogen, mutagen, sensitiser and strong oxidiser; use is restricted. Ask whether chromium(III) or another metal serves.',
    codes: ['H271', 'H317', 'H330', 'H340', 'H350', 'H410'],
    source: memory,
  },
  {
    id: 'chromium',
    metals: ['Cr'],
    oxidationStates: [2, 3],
    text: 'Chromium(III) is far less toxic than chromium(VI) but may sensitise; oxidation, also in waste, can give chromium(VI).',
    codes: ['H317'],
    source: memory,
  },
  {
    id: 'osmium',
    metals: ['Os'],
    text: 'Osmium compounds can be oxidised to volatile osmium tetroxide, fatal by breathing and blinding.',
    codes: ['H300', 'H310', 'H330', 'H314'],
    source: memory,
  },
  {
    id: 'vanadium',
    metals: ['V'],
    text: 'Vanadium compounds are toxic by breathing and mouth; vanadium(V) is suspected of genetic and reproductive harm.',
    codes: ['H302', 'H332', 'H341', 'H361d', 'H372'],
    source: memory,
  },
  {
    id: 'heavy-metal',
    metals: ['Hg', 'Cd'],
    text: 'Heavy metal: toxic, builds up in the body, special waste, sometimes a licence is needed.',
    codes: ['H300', 'H310', 'H330', 'H372', 'H410'],
    source: memory,
  },
  {
    id: 'platinum',
    metals: ['Pt', 'Ir', 'Rh'],
    text: 'Halogeno complexes of platinum metals are severe sensitisers of the airways.',
    codes: ['H317', 'H334'],
    source: memory,
  },
  {
    id: 'permanganate',
    metals: ['Mn'],
    oxidationStates: [6, 7],
    text: 'Manganese(VI) and (VII) oxo salts are strong oxidisers: fire or explosion with organic matter.',
    codes: ['H272', 'H302', 'H410'],
    source: memory,
  },
  {
    id: 'manganese',
    metals: ['Mn'],
    oxidationStates: [2, 3, 4],
    text: 'Manganese dust harms the nerves on long exposure.',
    codes: ['H373'],
    source: memory,
  },
  {
    id: 'copper',
    metals: ['Cu'],
    text: 'Copper salts are harmful by mouth and very toxic to water life.',
    codes: ['H302', 'H410'],
    source: memory,
  },
  {
    id: 'silver',
    metals: ['Ag'],
    text: 'Silver salts stain and corrode skin and are very toxic to water life; do not mix waste with ammonia.',
    codes: ['H314', 'H410'],
    source: memory,
  },
  {
    id: 'radioactive',
    metals: ['Tc'],
    text: 'Technetium has no stable isotope: radiation protection rules and a licence apply.',
    codes: [],
    source: 'IUPAC: no standard atomic weight for want of a stable isotope',
  },
];

/** Cautions that go with the central metal; a metal without a rule is said to be not assessed. */
export function metalCautions(metal: string, oxidationState: number): Caution[] {
  const hits = rules.filter(
    ({ metals, oxidationStates }) =>
      metals.includes(metal) && (oxidationStates === undefined || oxidationStates.includes(oxidationState)),
  );
  if (hits.length === 0) {
    return [
      {
        id: 'metal-not-assessed',
        about: metal,
        text: 'No special entry for this metal and oxidation state: not assessed. Most transition-metal salts are harmful and irritant.',
        codes: [],
        source: 'no entry in the library',
      },
    ];
  }
  return hits.map(({ id, text, codes, source }) => ({
    id: `metal-${id}`,
    about: metal,
    text,
    codes,
    source,
  }));
}
