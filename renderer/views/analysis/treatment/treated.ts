import { stepsForFitting, treat } from '../../../../core/measured/treatment/treat';
import type { Treated } from '../../../../core/measured/treatment/steps';
import { inWavenumber } from '../../../../core/measured/treatment/wavenumber';
import type { Curve, CurveData, YUnit } from '../../../../core/record/curve';
import type { TreatmentStep } from '../../../../core/record/treatment';

/** Points that a fit may use, wavenumber ascending. */
export interface FitPoints {
  readonly wavenumber_cm1: readonly number[];
  readonly value: readonly number[];
}

export interface TreatedCurve {
  /** After all steps; null where a step cannot be done. */
  readonly shown: Treated | null;
  /** Without smoothing; null where the axis is not known or a step cannot be done. */
  readonly points: FitPoints | null;
  readonly quantity: YUnit;
  readonly error: string | null;
}

/** The curve after its steps, for looking at and for fitting. */
export function treated(
  curve: Curve,
  steps: readonly TreatmentStep[],
  find: (id: string) => CurveData | undefined,
): TreatedCurve {
  try {
    const shown = treat(curve, steps, find);
    const plain = treat(curve, stepsForFitting(steps), find);
    return { shown, points: pointsOf(plain), quantity: plain.yUnit, error: null };
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    return { shown: null, points: null, quantity: curve.yUnit, error: message };
  }
}

/** Points with a value over wavenumber. */
export function pointsOf(curve: CurveData): FitPoints | null {
  const turned = inWavenumber(curve);
  if (turned === null) return null;
  const wavenumber_cm1: number[] = [];
  const value: number[] = [];
  turned.y.forEach((y, index) => {
    if (y === null) return;
    wavenumber_cm1.push(turned.wavenumber_cm1[index]!);
    value.push(y);
  });
  return { wavenumber_cm1, value };
}
