import { useSettings } from '../../app/services';
import { columns } from './grid/columns';
import './ColumnChooser.css';

/** Which columns are shown; remembered on this machine. */
export function ColumnChooser() {
  const { settings, set } = useSettings();
  const hidden = new Set(settings.hiddenColumns);
  const toggle = (id: string): void => {
    const next = new Set(hidden);
    if (!next.delete(id)) next.add(id);
    set('hiddenColumns', [...next]);
  };
  return (
    <details className="column-chooser">
      <summary className="button">Columns</summary>
      <fieldset>
        <legend className="visually-hidden">Columns that are shown</legend>
        {columns
          .filter(({ fixed }) => !fixed)
          .map(({ id, title }) => (
            <label key={id} className="check">
              <input type="checkbox" checked={!hidden.has(id)} onChange={() => toggle(id)} />
              {title}
            </label>
          ))}
      </fieldset>
    </details>
  );
}
