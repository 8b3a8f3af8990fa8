import { SpinhueError } from '../../errors';
import type { CurveData } from '../../record/curve';
import { tidy } from '../reading/order';

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

/** Decimal factor under which all ordinates are whole numbers of at most nine digits; null where there is none. */
function yFactorDigits(values: readonly number[]): number | null {
  const largest = Math.max(...values.map(Math.abs), 1e-300);
  const most = Math.min(15, Math.max(0, 9 - Math.ceil(Math.log10(largest))));
  for (let digits = 0; digits <= most; digits++) {
    const factor = Number(`1e-${digits}`);
    if (values.every((value) => tidy(Math.round(value * 10 ** digits) * factor) === value)) return digits;
  }
  return null;
}

/** Spacing of an axis that the reader lays out again exactly from its ends and its count, null for any other. */
function spacing(x: readonly number[]): number | null {
  const step = (x.at(-1)! - x[0]!) / (x.length - 1);
  return x.every((value, i) => value === tidy(x[0]! + i * step, 13)) ? step : null;
}

const rounded = (value: number): string => String(tidy(value, 12));

/**
 * A spectrum as JCAMP-DX 4.24 (R. S. McDonald, P. A. Wilks Jr., Appl. Spectrosc. 42, 151, 1988): `XYDATA` in AFFN form for
 * an even axis and ordinates of at most nine digits, `XYPOINTS` for all other curves, `PEAK TABLE` for peaks; missing points
 * as `?`. No digit is lost: what is read again is the same, number by number. Throws a SpinhueError where the units are not
 * known: the format demands them.
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
  const step = curve.kind === 'curve' && x.length > 2 && digits !== null ? spacing(x) : null;
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
    `##YFACTOR=${step === null || digits === null ? 1 : Number(`1e-${digits}`)}`,
    `##FIRSTX=${x[0]!}`,
    `##LASTX=${x.at(-1)!}`,
    ...(step === null ? [] : [`##DELTAX=${rounded(step)}`]),
    ...(y[0] === null || peaks ? [] : [`##FIRSTY=${y[0]!}`]),
    `##NPOINTS=${x.length}`,
  ];
  if (step === null || digits === null) {
    lines.push(peaks ? '##PEAK TABLE=(XY..XY)' : '##XYPOINTS=(XY..XY)');
    for (const [i, value] of x.entries()) lines.push(`${value}, ${y[i] ?? '?'}`);
  } else {
    lines.push('##XYDATA=(X++(Y..Y))');
    const scale = 10 ** digits;
    for (let i = 0; i < x.length;) {
      let line = rounded(x[i]!);
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
