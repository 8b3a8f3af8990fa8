import { useCallback, useMemo, useState } from 'react';
import { complexFormula } from '../../../core/library/complexFormula';
import { type BandFit, stepsForFitting } from '../../../core/measured';
import type { Analysis } from '../../../core/record/analysis';
import type { Curve } from '../../../core/record/curve';
import { currentContent } from '../../../core/record/revisions';
import type { TreatmentStep } from '../../../core/record/treatment';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useAction, useStored, useStore } from '../../app/services';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel, Formula, useToast } from '../../parts';
import type { AnalysisFields, Store } from '../../store';
import { AssignPanel } from './assign/AssignPanel';
import { measuredBands } from './assign/measuredBands';
import { FieldFitPanel } from './field/FieldFitPanel';
import { FitPanel } from './fit/FitPanel';
import { treated } from './treatment/treated';
import { TreatmentPanel } from './treatment/TreatmentPanel';
import './AnalysisView.css';

const tables = ['measurements', 'analyses', 'frozenPredictions'] as const;

/** From one measured spectrum or list of bands to an assignment and the field that fits it. */
export default function AnalysisView() {
  const { address } = useRouter();
  const { project, rows } = useProject();
  useVersion(rows);
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const [lastFit, setLastFit] = useState<BandFit | null>(null);
  const library = useLibrary();
  const id = address.item ?? '';
  const ask = useCallback((from: Store) => everythingOf(from, project.id, id), [project.id, id]);
  const { value, error } = useStored(ask, tables);
  const content = value?.measurement && currentContent(value.measurement);
  const curve = value?.curve ?? null;
  const treatment = value?.analysis?.treatment;
  const result = useMemo(
    () =>
      curve === null
        ? null
        : treated(curve, treatment ?? [], (wanted) => value?.blanks.get(wanted)?.curve ?? undefined),
    [curve, treatment, value?.blanks],
  );
  if (error !== null)
    return (
      <ErrorPanel
        title="This measurement cannot be read"
        problems={[{ code: 'integrity', field: '', message: error }]}
      />
    );
  if (!value) return <p className="soft">Opening…</p>;
  const { measurement, analysis, frozen, blanks } = value;
  const candidate = measurement && rows.get(measurement.candidateId);
  if (!measurement || !content || !candidate || measurement.deletedAt !== null) {
    return (
      <>
        <ViewHeader title="Not found" />
        <EmptyState
          title="This measurement is not here"
          actions={
            <a className="button" href={linkTo({ view: 'record', project: project.id })}>
              The lab record
            </a>
          }
        >
          It may have been deleted, or its candidate lies in the bin.
        </EmptyState>
      </>
    );
  }
  /** A fit belongs to the numbers it was made of: other steps remove it, in the same step that can be undone. */
  const saveSteps = async (steps: readonly TreatmentStep[], label: string): Promise<boolean> => {
    const same =
      JSON.stringify(stepsForFitting(steps)) === JSON.stringify(stepsForFitting(analysis?.treatment ?? []));
    const stale = !same && analysis?.bandFit != null;
    const gone = stale ? { bandFit: null, assignment: [], fieldFit: null } : {};
    const done = await save({ treatment: [...steps], ...gone }, label);
    if (done && stale)
      toast({
        message: 'The band fit was made of other numbers and is gone with this step',
        undo: () => void act(() => store.journal.undo(project.id)),
      });
    return done;
  };
  const save = (fields: AnalysisFields, label: string): Promise<boolean> =>
    act(() => store.analyses.save(measurement, analysis, fields, label));
  const bands = measuredBands(content, analysis);
  return (
    <div className="stack">
      <nav className="sheet-way" aria-label="Way back">
        <a href={linkTo({ view: 'record', project: project.id, item: candidate.id })}>Lab record</a>
      </nav>
      <ViewHeader
        title={<Formula formula={complexFormula(candidate.composition, library)} />}
        summary={
          content.kind === 'spectrum'
            ? `Spectrum ${content.name ?? content.source?.fileName ?? ''}. The raw numbers stay as they were read.`
            : 'Bands as they were typed.'
        }
      />
      {content.kind === 'spectrum' && curve === null && (
        <ErrorPanel
          title="The numbers of this spectrum are missing"
          problems={[
            {
              code: 'integrity',
              field: '',
              message: 'They did not travel with the project.',
              remedy: 'Import the file again, or restore a snapshot.',
            },
          ]}
        />
      )}
      {curve !== null && result !== null && (
        <>
          <TreatmentPanel
            curve={curve}
            steps={analysis?.treatment ?? []}
            result={result}
            conditions={content.conditions}
            title={`${complexFormula(candidate.composition, library)} ${content.kind === 'spectrum' ? (content.name ?? '') : ''}`.trim()}
            blanks={blanks}
            onSave={saveSteps}
          />
          <FitPanel
            key={analysis?.bandFit ? 'fitted' : 'open'}
            points={result.points}
            quantity={result.quantity}
            kept={analysis?.bandFit ?? null}
            last={lastFit}
            onFit={setLastFit}
            onSave={(bandFit, label) => save({ bandFit, assignment: [], fieldFit: null }, label)}
          />
        </>
      )}
      {bands.length > 0 && (
        <>
          <AssignPanel
            measured={bands}
            frozen={frozen}
            kept={analysis?.assignment ?? []}
            onSave={(assignment, label) => save({ assignment, fieldFit: null }, label)}
          />
          <FieldFitPanel
            candidate={candidate}
            frozen={frozen}
            measured={bands}
            assignment={analysis?.assignment ?? []}
            kept={analysis?.fieldFit ?? null}
            onSave={(fieldFit, label) => save({ fieldFit }, label)}
          />
        </>
      )}
    </div>
  );
}

