import { useId } from 'react';
import { useUnit } from './UnitContext';
import { energyUnits, unitSpoken, unitText } from './unitNames';
import './UnitSwitch.css';

/** Radio group that sets the unit of every energy on the page. */
export function UnitSwitch({ legend = 'Energy unit' }: { readonly legend?: string }) {
  const { unit, setUnit } = useUnit();
  const name = useId();
  return (
    <fieldset className="unit-switch">
      <legend className="visually-hidden">{legend}</legend>
      {energyUnits.map((choice) => (
        <label key={choice} className="unit-switch-choice" title={unitSpoken[choice]}>
          <input
            type="radio"
            name={name}
            value={choice}
            checked={choice === unit}
            onChange={() => setUnit(choice)}
          />
          <span>{unitText[choice]}</span>
        </label>
      ))}
    </fieldset>
  );
}
