import { figureStep, writeToStep } from './formatNumber';

export interface WrittenRange {
  readonly value: string;
  /** `20 000–23 500`, with `to` where a dash next to a minus sign would mislead; null without an uncertainty. */
  readonly range: string | null;
}

/**
 * Writes a value and the ends of its range with at most `figures` significant figures, and never finer than two
 * figures of the half-width: more would claim what the uncertainty denies.
 */
export function writeRange(
  value: number,
  low: number | null,
  high: number | null,
  figures = 3,
): WrittenRange {
  const halfWidth = low === null || high === null ? 0 : Math.abs(high - low) / 2;
  const coarsest = Number.isFinite(halfWidth) ? figureStep(halfWidth, 2) : 0;
  const write = (number: number): string =>
    writeToStep(number, Math.max(figureStep(number, figures), coarsest));
  if (low === null || high === null) return { value: write(value), range: null };
  const [first, last] = low <= high ? [low, high] : [high, low];
  if (!Number.isFinite(last)) return { value: write(value), range: `above ${write(first)}` };
  const joint = first < 0 ? ' to ' : '–';
  return { value: write(value), range: `${write(first)}${joint}${write(last)}` };
}
