import { firstBandOf } from '../../../workers/estimateSummary';
import type { TableRow } from '../tableRow';

const heads = [
  ...[
    'formula',
    'name',
    'metal',
    'oxidation state',
    'geometry',
    'isomer',
    'ligands',
    'd electrons',
    'ground term',
  ],
  ...['10Dq / cm-1', 's(10Dq) / cm-1', 'B / cm-1', 's(B) / cm-1', 'spin state', 'P(high spin)'],
  ...[
    'first band / cm-1',
    's(first band) / cm-1',
    'first band',
    'seen colour',
    'sRGB',
    'dE00 to target',
    'tags',
    'notes',
  ],
];

/** Spreadsheets take a leading = + - @ for a formula: an apostrophe makes it text again. */
export const asCell = (value: string | number | null): string => {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  const line = value.replace(/[\t\r\n]+/g, ' ');
  return /^[=+\-@]/.test(line) ? `'${line}` : line;
};

const rounded = (value: number | null | undefined, digits = 0): number | null =>
  value === null || value === undefined ? null : Number(value.toFixed(digits));

function cellsOf({ candidate, summary, distance }: TableRow): (string | number | null)[] {
  const { composition, name, tags, notes } = candidate;
  const estimate = summary?.ok ? summary : null;
  const band = estimate && firstBandOf(estimate);
  return [
    ...[estimate?.formula ?? '', name, composition.metal, composition.oxidationState, composition.geometry],
    composition.isomer ?? '',
    Object.entries(composition.ligands)
      .map(([id, count]) => `${count} ${id}`)
      .join(', '),
    ...[estimate?.dElectrons ?? null, estimate?.groundTerm ?? ''],
    ...[rounded(estimate?.tenDq?.value), rounded(estimate?.tenDq?.sigma)],
    ...[rounded(estimate?.racahB?.value), rounded(estimate?.racahB?.sigma)],
    ...[estimate?.spin.words ?? '', rounded(estimate?.spin.probabilityHigh, 3)],
    ...[rounded(band?.energy), rounded(band?.sigma), band?.label ?? ''],
    ...[estimate?.colour?.words ?? '', estimate?.colour?.srgb ?? '', rounded(distance, 1)],
    ...[tags.join(', '), notes],
  ];
}

/** Rows as text that a spreadsheet takes when pasted: tabs between cells, units in the head. */
export const tableText = (rows: readonly TableRow[]): string =>
  [heads, ...rows.map(cellsOf)].map((cells) => cells.map(asCell).join('\t')).join('\n');
