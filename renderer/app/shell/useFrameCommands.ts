import { useMemo } from 'react';
import { type Command, menuCommand, useCommands } from '../commands';
import { useExchange } from '../exchange/ExchangeContext';
import { useRouter } from '../router/RouterContext';
import { type History, useServices, useTheme } from '../services';
import { useProjectState } from '../session/ProjectSession';
import type { Host } from '../../host';
import type { ViewDefinition } from '../view';

interface FrameActions {
  readonly history: History;
  readonly find: () => void;
  readonly shortcuts: () => void;
}

const savePdf = (host: Host): Promise<unknown> =>
  host.printToPdf({
    suggestedName: `${document.title.replace(/[^\p{L}\p{N} -]/gu, '').trim() || 'page'}.pdf`,
    pageSize: 'A4',
    landscape: false,
  });

/** Commands that are on offer whatever view is on screen. */
export function useFrameCommands(views: readonly ViewDefinition[], actions: FrameActions): void {
  const { host } = useServices();
  const { go } = useRouter();
  const { choose } = useTheme();
  const exchange = useExchange();
  const project = useProjectState();
  const projectId = project.state === 'open' ? project.session.project.id : null;
  const { history, find, shortcuts } = actions;

  const navigation = useMemo(
    () =>
      views
        .filter((view) => view.order !== null || view.command !== undefined)
        .map((view): Command => {
          const needsProject = view.place === 'project';
          const run = (): void => go({ view: view.id, project: needsProject ? projectId : null });
          const more = {
            keywords: view.hint,
            disabled: needsProject && projectId === null,
            ...(view.keys === undefined ? {} : { keys: [view.keys] }),
          };
          return view.command === undefined
            ? { id: `show-${view.id}`, label: view.title, group: 'Go to', run, ...more }
            : menuCommand(view.command, run, more);
        }),
    [views, go, projectId],
  );

  const general = useMemo((): readonly Command[] => {
    const needsProject = { disabled: projectId === null };
    return [
      menuCommand('find', find, { whileTyping: true, keys: ['/'] }),
      menuCommand('show-shortcuts', shortcuts, { keys: ['?'] }),
      menuCommand('undo', history.undo, {
        disabled: history.undoLabel === null,
        ...(history.undoLabel === null ? {} : { label: `Undo: ${history.undoLabel}` }),
      }),
      menuCommand('redo', history.redo, {
        disabled: history.redoLabel === null,
        keys: ['Mod+Y'],
        ...(history.redoLabel === null ? {} : { label: `Redo: ${history.redoLabel}` }),
      }),
      menuCommand('import-project', exchange.importProject),
      menuCommand(
        'export-project',
        () => projectId !== null && exchange.exportProject(projectId),
        needsProject,
      ),
      menuCommand('add-measurement', () => go({ view: 'record', project: projectId }), needsProject),
      menuCommand('print', () => void host.print()),
      menuCommand('print-to-pdf', () => void (host.info.abilities.pdf ? savePdf(host) : host.print())),
      menuCommand('choose-mirror-folder', () => void host.mirror.chooseFolder(), {
        disabled: !host.info.abilities.chooseMirrorFolder,
      }),
      ...(['system', 'light', 'dark'] as const).map((theme) =>
        menuCommand(`theme-${theme}`, () => choose(theme)),
      ),
    ];
  }, [find, shortcuts, history, exchange, projectId, host, choose, go]);

  useCommands(navigation);
  useCommands(general);
}
