import type { Project } from '../../../core/record/project';
import { useExchange } from '../../app/exchange/ExchangeContext';
import { linkTo } from '../../app/router/RouterContext';
import { dayOf, useAction, useStore } from '../../app/services';
import { useToast } from '../../parts';
import { counted } from '../../store';
import { ProjectPalette } from './ProjectPalette';
import { ProjectName } from './ProjectName';
import './ProjectList.css';

export interface ListedProject extends Project {
  readonly candidateCount: number;
}

export function ProjectList({ projects }: { readonly projects: readonly ListedProject[] }) {
  return (
    <ul className="project-list">
      {projects.map((project) => (
        <ProjectRow key={project.id} project={project} />
      ))}
    </ul>
  );
}

function ProjectRow({ project }: { readonly project: ListedProject }) {
  const { exportProject } = useExchange();
  const remove = useRemove(project);
  return (
    <li className="project-row">
      <div className="project-row-words">
        <ProjectName project={project} href={linkTo({ view: 'candidates', project: project.id })} />
        {project.notes !== '' && <p className="project-row-notes">{project.notes}</p>}
        <p className="soft small">
          {counted(project.candidateCount, 'candidate')}, changed {dayOf(project.updatedAt)}
        </p>
        <ProjectPalette project={project} />
      </div>
      <div className="project-row-actions">
        <a className="button button-main" href={linkTo({ view: 'candidates', project: project.id })}>
          Open<span className="visually-hidden"> {project.name}</span>
        </a>
        <button type="button" onClick={() => exportProject(project.id)} aria-label={`Export ${project.name}`}>
          Export…
        </button>
        <button type="button" className="button-quiet" onClick={remove} aria-label={`Delete ${project.name}`}>
          Delete
        </button>
      </div>
    </li>
  );
}

function useRemove(project: Project): () => void {
  const store = useStore();
  const act = useAction();
  const toast = useToast();
  return () =>
    void act(async () => {
      await store.projects.remove(project.id);
      toast({
        message: `“${project.name}” is in the bin`,
        undo: () => void act(() => store.journal.undo(project.id)),
      });
    });
}
