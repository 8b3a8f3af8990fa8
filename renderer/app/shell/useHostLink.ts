import { useEffect } from 'react';
import type { RecentProject } from '../../host';
import { useToast } from '../../parts';
import type { Store } from '../../store';
import { useCommandRegistry } from '../commands';
import { useRouter } from '../router/RouterContext';
import { type History, useServices, useStored } from '../services';
import { useProjectState } from '../session/ProjectSession';

/** Answers the menu of the window and tells it what is possible. */
export function useHostLink(history: History): void {
  const { host } = useServices();
  const registry = useCommandRegistry();
  const toast = useToast();
  const { go } = useRouter();
  const project = useProjectState();
  const projectOpen = project.state === 'open';

  useEffect(
    () =>
      host.onCommand((command) => {
        if (command.id === 'open-project') {
          go({ view: 'candidates', project: command.projectId });
          return;
        }
        const known = registry.find(command.id);
        if (known && !known.disabled) known.run();
        else
          toast({
            message: known ? `“${known.label}” needs an open project.` : 'That is not possible here.',
          });
      }),
    [host, registry, toast, go],
  );

  const { undoLabel, redoLabel } = history;
  const { value: recent = none } = useStored(recentProjects, projectsOnly);
  useEffect(() => {
    host.setMenuState({ projectOpen, undo: undoLabel, redo: redoLabel, recent }).catch(() => undefined);
  }, [host, projectOpen, undoLabel, redoLabel, recent]);
}

const none: readonly RecentProject[] = [];
const projectsOnly = ['projects'] as const;
/** A menu that one reads at a glance. */
const mostRecent = 8;

/** Projects by the time of their last change. */
async function recentProjects(store: Store): Promise<readonly RecentProject[]> {
  const projects = await store.projects.list();
  return projects.slice(0, mostRecent).map(({ id, name }) => ({ projectId: id, name }));
}
