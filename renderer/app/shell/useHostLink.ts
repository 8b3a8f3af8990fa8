import { useEffect } from 'react';
import { useToast } from '../../parts';
import { useCommandRegistry } from '../commands';
import { useRouter } from '../router/RouterContext';
import { type History, useServices } from '../services';
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
  useEffect(() => {
    host.setMenuState({ projectOpen, undo: undoLabel, redo: redoLabel, recent: [] }).catch(() => undefined);
  }, [host, projectOpen, undoLabel, redoLabel]);
}
