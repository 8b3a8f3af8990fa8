import { useCallback, useEffect, useState } from 'react';
import type { MirroredProject, MirrorStatus } from '../../host';
import { inWords, minuteOf, useAction, useServices } from '../../app/services';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel } from '../../parts';
import { SnapshotList } from './SnapshotList';
import './BackupsView.css';

interface Found {
  readonly status: MirrorStatus;
  readonly projects: readonly MirroredProject[];
}

const megabytes = (bytes: number): string => `${(bytes / 1e6).toFixed(bytes < 1e5 ? 3 : 1)} MB`;

/** The folder of open files that follows every change, and the snapshots in it. */
export default function BackupsView() {
  const { host } = useServices();
  const act = useAction();
  const { found, error, refresh } = useCopies();
  const { chooseMirrorFolder, mirror } = host.info.abilities;
  const actions = (
    <>
      {chooseMirrorFolder && (
        <button
          type="button"
          onClick={() =>
            void act(async () => {
              await host.mirror.chooseFolder();
              await refresh();
            })
          }
        >
          Choose the folder…
        </button>
      )}
      {mirror && found?.status.folder && (
        <button type="button" onClick={() => void act(() => host.mirror.revealFolder())}>
          Show the folder
        </button>
      )}
    </>
  );
  return (
    <>
      <ViewHeader
        title="Copies and snapshots"
        summary="Each project also lies as open files in a folder of yours, written shortly after every change."
        actions={actions}
      />
      {error !== null && (
        <ErrorPanel
          title="The folder of copies cannot be read"
          problems={[
            {
              code: 'unreadable-file',
              field: '',
              message: error,
              remedy: 'Choose another folder, or mend it and try again.',
            },
          ]}
        >
          <button type="button" onClick={() => void refresh()}>
            Try again
          </button>
        </ErrorPanel>
      )}
      {found && <Copies found={found} />}
      {!found && error === null && <p className="soft">Looking…</p>}
    </>
  );
}

function Copies({ found: { status, projects } }: { readonly found: Found }) {
  if (status.state === 'off')
    return (
      <EmptyState title="No copies are kept here">
        {status.problem
          ? `${status.problem.message} ${status.problem.remedy}`
          : 'Started like this, the program keeps its projects in the browser alone. Start it with its own start command, or export your projects now and then.'}
      </EmptyState>
    );
  return (
    <div className="stack">
      <section className="panel" aria-label="State of the copies">
        <dl className="quantities">
          <div className="quantity">
            <dt>Folder</dt>
            <dd className="backups-path">{status.folder ?? 'none'}</dd>
          </div>
          <div className="quantity">
            <dt>Last written</dt>
            <dd>{status.lastWrittenAt === null ? 'not since the start' : minuteOf(status.lastWrittenAt)}</dd>
          </div>
        </dl>
        {status.problem && (
          <ErrorPanel
            title="The copies are behind"
            problems={[{ code: 'unreadable-file', field: '', ...status.problem }]}
          />
        )}
      </section>
      {projects.length === 0 ? (
        <EmptyState title="Nothing copied yet">
          The first change of a project makes its first copy.
        </EmptyState>
      ) : (
        projects.map((project) => (
          <section key={project.projectId} className="panel stack" aria-label={project.name}>
            <h2>{project.name}</h2>
            <p className="soft">
              Written {minuteOf(project.writtenAt)}, {megabytes(project.bytes)}, {project.snapshots}{' '}
              {project.snapshots === 1 ? 'snapshot' : 'snapshots'}.
            </p>
            <SnapshotList project={project} />
          </section>
        ))
      )}
    </div>
  );
}

/** What lies in the folder, looked at again whenever the mirror tells of a change. */
function useCopies() {
  const { host } = useServices();
  const [found, setFound] = useState<Found | null>(null);
  const [error, setError] = useState<string | null>(null);
  const refresh = useCallback(async () => {
    try {
      const status = await host.mirror.status();
      const projects = status.state === 'off' ? [] : await host.mirror.projects();
      setFound({ status, projects });
      setError(null);
    } catch (cause) {
      setError(inWords(cause));
    }
  }, [host]);
  useEffect(() => {
    // eslint-disable-next-line react-hooks/set-state-in-effect -- the folder lies outside the page
    void refresh();
    return host.mirror.onStatus(() => void refresh());
  }, [host, refresh]);
  return { found, error, refresh };
}
