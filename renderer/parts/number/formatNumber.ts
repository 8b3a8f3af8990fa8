const narrowSpace = '\u202f';
const minus = '\u2212';

/** Rounds to a multiple of `step`; a step of 0 leaves the value alone. */
const toStep = (value: number, step: number): number => (step > 0 ? Math.round(value / step) * step : value);

const decade = (value: number): number => Math.floor(Math.log10(Math.abs(value)) + 1e-12);

/** Step (a power of ten) that leaves `figures` significant figures in `value`, also where rounding adds a digit. */
export function figureStep(value: number, figures: number): number {
  if (value === 0 || !Number.isFinite(value)) return 0;
  const step = 10 ** (decade(value) - (figures - 1));
  return 10 ** (decade(toStep(value, step)) - (figures - 1));
}

/** Decimals needed to write multiples of `step`, never more than twelve. */
const decimalsOf = (step: number): number =>
  step > 0 ? Math.min(12, Math.max(0, -Math.floor(Math.log10(step) + 1e-9))) : 0;

function grouped(digits: string): string {
  const [whole, fraction] = digits.split('.');
  const parts = whole!.replace(/\B(?=(\d{3})+(?!\d))/g, narrowSpace);
  return fraction === undefined ? parts : `${parts}.${fraction}`;
}

const raised = (exponent: number): string =>
  [...String(exponent)].map((sign) => (sign === '-' ? '⁻' : '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(sign)])).join('');

/** Writes `value` to a multiple of `step` with narrow spaces between groups of three and a true minus sign. */
export function writeToStep(value: number, step: number): string {
  if (!Number.isFinite(value)) return value > 0 ? '∞' : value < 0 ? `${minus}∞` : 'not a number';
  const rounded = toStep(value, step);
  const size = Math.abs(rounded);
  if (size >= 1e9 || (size > 0 && size < 1e-5)) {
    const digits = step > 0 ? Math.max(0, decade(size) - decade(step)) : 2;
    const [mantissa, exponent] = size.toExponential(digits).split('e');
    return `${rounded < 0 ? minus : ''}${mantissa} × 10${raised(Number(exponent))}`;
  }
  const text = grouped(size.toFixed(decimalsOf(step)));
  return rounded < 0 ? minus + text : text;
}

/** Writes `value` with at most `figures` significant figures. */
export function formatFigures(value: number, figures = 3): string {
  return writeToStep(value, figureStep(value, figures));
}

/** Writes a number that a person set (a path length, a concentration) without digits they did not give. */
export const formatGiven = (value: number): string =>
  writeToStep(
    value,
    value === 0 ? 1 : 10 ** -(String(Number(value.toPrecision(6))).split('.')[1]?.length ?? 0),
  );

/** Writes a share of one as percent without digits that nobody could know: `< 1 %`, `86 %`, `> 99 %`. */
export function formatShare(share: number): string {
  if (!Number.isFinite(share)) return 'unknown';
  if (share > 0 && share < 0.01) return `<${narrowSpace}1${narrowSpace}%`;
  if (share < 1 && share > 0.99) return `>${narrowSpace}99${narrowSpace}%`;
  return `${Math.round(share * 100)}${narrowSpace}%`;
}
