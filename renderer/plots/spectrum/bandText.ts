import { type Band } from '../../../core/transitions/types';
import { fromWavenumber, type EnergyUnit } from '../../../core/units';
import { spokenTerm } from '../../parts/chemistry';
import { formatFigures, unitText, writeRange } from '../../parts/number';

/** A place on the axis in the chosen unit, and as a wavelength too where that is another. */
export function placeText(wavenumber_cm1: number, unit: EnergyUnit): string {
  const here = `${formatFigures(fromWavenumber(wavenumber_cm1, unit))} ${unitText[unit]}`;
  const other = unit === 'nm' ? 'cm-1' : 'nm';
  return `${here} (${formatFigures(fromWavenumber(wavenumber_cm1, other))} ${unitText[other]})`;
}

/** A band in words, with its range and class. */
export function bandText(band: Band, unit: EnergyUnit): string {
  const convert = (value: number): number => fromWavenumber(Math.max(1, value), unit);
  const { value, range } = writeRange(
    convert(band.energy_cm1),
    convert(band.energy_cm1 - band.sigma_cm1),
    convert(band.energy_cm1 + band.sigma_cm1),
  );
  const name = band.multiplicity === null ? `${band.kind}, ${band.label}` : spokenTerm(band.label);
  return `${name}: ${value} (${range}) ${unitText[unit]}, ${band.intensityClass}`;
}