async function everythingOf(store: Store, projectId: string, id: string) {
  const measurement = await store.measurements.get(id);
  if (measurement === undefined) return { measurement: null, ...nothing };
  const content = currentContent(measurement);
  const curve =
    content.kind === 'spectrum' ? ((await store.measurements.curve(content.curveId)) ?? null) : null;
  const frozen =
    (await store.frozenPredictions.ofProject(projectId)).get(measurement.frozenPredictionId ?? '') ?? null;
  const analysis = await store.analyses.of(id);
  const subtracted = (analysis?.treatment ?? []).flatMap((step) =>
    step.op === 'subtract blank' ? step.curveId : [],
  );
  const blanks = await possibleBlanks(store, projectId, id, new Set(subtracted));
  return { measurement, curve, frozen, analysis, blanks };
}

const nothing = {
  curve: null,
  frozen: null,
  analysis: null as Analysis | null,
  blanks: new Map<string, Blank>() as ReadonlyMap<string, Blank>,
};

interface Blank {
  readonly name: string;
  /** Null until a step subtracts it: numbers are read only where they are used. */
  readonly curve: Curve | null;
}

/** Other spectra of the project by the id of their curve, those that are subtracted first. */
async function possibleBlanks(
  store: Store,
  projectId: string,
  id: string,
  subtracted: ReadonlySet<string>,
): Promise<ReadonlyMap<string, Blank>> {
  const blanks = new Map<string, Blank>();
  for (const each of await store.measurements.ofProject(projectId)) {
    const content = currentContent(each);
    if (content.kind !== 'spectrum' || each.id === id || blanks.has(content.curveId)) continue;
    const isUsed = subtracted.has(content.curveId);
    if (blanks.size >= mostBlanks && !isUsed) continue;
    const curve = isUsed ? ((await store.measurements.curve(content.curveId)) ?? null) : null;
    blanks.set(content.curveId, { name: content.name ?? content.source?.fileName ?? 'a spectrum', curve });
  }
  return blanks;
}

/** A list to choose from that anybody can still read. */
const mostBlanks = 100;
