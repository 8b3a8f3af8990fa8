import type { ChangeEvent } from 'react';
import { illuminantIds, illuminants, observerIds, observers } from '../../../../core/colour';
import { solventWindows } from '../../../../core/spectrum';
import { Field } from '../../../app/form';
import { formatGiven, SegmentedChoice } from '../../../parts';
import { LogSlider } from './LogSlider';
import { solventWords, type Viewing } from './viewing';
import './ViewingPanel.css';

interface ViewingPanelProps {
  readonly viewing: Viewing;
  readonly onChange: (change: Partial<Viewing>) => void;
  /** Back to the strength of the candidate in daylight; null where it is so already. */
  readonly onReset: (() => void) | null;
  /** Stores concentration and path with the candidate; null where they are stored already. */
  readonly onKeep: (() => void) | null;
}

/** Strength, temperature and light that colour and spectrum of a sheet are shown for; everything follows at once. */
export function ViewingPanel({ viewing, onChange, onReset, onKeep }: ViewingPanelProps) {
  const { concentration_mM, path_cm, temperature_K, illuminant, observer, solvent, matter } = viewing;
  const pick =
    <Key extends keyof Viewing>(key: Key) =>
    (event: ChangeEvent<HTMLSelectElement>): void =>
      onChange({
        [key]: event.currentTarget.value === '' ? null : event.currentTarget.value,
      } as Partial<Viewing>);
  return (
    <section className="panel sheet-wide viewing-panel" aria-labelledby="sheet-viewing">
      <header>
        <h2 id="sheet-viewing">Looked at as</h2>
        <SegmentedChoice
          legend="Solution or powder"
          options={[
            { id: 'solution', label: 'solution' },
            { id: 'powder', label: 'powder' },
          ]}
          value={matter}
          onChange={(id) => onChange({ matter: id })}
        />
        {onKeep !== null && (
          <button type="button" className="button-quiet" onClick={onKeep}>
            Keep this strength
          </button>
        )}
        {onReset !== null && (
          <button type="button" className="button-quiet" onClick={onReset}>
            As it was
          </button>
        )}
      </header>
      <div className="viewing-fields">
        <LogSlider
          label="Concentration"
          value={concentration_mM}
          least={0.01}
          most={1000}
          unit="mM"
          onChange={(value) => onChange({ concentration_mM: value })}
        />
        <LogSlider
          label="Path"
          value={path_cm}
          least={0.01}
          most={10}
          unit="cm"
          onChange={(value) => onChange({ path_cm: value })}
        />
        <Field label={`Temperature, ${formatGiven(Math.round(temperature_K))} K`}>
          {(attributes) => (
            <input
              {...attributes}
              type="range"
              min={10}
              max={400}
              step={1}
              value={temperature_K}
              aria-valuetext={`${Math.round(temperature_K)} kelvin`}
              onChange={(event) => onChange({ temperature_K: event.currentTarget.valueAsNumber })}
            />
          )}
        </Field>
        <Field label="Light">
          {(attributes) => (
            <select {...attributes} value={illuminant} onChange={pick('illuminant')}>
              {illuminantIds.map((id) => (
                <option key={id} value={id}>
                  {illuminants[id].name}
                </option>
              ))}
            </select>
          )}
        </Field>
        <Field label="Observer">
          {(attributes) => (
            <select {...attributes} value={observer} onChange={pick('observer')}>
              {observerIds.map((id) => (
                <option key={id} value={id}>
                  {observers[id].name}
                </option>
              ))}
            </select>
          )}
        </Field>
        <Field label="Solvent" hint={solventWords(solvent) ?? undefined}>
          {(attributes) => (
            <select {...attributes} value={solvent ?? ''} onChange={pick('solvent')}>
              <option value="">none in particular</option>
              {solventWindows.map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
            </select>
          )}
        </Field>
      </div>
    </section>
  );
}
