/** One candidate of the demo project, as a chemist would enter it. */
export interface DemoCandidate {
  readonly id: string;
  readonly name: string;
  readonly composition: {
    readonly metal: string;
    readonly oxidationState: number;
    readonly geometry: 'octahedral' | 'tetragonal' | 'tetrahedral' | 'square-planar';
    readonly ligands: Readonly<Record<string, number>>;
    readonly isomer: string | null;
  };
  readonly counterIon: string | null;
  readonly concentration_mM: number;
  readonly path_cm: number;
  readonly tags: readonly string[];
  readonly notes: string;
}

type Geometry = DemoCandidate['composition']['geometry'];

/** The cell of the made-up task. */
const path_cm = 2;

const candidate = (
  id: string,
  metal: string,
  oxidationState: number,
  ligands: Readonly<Record<string, number>>,
  counterIon: string | null,
  more: {
    geometry?: Geometry;
    isomer?: string;
    concentration_mM?: number;
    tags?: readonly string[];
    notes?: string;
  } = {},
): DemoCandidate => ({
  id: `demo-${id}`,
  name: '',
  composition: {
    metal,
    oxidationState,
    geometry: more.geometry ?? 'octahedral',
    ligands,
    isomer: more.isomer ?? null,
  },
  counterIon,
  concentration_mM: more.concentration_mM ?? 20,
  path_cm,
  tags: more.tags ?? [],
  notes: more.notes ?? '',
});

const shelf = { tags: ['on the shelf'] };

const chromium: readonly DemoCandidate[] = [
  candidate('cr-aqua', 'Cr', 3, { h2o: 6 }, 'nitrate', {
    ...shelf,
    notes: 'Two bands straddle the green: the hue depends on the strength.',
  }),
  candidate('cr-ox', 'Cr', 3, { ox: 3 }, 'potassium', { concentration_mM: 10, ...shelf }),
  candidate('cr-mal', 'Cr', 3, { mal: 3 }, 'potassium', { concentration_mM: 10 }),
  candidate('cr-acac', 'Cr', 3, { acac: 3 }, null, { concentration_mM: 10, notes: 'For organic solvents.' }),
  candidate('cr-urea', 'Cr', 3, { urea: 6 }, 'chloride'),
  candidate('cr-gly', 'Cr', 3, { gly: 3 }, null, { isomer: 'fac', concentration_mM: 10 }),
  candidate('cr-edta', 'Cr', 3, { edta: 1 }, 'sodium', { concentration_mM: 6, ...shelf }),
  candidate('cr-ncs', 'Cr', 3, { ncs_n: 6 }, 'potassium', { concentration_mM: 6 }),
  candidate('cr-en', 'Cr', 3, { en: 3 }, 'chloride', { concentration_mM: 10 }),
  candidate('cr-nh3', 'Cr', 3, { nh3: 6 }, 'chloride'),
  candidate('cr-nh3-5-cl', 'Cr', 3, { nh3: 5, cl: 1 }, 'chloride'),
  candidate('cr-en-ox-2', 'Cr', 3, { en: 1, ox: 2 }, 'sodium', { concentration_mM: 10 }),
  candidate('cr-en-2-ox', 'Cr', 3, { en: 2, ox: 1 }, 'chloride', { concentration_mM: 10 }),
  candidate('cr-en-2-f-2', 'Cr', 3, { en: 2, f: 2 }, 'chloride', { isomer: 'trans' }),
  candidate('cr-en-2-br-2', 'Cr', 3, { en: 2, br: 2 }, 'bromide', { isomer: 'trans' }),
  candidate('cr-aqua-4-cl-2', 'Cr', 3, { h2o: 4, cl: 2 }, 'chloride', { isomer: 'trans', ...shelf }),
  candidate('cr-dmso', 'Cr', 3, { dmso_o: 6 }, 'tetrafluoroborate'),
];

