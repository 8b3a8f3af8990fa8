import { useMemo, useState } from 'react';
import { estimateDraws, spectrumRange } from '../../../core/prediction';
import type { Prediction } from '../../../core/prediction/types';
import { molesPerLitre } from '../../../core/spectrum';
import { absorptionCurve, spectrumGrid } from '../../../core/spectrum/absorptionCurve';
import { formatGiven, SegmentedChoice } from '../../parts';
import { SpectrumPlot } from '../../plots';
import { solventWords } from './viewing/viewing';

/** Wavenumber ascending, as the plot reads it. */
const grid = spectrumGrid(50).toReversed();
const draws = 200;

interface SpectrumPanelProps {
  readonly prediction: Prediction;
  readonly solvent: string | null;
}

/** The predicted spectrum with the range of the draws around it, as molar absorptivity or as absorbance. */
export function SpectrumPanel({ prediction, solvent }: SpectrumPanelProps) {
  const { bands, conditions, tenDq, racahB, racahC, composition } = prediction;
  const { concentration_mM, path_cm } = conditions;
  const [quantity, setQuantity] = useState<'molar-absorptivity' | 'absorbance'>('molar-absorptivity');
  const factor = quantity === 'absorbance' ? molesPerLitre(concentration_mM) * path_cm : 1;
  // The parts, not the prediction: a change of lamp or strength leaves the spectrum as it is.
  const { wavenumber_cm1, molarAbsorptivity, low, high } = useMemo(
    () => ({
      ...absorptionCurve(bands, grid),
      ...spectrumRange(estimateDraws({ bands, tenDq, racahB, racahC, composition }, draws), grid),
    }),
    [bands, tenDq, racahB, racahC, composition],
  );
  const times = (values: Float64Array): Float64Array => values.map((value) => value * factor);
  return (
    <section className="panel sheet-wide stack" aria-label="Predicted spectrum">
      <SegmentedChoice
        legend="Axis of strength"
        options={[
          { id: 'molar-absorptivity', label: 'molar absorptivity' },
          {
            id: 'absorbance',
            label: `absorbance at ${formatGiven(concentration_mM)} mM, ${formatGiven(path_cm)} cm`,
          },
        ]}
        value={quantity}
        onChange={setQuantity}
      />
      <SpectrumPlot
        title="Predicted absorption spectrum"
        predicted={bands.length === 0 ? null : { wavenumber_cm1, value: times(molarAbsorptivity) }}
        range={bands.length === 0 ? null : { low: times(low), high: times(high) }}
        bands={bands}
        bandFactor={factor}
        quantity={quantity}
        note={['The shaded range holds 68 % of the draws.', solventWords(solvent)].filter(Boolean).join(' ')}
      />
    </section>
  );
}
