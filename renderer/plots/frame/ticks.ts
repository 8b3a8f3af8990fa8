import { writeToStep } from '../../parts/number/formatNumber';
import { type Interval } from './scale';

export interface Ticks {
  readonly values: readonly number[];
  readonly text: (value: number) => string;
}

/** 1, 2 or 5 times a power of ten, so that about `count` steps fit. */
export function niceStep(length: number, count: number): number {
  if (!(length > 0) || !Number.isFinite(length)) return 1;
  const rough = length / Math.max(1, count);
  const power = 10 ** Math.floor(Math.log10(rough));
  const lead = rough / power;
  return power * (lead < 1.5 ? 1 : lead < 3.5 ? 2 : lead < 7.5 ? 5 : 10);
}

/** Room that a tick needs, px: the width of its figures along x, one line along y. */
const room = (along: 'x' | 'y', texts: readonly string[]): number =>
  along === 'y' ? 36 : Math.max(44, 6.6 * Math.max(...texts.map((text) => text.length)) + 18);

function ticksAt([low, high]: Interval, step: number): Ticks {
  const values: number[] = [];
  const first = Math.ceil(low / step - 1e-9);
  const last = Math.floor(high / step + 1e-9);
  for (let index = first; index <= last; index++) values.push(index * step + 0);
  const leading = 10 ** Math.floor(Math.log10(step) + 1e-9);
  return { values, text: (value) => writeToStep(value, leading) };
}

/** Round numbers inside the interval, as close as their figures allow on an axis `pixels` long. */
export function linearTicks([from, to]: Interval, pixels: number, along: 'x' | 'y'): Ticks {
  const interval: Interval = from < to ? [from, to] : [to, from];
  const length = interval[1] - interval[0];
  let ticks = ticksAt(interval, niceStep(length, 2));
  for (let count = 40; count >= 2; count--) {
    const step = niceStep(length, count);
    const tried = ticksAt(interval, step);
    const gap = (step / length) * pixels;
    if (tried.values.length > 1 && gap >= room(along, tried.values.map(tried.text))) {
      ticks = tried;
      break;
    }
  }
  return ticks;
}

/** Powers of ten inside the interval, every second or third where there are many. */
export function logTicks([low, high]: Interval, count: number): Ticks {
  const [first, last] = [Math.ceil(Math.log10(low) - 1e-9), Math.floor(Math.log10(high) + 1e-9)];
  const every = Math.max(1, Math.ceil((last - first + 1) / Math.max(1, count)));
  const values: number[] = [];
  for (let power = first; power <= last; power += every) values.push(10 ** power);
  return { values, text: (value) => writeToStep(value, value) };
}
