import { useCallback, useMemo, useState } from 'react';
import { menuCommand, useCommands } from '../../app/commands';
import { useExchange } from '../../app/exchange/ExchangeContext';
import { useStored } from '../../app/services';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel } from '../../parts';
import type { Store } from '../../store';
import { TourOffer } from '../../app/tour/Tour';
import { NewProjectDialog } from './NewProjectDialog';
import { ProjectList } from './ProjectList';

const listing = (store: Store) => store.projects.listWithCounts();

export default function StartView() {
  const { value: projects, error } = useStored(listing, ['projects', 'candidates']);
  const { importProject } = useExchange();
  const [creating, setCreating] = useState(false);
  const create = useCallback(() => setCreating(true), []);
  useCommands(useMemo(() => [menuCommand('new-project', create, { keys: ['n'] })], [create]));

  const actions = (
    <>
      <button type="button" onClick={importProject}>
        Import a project…
      </button>
      <button type="button" className="button-main" onClick={create}>
        New project…
      </button>
    </>
  );
  return (
    <>
      <ViewHeader
        title="Projects"
        summary="A project holds the complexes you weigh against each other, and what you measured on them."
        actions={actions}
      />
      <TourOffer />
      {error !== null && (
        <ErrorPanel
          title="The list of projects cannot be read"
          problems={[{ code: 'integrity', field: '', message: error }]}
        />
      )}
      {projects?.length === 0 && (
        <EmptyState title="No project yet" actions={actions}>
          Begin with a question: “which of these would absorb 540 to 580 nm?” Give it a name, then enter the
          complexes you could make. Or import a project that somebody exported.
        </EmptyState>
      )}
      {projects !== undefined && projects.length > 0 && <ProjectList projects={projects} />}
      <NewProjectDialog open={creating} onClose={() => setCreating(false)} />
    </>
  );
}
