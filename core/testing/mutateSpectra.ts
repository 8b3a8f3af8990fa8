import { readSpectrumFile } from '../measured/reading/readSpectrumFile';
import type { SpectrumReading } from '../measured/reading/types';
import type { Seeded } from './seeded';

const lineStarts = (bytes: Uint8Array): number[] => {
  const starts = [0];
  for (let i = 0; i < bytes.length - 1; i++)
    if (bytes[i] === 10 || (bytes[i] === 13 && bytes[i + 1] !== 10)) starts.push(i + 1);
  return starts;
};

const join = (...parts: Uint8Array[]): Uint8Array => {
  const out = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    out.set(part, at);
    at += part.length;
  }
  return out;
};

const nasty = [
  ...[
    '999999999',
    '1e999',
    '-',
    '.',
    ',',
    ';',
    '"',
    '\t',
    ' ',
    '\r',
    '\n',
    '\r\n',
    '?',
    'NaN',
    'Z99999',
    '%',
    '@',
    's9',
    '##END=',
    '##',
  ],
  ...[
    '=',
    '$$',
    '##TITLE=',
    '##NPOINTS=5',
    '##DATA TYPE=LINK',
    '0x1F',
    '1.2.3',
    '--5',
    '\u0000',
    '¿',
    '1e5',
    '-1e-5',
    '##XYDATA=(XY..XY)',
  ],
].map((text) => new TextEncoder().encode(text));

/** One random change of a file: bytes, lines, ends, pieces of another file. */
function change(bytes: Uint8Array, others: readonly Uint8Array[], random: Seeded): Uint8Array {
  const at = random.below(bytes.length + 1);
  const starts = lineStarts(bytes);
  const line = () => {
    const k = random.below(starts.length);
    return [starts[k]!, starts[k + 1] ?? bytes.length] as const;
  };
  switch (random.below(11)) {
    case 0: {
      const out = bytes.slice();
      if (out.length > 0) out[random.below(out.length)] = random.below(256);
      return out;
    }
    case 1: {
      const out = bytes.slice();
      const place = random.below(Math.max(1, out.length));
      if (out.length > 0) out[place] = '0123456789.,+-;ABJSaj@%\t \n?'.charCodeAt(random.below(27));
      return out;
    }
    case 2:
      return join(bytes.slice(0, at), bytes.slice(Math.min(bytes.length, at + 1 + random.below(4))));
    case 3:
      return join(bytes.slice(0, at), nasty[random.below(nasty.length)]!, bytes.slice(at));
    case 4:
      return bytes.slice(0, at);
    case 5: {
      const [from, to] = line();
      return join(bytes.slice(0, from), bytes.slice(to));
    }
    case 6: {
      const [from, to] = line();
      return join(bytes.slice(0, to), bytes.slice(from, to), bytes.slice(to));
    }
    case 7: {
      const [from, to] = line();
      const [low, high] = line();
      if (to > low) return bytes.slice();
      return join(
        bytes.slice(0, from),
        bytes.slice(low, high),
        bytes.slice(to, low),
        bytes.slice(from, to),
        bytes.slice(high),
      );
    }
    case 8: {
      const other = others[random.below(others.length)]!;
      return join(bytes.slice(0, at), other.slice(random.below(other.length + 1)));
    }
    case 9: {
      const out = bytes.slice();
      const [from, to] = [random.next() < 0.5 ? ',' : ';', random.next() < 0.5 ? '.' : '\t'].map((c) =>
        c.charCodeAt(0),
      );
      for (let i = 0; i < out.length; i++) if (out[i] === from) out[i] = to!;
      return out;
    }
    default: {
      const out = bytes.slice();
      const start = random.below(Math.max(1, out.length));
      for (let i = start; i < Math.min(out.length, start + 8); i++) out[i] = random.below(256);
      return out;
    }
  }
}

export function mutate(bytes: Uint8Array, others: readonly Uint8Array[], random: Seeded): Uint8Array {
  let out = bytes;
  for (let k = 1 + random.below(3); k > 0; k--) out = change(out, others, random);
  return out;
}

