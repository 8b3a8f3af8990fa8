/** 97.5 % points of Student's t for 1 to 30 degrees of freedom, as in any table (from memory, e.g. of the NIST handbook). */
const table = [
  ...[12.706, 4.303, 3.182, 2.776, 2.571, 2.447, 2.365, 2.306, 2.262, 2.228],
  ...[2.201, 2.179, 2.16, 2.145, 2.131, 2.12, 2.11, 2.101, 2.093, 2.086],
  ...[2.08, 2.074, 2.069, 2.064, 2.06, 2.056, 2.052, 2.048, 2.045, 2.042],
];
const normal = 1.959964;

/**
 * Half-width of a 95 % interval in standard errors: Student's t; beyond the table by its expansion for many degrees of
 * freedom (M. Abramowitz, I. A. Stegun, 1964, 26.7.5). Infinite without a degree of freedom.
 */
export function studentT95(degreesOfFreedom: number): number {
  if (!(degreesOfFreedom >= 1)) return Infinity;
  const listed = table[degreesOfFreedom - 1];
  if (listed !== undefined) return listed;
  const z = normal;
  return (
    z +
    (z ** 3 + z) / (4 * degreesOfFreedom) +
    (5 * z ** 5 + 16 * z ** 3 + 3 * z) / (96 * degreesOfFreedom ** 2)
  );
}
