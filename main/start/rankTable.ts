import type { Prediction, PredictionOutcome } from '../../core/prediction';

interface Column {
  readonly title: string;
  readonly right?: true;
  readonly cell: (row: Row) => string;
}
interface Row {
  readonly rank: number;
  readonly prediction: Prediction;
  readonly distance: number | null;
}

const withSigma = ({ value, sigma }: { value: number | null; sigma: number | null }): string =>
  value === null ? 'unknown' : `${Math.round(value)} ± ${sigma === null ? '?' : Math.round(sigma)}`;

const firstAllowed = ({ bands }: Prediction): string => {
  const band = bands.find(({ kind }) => kind === 'spin-allowed') ?? bands[0];
  return band ? `${Math.round(band.wavelength_nm)} nm` : 'none';
};

const spinWords = ({ spin }: Prediction): string =>
  spin.probabilityHigh === null
    ? spin.words.slice(0, 30)
    : `${spin.state}, P(high) ${spin.probabilityHigh.toFixed(2)}`;

const columns: readonly Column[] = [
  { title: '#', right: true, cell: ({ rank }) => String(rank) },
  { title: 'complex', cell: ({ prediction }) => prediction.formula },
  { title: '10Dq / cm-1', right: true, cell: ({ prediction }) => withSigma(prediction.tenDq) },
  { title: 'first band', right: true, cell: ({ prediction }) => firstAllowed(prediction) },
  { title: 'spin', cell: ({ prediction }) => spinWords(prediction) },
  { title: 'seen colour', cell: ({ prediction }) => prediction.colour?.words ?? 'not estimated' },
  { title: 'dE00', right: true, cell: ({ distance }) => (distance === null ? '' : distance.toFixed(1)) },
];

/** Rows in the order given by `distanceOf` (nearest first, unknown last), as a table of plain text. */
export function rankTable(
  title: string,
  outcomes: readonly PredictionOutcome[],
  distanceOf: (prediction: Prediction) => number | null = () => null,
): string {
  const good = outcomes.flatMap((outcome) => (outcome.ok ? [outcome.prediction] : []));
  const rows = good
    .map((prediction) => ({ prediction, distance: distanceOf(prediction) }))
    .sort((a, b) => (a.distance ?? Infinity) - (b.distance ?? Infinity))
    .map((row, i) => ({ ...row, rank: i + 1 }));
  const cells = [
    columns.map(({ title }) => title),
    ...rows.map((row) => columns.map(({ cell }) => cell(row))),
  ];
  const widths = columns.map((_, i) => Math.max(...cells.map((line) => [...line[i]!].length)));
  const lines = cells.map((line) =>
    line
      .map((text, i) => {
        const space = ' '.repeat(widths[i]! - [...text].length);
        return columns[i]!.right ? space + text : text + space;
      })
      .join('  ')
      .trimEnd(),
  );
  const refused = outcomes.flatMap((outcome) =>
    outcome.ok ? [] : [`not estimated: ${outcome.id}: ${outcome.problems[0]?.message ?? ''}`],
  );
  return [title, '', ...lines, ...(refused.length > 0 ? ['', ...refused] : [])].join('\n');
}
