import { SpinhueError } from '../../errors';
import type { CurveData } from '../../record/curve';
import type { TreatmentStep } from '../../record/treatment';
import { fitPolynomial, polynomialAt, scatterAt, fitScatter } from './background';
import { localFit } from './localPolynomial';

/** A curve on its way through treatment. */
export interface Treated extends CurveData {
  /** Standard uncertainty of each ordinate where one is known; null before any step gave one. */
  readonly u: readonly (number | null)[] | null;
  /** What a step did or could not do, for a person. */
  readonly remarks: readonly string[];
}

type Ordinate = number | null;
type StepOf<Op extends TreatmentStep['op']> = Extract<TreatmentStep, { op: Op }>;
export type FindCurve = (id: string) => CurveData | undefined;

function refuse(message: string, remedy?: string): never {
  throw new SpinhueError({
    code: 'unknown-field-value',
    field: 'treatment',
    message,
    ...(remedy === undefined ? {} : { remedy }),
  });
}

const needsAbsorbance = (curve: Treated, step: string): void => {
  if (curve.yUnit !== 'absorbance') {
    refuse(
      `${step} works on absorbance, the curve holds ${curve.yUnit}`,
      'convert to absorbance first, or say what y is',
    );
  }
};
const inRanges = (x: number, ranges: readonly (readonly [number, number])[]): boolean =>
  ranges.some(([low, high]) => x >= low && x <= high);
const mapY = (curve: Treated, change: (y: number, x: number) => Ordinate): Ordinate[] =>
  curve.y.map((y, i) => (y === null ? null : change(y, curve.x[i]!)));
const lost = (before: readonly Ordinate[], after: readonly Ordinate[]): number =>
  after.filter((y, i) => y === null && before[i] !== null).length;
const points = (n: number) => `${n} point${n === 1 ? '' : 's'}`;

function withRemark(curve: Treated, change: Partial<Treated>, remark?: string): Treated {
  return { ...curve, ...change, remarks: remark === undefined ? curve.remarks : [...curve.remarks, remark] };
}

function toAbsorbance(curve: Treated): Treated {
  const full =
    curve.yUnit === 'transmittance'
      ? 1
      : curve.yUnit === 'percent-transmittance'
        ? 100
        : refuse(`absorbance follows from transmittance, the curve holds ${curve.yUnit}`);
  const y = mapY(curve, (value) => (value > 0 ? -Math.log10(value / full) : null));
  const gone = lost(curve.y, y);
  return withRemark(
    curve,
    { y, u: null, yUnit: 'absorbance' },
    gone > 0 ? `${points(gone)} without transmitted light have no absorbance` : undefined,
  );
}

function mergeEqualX(curve: Treated, step: StepOf<'merge equal x'>): Treated {
  const x: number[] = [];
  const groups: Ordinate[][] = [];
  for (const [i, value] of curve.x.entries()) {
    if (x.at(-1) === value) groups.at(-1)!.push(curve.y[i]!);
    else {
      x.push(value);
      groups.push([curve.y[i]!]);
    }
  }
  const y = groups.map((group): Ordinate => {
    const known = group.filter((value) => value !== null);
    if (known.length === 0) return null;
    if (step.keep === 'mean') return known.reduce((sum, value) => sum + value, 0) / known.length;
    return step.keep === 'first' ? known[0]! : known.at(-1)!;
  });
  return withRemark(
    curve,
    { x, y, u: null },
    `${points(curve.x.length - x.length)} with an x that stands twice merged (${step.keep})`,
  );
}

/** Linear interpolation; null outside the curve or beside a missing point. */
function valueAt(curve: CurveData, x: number): Ordinate {
  let low = 0;
  let high = curve.x.length - 1;
  if (x < curve.x[low]! || x > curve.x[high]!) return null;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (curve.x[middle]! <= x) low = middle;
    else high = middle;
  }
  const [a, b] = [curve.y[low]!, curve.y[high]!];
  const [xa, xb] = [curve.x[low]!, curve.x[high]!];
  if (x === xa) return a;
  if (x === xb) return b;
  return a === null || b === null ? null : a + ((b - a) * (x - xa)) / (xb - xa);
}

function subtractBlank(curve: Treated, step: StepOf<'subtract blank'>, find: FindCurve): Treated {
  const blank = find(step.curveId);
  if (blank === undefined)
    refuse('the blank is not among the curves of the project', 'choose the blank again');
  if (blank.xUnit !== curve.xUnit || blank.yUnit !== curve.yUnit) {
    refuse(
      `the blank is ${blank.yUnit} against ${blank.xUnit}, the curve ${curve.yUnit} against ${curve.xUnit}`,
    );
  }
  needsAbsorbance(curve, 'subtracting a blank');
  const y = mapY(curve, (value, x) => {
    const under = valueAt(blank, x);
    return under === null ? null : value - under;
  });
  const gone = lost(curve.y, y);
  return withRemark(curve, { y }, gone > 0 ? `${points(gone)} outside the blank are left out` : undefined);
}

/** Known points inside the ranges. */
function support(
  curve: Treated,
  ranges: readonly (readonly [number, number])[],
  least: number,
): { x: number[]; y: number[] } {
  const x: number[] = [];
  const y: number[] = [];
  for (const [i, value] of curve.y.entries()) {
    if (value === null || !inRanges(curve.x[i]!, ranges)) continue;
    x.push(curve.x[i]!);
    y.push(value);
  }
  if (x.length < least)
    refuse(`${points(x.length)} in the chosen ranges; at least ${least} are needed`, 'choose wider ranges');
  return { x, y };
}

