import { visibleFrom_nm, visibleTo_nm } from './spectralColour';

/** Transmittance (0 to 1) of the visible range at equal steps from 380 to 780 nm. */
export type VisibleTransmittance = ArrayLike<number>;

const wavelengthAt = (index: number, count: number): number =>
  count < 2 ? visibleFrom_nm : visibleFrom_nm + ((visibleTo_nm - visibleFrom_nm) * index) / (count - 1);

/** Transmittance at `nm`, linear between samples; null outside 380 to 780 nm or without samples. */
export function transmittanceAt(samples: VisibleTransmittance, nm: number): number | null {
  if (samples.length === 0 || nm < visibleFrom_nm || nm > visibleTo_nm) return null;
  const place = ((nm - visibleFrom_nm) / (visibleTo_nm - visibleFrom_nm)) * (samples.length - 1);
  const below = Math.min(Math.floor(place), samples.length - 1);
  const above = Math.min(below + 1, samples.length - 1);
  return samples[below]! + (samples[above]! - samples[below]!) * (place - below);
}

/** Stretches, in nm, where at least `threshold` of the light passes. */
export function passedRanges(samples: VisibleTransmittance, threshold = 0.5): [number, number][] {
  const ranges: [number, number][] = [];
  let start: number | null = null;
  const crossing = (index: number): number => {
    const [before, after] = [samples[index - 1]!, samples[index]!];
    const share = (threshold - before) / (after - before);
    return (
      wavelengthAt(index - 1, samples.length) +
      (share * (visibleTo_nm - visibleFrom_nm)) / (samples.length - 1)
    );
  };
  for (let index = 0; index < samples.length; index++) {
    const passes = samples[index]! >= threshold;
    if (passes && start === null) start = index === 0 ? visibleFrom_nm : crossing(index);
    if (!passes && start !== null) {
      ranges.push([start, crossing(index)]);
      start = null;
    }
  }
  if (start !== null) ranges.push([start, visibleTo_nm]);
  return ranges;
}

const toTen = (nm: number): number => Math.round(nm / 10) * 10;

/** The strip in words: `passes 600–780 nm`. At least half of the light counts as passing. */
export function passedInWords(samples: VisibleTransmittance): string {
  if (samples.length === 0) return 'not estimated';
  const values = Array.from(samples);
  const [least, most] = [Math.min(...values), Math.max(...values)];
  const ranges = passedRanges(samples);
  if (ranges.length === 0) {
    if (most < 0.1) return 'passes almost nothing between 380 and 780 nm';
    const best = toTen(wavelengthAt(values.indexOf(most), values.length));
    return `passes less than half everywhere, most (${Math.round(most * 100)} %) near ${best} nm`;
  }
  if (least >= 0.5) {
    const darkest = toTen(wavelengthAt(values.indexOf(least), values.length));
    return least > 0.9
      ? 'passes the whole visible range'
      : `passes the whole visible range, least (${Math.round(least * 100)} %) near ${darkest} nm`;
  }
  const named = ranges
    .map(([from, to]) => [toTen(from), toTen(to)] as const)
    .filter(([from, to]) => from < to);
  if (named.length === 0) return `passes only a few nanometres near ${toTen(ranges[0]![0])} nm`;
  return `passes ${named.map(([from, to]) => `${from}–${to}`).join(' and ')} nm`;
}
