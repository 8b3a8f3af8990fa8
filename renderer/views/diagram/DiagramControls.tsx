import { Formula, SearchableSelect, SegmentedChoice } from '../../parts';
import { limits, type DiagramSettings } from './diagramSettings';
import { ionChoices, ionOptions } from './ionChoices';
import { SliderField } from './SliderField';

interface DiagramControlsProps {
  readonly settings: DiagramSettings;
  readonly onChange: (settings: DiagramSettings) => void;
}

const counts = ['1', '2', '3', '4', '5', '6', '7', '8', '9'] as const;

/** d count, geometry, field and Racah parameters, or an ion to take them from. */
export function DiagramControls({ settings, onChange }: DiagramControlsProps) {
  const set = (change: Partial<DiagramSettings>): void => onChange({ ...settings, ...change });
  const takeIon = (id: string): void => {
    const ion = ionChoices.get(id);
    if (!ion) return;
    set({ dElectrons: ion.dElectrons, B: ion.B, cOverB: ion.cOverB ?? settings.cOverB });
  };
  return (
    <form
      className="diagram-controls panel"
      aria-label="Ion and field"
      onSubmit={(event) => event.preventDefault()}
    >
      <SearchableSelect
        label="Free-ion B and C of"
        placeholder="an ion, e.g. iron(II)"
        options={ionOptions}
        value={null}
        onChange={takeIon}
        clearAfterChoice
        renderOption={({ id, label, detail }) => (
          <>
            <span>
              {label} <Formula formula={id.replace(/(\d\+)$/, '^$1')} />
            </span>
            <span className="option-detail">{detail}</span>
          </>
        )}
      />
      <SegmentedChoice
        legend="d electrons"
        legendShown
        options={counts.map((count) => ({ id: count, label: count }))}
        value={String(settings.dElectrons) as (typeof counts)[number]}
        onChange={(count) => set({ dElectrons: Number(count) })}
      />
      <SegmentedChoice
        legend="Geometry"
        legendShown
        options={[
          { id: 'octahedral', label: 'octahedral' },
          { id: 'tetrahedral', label: 'tetrahedral', title: 'e lies below t2' },
        ]}
        value={settings.geometry}
        onChange={(geometry) => set({ geometry })}
      />
      <SegmentedChoice
        legend="Axes"
        legendShown
        options={[
          { id: 'over-B', label: 'E/B against 10Dq/B' },
          { id: 'absolute', label: 'E against 10Dq' },
        ]}
        value={settings.axes}
        onChange={(axes) => set({ axes })}
      />
      <SliderField
        label="10Dq"
        unit="cm⁻¹"
        value={settings.tenDq}
        onChange={(tenDq) => set({ tenDq })}
        {...limits.tenDq}
      />
      <SliderField label="B" unit="cm⁻¹" value={settings.B} onChange={(B) => set({ B })} {...limits.B} />
      <SliderField
        label="C/B"
        unit=""
        value={settings.cOverB}
        onChange={(cOverB) => set({ cOverB })}
        {...limits.cOverB}
      />
    </form>
  );
}
