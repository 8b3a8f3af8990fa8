import { fromWavenumber, type EnergyUnit } from '../../../core/units';

/** Values over wavenumber, ascending. */
export interface SpectrumCurve {
  readonly wavenumber_cm1: ArrayLike<number>;
  readonly value: ArrayLike<number>;
}

/** The same points over an axis in `unit`, ascending there too: a wavelength axis runs the other way. */
export function curveInUnit(
  { wavenumber_cm1, value }: SpectrumCurve,
  unit: EnergyUnit,
): { readonly xs: Float64Array; readonly ys: Float64Array } {
  const count = wavenumber_cm1.length;
  const xs = new Float64Array(count);
  const ys = new Float64Array(count);
  for (let index = 0; index < count; index++) {
    const place = unit === 'nm' ? count - 1 - index : index;
    xs[place] = fromWavenumber(wavenumber_cm1[index]!, unit);
    ys[place] = value[index]!;
  }
  return { xs, ys };
}

/** 200 to 2000 nm: from the far end of quartz cells to the near infrared, where the first bands of Ni and Co lie. */
export const usualRange_cm1 = [5_000, 50_000] as const;

/** The part of the data inside the usual range, cm⁻¹; the usual range where there is no data. */
export function shownRange_cm1(curves: readonly SpectrumCurve[]): readonly [number, number] {
  let low = Infinity;
  let high = -Infinity;
  for (const { wavenumber_cm1 } of curves) {
    if (wavenumber_cm1.length === 0) continue;
    low = Math.min(low, wavenumber_cm1[0]!);
    high = Math.max(high, wavenumber_cm1[wavenumber_cm1.length - 1]!);
  }
  const range: [number, number] = [Math.max(low, usualRange_cm1[0]), Math.min(high, usualRange_cm1[1])];
  return range[0] < range[1] ? range : usualRange_cm1;
}

/** Axis ends in `unit`, ascending, for a range in cm⁻¹. */
export const axisDomain = (
  [low, high]: readonly [number, number],
  unit: EnergyUnit,
): readonly [number, number] =>
  unit === 'nm'
    ? [fromWavenumber(high, unit), fromWavenumber(low, unit)]
    : [fromWavenumber(low, unit), fromWavenumber(high, unit)];
