import { useMemo } from 'react';
import type { Prediction } from '../../../core/prediction/types';
import { absorptionCurve, spectrumGrid } from '../../../core/spectrum/absorptionCurve';
import { SpectrumPlot } from '../../plots';

/** Wavenumber ascending, as the plot reads it. */
const grid = spectrumGrid(50).toReversed();

export function SpectrumPanel({ prediction }: { readonly prediction: Prediction }) {
  const { bands } = prediction;
  const predicted = useMemo(() => {
    if (bands.length === 0) return null;
    const { wavenumber_cm1, molarAbsorptivity } = absorptionCurve(bands, grid);
    return { wavenumber_cm1, value: molarAbsorptivity };
  }, [bands]);
  return (
    <section className="panel sheet-wide" aria-label="Predicted spectrum">
      <SpectrumPlot title="Predicted absorption spectrum" predicted={predicted} bands={bands} />
    </section>
  );
}
