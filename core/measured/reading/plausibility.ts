import type { ReadSpectrum, ReadingWarning } from './types';

const largest = (values: readonly (number | null)[]): number =>
  values.reduce<number>((most, value) => (value !== null && value > most ? value : most), -Infinity);

/** Units that hardly fit the numbers: a slip between A and %T or nm and cm-1 is easily made and hard to see later. */
export function plausibility(spectrum: ReadSpectrum): ReadingWarning[] {
  const warnings: ReadingWarning[] = [];
  const say = (message: string) =>
    warnings.push({ code: 'plausibility', message: `${spectrum.name ?? 'the spectrum'}: ${message}` });
  const [low, high] = [spectrum.x[0]!, spectrum.x.at(-1)!];
  const top = largest(spectrum.y);
  if (spectrum.xUnit === 'nm' && (low < 100 || high > 5000)) {
    say(`x runs from ${low} to ${high}, which is unusual in nm; is it cm-1?`);
  }
  if (spectrum.xUnit === 'cm-1' && high < 2500)
    say(`x runs from ${low} to ${high}, which is unusual in cm-1; is it nm?`);
  if (spectrum.yUnit === 'absorbance' && top > 10)
    say(`absorbance up to ${top}; is it %T or molar absorptivity?`);
  if (spectrum.yUnit === 'transmittance' && top > 2) say(`transmittance up to ${top}; is it percent?`);
  if (spectrum.yUnit === 'percent-transmittance' && top > 0 && top <= 1.2) {
    say(`%T never above ${top}; is it transmittance from 0 to 1?`);
  }
  return warnings;
}
