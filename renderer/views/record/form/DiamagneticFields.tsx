import { Field } from '../../../app/form';
import { formatFigures } from '../../../parts';
import type { DiamagneticBasis, MeasurementDraft } from '../draft/measurementDraft';
import type { Substance } from '../draft/substance';
import { TextField } from './TextField';

interface DiamagneticFieldsProps {
  readonly draft: MeasurementDraft;
  readonly substance: Substance;
  readonly onChange: (change: Partial<MeasurementDraft>) => void;
  readonly label: string;
}

const bases: readonly (readonly [DiamagneticBasis, string])[] = [
  ['pascal sum', 'Pascal constants'],
  ['half molar mass', 'half the molar mass'],
  ['typed', 'a value of your own'],
  ['none', 'none'],
];

/** How a susceptibility is corrected for diamagnetism. */
export function DiamagneticFields({ draft, substance, onChange, label }: DiamagneticFieldsProps) {
  const { pascal_cm3_mol: pascal, account, molarMass_g_mol: mass } = substance;
  const hint = {
    'pascal sum':
      pascal === null
        ? 'a part of this substance has none: choose another way'
        : `${formatFigures(pascal * 1e6, 3)} × 10⁻⁶ cm³/mol: ${account}`,
    'half molar mass':
      mass === null ? 'enter the molar mass' : `${formatFigures(-mass / 2, 3)} × 10⁻⁶ cm³/mol, a rough rule`,
    typed: undefined,
    none: 'the moment then comes out 1 to 3 % too low',
  }[draft.basis];
  return (
    <>
      <Field label={label} hint={hint}>
        {(attributes) => (
          <select
            {...attributes}
            value={draft.basis}
            onChange={(event) => onChange({ basis: event.currentTarget.value as DiamagneticBasis })}
          >
            {bases.map(([id, words]) => (
              <option key={id} value={id}>
                {words}
              </option>
            ))}
          </select>
        )}
      </Field>
      {draft.basis === 'typed' && (
        <TextField
          label="Diamagnetic susceptibility"
          unit="10⁻⁶ cm³/mol"
          hint="negative, as in tables"
          value={draft.diamagnetism}
          onChange={(diamagnetism) => onChange({ diamagnetism })}
        />
      )}
    </>
  );
}
