/** Smoothed value and derivatives at one point, and how strongly noise of the data comes through in each. */
export interface LocalFit {
  readonly value: number;
  readonly first: number;
  readonly second: number;
  /** Standard deviation of the second derivative per unit standard deviation of one point. */
  readonly secondGain: number;
}

/** Solves A x = b for several right-hand sides by elimination with pivoting; A is n by n, row by row. */
function solve(a: number[][], b: number[][]): number[][] {
  const n = a.length;
  for (let column = 0; column < n; column++) {
    let pivot = column;
    for (let row = column + 1; row < n; row++) {
      if (Math.abs(a[row]![column]!) > Math.abs(a[pivot]![column]!)) pivot = row;
    }
    [a[column], a[pivot]] = [a[pivot]!, a[column]!];
    [b[column], b[pivot]] = [b[pivot]!, b[column]!];
    const head = a[column]![column]!;
    for (let row = 0; row < n; row++) {
      if (row === column) continue;
      const factor = a[row]![column]! / head;
      if (factor === 0) continue;
      for (let k = column; k < n; k++) a[row]![k]! -= factor * a[column]![k]!;
      for (let k = 0; k < b[row]!.length; k++) b[row]![k]! -= factor * b[column]![k]!;
    }
  }
  return b.map((row, i) => row.map((value) => value / a[i]![i]!));
}

/**
 * Fits a polynomial to the `window` points around index `at` by least squares and evaluates it there; at the ends the
 * window stays inside the data. For equal spacing this is the method of Savitzky and Golay (Anal. Chem. 36, 1627, 1964);
 * the spacing may be uneven, as it is in wavenumber. `x` ascends strictly.
 */
export function localFit(
  x: readonly number[],
  y: readonly number[],
  at: number,
  window: number,
  degree: number,
): LocalFit {
  const size = Math.min(window, x.length);
  const start = Math.max(0, Math.min(at - (size >> 1), x.length - size));
  const scale = (x[start + size - 1]! - x[start]!) / 2;
  const terms = Math.min(degree, size - 1) + 1;
  const powers = Array.from({ length: size }, (_, i) => {
    const t = (x[start + i]! - x[at]!) / scale;
    const row = [1];
    for (let k = 1; k < terms; k++) row.push(row[k - 1]! * t);
    return row;
  });
  const normal = Array.from({ length: terms }, (_, j) =>
    Array.from({ length: terms }, (_, k) => powers.reduce((sum, row) => sum + row[j]! * row[k]!, 0)),
  );
  const right = Array.from({ length: terms }, (_, j) => powers.map((row) => row[j]!));
  // Rows of the solution are the weights with which the data make up each coefficient.
  const weights = solve(normal, right);
  const coefficient = (k: number): number =>
    k < terms ? weights[k]!.reduce((sum, weight, i) => sum + weight * y[start + i]!, 0) : 0;
  const gain = terms > 2 ? Math.sqrt(weights[2]!.reduce((sum, weight) => sum + weight * weight, 0)) : 0;
  return {
    value: coefficient(0),
    first: coefficient(1) / scale,
    second: (2 * coefficient(2)) / scale ** 2,
    secondGain: (2 * gain) / scale ** 2,
  };
}
