import { useMemo, useState } from 'react';
import { mergeBundles, readBundle, type BundleContent, type Side } from '../../../core/record/bundle';
import type { Problem } from '../../../core/errors';
import { snapshotBefore } from '../../app/exchange/snapshotBefore';
import { useRouter } from '../../app/router/RouterContext';
import { useAction, useServices, useStore } from '../../app/services';
import { useProject } from '../../app/session/ProjectSession';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel, useToast } from '../../parts';
import { bringIn, counted, planImport, projectContent } from '../../store';
import { ConflictTable } from './ConflictTable';
import { conflictKey } from './conflictText';

interface Copies {
  readonly fileName: string;
  readonly mine: BundleContent;
  readonly theirs: BundleContent;
}

/** Two copies of one project, brought together record by record; what both changed is for a person to decide. */
export default function MergeView() {
  const { project } = useProject();
  const { host } = useServices();
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  const { go } = useRouter();
  const [copies, setCopies] = useState<Copies | null>(null);
  const [problems, setProblems] = useState<readonly Problem[]>([]);
  const [chosen, setChosen] = useState<ReadonlyMap<string, Side>>(new Map());
  const result = useMemo(
    () =>
      copies === null
        ? null
        : mergeBundles(
            null,
            copies.mine,
            copies.theirs,
            (conflict) => chosen.get(conflictKey(conflict)) ?? 'mine',
          ),
    [copies, chosen],
  );
  const open = (): void =>
    void act(async () => {
      const [file] = await host.openFiles({ kind: 'bundle' });
      if (!file) return;
      const reading = readBundle(file.bytes);
      setCopies(null);
      setChosen(new Map());
      setProblems(reading.ok ? otherProject(reading.content, project.id, file.name) : reading.problems);
      if (!reading.ok || reading.content.projects[0]?.id !== project.id) return;
      setCopies({
        fileName: file.name,
        mine: await projectContent(store.db, project.id),
        theirs: reading.content,
      });
    });
  const take = (): void =>
    void act(async () => {
      if (result === null) return;
      await snapshotBefore(host, store, project, 'before-import');
      await bringIn(store.journal, await planImport(store.db, result.content));
      toast({
        message: `Merged: ${counted(result.taken.length, 'record')} taken over`,
        undo: () => void act(() => store.journal.undo(project.id)),
      });
      go({ view: 'candidates', project: project.id });
    });
  return (
    <>
      <ViewHeader
        title="Merge another copy"
        summary={`A colleague’s export or copy of “${project.name}” is compared with yours. Nothing changes before you take it.`}
        actions={
          <button type="button" className={copies ? '' : 'button-main'} onClick={open}>
            Choose the other copy…
          </button>
        }
      />
      {problems.length > 0 && (
        <ErrorPanel title="This file cannot be merged" problems={problems.slice(0, 12)} />
      )}
      {result === null && problems.length === 0 && (
        <EmptyState title="No other copy yet">
          Choose a project file that was exported from this same project, or its copy in a shared folder.
        </EmptyState>
      )}
      {result !== null && copies !== null && (
        <div className="stack">
          <section className="panel stack" aria-labelledby="merge-summary">
            <h2 id="merge-summary">From {copies.fileName}</h2>
            <p>
              {result.taken.length === 0
                ? 'Nothing in it is new to you.'
                : `${counted(result.taken.filter(({ what }) => what === 'added').length, 'record')} would be added, ${result.taken.filter(({ what }) => what === 'changed').length} changed.`}{' '}
              {result.conflicts.length === 0
                ? 'The copies do not contradict each other.'
                : `${counted(result.conflicts.length, 'field')} say different things; yours stands until you choose.`}
            </p>
            <div>
              <button
                type="button"
                className="button-main"
                disabled={result.taken.length === 0}
                onClick={take}
              >
                Take it over
              </button>
            </div>
          </section>
          {result.conflicts.length > 0 && (
            <ConflictTable
              conflicts={result.conflicts}
              mine={copies.mine}
              onChoose={(key, side) => setChosen((before) => new Map(before).set(key, side))}
            />
          )}
        </div>
      )}
    </>
  );
}

const otherProject = (content: BundleContent, id: string, fileName: string): Problem[] =>
  content.projects[0]?.id === id
    ? []
    : [
        {
          code: 'integrity',
          field: fileName,
          message: 'It holds another project than the one that is open.',
          remedy: 'Import it as a project of its own, or choose a copy of this one.',
        },
      ];
