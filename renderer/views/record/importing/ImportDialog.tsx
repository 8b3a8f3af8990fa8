import { useCallback, useId, useMemo, useState, type FormEvent } from 'react';
import type { Problem } from '../../../../core/errors';
import type { MeasurementContent } from '../../../../core/record/measurement';
import type { Candidate } from '../../../../core/record/project';
import { dayOf, useStored } from '../../../app/services';
import { Dialog, ErrorPanel } from '../../../parts';
import type { NewMeasurements, Store } from '../../../store';
import { conditionsOf } from '../draft/contentOf';
import { blankConditions, type ConditionsDraft } from '../draft/measurementDraft';
import { ConditionFields } from '../form/ConditionFields';
import { batchOf } from '../form/MeasurementDialog';
import { foundIn, openQuestion, plainName, type FoundSpectrum } from './chosenSpectra';
import { FilePart } from './FilePart';
import { type IncomingFile, useReadings } from './useReadings';

export type ImportedSpectra = Pick<NewMeasurements, 'contents' | 'curves' | 'files' | 'batch' | 'by'>;

interface ImportDialogProps {
  readonly candidate: Candidate;
  /** Stable for as long as the dialog is open. */
  readonly incoming: readonly IncomingFile[];
  readonly initials: string;
  readonly notice: string | null;
  /** Resolves to whether they were saved. */
  readonly onSave: (imported: ImportedSpectra) => Promise<boolean>;
  readonly onClose: () => void;
}

/** Spectra from files, looked at before anything is kept. */
export function ImportDialog({ candidate, incoming, initials, notice, onSave, onClose }: ImportDialogProps) {
  const form = useId();
  const { files, choose } = useReadings(incoming);
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set());
  const [draft, setDraft] = useState<ConditionsDraft>(() => blankConditions(initials, ''));
  const [problems, setProblems] = useState<readonly Problem[]>([]);
  const [saving, setSaving] = useState(false);
  const found = useMemo(() => foundIn(files), [files]);
  const chosen = found.filter(({ key }) => !left.has(key));
  const reading = files.some(({ result, broke }) => result === null && broke === null);
  const known = useKnownFiles(candidate.projectId, found);
  const toggle = (key: string): void =>
    setLeft((before) => {
      const after = new Set(before);
      if (!after.delete(key)) after.add(key);
      return after;
    });
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (saving || reading) return;
    const conditions = conditionsOf(draft);
    const open: Problem[] = chosen.flatMap((each): Problem[] => {
      const question = openQuestion(each);
      return question === null
        ? []
        : [
            {
              code: 'missing-field',
              field: each.fileName,
              message: question,
              remedy: 'Choose the unit above, or leave this spectrum out.',
            },
          ];
    });
    const wrong = conditions.ok ? open : [...open, ...conditions.problems];
    setProblems(wrong);
    if (!conditions.ok || wrong.length > 0) return;
    setSaving(true);
    const contents = chosen.map((each): MeasurementContent => ({
      kind: 'spectrum',
      conditions: conditions.value,
      remark: draft.remark.trim(),
      attachments: [],
      curveId: each.curve.id,
      source: { fileId: each.file.id, fileName: plainName(each.fileName), index: each.index },
      name: each.spectrum.name?.slice(0, 200) ?? null,
    }));
    void onSave({
      contents,
      curves: chosen.map(({ curve }) => curve),
      files: [...new Map(chosen.map(({ file }) => [file.id, file])).values()],
      batch: batchOf(draft),
      by: draft.operator.trim(),
    }).then((done) => {
      setSaving(false);
      if (done) onClose();
    });
  };
  return (
    <Dialog
      open
      wide
      title={incoming.length === 1 ? 'Import a spectrum' : `Import spectra from ${incoming.length} files`}
      onClose={onClose}
      actions={
        <>
          <button type="button" onClick={onClose}>
            Cancel
          </button>
          <button
            type="submit"
            form={form}
            className="button-main"
            disabled={saving || reading || chosen.length === 0}
          >
            {chosen.length === 1 ? 'Keep the spectrum' : `Keep ${chosen.length} spectra`}
          </button>
        </>
      }
    >
      <form id={form} className="stack record-form" onSubmit={submit} noValidate>
        {notice !== null && <p className="record-notice">{notice}</p>}
        {files.map((file, place) => (
          <FilePart
            key={`${place} ${file.name}`}
            file={file}
            known={file.result === null ? null : (known.get(file.result.file.id) ?? null)}
            isChosen={(index) => !left.has(`${place} ${index}`)}
            onToggle={(index) => toggle(`${place} ${index}`)}
            onChoose={(choices, units) => choose(place, choices, units)}
          />
        ))}
        <ConditionFields
          draft={draft}
          onChange={(change) => setDraft((before) => ({ ...before, ...change }))}
          withSample
        />
        <ErrorPanel problems={problems} title="Not kept yet" />
      </form>
    </Dialog>
  );
}

/** What the record already holds from the same bytes, by hash of the file. */
function useKnownFiles(projectId: string, found: readonly FoundSpectrum[]): ReadonlyMap<string, string> {
  const ids = [...new Set(found.map(({ file }) => file.id))].join(' ');
  const ask = useCallback(
    async (store: Store) => {
      const said = new Map<string, string>();
      for (const id of ids.split(' ').filter(Boolean)) {
        const [first] = await store.measurements.fromFile(projectId, id);
        if (first)
          said.set(
            id,
            `This file is in the record already, since ${dayOf(first.createdAt.slice(0, 10))}: keeping it again counts it twice.`,
          );
      }
      return said;
    },
    [projectId, ids],
  );
  return useStored(ask, ['measurements']).value ?? new Map<string, string>();
}
