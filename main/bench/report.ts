/** One thing timed. */
export interface Timing {
  readonly what: string;
  /** Best of the repeats, milliseconds. */
  readonly milliseconds: number;
  readonly repeats: number;
}

/** A figure that a bench is run for: a ratio of two timings, a rate, a bound. */
export interface Figure {
  readonly what: string;
  readonly value: number;
  readonly unit: string;
  /** What it should at least (or at most) be; null where nothing is aimed at. */
  readonly target: { readonly sense: 'at least' | 'at most'; readonly value: number } | null;
}

export interface BenchResult {
  readonly title: string;
  readonly timings: readonly Timing[];
  readonly figures: readonly Figure[];
  /** What was left out and why, one sentence each. */
  readonly skipped: readonly string[];
}

/** A bench: one file each in this folder, listed in `benches.ts`. */
export interface Bench {
  readonly name: string;
  /** `engine` runs by default; other groups are asked for by `--<group>`. */
  readonly group: 'engine' | 'search' | 'ui';
  readonly run: (options: BenchOptions) => BenchResult | Promise<BenchResult>;
}

export interface BenchOptions {
  /** Fewer repeats and smaller sizes. */
  readonly quick: boolean;
}

export const figure = (
  what: string,
  value: number,
  unit: string,
  target: Figure['target'] = null,
): Figure => ({
  what,
  value,
  unit,
  target,
});
export const atLeast = (value: number): Figure['target'] => ({ sense: 'at least', value });
export const atMost = (value: number): Figure['target'] => ({ sense: 'at most', value });

export const isMet = ({ value, target }: Figure): boolean | null =>
  target === null ? null : target.sense === 'at least' ? value >= target.value : value <= target.value;

/** Four significant digits without exponent. */
const short = (value: number): string =>
  value >= 1000 ? Math.round(value).toLocaleString('en') : String(Number(value.toPrecision(4)));

export function describe({ title, timings, figures, skipped }: BenchResult): string {
  const width = Math.max(0, ...[...timings, ...figures].map(({ what }) => what.length));
  return [
    title,
    ...timings.map(
      ({ what, milliseconds, repeats }) =>
        `  ${what.padEnd(width)}  ${short(milliseconds)} ms (best of ${repeats})`,
    ),
    ...figures.map((each) => {
      const aim =
        each.target === null
          ? ''
          : `  (${each.target.sense} ${short(each.target.value)}: ${isMet(each) === true ? 'met' : 'NOT met'})`;
      return `  ${each.what.padEnd(width)}  ${short(each.value)} ${each.unit}${aim}`;
    }),
    ...skipped.map((sentence) => `  skipped: ${sentence}`),
  ].join('\n');
}
