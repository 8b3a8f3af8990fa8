import { Field } from '../../../app/form';
import { formatFigures } from '../../../parts';
import { conditionsOf } from '../draft/contentOf';
import { computedMoment, isComputed } from '../draft/magneticContent';
import type { MeasurementDraft, MomentContent } from '../draft/measurementDraft';
import { Reader } from '../draft/reader';
import type { Substance } from '../draft/substance';
import { DiamagneticFields } from './DiamagneticFields';
import { TextField } from './TextField';
import { UncertainField } from './UncertainField';

interface MomentFieldsProps {
  readonly draft: MeasurementDraft;
  readonly substance: Substance;
  readonly onChange: (change: Partial<MeasurementDraft>) => void;
}

const methods: readonly (readonly [MomentContent['method'], string])[] = [
  ['Evans', 'Evans, NMR'],
  ['balance', 'balance'],
  ['magnetometer', 'magnetometer'],
  ['typed', 'not stated'],
];

/** A moment at one temperature: worked out from what was read off, or typed. */
export function MomentFields({ draft, substance, onChange }: MomentFieldsProps) {
  const computed = isComputed(draft);
  const { molarMass_g_mol: mass } = substance;
  return (
    <div className="stack">
      <div className="record-fields">
        <Field label="Method">
          {(attributes) => (
            <select
              {...attributes}
              value={draft.method}
              onChange={(event) => onChange({ method: event.currentTarget.value as MomentContent['method'] })}
            >
              {methods.map(([id, words]) => (
                <option key={id} value={id}>
                  {words}
                </option>
              ))}
            </select>
          )}
        </Field>
        {draft.method === 'Evans' && (
          <>
            <UncertainField
              label="Shift"
              unit="Hz"
              value={draft.shift}
              u={draft.shiftU}
              onChange={(shift) => onChange({ shift })}
              onU={(shiftU) => onChange({ shiftU })}
            />
            <TextField
              label="Spectrometer frequency"
              unit="MHz"
              value={draft.spectrometer}
              onChange={(spectrometer) => onChange({ spectrometer })}
            />
            <Field label="Field of the magnet">
              {(attributes) => (
                <select
                  {...attributes}
                  value={draft.magnet}
                  onChange={(event) => onChange({ magnet: event.currentTarget.value as 'along' | 'across' })}
                >
                  <option value="along">along the tube (superconducting)</option>
                  <option value="across">across the tube (iron magnet)</option>
                </select>
              )}
            </Field>
          </>
        )}
        {draft.method === 'balance' && (
          <>
            <UncertainField
              label="Mass susceptibility"
              unit="10⁻⁶ cm³/g"
              value={draft.massSusceptibility}
              u={draft.massSusceptibilityU}
              onChange={(massSusceptibility) => onChange({ massSusceptibility })}
              onU={(massSusceptibilityU) => onChange({ massSusceptibilityU })}
            />
            <TextField
              label="Molar mass"
              unit="g/mol"
              hint={
                mass === null
                  ? 'with counter-ion and solvate'
                  : `empty: ${formatFigures(mass, 5)}, with counter-ion and solvate of the candidate`
              }
              value={draft.molarMass}
              onChange={(molarMass) => onChange({ molarMass })}
            />
          </>
        )}
        {computed ? (
          <DiamagneticFields
            label="Correction for diamagnetism"
            draft={draft}
            substance={substance}
            onChange={onChange}
          />
        ) : (
          <UncertainField
            label="Effective moment"
            unit="μB"
            value={draft.moment}
            u={draft.momentUncertainty}
            onChange={(moment) => onChange({ moment })}
            onU={(momentUncertainty) => onChange({ momentUncertainty })}
          />
        )}
      </div>
      {computed && <WorkedOut draft={draft} substance={substance} />}
      {!computed && (draft.method === 'Evans' || draft.method === 'balance') && (
        <p className="soft small">
          Enter what was read off and the moment is worked out, or type the moment itself.
        </p>
      )}
      {draft.method === 'Evans' && (
        <p className="soft small">
          Shift of the reference towards high frequency in the sample. Away from the temperature of
          preparation the density of the solvent changes the concentration by about 0.1 % per kelvin: enter
          the concentration at the temperature of the measurement.
        </p>
      )}
    </div>
  );
}

function WorkedOut({ draft, substance }: Pick<MomentFieldsProps, 'draft' | 'substance'>) {
  const conditions = conditionsOf(draft);
  const reader = new Reader();
  const found = conditions.ok ? computedMoment(draft, conditions.value, substance, reader) : null;
  if (found === null)
    return (
      <p className="soft" role="status">
        Not worked out yet:{' '}
        {reader.problems.map(({ message }) => message).join(' ') || 'check the conditions.'}
      </p>
    );
  const { chi_cm3_mol, chiT_cm3K_mol, moment_BM, remarks } = found.result;
  return (
    <div role="status">
      <p>
        Effective moment <strong>{formatFigures(moment_BM.value, 3)}</strong>
        {moment_BM.u !== null && ` ± ${formatFigures(moment_BM.u, 2)}`} μB; χ as measured{' '}
        {formatFigures(chi_cm3_mol.value * 1e6, 4)} × 10⁻⁶ cm³/mol, χT corrected{' '}
        {formatFigures(chiT_cm3K_mol.value, 3)} cm³ K/mol.
      </p>
      {remarks.map((remark) => (
        <p key={remark} className="soft">
          {remark}.
        </p>
      ))}
    </div>
  );
}
