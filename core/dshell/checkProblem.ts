import { SpinhueError } from '../errors';

/** The problem is refused unless `value` is finite. */
export function requireFinite(value: number, field: string): void {
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    throw new SpinhueError({
      code: 'not-finite',
      message: `${field} is ${String(value)}, not a finite number`,
      field,
      remedy: 'give a finite number in cm-1',
    });
  }
}

/** The problem is refused unless `value` is finite and not negative. */
export function requireNotNegative(value: number, field: string): void {
  requireFinite(value, field);
  if (value < 0) {
    throw new SpinhueError({
      code: 'out-of-range',
      message: `${field} is ${value}; it cannot be negative`,
      field,
      remedy: `give ${field} as zero or a positive number`,
    });
  }
}

/** The problem is refused unless N is an integer from 1 to 9. */
export function requireElectronCount(value: number, field = 'dElectrons'): void {
  requireFinite(value, field);
  if (!Number.isInteger(value) || value < 1 || value > 9) {
    throw new SpinhueError({
      code: 'out-of-range',
      message: `${field} is ${value}; the shell holds 1 to 9 d electrons here (d0 and d10 have one state only)`,
      field,
      remedy: 'give an integer from 1 to 9',
    });
  }
}
