import { useId, useState, type FormEvent } from 'react';
import type { Problem } from '../../../../core/errors';
import type { MeasurementContent } from '../../../../core/record/measurement';
import { Field } from '../../../app/form';
import { Dialog, ErrorPanel, SegmentedChoice } from '../../../parts';
import type { NamedBatch } from '../../../store';
import { contentOf } from '../draft/contentOf';
import type { ConditionsDraft, MeasurementDraft } from '../draft/measurementDraft';
import { ConditionFields } from './ConditionFields';
import { ParticularFields } from './ParticularFields';
import { TextField } from './TextField';

export interface Entered {
  readonly content: MeasurementContent;
  readonly batch: NamedBatch | null;
  /** Initials of who enters it. */
  readonly by: string;
  /** Only for a correction. */
  readonly why: string;
}

interface MeasurementDialogProps {
  readonly start: MeasurementDraft;
  /** A correction keeps the kind and asks for the reason. */
  readonly correcting: boolean;
  /** Said above the form: what saving will also do. */
  readonly notice: string | null;
  /** Resolves to whether it was saved. */
  readonly onSave: (entered: Entered) => Promise<boolean>;
  readonly onClose: () => void;
}

export const batchOf = ({ batch, phase }: ConditionsDraft): NamedBatch | null =>
  batch.trim() === '' ? null : { batch: batch.trim().slice(0, 100), phase: phase === '' ? null : phase };

/** A measurement as it is typed, new or corrected. */
export function MeasurementDialog({ start, correcting, notice, onSave, onClose }: MeasurementDialogProps) {
  const form = useId();
  const [draft, setDraft] = useState(start);
  const [why, setWhy] = useState('');
  const [problems, setProblems] = useState<readonly Problem[]>([]);
  const [saving, setSaving] = useState(false);
  const change = (part: Partial<MeasurementDraft>): void => setDraft((before) => ({ ...before, ...part }));
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (saving) return;
    const checked = contentOf(draft);
    const found = checked.ok ? [] : [...checked.problems];
    if (correcting && why.trim() === '')
      found.push({
        code: 'missing-field',
        field: 'reason',
        message: 'A correction needs its reason.',
        remedy: 'Say in a few words why.',
      });
    setProblems(found);
    if (!checked.ok || found.length > 0) return;
    setSaving(true);
    void onSave({ content: checked.value, batch: batchOf(draft), by: draft.operator.trim(), why }).then(
      (done) => {
        setSaving(false);
        if (done) onClose();
      },
    );
  };
  return (
    <Dialog
      open
      wide
      title={correcting ? `Correct this ${draft.kind}` : 'Add a measurement'}
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button type="submit" form={form} className="button-main" disabled={saving}>
            {correcting ? 'Save as a new revision' : 'Save the measurement'}
          </button>
        </>
      }
    >
      <form id={form} className="stack record-form" onSubmit={submit} noValidate>
        {notice !== null && <p className="record-notice">{notice}</p>}
        {!correcting && (
          <SegmentedChoice
            legend="What was measured"
            options={[
              { id: 'band list', label: 'Bands' },
              { id: 'moment', label: 'Moment' },
              { id: 'observed colour', label: 'Colour seen' },
              { id: 'note', label: 'Note' },
            ]}
            value={draft.kind}
            onChange={(kind) => change({ kind })}
          />
        )}
        <ParticularFields draft={draft} onChange={change} />
        <ConditionFields draft={draft} onChange={change} withSample={!correcting} />
        <Field label="Note">
          {(attributes) => (
            <textarea
              {...attributes}
              rows={2}
              value={draft.remark}
              onChange={(event) => change({ remark: event.currentTarget.value })}
            />
          )}
        </Field>
        {correcting && (
          <TextField
            label="Why it is corrected"
            hint="kept with your initials and the time; the former entry stays readable"
            value={why}
            onChange={setWhy}
          />
        )}
        <ErrorPanel problems={problems} title="Not saved yet" />
      </form>
    </Dialog>
  );
}