/** What a reading must never do, whatever the file; null where all is well. */
function complaint(reading: SpectrumReading, bytes: Uint8Array): string | null {
  if ((reading.outcome === 'error') !== (reading.error !== undefined)) return 'outcome and error disagree';
  if (reading.outcome === 'error' && reading.spectra.length > 0) return 'spectra beside an error';
  if (reading.outcome !== 'error' && reading.spectra.length === 0) return 'neither spectrum nor error';
  for (const { x, y, kind } of reading.spectra) {
    if (x.length !== y.length || x.length === 0) return 'x and y differ in length';
    for (let i = 0; i < x.length; i++) {
      if (!Number.isFinite(x[i])) return 'x is not finite';
      if (y[i] !== null && !Number.isFinite(y[i])) return 'y is not finite';
      if (i > 0 && x[i]! < x[i - 1]!) return 'x does not ascend';
    }
    if (kind === 'curve' && x.length < 2) return 'a curve of one point';
    if (reading.warnings.length === 0 && y.includes(null)) return 'a missing value without a message';
  }
  return reading.warnings.length > 0 || reading.outcome !== 'ok' ? null : silentLoss(reading, bytes);
}

/** Counts points by a second, cruder way and compares, where the reader had nothing to remark. */
function silentLoss(reading: SpectrumReading, bytes: Uint8Array): string | null {
  const utf16 = reading.layout?.encoding.startsWith('utf-16') ?? false;
  const text = new TextDecoder(utf16 ? reading.layout!.encoding : 'utf-8').decode(bytes);
  const points = reading.spectra.reduce((sum, spectrum) => sum + spectrum.x.length, 0);
  if (reading.format === 'jcamp-dx') {
    // In n-tuples each page announces its own points; a label above the pages announces nothing.
    const count = (part: string): number =>
      [
        ...part
          .replace(/\$\$.*/g, '')
          .matchAll(
            /^[^\S\r\n]*##[ \t\-/_]*N[ \t\-/_]*P[ \t\-/_]*O[ \t\-/_]*I[ \t\-/_]*N[ \t\-/_]*T[ \t\-/_]*S[ \t\-/_]*=\s*([0-9.+E-]+)/gim,
          ),
      ].reduce((total, match) => total + Number(match[1]), 0);
    const pages = text.search(/^##PAGE\s*=/m);
    // A label that stands twice with one value announces its points once.
    const twice = /NPOINTS=(\d+)\s+##NPOINTS=\1\s/.test(text);
    const sums = [count(text), count(text.slice(Math.max(0, pages)))];
    return !twice && sums[0] !== 0 && !sums.includes(points)
      ? `NPOINTS announce ${sums.join(' or ')} points, ${points} were read`
      : null;
  }
  const lines = text
    .split(/\r\n|\r|\n/)
    .filter((line) => /^\s*"?[+-]?\d[\d.,]*"?\s*[;,\t ]\s*"?[+-]?\d/.test(line)).length;
  const longest = Math.max(...reading.spectra.map((spectrum) => spectrum.x.length));
  return lines > longest ? `${lines} lines start with a number, ${longest} points were read` : null;
}

export interface SoakFinding {
  readonly seed: number;
  readonly what: string;
  readonly bytes: Uint8Array;
}
export interface SoakResult {
  readonly count: number;
  readonly outcomes: Readonly<Record<string, number>>;
  readonly slowest_ms: number;
  readonly findings: readonly SoakFinding[];
}

/** Reads `count` mutations of the files and checks each reading. Case n of a seed is the same in every run. */
export function soak(
  files: readonly Uint8Array[],
  count: number,
  start: number,
  seeded: (seed: number) => Seeded,
): SoakResult {
  const outcomes: Record<string, number> = {};
  const findings: SoakFinding[] = [];
  let slowest_ms = 0;
  for (let seed = start; seed < start + count; seed++) {
    const random = seeded(seed);
    const bytes = mutate(files[random.below(files.length)]!, files, random);
    const before = performance.now();
    let what: string | null;
    try {
      const reading = readSpectrumFile(bytes);
      outcomes[reading.outcome] = (outcomes[reading.outcome] ?? 0) + 1;
      what = complaint(reading, bytes);
    } catch (error) {
      what = `threw ${String(error)}`;
    }
    let took = performance.now() - before;
    if (took > 500) {
      // A second run tells a slow file from a busy machine.
      const again = performance.now();
      readSpectrumFile(bytes);
      took = Math.min(took, performance.now() - again);
    }
    slowest_ms = Math.max(slowest_ms, took);
    if (took > 2000) what ??= `took ${Math.round(took)} ms`;
    if (what !== null && findings.length < 50) findings.push({ seed, what, bytes });
  }
  return { count, outcomes, slowest_ms, findings };
}