const nickel: readonly DemoCandidate[] = [
  candidate('ni-en', 'Ni', 2, { en: 3 }, 'sulfate', {
    concentration_mM: 60,
    ...shelf,
    notes: 'Violet as a textbook sample; nickel needs the caution.',
  }),
  candidate('ni-nh3', 'Ni', 2, { nh3: 6 }, 'chloride', { concentration_mM: 60 }),
  candidate('ni-pn', 'Ni', 2, { pn: 3 }, 'sulfate', { concentration_mM: 60 }),
  candidate('ni-dien', 'Ni', 2, { dien: 2 }, 'chloride', { concentration_mM: 60, isomer: 'mer' }),
  candidate('ni-tacn', 'Ni', 2, { tacn: 2 }, 'chloride', { concentration_mM: 60 }),
  candidate('ni-phen', 'Ni', 2, { phen: 3 }, 'chloride', { concentration_mM: 40 }),
  candidate('ni-bipy', 'Ni', 2, { bipy: 3 }, 'chloride', { concentration_mM: 40 }),
  candidate('ni-en-2-aqua-2', 'Ni', 2, { en: 2, h2o: 2 }, 'sulfate', {
    concentration_mM: 60,
    isomer: 'trans',
  }),
  candidate('ni-gly', 'Ni', 2, { gly: 3 }, 'potassium', { concentration_mM: 60 }),
  candidate('ni-aqua', 'Ni', 2, { h2o: 6 }, 'sulfate', { concentration_mM: 100, ...shelf }),
];

const copper: readonly DemoCandidate[] = [
  candidate('cu-en', 'Cu', 2, { en: 2, h2o: 2 }, 'sulfate', {
    geometry: 'tetragonal',
    isomer: 'trans',
    concentration_mM: 10,
    ...shelf,
  }),
  candidate('cu-nh3', 'Cu', 2, { nh3: 4, h2o: 2 }, 'sulfate', {
    geometry: 'tetragonal',
    isomer: 'trans',
    concentration_mM: 12,
    ...shelf,
  }),
  candidate('cu-gly', 'Cu', 2, { gly: 2, h2o: 2 }, null, { geometry: 'tetragonal', concentration_mM: 12 }),
  candidate('cu-aqua', 'Cu', 2, { h2o: 6 }, 'sulfate', {
    geometry: 'tetragonal',
    concentration_mM: 40,
    ...shelf,
  }),
];

const others: readonly DemoCandidate[] = [
  candidate('v-aqua', 'V', 3, { h2o: 6 }, 'chloride', { notes: 'Air-sensitive.' }),
  candidate('v-ox', 'V', 3, { ox: 3 }, 'potassium', { concentration_mM: 10, notes: 'Air-sensitive.' }),
  candidate('v2-aqua', 'V', 2, { h2o: 6 }, 'sulfate', { notes: 'Very air-sensitive.' }),
  candidate('ti-aqua', 'Ti', 3, { h2o: 6 }, 'chloride', { concentration_mM: 60, notes: 'Air-sensitive.' }),
  candidate('mn3-acac', 'Mn', 3, { acac: 3 }, null, { concentration_mM: 5 }),
  candidate('mn3-ox', 'Mn', 3, { ox: 3 }, 'potassium', {
    concentration_mM: 5,
    notes: 'Decomposes in light.',
  }),
  candidate('fe-phen', 'Fe', 2, { phen: 3 }, 'sulfate', {
    concentration_mM: 0.1,
    tags: ['charge transfer'],
    notes: 'Strong, but at 510 nm and red.',
  }),
  candidate('mo-cl', 'Mo', 3, { cl: 6 }, 'potassium', { concentration_mM: 25 }),
  candidate('mno4', 'Mn', 7, { oxo: 4 }, 'potassium', {
    geometry: 'tetrahedral',
    concentration_mM: 0.3,
    tags: ['charge transfer'],
    notes: 'Strong oxidiser: looks right, keeps badly.',
  }),
  candidate('ru-bipy', 'Ru', 2, { bipy: 3 }, 'chloride', {
    concentration_mM: 0.05,
    tags: ['charge transfer'],
  }),
];

export const demoCandidates: readonly DemoCandidate[] = [...chromium, ...nickel, ...copper, ...others];
