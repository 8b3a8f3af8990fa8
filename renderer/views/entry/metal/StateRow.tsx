import { findMetal, dElectronCount } from '../../../../core/library/elements';
import { findIon, type ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { possibleStates } from '../draft';
import './MetalGrid.css';

interface StateRowProps {
  readonly metal: string;
  readonly value: number | null;
  readonly library: ParameterLibrary;
  readonly onChange: (state: number) => void;
}

const roman = ['0', 'I', 'II', 'III', 'IV', 'V', 'VI', 'VII', 'VIII', 'IX'];
const stateText = (state: number): string => (state < 0 ? `−${roman[-state]}` : roman[state]!);

/** Oxidation states of the chosen metal with the d count that follows. */
export function StateRow({ metal, value, library, onChange }: StateRowProps) {
  const record = findMetal(metal)!;
  return (
    <fieldset className="state-row">
      <legend>Oxidation state of {record.name}</legend>
      <div className="choices">
        {possibleStates(metal).map((state) => {
          const listed = (findIon(library, metal, state)?.B0.value ?? null) !== null;
          return (
            <label key={state} className="choice" data-unlisted={!listed || undefined}>
              <input type="radio" name="state" checked={state === value} onChange={() => onChange(state)} />
              <span>{stateText(state)}</span>
              <small>
                d<sup>{dElectronCount(record, state)}</sup>
              </small>
            </label>
          );
        })}
      </div>
    </fieldset>
  );
}
