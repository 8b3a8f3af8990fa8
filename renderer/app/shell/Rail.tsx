import type { Address } from '../router/address';
import { useRouter, linkTo } from '../router/RouterContext';
import { useProjectState } from '../session/ProjectSession';
import type { ViewDefinition } from '../view';
import './Rail.css';

interface RailProps {
  readonly views: readonly ViewDefinition[];
}

const inOrder = (
  views: readonly ViewDefinition[],
  place: ViewDefinition['place'],
): readonly ViewDefinition[] =>
  views
    .filter((view) => view.place === place && view.order !== null)
    .sort((one, other) => one.order! - other.order!);

/** The tasks within the project, then those of the workbench. */
export function Rail({ views }: RailProps) {
  const project = useProjectState();
  const projectId = project.state === 'open' ? project.session.project.id : null;
  return (
    <nav className="rail" aria-label="Tasks">
      {projectId !== null && (
        <RailGroup title="Project" views={inOrder(views, 'project')} projectId={projectId} all={views} />
      )}
      <RailGroup title="Workbench" views={inOrder(views, 'workbench')} projectId={null} all={views} />
    </nav>
  );
}

function markedView(views: readonly ViewDefinition[], { view, item }: Address): string {
  const shown = views.find(({ id }) => id === view);
  return shown?.under !== undefined && (item !== null || shown.order === null) ? shown.under : view;
}

interface RailGroupProps extends RailProps {
  /** With those that have no entry of their own. */
  readonly all: readonly ViewDefinition[];
  readonly title: string;
  readonly projectId: string | null;
}

function RailGroup({ title, views, all, projectId }: RailGroupProps) {
  const { address } = useRouter();
  const marked = markedView(all, address);
  return (
    <div className="rail-group">
      <h2 className="rail-title">{title}</h2>
      <ul>
        {views.map((view) => {
          const current = view.id === marked;
          return (
            <li key={view.id}>
              <a
                href={linkTo({ view: view.id, project: projectId })}
                aria-current={current ? 'page' : undefined}
                title={view.hint}
              >
                {view.title}
              </a>
            </li>
          );
        })}
      </ul>
    </div>
  );
}
