import { useTheme } from '../../app/services';

const themes = [
  ['system', 'As the system'],
  ['light', 'Light'],
  ['dark', 'Dark'],
] as const;

export function AppearanceSection() {
  const { choice, choose } = useTheme();
  return (
    <section className="panel" aria-labelledby="settings-appearance">
      <h2 id="settings-appearance">Appearance</h2>
      <fieldset>
        <legend>Light or dark; colour samples lie on the same grey in both</legend>
        {themes.map(([theme, label]) => (
          <label key={theme} className="check">
            <input type="radio" name="theme" checked={choice === theme} onChange={() => choose(theme)} />
            {label}
          </label>
        ))}
      </fieldset>
    </section>
  );
}
