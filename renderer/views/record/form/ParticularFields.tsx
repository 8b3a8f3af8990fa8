import type { MeasurementDraft } from '../draft/measurementDraft';
import type { Substance } from '../draft/substance';
import { BandRows } from './BandRows';
import { MomentFields } from './MomentFields';
import { SeriesFields } from './SeriesFields';
import { TextField } from './TextField';

interface ParticularFieldsProps {
  readonly draft: MeasurementDraft;
  readonly substance: Substance;
  readonly onChange: (change: Partial<MeasurementDraft>) => void;
}

/** What only this kind of measurement has. */
export function ParticularFields({ draft, substance, onChange }: ParticularFieldsProps) {
  switch (draft.kind) {
    case 'band list':
      return <BandRows draft={draft} onChange={onChange} withStrength />;
    case 'emission':
      return (
        <div className="stack">
          <BandRows draft={draft} onChange={onChange} withStrength={false} />
          <div className="record-fields">
            <TextField
              label="Excited at"
              unit="nm"
              value={draft.excitation}
              onChange={(excitation) => onChange({ excitation })}
            />
            <TextField
              label="Lifetime"
              unit="μs"
              value={draft.lifetime}
              onChange={(lifetime) => onChange({ lifetime })}
            />
          </div>
        </div>
      );
    case 'moment':
      return <MomentFields draft={draft} substance={substance} onChange={onChange} />;
    case 'moment series':
      return <SeriesFields draft={draft} substance={substance} onChange={onChange} />;
    case 'observed colour':
      return (
        <div className="record-fields">
          <TextField
            label="Colour in words"
            hint="as you see it, e.g. pale violet"
            value={draft.words}
            onChange={(words) => onChange({ words })}
          />
          <TextField
            label="Light source"
            hint="daylight, lamp"
            value={draft.lightSource}
            onChange={(lightSource) => onChange({ lightSource })}
          />
        </div>
      );
    case 'spectrum':
      return (
        <p className="soft">The numbers stay as they were read; only what stands around them changes.</p>
      );
    case 'note':
      return null;
  }
}
