import { useMemo } from 'react';
import { absorptionCurve, spectrumGrid } from '../../../core/spectrum/absorptionCurve';
import { SpectrumPlot } from '../../plots';
import type { Compared } from './useCompared';

/** Wavenumber ascending, as the plot reads it. */
const grid = spectrumGrid(50).toReversed();

/** The predicted spectra of all in one picture. */
export function CompareSpectra({ compared }: { readonly compared: readonly Compared[] }) {
  const curves = useMemo(
    () =>
      compared
        .filter(({ prediction }) => prediction.bands.length > 0)
        .map(({ prediction }) => {
          const { wavenumber_cm1, molarAbsorptivity } = absorptionCurve(prediction.bands, grid);
          const { isomer } = prediction.composition;
          const name = isomer == null ? prediction.formula : `${isomer}-${prediction.formula}`;
          return { name, wavenumber_cm1, value: molarAbsorptivity };
        }),
    [compared],
  );
  return (
    <section className="panel" aria-label="Spectra">
      <SpectrumPlot
        title="Predicted absorption spectra"
        predicted={null}
        measured={curves}
        allPredicted
        note="Central estimates: each band may lie anywhere in its range, see the table. All curves are predicted."
      />
    </section>
  );
}
