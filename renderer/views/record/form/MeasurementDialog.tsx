import { useId, useState, type FormEvent } from 'react';
import type { Problem } from '../../../../core/errors';
import type { StoredFile } from '../../../../core/record/file';
import type { MeasurementContent } from '../../../../core/record/measurement';
import { Field } from '../../../app/form';
import { Dialog, ErrorPanel, SegmentedChoice } from '../../../parts';
import type { NamedBatch } from '../../../store';
import { contentOf } from '../draft/contentOf';
import type { ConditionsDraft, MeasurementDraft } from '../draft/measurementDraft';
import type { Substance } from '../draft/substance';
import { AttachmentFields, type Attached } from './AttachmentFields';
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
  /** Attachments that are not in the record yet. */
  readonly files: readonly StoredFile[];
}

interface MeasurementDialogProps {
  readonly start: MeasurementDraft;
  readonly substance: Substance;
  /** What is corrected: it keeps its kind, and the reason is asked for. Null for a new measurement. */
  readonly before: MeasurementContent | null;
  /** Initials of whoever sits here, as the settings know them; empty where they do not. */
  readonly initials: string;
  /** Whether the batch can be named here: it stays with a measurement for good. */
  readonly withSample: boolean;
  /** Said above the form: what saving will also do. */
  readonly notice: string | null;
  /** Resolves to whether it was saved. */
  readonly onSave: (entered: Entered) => Promise<boolean>;
  readonly onClose: () => void;
}

export const batchOf = ({ batch, phase }: ConditionsDraft): NamedBatch | null =>
  batch.trim() === '' ? null : { batch: batch.trim().slice(0, 100), phase: phase === '' ? null : phase };

/** A measurement as it is typed, new or corrected. */
export function MeasurementDialog(props: MeasurementDialogProps) {
  const { start, substance, before, initials, withSample, notice, onSave, onClose } = props;
  const correcting = before !== null;
  const form = useId();
  const [draft, setDraft] = useState(start);
  const [why, setWhy] = useState('');
  const [signer, setSigner] = useState(initials);
  const [attached, setAttached] = useState<readonly Attached[]>(() =>
    (before?.attachments ?? []).map((each) => ({ ...each, file: null })),
  );
  const [problems, setProblems] = useState<readonly Problem[]>([]);
  const [saving, setSaving] = useState(false);
  const change = (part: Partial<MeasurementDraft>): void => setDraft((old) => ({ ...old, ...part }));
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (saving) return;
    const checked = contentOf(draft, substance, before);
    const found = checked.ok ? [] : [...checked.problems];
    if (correcting && why.trim() === '')
      found.push({
        code: 'missing-field',
        field: 'reason',
        message: 'A correction needs its reason.',
        remedy: 'Say in a few words why.',
      });
    if (correcting && signer.trim() === '')
      found.push({
        code: 'missing-field',
        field: 'your initials',
        message: 'A correction is signed.',
        remedy: 'Enter your initials.',
      });
    setProblems(found);
    if (!checked.ok || found.length > 0) return;
    setSaving(true);
    const attachments = attached.map(({ name, fileId }) => ({ name, fileId }));
    void onSave({
      content: { ...checked.value, attachments },
      batch: batchOf(draft),
      by: (correcting ? signer : draft.operator).trim().slice(0, 100),
      why,
      files: attached.flatMap(({ file }) => file ?? []),
    }).then((done) => {
      setSaving(false);
      if (done) onClose();
    });
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
              { id: 'moment series', label: 'Moments over T' },
              { id: 'emission', label: 'Emission' },
              { id: 'observed colour', label: 'Colour seen' },
              { id: 'note', label: 'Note' },
            ]}
            value={draft.kind}
            // Readings are corrected here; what a pasted series was corrected by, only its owner knows.
            onChange={(kind) => change({ kind, basis: kind === 'moment series' ? 'none' : 'pascal sum' })}
          />
        )}
        <ParticularFields draft={draft} substance={substance} onChange={change} />
        <ConditionFields draft={draft} onChange={change} withSample={withSample} />
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
        <AttachmentFields attached={attached} onChange={setAttached} />
        {correcting && (
          <fieldset className="record-fields">
            <legend>This correction</legend>
            <TextField
              label="Why it is corrected"
              hint="kept with your initials and the time; the former entry stays readable"
              value={why}
              onChange={setWhy}
            />
            <TextField label="Your initials" value={signer} onChange={setSigner} />
          </fieldset>
        )}
        <ErrorPanel problems={problems} title="Not saved yet" />
      </form>
    </Dialog>
  );
}
