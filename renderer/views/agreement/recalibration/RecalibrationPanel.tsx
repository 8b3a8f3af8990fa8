import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { basisFor, observationsOf } from '../../../../core/agreement/recalibration';
import type { ParameterSet } from '../../../../core/record/project';
import { snapshotBefore } from '../../../app/exchange/snapshotBefore';
import { useAction, useServices, useStore } from '../../../app/services';
import { useProject } from '../../../app/session/ProjectSession';
import { ErrorPanel, Progress, useToast } from '../../../parts';
import { recalibrateInWorker } from '../../../workers/recalibration/recalibrateInWorker';
import type { RecordPairs } from '../useRecordPairs';
import { adoptedSet, type Approval, type Proposal } from './adoptedSet';
import { ParameterSets } from './ParameterSets';
import { ProposalForm } from './ProposalForm';

/** Lets the parameters learn from the field fits of the record: proposed, looked at, approved, never by itself. */
export function RecalibrationPanel({ record }: { readonly record: RecordPairs }) {
  const { project, rows, parameterSet } = useProject();
  const { host } = useServices();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const [progress, setProgress] = useState<{ done: number; of: number } | null>(null);
  const [proposal, setProposal] = useState<Proposal | null>(null);
  const [error, setError] = useState<string | null>(null);
  const abort = useRef<AbortController | null>(null);
  const observations = useMemo(
    () => observationsOf(record.measurements, record.analyses, record.frozen, (id) => rows.get(id)),
    [record, rows],
  );
  const basis = useMemo(
    () => basisFor(observations, parameterSet, record.sets),
    [observations, parameterSet, record.sets],
  );
  useEffect(() => () => abort.current?.abort(), []);
  const run = useCallback(() => {
    const controller = new AbortController();
    abort.current = controller;
    setError(null);
    setProposal(null);
    setProgress({ done: 0, of: observations.length });
    recalibrateInWorker({ observations, overlay: basis }, controller.signal, (done, of) =>
      setProgress({ done, of }),
    )
      .then(
        (value) => setProposal({ value, observations, basis }),
        (cause: unknown) => {
          if (!controller.signal.aborted) setError(cause instanceof Error ? cause.message : String(cause));
        },
      )
      .finally(() => setProgress(null));
  }, [observations, basis]);
  const approve = (approval: Approval): void => {
    if (proposal === null) return;
    void act(async () => {
      await snapshotBefore(host, store, project, 'before-recalibration');
      const set = adoptedSet(proposal, approval, project.id, store.clock);
      await store.parameterSets.adopt(set, `use the parameters “${set.name}”`);
      setProposal(null);
      toast({
        message: 'New parameters in use; frozen predictions stay as they were',
        undo: () => void act(() => store.journal.undo(project.id)),
      });
    });
  };
  const choose = (set: ParameterSet | null): void =>
    void act(async () => {
      const label = set === null ? 'use the library without changes' : `use the parameters “${set.name}”`;
      await store.projects.update(project.id, label, { parameterSetId: set?.id ?? null });
    });
  return (
    <section className="panel stack" aria-labelledby="recalibration">
      <h2 id="recalibration">Parameters that learn</h2>
      <p>
        {observations.length === 0
          ? 'Fit the field of measured complexes in the lab record first: their 10Dq and B are what the parameters can learn from.'
          : `${observations.length} field ${observations.length === 1 ? 'fit' : 'fits'} in this record. A proposal shows what would change and whether complexes are predicted better from each other; nothing changes before you approve it.`}
        {observations.length > 0 &&
          basis !== parameterSet &&
          ` Some of these complexes went into the parameters in use, so a proposal starts again from ${basis === null ? 'the literature' : `“${basis.name}”`}: evidence counts once.`}
      </p>
      <div>
        <button
          type="button"
          className="button-main"
          disabled={observations.length === 0 || progress !== null}
          onClick={run}
        >
          Propose new parameters
        </button>
      </div>
      {progress && (
        <Progress
          label="Leaving out one complex after the other"
          done={progress.done}
          total={progress.of}
          onCancel={() => abort.current?.abort()}
        />
      )}
      {error !== null && (
        <ErrorPanel title="No proposal" problems={[{ code: 'no-convergence', field: '', message: error }]} />
      )}
      {proposal && <ProposalForm proposal={proposal} onApprove={approve} onClose={() => setProposal(null)} />}
      <ParameterSets sets={record.sets} current={parameterSet} onChoose={choose} />
    </section>
  );
}
