import { SegmentedChoice } from '../input/SegmentedChoice';
import { useUnit } from './UnitContext';
import { energyUnits, unitSpoken, unitText } from './unitNames';

const options = energyUnits.map((unit) => ({ id: unit, label: unitText[unit], title: unitSpoken[unit] }));

/** Radio group that sets the unit of every energy on the page. */
export function UnitSwitch({ legend = 'Energy unit' }: { readonly legend?: string }) {
  const { unit, setUnit } = useUnit();
  return <SegmentedChoice legend={legend} options={options} value={unit} onChange={setUnit} />;
}
