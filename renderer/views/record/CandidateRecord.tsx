import { useCallback, useMemo, useState } from 'react';
import { complexFormula } from '../../../core/library/complexFormula';
import type { Measurement } from '../../../core/record/measurement';
import type { Candidate } from '../../../core/record/project';
import { currentContent } from '../../../core/record/revisions';
import { minuteOf, useAction, useServices, useSettings, useStored, useStore } from '../../app/services';
import { inputOf } from '../../app/session/candidateInput';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { usePrediction } from '../../app/session/usePrediction';
import { ErrorPanel, useToast } from '../../parts';
import type { Store } from '../../store';
import { AgreementFigures } from '../agreement/AgreementFigures';
import { PairTable } from '../agreement/PairTable';
import { informedBy, pairsOf } from '../agreement/recordPairs';
import { keepingTheRest } from './draft/contentOf';
import { blankMeasurement, draftOf } from './draft/measurementDraft';
import { substanceOf } from './draft/substance';
import { type Entered, MeasurementDialog } from './form/MeasurementDialog';
import { DropArea } from './importing/DropArea';
import { ImportDialog, type ImportedSpectra } from './importing/ImportDialog';
import { PasteSpectrum } from './importing/PasteSpectrum';
import type { IncomingFile } from './importing/useReadings';
import { MeasurementList } from './MeasurementList';
import { SamplePanel } from './samples/SamplePanel';

const shared = ['measurements', 'frozenPredictions', 'samples', 'analyses', 'parameterSets'] as const;

