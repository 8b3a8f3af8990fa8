import { useMemo } from 'react';
import { Field } from '../../../app/form';
import { SegmentedChoice } from '../../../parts';
import { MomentPlot } from '../../../plots';
import { seriesOf } from '../draft/magneticContent';
import type { MeasurementDraft } from '../draft/measurementDraft';
import { Reader } from '../draft/reader';
import type { Substance } from '../draft/substance';
import { DiamagneticFields } from './DiamagneticFields';

interface SeriesFieldsProps {
  readonly draft: MeasurementDraft;
  readonly substance: Substance;
  readonly onChange: (change: Partial<MeasurementDraft>) => void;
}

/** Moments at many temperatures, pasted from the instrument. */
export function SeriesFields({ draft, substance, onChange }: SeriesFieldsProps) {
  const series = useMemo(() => {
    const found = seriesOf(draft, substance, new Reader());
    return found === null || found.points.length === 0
      ? []
      : [
          {
            name: 'entered',
            kind: 'measured' as const,
            points: found.points.map(({ temperature_K, chiT }) => ({
              temperature_K,
              chiT: chiT.value,
              u: chiT.u,
            })),
          },
        ];
  }, [draft, substance]);
  return (
    <div className="stack">
      <SegmentedChoice
        legend="Second column holds"
        legendShown
        options={[
          { id: 'chiT', label: 'χT / cm³ K mol⁻¹' },
          { id: 'moment', label: 'μeff / μB' },
        ]}
        value={draft.seriesQuantity}
        onChange={(seriesQuantity) => onChange({ seriesQuantity })}
      />
      <Field
        label="Temperature in kelvin, value, uncertainty if known"
        hint="one line a temperature, corrected for diamagnetism, per metal centre"
      >
        {(attributes) => (
          <textarea
            {...attributes}
            className="record-paste"
            rows={6}
            spellCheck={false}
            value={draft.series}
            onChange={(event) => onChange({ series: event.currentTarget.value })}
          />
        )}
      </Field>
      <div className="record-fields">
        <DiamagneticFields
          label="Correction that the values hold"
          draft={draft}
          substance={substance}
          onChange={onChange}
        />
      </div>
      {series.length > 0 && <MomentPlot series={series} height={220} />}
    </div>
  );
}
