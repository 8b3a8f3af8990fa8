import { colourUnderManyLamps, type ColourNumbers } from '../../../core/colour';
import { SpinhueError, type ErrorCode } from '../../../core/errors';
import { visibleReflectance, visibleTransmission, type SpectralBand } from '../../../core/spectrum';
import type { Command } from '../command';
import { answerEntries } from '../entries';

type Entry = Record<string, unknown>;

const most = 1000;

const fail = (code: ErrorCode, field: string, message: string): never => {
  throw new SpinhueError({ code, field, message });
};

/** A finite number of at least `limit` (`above`: greater than it); anything else is refused by the name of the field. */
function numberIn(entry: Entry, name: string, field: string, limit: number, above = false): number {
  const value = entry[name];
  if (value === undefined || value === null) return fail('missing-field', field, `${field} is missing`);
  if (typeof value !== 'number') {
    return fail('wrong-type', field, `${field} is ${JSON.stringify(value)}, not a number`);
  }
  if (!Number.isFinite(value)) return fail('not-finite', field, `${field} is not a finite number`);
  if (above ? value <= limit : value < limit) {
    return fail(
      'out-of-range',
      field,
      `${field} is ${value}; give a number ${above ? `greater than ${limit}` : `of at least ${limit}`}`,
    );
  }
  return value;
}

const isEntry = (value: unknown): value is Entry =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

function bandsOf(entry: Entry): SpectralBand[] {
  const { bands } = entry;
  if (bands === undefined)
    return fail('missing-field', 'bands', 'bands is missing; give a list, empty for none');
  if (!Array.isArray(bands)) return fail('wrong-type', 'bands', 'bands is not a list');
  if (bands.length > most) {
    return fail('too-large', 'bands', `bands has ${bands.length} entries; at most ${most} are taken`);
  }
  return bands.map((band: unknown, index) => {
    const field = `bands[${index}]`;
    if (!isEntry(band)) return fail('wrong-type', field, `${field} is not an object`);
    return {
      energy_cm1: numberIn(band, 'centre_cm1', `${field}.centre_cm1`, 0, true),
      width_cm1: numberIn(band, 'fwhm_cm1', `${field}.fwhm_cm1`, 0, true),
      molarAbsorptivity: numberIn(band, 'eps', `${field}.eps`, 0),
    };
  });
}

function passedBy(entry: Entry): { passed: Float64Array; matter: 'solution' | 'powder' } {
  switch (entry.kind) {
    case 'solution': {
      const concentration = numberIn(entry, 'conc', 'conc', 0);
      const path = numberIn(entry, 'path_cm', 'path_cm', 0, true);
      return { passed: visibleTransmission(bandsOf(entry), 1000 * concentration, path), matter: 'solution' };
    }
    case 'powder':
    case 'powder_kubelka_munk': {
      const scale = numberIn(entry, 'scale', 'scale', 0);
      const background = entry.background === undefined ? 0 : numberIn(entry, 'background', 'background', 0);
      return { passed: visibleReflectance(bandsOf(entry), scale, background), matter: 'powder' };
    }
    case undefined:
      return fail('missing-field', 'kind', 'kind is missing; give "solution" or "powder"');
    default:
      return fail(
        'unknown-field-value',
        'kind',
        `kind is ${JSON.stringify(entry.kind)}; known are "solution" and "powder"`,
      );
  }
}

const rounded = (value: number): number => Math.round(value * 1e6) / 1e6 + 0;

const printed = (numbers: ColourNumbers) => ({
  ...numbers,
  XYZ: numbers.XYZ.map(rounded),
  xy: numbers.xy.map(rounded),
  Lab: numbers.Lab.map(rounded),
  C: rounded(numbers.C),
  h: rounded(numbers.h),
  OKLab: numbers.OKLab.map(rounded),
  srgbLinear: numbers.srgbLinear.map(rounded),
});

/** The colours of one entry, keyed by lamp and observer. */
function colourOf(entry: Entry) {
  const { passed, matter } = passedBy(entry);
  const results = Object.entries(colourUnderManyLamps(passed, matter)).map(
    ([view, numbers]) => [view, printed(numbers)] as const,
  );
  return { id: entry.id ?? null, results: Object.fromEntries(results) };
}

export const colour: Command = {
  name: 'colour',
  usage: 'FILE.json',
  summary: 'colours of solutions and powders from their bands, under five lamps and two observers',
  options: {},
  operands: { min: 1, max: 1 },
  async run({ operands: [file] }, io) {
    return answerEntries(await io.readJson(file!), colourOf);
  },
};
