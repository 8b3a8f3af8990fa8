import { useSettings } from '../../app/services';
import { Keys } from '../../parts';

export function KeyboardSection() {
  const { settings, set } = useSettings();
  return (
    <section className="panel" aria-labelledby="settings-keyboard">
      <h2 id="settings-keyboard">Keyboard</h2>
      <label className="check">
        <input
          type="checkbox"
          checked={settings.singleKeys}
          onChange={(event) => set('singleKeys', event.currentTarget.checked)}
        />
        Single letters work as shortcuts
      </label>
      <p className="soft">
        Switch this off if you dictate or rest your hands on the keys. <Keys combo="Ctrl+/" /> shows all
        shortcuts.
      </p>
    </section>
  );
}
