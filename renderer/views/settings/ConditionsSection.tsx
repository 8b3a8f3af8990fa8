import { Field, NumberField } from '../../app/form';
import { useSettings } from '../../app/services';

export function ConditionsSection() {
  const { settings, set } = useSettings();
  return (
    <section className="panel" aria-labelledby="settings-conditions">
      <h2 id="settings-conditions">At your bench</h2>
      <p className="soft">
        Seen colours depend on concentration and path. These hold for every candidate that names none of its
        own.
      </p>
      <div className="settings-pair">
        <NumberField
          label="Usual concentration"
          unit="mM"
          value={settings.concentration_mM}
          most={10_000}
          onChange={(value) => value !== null && set('concentration_mM', value)}
        />
        <NumberField
          label="Usual path length"
          unit="cm"
          value={settings.path_cm}
          most={100}
          onChange={(value) => value !== null && set('path_cm', value)}
        />
        <Field label="Your initials" hint="Stand in the log beside what you measure and correct.">
          {(attributes) => (
            <input
              {...attributes}
              maxLength={20}
              value={settings.initials}
              onChange={(event) => set('initials', event.currentTarget.value)}
            />
          )}
        </Field>
      </div>
    </section>
  );
}
