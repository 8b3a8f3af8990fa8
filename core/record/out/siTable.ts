import type { Uncertain } from '../uncertain';
import { toCsv, type CsvStyle } from './csv';
import { uncertainText } from './uncertainText';

/** One band of one compound as it is reported. */
export interface SiBand {
  readonly compound: string;
  readonly medium: string | null;
  readonly energy_cm1: Uncertain;
  /** `maximum`, `shoulder` or `fitted centre`: they are not the same thing. */
  readonly feature: string;
  readonly molarAbsorptivity: Uncertain | null;
  readonly width_cm1: number | null;
  readonly assignment: string | null;
  readonly calculated_cm1: number | null;
}

const header = [
  'Compound',
  'Medium',
  'λ/nm',
  'ν̃/cm⁻¹',
  'Feature',
  'ε/(L mol⁻¹ cm⁻¹)',
  'FWHM/cm⁻¹',
  'Assignment',
  'ν̃(calc.)/cm⁻¹',
] as const;

function cells(band: SiBand): string[] {
  const { value, u } = band.energy_cm1;
  const wavelength = 1e7 / value;
  return [
    band.compound,
    band.medium ?? '–',
    uncertainText(wavelength, u === null ? null : (wavelength * u) / value, 3),
    uncertainText(value, u, 4),
    band.feature,
    band.molarAbsorptivity === null
      ? '–'
      : uncertainText(band.molarAbsorptivity.value, band.molarAbsorptivity.u, 3),
    band.width_cm1 === null ? '–' : uncertainText(band.width_cm1, null, 2),
    band.assignment ?? '–',
    band.calculated_cm1 === null ? '–' : uncertainText(band.calculated_cm1, null, 3),
  ];
}

/** Heading and rows of a table of bands for supporting information, compounds in the given order, bands ascending. */
export function siTable(bands: readonly SiBand[]): {
  readonly header: readonly string[];
  readonly rows: readonly (readonly string[])[];
} {
  const order = [...new Set(bands.map((band) => band.compound))];
  const sorted = bands.toSorted(
    (a, b) =>
      order.indexOf(a.compound) - order.indexOf(b.compound) || a.energy_cm1.value - b.energy_cm1.value,
  );
  return { header, rows: sorted.map(cells) };
}

export const siTableCsv = (bands: readonly SiBand[], style?: CsvStyle): string => {
  const table = siTable(bands);
  return toCsv([table.header, ...table.rows], style);
};

/** The table as plain text with aligned columns. */
export function siTableText(bands: readonly SiBand[]): string {
  const table = siTable(bands);
  const rows = [table.header, ...table.rows];
  const width = (text: string) => [...text.normalize('NFC')].filter((c) => !/\p{Mn}/u.test(c)).length;
  const widths = table.header.map((_, column) => Math.max(...rows.map((row) => width(row[column]!))));
  return rows
    .map(
      (row) =>
        `${row
          .map((cell, i) => cell + ' '.repeat(widths[i]! - width(cell)))
          .join('  ')
          .trimEnd()}\n`,
    )
    .join('');
}
