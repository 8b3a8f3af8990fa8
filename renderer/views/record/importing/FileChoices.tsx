import type { DelimitedChoices } from '../../../../core/measured/delimited/read';
import { xUnits, yUnits, type XUnit, type YUnit } from '../../../../core/record/curve';
import { Field } from '../../../app/form';
import type { StatedUnits } from '../../../workers/reading/protocol';
import type { ReadFile } from './useReadings';

const delimiterWords = { ',': 'comma', ';': 'semicolon', '\t': 'tab', whitespace: 'blanks' } as const;
export const xWords: Record<XUnit, string> = { nm: 'nm', 'cm-1': 'cm⁻¹', unknown: 'not stated' };
export const yWords: Record<YUnit, string> = {
  absorbance: 'absorbance',
  transmittance: 'transmittance, 0 to 1',
  'percent-transmittance': '% transmittance',
  'molar-absorptivity': 'molar absorptivity',
  unknown: 'not stated',
};

interface FileChoicesProps {
  readonly file: ReadFile;
  readonly onChoose: (choices: DelimitedChoices, units: StatedUnits) => void;
}

/** How a file was understood, open to correction; each choice reads it again. */
export function FileChoices({ file, onChoose }: FileChoicesProps) {
  const { choices, units, result } = file;
  const reading = result?.reading;
  const layout = reading?.layout;
  const [first] = reading?.spectra ?? [];
  const delimited = reading?.format === 'delimited' || layout?.delimiter !== undefined;
  return (
    <div className="record-fields">
      {delimited && (
        <>
          <Field label="Columns parted by">
            {(attributes) => (
              <select
                {...attributes}
                value={choices.delimiter ?? layout?.delimiter ?? ','}
                onChange={(event) =>
                  onChoose(
                    { ...choices, delimiter: event.currentTarget.value as keyof typeof delimiterWords },
                    units,
                  )
                }
              >
                {Object.entries(delimiterWords).map(([id, words]) => (
                  <option key={id} value={id}>
                    {words}
                  </option>
                ))}
              </select>
            )}
          </Field>
          <Field label="Decimal sign">
            {(attributes) => (
              <select
                {...attributes}
                value={choices.decimal ?? layout?.decimal ?? '.'}
                onChange={(event) =>
                  onChoose({ ...choices, decimal: event.currentTarget.value as '.' | ',' }, units)
                }
              >
                <option value=".">point</option>
                <option value=",">comma</option>
              </select>
            )}
          </Field>
        </>
      )}
      <Field label="x holds">
        {(attributes) => (
          <select
            {...attributes}
            value={units.xUnit ?? first?.xUnit ?? 'unknown'}
            onChange={(event) => {
              const xUnit = event.currentTarget.value as XUnit;
              onChoose({ ...choices, xUnit }, { ...units, xUnit });
            }}
          >
            {xUnits.map((unit) => (
              <option key={unit} value={unit}>
                {xWords[unit]}
              </option>
            ))}
          </select>
        )}
      </Field>
      <Field label="y holds">
        {(attributes) => (
          <select
            {...attributes}
            value={units.yUnit ?? first?.yUnit ?? 'unknown'}
            onChange={(event) => {
              const yUnit = event.currentTarget.value as YUnit;
              onChoose({ ...choices, yUnit }, { ...units, yUnit });
            }}
          >
            {yUnits.map((unit) => (
              <option key={unit} value={unit}>
                {yWords[unit]}
              </option>
            ))}
          </select>
        )}
      </Field>
    </div>
  );
}