function subtractBaseline(curve: Treated, step: StepOf<'subtract baseline'>): Treated {
  needsAbsorbance(curve, 'subtracting a baseline');
  const degree = { constant: 0, linear: 1, quadratic: 2 }[step.form];
  const { x, y } = support(curve, step.ranges, degree + 2);
  const line = fitPolynomial(x, y, degree);
  return withRemark(
    curve,
    { y: mapY(curve, (value, at) => value - polynomialAt(line, at)) },
    `${step.form} baseline through ${points(x.length)}`,
  );
}

function subtractScatter(curve: Treated, step: StepOf<'subtract scatter'>): Treated {
  needsAbsorbance(curve, 'subtracting scatter');
  if (curve.xUnit === 'unknown') refuse('scatter depends on the wavelength, and the unit of x is not known');
  const wavelength = curve.xUnit === 'nm' ? (x: number) => x : (x: number) => 1e7 / x;
  const { x, y } = support(curve, step.ranges, 3);
  const scatter = fitScatter(x.map(wavelength), y, step.exponent);
  return withRemark(
    curve,
    { y: mapY(curve, (value, at) => value - scatterAt(scatter, wavelength(at))) },
    `scatter ${scatter.at500.toFixed(4)} (500 nm/lambda)^${scatter.exponent.toFixed(2)}`,
  );
}

function toMolarAbsorptivity(curve: Treated, step: StepOf<'to molar absorptivity'>): Treated {
  needsAbsorbance(curve, 'molar absorptivity');
  const molar = (step.concentration_mM.value / 1000) * step.path_cm.value;
  const relative = Math.hypot(
    (step.concentration_mM.u ?? 0) / step.concentration_mM.value,
    (step.path_cm.u ?? 0) / step.path_cm.value,
  );
  // GUM 5.1.6: relative standard uncertainties of a quotient add in quadrature.
  const u = curve.y.map((y) =>
    y === null ? null : Math.hypot((step.absorbance_u ?? 0) / molar, (y / molar) * relative),
  );
  const missing = [
    step.concentration_mM.u === null ? 'concentration' : '',
    step.path_cm.u === null ? 'path' : '',
    step.absorbance_u === null ? 'absorbance' : '',
  ].filter((name) => name !== '');
  return withRemark(
    curve,
    { y: mapY(curve, (value) => value / molar), u, yUnit: 'molar-absorptivity' },
    missing.length > 0
      ? `the uncertainty leaves out that of ${missing.join(' and ')}, which nobody stated`
      : undefined,
  );
}

function local(
  curve: Treated,
  window: number,
  degree: number,
  pick: 'value' | 'first' | 'second',
): Ordinate[] {
  if (degree >= window) refuse(`degree ${degree} needs a window of more than ${degree} points`);
  if (pick === 'second' && degree < 2) refuse('a second derivative needs a polynomial of degree 2 or more');
  const known = curve.y.flatMap((y, i) => (y === null ? [] : [i]));
  const x = known.map((i) => curve.x[i]!);
  const y = known.map((i) => curve.y[i]!);
  if (x.some((value, i) => i > 0 && value === x[i - 1])) {
    refuse('two points share one x', 'merge points of equal x first');
  }
  if (x.length < window) refuse(`${points(x.length)}; the window has ${window}`, 'choose a smaller window');
  const out: Ordinate[] = curve.y.map(() => null);
  for (const [k, i] of known.entries()) out[i] = localFit(x, y, k, window, degree)[pick];
  return out;
}

/** Applies one step. Throws a SpinhueError where the step does not suit the curve. */
export function applyStep(curve: Treated, step: TreatmentStep, find: FindCurve): Treated {
  switch (step.op) {
    case 'state units':
      return { ...curve, xUnit: step.xUnit, yUnit: step.yUnit };
    case 'to absorbance':
      return toAbsorbance(curve);
    case 'to percent transmittance':
      needsAbsorbance(curve, '%T');
      return { ...curve, y: mapY(curve, (a) => 100 * 10 ** -a), u: null, yUnit: 'percent-transmittance' };
    case 'merge equal x':
      return mergeEqualX(curve, step);
    case 'leave out': {
      const y = mapY(curve, (value, x) => (inRanges(x, step.ranges) ? null : value));
      return withRemark(curve, { y }, `${points(lost(curve.y, y))} left out: ${step.why}`);
    }
    case 'leave out above': {
      needsAbsorbance(curve, 'leaving out high absorbance');
      const y = mapY(curve, (value) => (value > step.absorbance ? null : value));
      return withRemark(
        curve,
        { y },
        `${points(lost(curve.y, y))} above absorbance ${step.absorbance} left out`,
      );
    }
    case 'subtract blank':
      return subtractBlank(curve, step, find);
    case 'subtract baseline':
      return subtractBaseline(curve, step);
    case 'subtract scatter':
      return subtractScatter(curve, step);
    case 'to molar absorptivity':
      return toMolarAbsorptivity(curve, step);
    case 'smooth':
      return withRemark(
        curve,
        { y: local(curve, step.window, step.degree, 'value'), u: null },
        'smoothed for looking at; fits are made on the points that were not smoothed',
      );
    case 'derivative':
      return withRemark(
        curve,
        {
          y: local(curve, step.window, step.degree, step.order === 1 ? 'first' : 'second'),
          u: null,
          yUnit: 'unknown',
        },
        `derivative of order ${step.order}`,
      );
  }
}
