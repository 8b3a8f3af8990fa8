import { useId, useState, type FormEvent } from 'react';
import type { Problem } from '../../../../core/errors';
import { molarMass } from '../../../../core/library/molarMass';
import type { Candidate } from '../../../../core/record/project';
import { phases, type Sample } from '../../../../core/record/sample';
import { Field } from '../../../app/form';
import { useLibrary } from '../../../app/session/useLibrary';
import { Dialog, ErrorPanel, formatFigures } from '../../../parts';
import type { SampleFields } from '../../../store';
import { Reader } from '../draft/reader';
import { TextField } from '../form/TextField';
import { substanceFormula } from './substanceFormula';

interface SampleDialogProps {
  readonly candidate: Candidate;
  /** Null for a new batch. */
  readonly sample: Sample | null;
  /** Resolves to whether it was saved. */
  readonly onSave: (fields: SampleFields) => Promise<boolean>;
  readonly onClose: () => void;
}

const text = (value: number | string | null | undefined): string => (value == null ? '' : String(value));
const draftOf = (sample: Sample | null, { counterIon, solvate }: Candidate) => ({
  batch: text(sample?.batch),
  formula: text(sample?.formula),
  counterIon: text(sample ? sample.counterIon : counterIon),
  solvate: text(sample ? sample.solvate : solvate),
  molarMass: sample?.molarMassBasis === 'typed' ? text(sample.molarMass_g_mol) : '',
  purity: text(sample?.purity_percent),
  purityBasis: text(sample?.purityBasis),
  phase: text(sample?.phase),
  mass: text(sample?.mass_mg),
  madeOn: text(sample?.madeOn),
  operator: text(sample?.operator),
  notes: text(sample?.notes),
});
type Draft = ReturnType<typeof draftOf>;

/** A batch as it was made; only its name is demanded. */
export function SampleDialog({ candidate, sample, onSave, onClose }: SampleDialogProps) {
  const form = useId();
  const library = useLibrary();
  const [draft, setDraft] = useState(() => draftOf(sample, candidate));
  const [problems, setProblems] = useState<readonly Problem[]>([]);
  const [saving, setSaving] = useState(false);
  const { composition } = candidate;
  const { counterIon, solvate } = draft;
  const weighed = molarMass(composition, library, { counterIon, solvate });
  const formula = substanceFormula(composition, counterIon, solvate, library);
  const field = (name: keyof Draft, label: string, more?: Partial<Parameters<typeof TextField>[0]>) => (
    <TextField
      {...more}
      label={label}
      value={draft[name]}
      onChange={(value) => setDraft((before) => ({ ...before, [name]: value }))}
    />
  );
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (saving) return;
    const reader = new Reader();
    const typed = reader.number(draft.molarMass, 'molar mass');
    const purity = reader.number(draft.purity, 'purity', -Number.MIN_VALUE);
    const mass_mg = reader.number(draft.mass, 'mass');
    if (purity !== null && purity > 100)
      reader.refuse('purity', `${draft.purity} is more than 100 %.`, 'Correct it, or leave it empty.');
    if (draft.batch.trim() === '')
      reader.refuse('batch', 'A batch needs its name.', 'Enter the one on the bottle.');
    setProblems(reader.problems);
    if (reader.problems.length > 0) return;
    const orNull = (value: string): string | null => value.trim() || null;
    const computed = weighed.value_g_mol;
    setSaving(true);
    void onSave({
      batch: draft.batch.trim().slice(0, 100),
      formula: orNull(draft.formula) ?? formula,
      counterIon: orNull(counterIon),
      solvate: orNull(solvate),
      molarMass_g_mol: typed ?? computed,
      molarMassBasis: typed !== null ? 'typed' : computed === null ? null : 'computed',
      purity_percent: purity,
      purityBasis: orNull(draft.purityBasis),
      phase: phases.find((phase) => phase === draft.phase) ?? null,
      mass_mg,
      madeOn: orNull(draft.madeOn),
      operator: draft.operator.trim().slice(0, 50) || null,
      notes: draft.notes,
    }).then((done) => {
      setSaving(false);
      if (done) onClose();
    });
  };
  return (
    <Dialog
      open
      wide
      title={sample === null ? 'Add a batch' : `Batch ${sample.batch}`}
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button type="submit" form={form} className="button-main" disabled={saving}>
            Save the batch
          </button>
        </>
      }
    >
      <form id={form} className="stack record-form" onSubmit={submit} noValidate>
        <div className="record-fields">
          {field('batch', 'Batch')}
          {field('counterIon', 'Counter-ion', { hint: 'such as Cl or perchlorate' })}
          {field('solvate', 'Solvate', { hint: 'such as 2 H2O' })}
          {field('formula', 'Formula', { hint: formula === null ? 'as weighed' : `empty: ${formula}` })}
          {field('molarMass', 'Molar mass', {
            unit: 'g/mol',
            hint:
              weighed.value_g_mol === null
                ? weighed.notes[0]
                : `empty: ${formatFigures(weighed.value_g_mol, 5)}${weighed.notes.length > 0 ? `, ${weighed.notes.join(', ')}` : ''}`,
          })}
          {field('purity', 'Purity', { unit: '% by mass' })}
          {field('purityBasis', 'Purity found by', { hint: 'such as elemental analysis' })}
          <Field label="Phase">
            {(attributes) => (
              <select
                {...attributes}
                value={draft.phase}
                onChange={(event) => {
                  const phase = event.currentTarget.value;
                  setDraft((before) => ({ ...before, phase }));
                }}
              >
                <option value="">not stated</option>
                {phases.map((phase) => (
                  <option key={phase}>{phase}</option>
                ))}
              </select>
            )}
          </Field>
          {field('mass', 'Mass', { unit: 'mg' })}
          {field('madeOn', 'Made on', { type: 'date' })}
          {field('operator', 'Initials')}
        </div>
        <Field label="Note">
          {(attributes) => (
            <textarea
              {...attributes}
              rows={2}
              value={draft.notes}
              onChange={(event) => {
                const notes = event.currentTarget.value;
                setDraft((before) => ({ ...before, notes }));
              }}
            />
          )}
        </Field>
        <ErrorPanel problems={problems} title="Not saved yet" />
      </form>
    </Dialog>
  );
}
