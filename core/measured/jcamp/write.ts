import { SpinhueError } from '../../errors';
import type { CurveData } from '../../record/curve';

export interface JcampHeader {
  readonly title: string;
  readonly origin: string;
  readonly owner: string;
  /** Further labels in order, e.g. `CONCENTRATIONS`; names that are not of the standard begin with `$`. */
  readonly labels?: readonly (readonly [label: string, value: string])[];
}

const xUnits = { nm: 'NANOMETERS', 'cm-1': '1/CM' } as const;
const yUnits = {
  absorbance: 'ABSORBANCE',
  transmittance: 'TRANSMITTANCE',
  'percent-transmittance': 'PERCENT TRANSMITTANCE',
  'molar-absorptivity': 'MOLAR ABSORPTIVITY (L/(MOL CM))',
} as const;

/** One line of text that cannot be taken for a label or a comment. */
const oneLine = (text: string): string =>
  text.replace(/\s+/g, ' ').replaceAll('##', '# #').replaceAll('$$', '$ $').trim();

/** Decimal factor under which all ordinates are whole numbers of at most nine digits, exactly where that is possible. */
function yFactorDigits(values: readonly number[]): number {
  const largest = Math.max(...values.map(Math.abs), 1e-300);
  const most = Math.max(0, 9 - Math.ceil(Math.log10(largest)));
  for (let digits = 0; digits < most; digits++) {
    const scale = 10 ** digits;
    if (
      values.every((value) => Math.abs(Math.round(value * scale) / scale - value) <= 1e-15 * Math.abs(value))
    )
      return digits;
  }
  return Math.min(most, 15);
}

/** Spacing of an evenly spaced axis, null for an uneven one. */
function spacing(x: readonly number[]): number | null {
  const step = (x.at(-1)! - x[0]!) / (x.length - 1);
  return x.every((value, i) => Math.abs(value - (x[0]! + i * step)) <= 1e-7 * Math.abs(step)) ? step : null;
}

const number = (value: number): string => String(Number(value.toPrecision(12)));

/**
 * A spectrum as JCAMP-DX 4.24 (R. S. McDonald, P. A. Wilks Jr., Appl. Spectrosc. 42, 151, 1988): `XYDATA` in AFFN form for
 * an even axis, `XYPOINTS` for an uneven one, `PEAK TABLE` for peaks; missing points as `?`. Throws a SpinhueError where
 * the units are not known: the format demands them.
 */
export function writeJcamp(curve: CurveData, header: JcampHeader): string {
  if (curve.xUnit === 'unknown' || curve.yUnit === 'unknown') {
    throw new SpinhueError({
      code: 'missing-field',
      field: curve.xUnit === 'unknown' ? 'xUnit' : 'yUnit',
      message: 'JCAMP-DX needs the units of both axes',
      remedy: 'say what x and y are',
    });
  }
  const { x, y } = curve;
  const known = y.filter((value) => value !== null);
  const digits = yFactorDigits(known);
  const step = curve.kind === 'curve' && x.length > 2 ? spacing(x) : null;
  const peaks = curve.kind === 'peaks';
  const lines = [
    `##TITLE=${oneLine(header.title)}`,
    '##JCAMP-DX=4.24',
    `##DATA TYPE=UV/VIS ${peaks ? 'PEAK TABLE' : 'SPECTRUM'}`,
    `##ORIGIN=${oneLine(header.origin)}`,
    `##OWNER=${oneLine(header.owner)}`,
    ...(header.labels ?? []).map(
      ([label, value]) => `##${oneLine(label).replaceAll('=', '')}=${oneLine(value)}`,
    ),
    `##XUNITS=${xUnits[curve.xUnit]}`,
    `##YUNITS=${yUnits[curve.yUnit]}`,
    '##XFACTOR=1',
    `##YFACTOR=${step === null ? 1 : Number(`1e-${digits}`)}`,
    `##FIRSTX=${number(x[0]!)}`,
    `##LASTX=${number(x.at(-1)!)}`,
    ...(step === null ? [] : [`##DELTAX=${number(step)}`]),
    ...(y[0] === null || peaks ? [] : [`##FIRSTY=${number(y[0]!)}`]),
    `##NPOINTS=${x.length}`,
  ];
  if (step === null) {
    lines.push(peaks ? '##PEAK TABLE=(XY..XY)' : '##XYPOINTS=(XY..XY)');
    for (const [i, value] of x.entries())
      lines.push(`${number(value)}, ${y[i] === null ? '?' : number(y[i]!)}`);
  } else {
    lines.push('##XYDATA=(X++(Y..Y))');
    const scale = 10 ** digits;
    for (let i = 0; i < x.length;) {
      let line = number(x[i]!);
      // Lines of the standard hold at most 80 characters.
      while (i < x.length) {
        const value = y[i]!;
        const next = value === null ? ' ?' : ` ${Math.round(value * scale)}`;
        if (line.length + next.length > 78) break;
        line += next;
        i++;
      }
      lines.push(line);
    }
  }
  return `${[...lines, '##END='].join('\r\n')}\r\n`;
}
