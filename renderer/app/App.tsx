import { useEffect, useMemo, type ReactNode } from 'react';
import { ToastProvider, UnitProvider, useToast } from '../parts';
import type { Settings } from '../store';
import { CommandProvider } from './commands';
import { ExchangeProvider } from './exchange/ExchangeContext';
import { FigureFiles } from './exchange/FigureFiles';
import { ProjectMirror } from './mirror/projectMirror';
import { RouterProvider, useRouter } from './router/RouterContext';
import { type Services, ServicesProvider, SettingsProvider, useServices, useSettings } from './services';
import { ProjectProvider } from './session/ProjectSession';
import { Frame } from './shell/Frame';
import type { ViewDefinition } from './view';

interface AppProps {
  readonly services: Services;
  readonly settings: Settings;
  readonly views: readonly ViewDefinition[];
  /** Something that happened before the first view was drawn. */
  readonly notice: string | null;
}

export function App({ services, settings, views, notice }: AppProps) {
  return (
    <ServicesProvider value={services}>
      <ToastProvider>
        <StartNotice notice={notice} />
        <SettingsProvider initial={settings}>
          <RouterProvider>
            <Chosen>
              <ExchangeProvider>
                <FigureFiles>
                  <Frame views={views} />
                </FigureFiles>
              </ExchangeProvider>
            </Chosen>
          </RouterProvider>
        </SettingsProvider>
      </ToastProvider>
    </ServicesProvider>
  );
}

function StartNotice({ notice }: { readonly notice: string | null }) {
  const toast = useToast();
  useEffect(() => {
    if (notice !== null) toast({ message: notice });
  }, [toast, notice]);
  return null;
}

/** What follows from the settings and the address. */
function Chosen({ children }: { readonly children: ReactNode }) {
  const { settings, set } = useSettings();
  const { address } = useRouter();
  // A project stays open while one looks something up in the library.
  const projectId = address.view === 'start' ? null : (address.project ?? settings.lastProject);
  useEffect(() => {
    if (address.project !== null && address.project !== settings.lastProject)
      set('lastProject', address.project);
  }, [address.project, settings.lastProject, set]);
  useMirror();
  return (
    <CommandProvider singleKeys={settings.singleKeys}>
      <UnitProvider unit={settings.energyUnit} onChange={(unit) => set('energyUnit', unit)}>
        <ProjectProvider projectId={projectId}>{children}</ProjectProvider>
      </UnitProvider>
    </CommandProvider>
  );
}

function useMirror(): void {
  const { store, host } = useServices();
  const mirror = useMemo(() => new ProjectMirror(store, host), [store, host]);
  useEffect(() => {
    // What the folder says about itself is shown in the settings.
    void mirror.catchUp().catch(() => undefined);
    const stop = host.onFlush(async () => {
      await mirror.flush();
      return { state: 'saved' };
    });
    return () => {
      stop();
      mirror.dispose();
    };
  }, [mirror, host]);
}
