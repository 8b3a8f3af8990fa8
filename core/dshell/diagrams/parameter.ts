import { SpinhueError } from '../../errors';
import { requireFinite } from '../checkProblem';
import { type LevelProblem } from '../problem';

/**
 * What a diagram runs along: `tenDqOverB` sets the cubic splitting of the field to x · B; any other name is the place of a
 * number in the problem (`zeta`, `field.Dt`, `field.ligands[0].e_pi_x`), which is set to x; a function makes the problem
 * itself, for distortions that change several numbers at once.
 */
export type DiagramParameter = string | ((x: number) => LevelProblem);

/** The problem at x. Throws `unknown-field-value` where the problem holds no number of that name. */
export function problemAlong(
  problem: LevelProblem,
  parameter: DiagramParameter,
): (x: number) => LevelProblem {
  if (typeof parameter === 'function') return parameter;
  if (parameter === 'tenDqOverB') {
    const setSplitting = settingNumber(problem, 'field.tenDq');
    return (x) => setSplitting(x * problem.B);
  }
  return settingNumber(problem, parameter);
}

type Step = string | number;

function settingNumber(problem: LevelProblem, path: string): (x: number) => LevelProblem {
  const steps: Step[] = path
    .split('.')
    .flatMap((part) => part.split(/[[\]]/).filter((piece) => piece !== ''))
    .map((piece) => (/^\d+$/.test(piece) ? Number(piece) : piece));
  const known = steps.reduce<unknown>((value, step) => (value as Record<Step, unknown>)?.[step], problem);
  // Optional numbers of the problem itself may be missing; they count as zero.
  const optional = path === 'zeta' || path === 'alpha';
  if (typeof known !== 'number' && !(optional && known === undefined)) {
    throw new SpinhueError({
      code: 'unknown-field-value',
      message: `the problem has no number at ${path}`,
      field: 'parameter',
      remedy: 'name a number of the problem, for example zeta, field.tenDq or field.ligands[0].e_pi_x',
    });
  }
  return (x) => {
    requireFinite(x, path);
    return withNumber(problem, steps, x) as LevelProblem;
  };
}

function withNumber(value: unknown, [step, ...rest]: readonly Step[], x: number): unknown {
  if (step === undefined) return x;
  if (Array.isArray(value)) return value.map((each, i) => (i === step ? withNumber(each, rest, x) : each));
  const record = (value ?? {}) as Record<Step, unknown>;
  return { ...record, [step]: withNumber(record[step], rest, x) };
}
