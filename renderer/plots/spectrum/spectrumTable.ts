import { type Band } from '../../../core/transitions/types';
import { fromWavenumber, type EnergyUnit } from '../../../core/units';
import { unitText } from '../../parts/number';
import { type PlotTableData } from '../frame';
import { type SpectrumCurve } from './spectrumUnits';

interface SpectrumTableParts {
  readonly predicted: SpectrumCurve | null;
  readonly measured: readonly (SpectrumCurve & { readonly name: string })[];
  readonly bands: readonly Band[];
  readonly unit: EnergyUnit;
  readonly quantity: 'molar-absorptivity' | 'absorbance';
  readonly bandFactor: number;
}

/** Bands first, as one reads them; then every point of every curve in one long list. */
export function spectrumTable(parts: SpectrumTableParts): PlotTableData {
  const { predicted, measured, bands, unit, quantity, bandFactor } = parts;
  const height = quantity === 'absorbance' ? 'absorbance' : 'molar absorptivity / L mol⁻¹ cm⁻¹';
  const curveRows = (name: string, { wavenumber_cm1, value }: SpectrumCurve) =>
    Array.from(wavenumber_cm1, (at, index) => [name, fromWavenumber(at, unit), null, value[index]!]);
  return {
    columns: ['what', `position / ${unitText[unit]}`, 'standard deviation / cm⁻¹', height],
    rows: [
      ...bands.map((band) => [
        `band ${band.label} (${band.kind})`,
        fromWavenumber(band.energy_cm1, unit),
        band.sigma_cm1,
        band.molarAbsorptivity * bandFactor,
      ]),
      ...(predicted ? curveRows('predicted', predicted) : []),
      ...measured.flatMap((curve) => curveRows(curve.name, curve)),
    ],
  };
}