/** The record of one candidate: what was predicted, what was measured, and how they agree. */
export function CandidateRecord({ candidate }: { readonly candidate: Candidate }) {
  const { conditions } = useProject();
  const library = useLibrary();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const { settings } = useSettings();
  const [open, setOpen] = useState<'new' | Measurement | null>(null);
  const [incoming, setIncoming] = useState<readonly IncomingFile[] | null>(null);
  const [pasting, setPasting] = useState(false);
  const { host } = useServices();
  const formula = complexFormula(candidate.composition, library);
  const input = useMemo(() => inputOf(candidate, conditions), [candidate, conditions]);
  const { counterIon } = candidate;
  const asked = usePrediction(
    input,
    useMemo(() => ({ counterIon }), [counterIon]),
  );
  const prediction = asked.current && asked.outcome?.ok ? asked.outcome.prediction : null;
  const waiting = !asked.current || (asked.outcome === null && asked.error === null);
  const ask = useCallback(
    async (from: Store) => ({
      measurements: await from.measurements.of(candidate.id),
      standing: await from.frozenPredictions.of(candidate.id),
      frozen: await from.frozenPredictions.ofProject(candidate.projectId),
      analyses: await from.analyses.ofProject(candidate.projectId),
      samples: await from.samples.of(candidate.id),
      sets: await from.parameterSets.of(candidate.projectId),
    }),
    [candidate.id, candidate.projectId],
  );
  const { value, error } = useStored(ask, shared);
  const substance = useMemo(() => substanceOf(candidate, library), [candidate, library]);
  const undo = (): void => void act(() => store.journal.undo(candidate.projectId));
  const add = ({ content, batch, by, files }: Entered): Promise<boolean> =>
    act(async () => {
      const contents = [content];
      const { froze } = await store.measurements.add({
        candidate,
        contents,
        batch,
        by,
        prediction,
        formula,
        files,
      });
      toast({ message: froze ? 'Prediction frozen, then measurement saved' : 'Measurement saved', undo });
    });
  const keep = (imported: ImportedSpectra): Promise<boolean> =>
    act(async () => {
      const { froze, measurements } = await store.measurements.add({
        candidate,
        prediction,
        formula,
        ...imported,
      });
      const kept = measurements.length === 1 ? 'Spectrum kept' : `${measurements.length} spectra kept`;
      toast({ message: froze ? `Prediction frozen, then ${kept.toLowerCase()}` : kept, undo });
    });
  const chooseFiles = (): void =>
    void act(async () => {
      const files = await host.openFiles({ kind: 'spectrum', many: true });
      if (files.length > 0) setIncoming(files);
    });
  const correct = (measurement: Measurement, entered: Entered): Promise<boolean> =>
    act(async () => {
      const { by, why, files, batch } = entered;
      await store.measurements.correct(measurement, {
        by,
        why,
        files,
        content: keepingTheRest(currentContent(measurement), entered.content),
        batch: batch && { candidate, named: batch },
      });
      toast({ message: 'Saved as a new revision', undo });
    });
  const remove = (measurement: Measurement): void =>
    void act(async () => {
      await store.measurements.remove(measurement);
      toast({ message: 'Measurement deleted', undo });
    });
  if (error !== null)
    return (
      <ErrorPanel
        title="The record cannot be read"
        problems={[{ code: 'integrity', field: '', message: error }]}
      />
    );
  if (!value) return <p className="soft">Opening…</p>;
  const pairs = value.measurements.flatMap((each) => {
    const before = value.frozen.get(each.frozenPredictionId ?? '') ?? null;
    return pairsOf(each, before, value.analyses.get(each.id) ?? null, informedBy(value.sets, before));
  });
  const [latest] = value.standing;
  const notice = latest
    ? null
    : prediction
      ? 'No prediction is frozen yet. Saving freezes the one that stands now first, so that the comparison is honest.'
      : 'This candidate could not be estimated: the measurement is kept without a prediction.';
  const today = new Date().toISOString().slice(0, 10);
  const draft =
    open === null
      ? null
      : open === 'new'
        ? blankMeasurement(settings.initials, today)
        : draftOf(currentContent(open), null);
  return (
    <DropArea onFiles={setIncoming}>
      <section className="panel stack" aria-labelledby="record-measured">
        <div className="record-head">
          <h2 id="record-measured">Measurements</h2>
          <span className="record-actions">
            <button type="button" disabled={waiting} onClick={chooseFiles}>
              Import spectra…
            </button>
            <button type="button" disabled={waiting} onClick={() => setPasting(true)}>
              Paste a table…
            </button>
            <button type="button" className="button-main" disabled={waiting} onClick={() => setOpen('new')}>
              Add measurement…
            </button>
          </span>
        </div>
        <p className="soft">
          {latest
            ? `${value.standing.length} frozen prediction${value.standing.length === 1 ? '' : 's'}, the latest of ${minuteOf(latest.frozenAt)}: ${latest.reason}.`
            : 'No frozen prediction yet; the first measurement freezes one before it is saved.'}
        </p>
        {value.measurements.length === 0 && (
          <p>Nothing measured yet. Drop a spectrum file here, import one, or type what was read off.</p>
        )}
        <MeasurementList
          measurements={value.measurements}
          samples={value.samples}
          onCorrect={setOpen}
          onDelete={remove}
        />
      </section>
      <SamplePanel candidate={candidate} samples={value.samples} />
      {pairs.length > 0 && (
        <section className="panel stack" aria-labelledby="record-pairs">
          <h2 id="record-pairs">Measured beside predicted</h2>
          <PairTable pairs={pairs} />
          <AgreementFigures pairs={pairs} />
        </section>
      )}
      {open !== null && draft !== null && (
        <MeasurementDialog
          start={draft}
          substance={substance}
          initials={settings.initials}
          before={open === 'new' ? null : currentContent(open)}
          withSample={open === 'new' || open.sampleId === null}
          notice={open === 'new' ? notice : null}
          onSave={(entered) => (open === 'new' ? add(entered) : correct(open, entered))}
          onClose={() => setOpen(null)}
        />
      )}
      {pasting && (
        <PasteSpectrum
          onClose={() => setPasting(false)}
          onText={(file) => {
            setPasting(false);
            setIncoming([file]);
          }}
        />
      )}
      {incoming !== null && (
        <ImportDialog
          candidate={candidate}
          incoming={incoming}
          initials={settings.initials}
          notice={notice}
          onSave={keep}
          onClose={() => setIncoming(null)}
        />
      )}
    </DropArea>
  );
}
