import { SpinhueError } from '../../errors';
import type { CurveData } from '../../record/curve';
import type { TreatmentStep } from '../../record/treatment';
import { applyStep, type FindCurve, type Treated } from './steps';

/**
 * Replays recorded steps on a raw curve, which is not touched. Throws a SpinhueError whose field names the step that
 * does not suit the curve.
 */
export function treat(
  raw: CurveData,
  steps: readonly TreatmentStep[],
  find: FindCurve = () => undefined,
): Treated {
  let curve: Treated = {
    kind: raw.kind,
    xUnit: raw.xUnit,
    yUnit: raw.yUnit,
    x: raw.x,
    y: raw.y,
    u: null,
    remarks: [],
  };
  for (const [i, step] of steps.entries()) {
    try {
      curve = applyStep(curve, step, find);
    } catch (error) {
      if (!(error instanceof SpinhueError)) throw error;
      throw new SpinhueError({
        code: error.code,
        field: `treatment[${i}]`,
        message: `step ${i + 1} (${step.op}): ${error.message}`,
        ...(error.remedy === undefined ? {} : { remedy: error.remedy }),
      });
    }
  }
  return curve;
}

/** The steps that a band fit is made after: smoothing and derivatives are for looking at only. */
export const stepsForFitting = (steps: readonly TreatmentStep[]): TreatmentStep[] =>
  steps.filter((step) => step.op !== 'smooth' && step.op !== 'derivative');
