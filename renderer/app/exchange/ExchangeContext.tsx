import { createContext, use, useCallback, useEffect, useMemo, useState, type ReactNode } from 'react';
import { useToast } from '../../parts';
import type { OpenedFile, SnapshotReason } from '../../host';
import { bringIn, bringInAsCopy, exportProject, fileNameFor } from '../../store';
import { useRouter } from '../router/RouterContext';
import { useAction, useServices } from '../services';
import { ImportPreview } from './ImportPreview';
import { type ImportOffer, readImport } from './readImport';
import { snapshotBefore } from './snapshotBefore';

interface Exchange {
  /** Writes the whole project to a file that the user chooses. */
  readonly exportProject: (projectId: string) => void;
  /** Asks for a file, shows what it would change, and takes it when told to. */
  readonly importProject: () => void;
  /** Shows what a bundle from elsewhere (a snapshot) would change, and takes it when told to. */
  readonly offerBundle: (file: NamedBytes, reason: SnapshotReason) => void;
}
type NamedBytes = Pick<OpenedFile, 'name' | 'bytes'>;

const ExchangeContext = createContext<Exchange>({
  exportProject: () => undefined,
  importProject: () => undefined,
  offerBundle: () => undefined,
});
export const useExchange = (): Exchange => use(ExchangeContext);

export function ExchangeProvider({ children }: { readonly children: ReactNode }) {
  const { store, host } = useServices();
  const act = useAction();
  const toast = useToast();
  const { go } = useRouter();
  const [offer, setOffer] = useState<ImportOffer | null>(null);

  const exporting = useCallback(
    (projectId: string) =>
      void act(async () => {
        const project = await store.projects.get(projectId);
        const data = await exportProject(store.db, projectId);
        const suggestedName = fileNameFor(project?.name ?? 'project', store.clock.now());
        const answer = await host.saveFile({ kind: 'bundle', suggestedName, data });
        if (answer.saved) toast({ message: `Exported as ${answer.name}` });
      }),
    [act, store, host, toast],
  );

  const [reason, setReason] = useState<SnapshotReason>('before-import');
  const look = useCallback(
    (file: NamedBytes, why: SnapshotReason = 'before-import') =>
      void act(async () => {
        setReason(why);
        setOffer(await readImport(store, file));
      }),
    [act, store],
  );
  useEffect(() => host.onFileOpened((file) => look(file)), [host, look]);
  const importing = useCallback(
    () =>
      void act(async () => {
        const [file] = await host.openFiles({ kind: 'bundle' });
        if (file) look(file);
      }),
    [act, host, look],
  );

  const take = useCallback(
    (how: 'in-place' | 'copy') => {
      const plan = offer?.plan;
      if (!plan) return;
      setOffer(null);
      void act(async () => {
        if (plan.known && how === 'in-place') {
          await snapshotBefore(host, store, { id: plan.projectId, name: plan.projectName }, reason);
        }
        const projectId =
          how === 'copy'
            ? await bringInAsCopy(store.journal, plan, store.clock.newId)
            : await bringIn(store.journal, plan);
        toast({
          message: `Imported “${plan.projectName}”`,
          undo: () => void act(() => store.journal.undo(projectId)),
        });
        go({ view: 'candidates', project: projectId });
      });
    },
    [offer, reason, act, host, store, toast, go],
  );

  const value = useMemo(
    () => ({ exportProject: exporting, importProject: importing, offerBundle: look }),
    [exporting, importing, look],
  );
  return (
    <ExchangeContext value={value}>
      {children}
      <ImportPreview offer={offer} onTake={take} onClose={() => setOffer(null)} />
    </ExchangeContext>
  );
}
