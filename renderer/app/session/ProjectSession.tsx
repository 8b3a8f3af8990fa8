import { createContext, use, useCallback, useEffect, useMemo, type ReactNode } from 'react';
import type { ParameterSet, Project } from '../../../core/record/project';
import type { Store } from '../../store';
import { madeWithName } from '../../workers/madeWith';
import type { Overlay } from '../../workers/protocol';
import { useServices, useSettings, useStored } from '../services';
import { CandidateRows } from './candidateRows';
import { Estimates } from './estimates';
import type { Conditions } from './candidateInput';

/** The open project with everything that its views share. */
export interface ProjectSession {
  readonly project: Project;
  readonly rows: CandidateRows;
  readonly estimates: Estimates;
  /** Parameter set laid over the library; null for the library as it is. */
  readonly parameterSet: ParameterSet | null;
  readonly overlay: Overlay;
  /** Conditions that hold where a candidate names none. */
  readonly conditions: Conditions;
}

export type ProjectState =
  | { readonly state: 'none' }
  | { readonly state: 'reading' }
  | { readonly state: 'missing' }
  | { readonly state: 'failed'; readonly message: string }
  | { readonly state: 'open'; readonly session: ProjectSession };

const ProjectContext = createContext<ProjectState>({ state: 'none' });
export const useProjectState = (): ProjectState => use(ProjectContext);

/** For views inside a project: the frame draws them only once the project is open. */
export function useProject(): ProjectSession {
  const state = use(ProjectContext);
  if (state.state !== 'open') throw new Error('no project is open');
  return state.session;
}

interface Found {
  readonly project: Project | undefined;
  readonly parameterSet: ParameterSet | null;
}

async function find(store: Store, projectId: string): Promise<Found> {
  const project = await store.projects.get(projectId);
  const setId = project?.parameterSetId ?? null;
  const set = setId === null ? undefined : await store.parameterSets.get(setId);
  return { project: project?.deletedAt === null ? project : undefined, parameterSet: set ?? null };
}

const shared = ['projects', 'parameterSets'] as const;

/** Opens a project and keeps it open until another one is asked for. */
export function ProjectProvider({
  projectId,
  children,
}: {
  readonly projectId: string | null;
  readonly children: ReactNode;
}) {
  const ask = useCallback(
    async (store: Store): Promise<Found | null> => (projectId === null ? null : find(store, projectId)),
    [projectId],
  );
  const { value: found, error } = useStored(ask, shared);
  const live = useLive(found?.project?.id ?? null, found?.parameterSet ?? null);

  const state = useMemo((): ProjectState => {
    if (projectId === null) return { state: 'none' };
    if (error !== null) return { state: 'failed', message: error };
    if (!found) return { state: 'reading' };
    if (!found.project) return { state: 'missing' };
    if (!live || live.rows.projectId !== found.project.id) return { state: 'reading' };
    return { state: 'open', session: { ...live, project: found.project } };
  }, [projectId, found, error, live]);
  return <ProjectContext value={state}>{children}</ProjectContext>;
}

/** The parts of a session that live and die: rows with the project, estimates with the parameters and conditions. */
function useLive(
  projectId: string | null,
  parameterSet: ParameterSet | null,
): Omit<ProjectSession, 'project'> | null {
  const { store, pool } = useServices();
  const { settings } = useSettings();
  const { concentration_mM, path_cm } = settings;
  const setKey = parameterSet?.hash ?? null;
  // The row object is new after each read; its content is told by the hash.
  // eslint-disable-next-line react-hooks/exhaustive-deps
  const set = useMemo(() => parameterSet, [setKey]);

  const live = useMemo(() => {
    if (projectId === null) return null;
    const conditions = { concentration_mM, path_cm };
    const overlay = set === null ? null : { name: set.name, values: set.values };
    const madeWith = madeWithName(overlay);
    const estimates = new Estimates({ pool, cache: store.estimates, conditions, overlay, madeWith });
    const rows = new CandidateRows(store, projectId, (candidates) => estimates.want(candidates));
    return { rows, estimates, parameterSet: set, overlay, conditions };
  }, [store, pool, projectId, set, concentration_mM, path_cm]);

  useEffect(() => {
    if (live === null) return;
    const stop = live.rows.start();
    return () => {
      stop();
      live.estimates.stop();
    };
  }, [live]);
  return live;
}
