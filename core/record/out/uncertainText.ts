/**
 * A value with its standard uncertainty in brackets, in units of the last digit, as in `13.0(2)` (GUM 7.2.2); the
 * uncertainty keeps one digit, two where it begins with 1. Without an uncertainty `digits` significant digits are shown.
 */
export function uncertainText(value: number | null, u: number | null, digits = 4): string {
  if (value === null || !Number.isFinite(value)) return '–';
  if (u === null || !(u > 0) || !Number.isFinite(u)) {
    const rounded = Number(value.toPrecision(digits));
    return String(rounded);
  }
  let exponent = Math.floor(Math.log10(u));
  if (u / 10 ** exponent < 1.95) exponent--;
  const inLastDigit = Math.round(u / 10 ** exponent);
  if (exponent >= 0) {
    const step = 10 ** exponent;
    return `${Math.round(value / step) * step}(${inLastDigit * step})`;
  }
  return `${value.toFixed(-exponent)}(${inLastDigit})`;
}
