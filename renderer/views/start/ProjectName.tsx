import { useState } from 'react';
import type { Project } from '../../../core/record/project';
import { useAction, useStore } from '../../app/services';

interface ProjectNameProps {
  readonly project: Project;
  readonly href: string;
}

/** The name as a link, and in its place a field while it is being changed. */
export function ProjectName({ project, href }: ProjectNameProps) {
  const [editing, setEditing] = useState(false);
  if (editing) return <NameField project={project} onDone={() => setEditing(false)} />;
  return (
    <h2 className="project-name">
      <a href={href}>{project.name}</a>
      {project.demo && <span className="badge">demo</span>}
      <button
        type="button"
        className="button-quiet small"
        onClick={() => setEditing(true)}
        aria-label={`Rename ${project.name}`}
      >
        Rename
      </button>
    </h2>
  );
}

function NameField({ project, onDone }: { readonly project: Project; readonly onDone: () => void }) {
  const store = useStore();
  const act = useAction();
  const [name, setName] = useState(project.name);
  const save = (): void => {
    const wanted = name.trim().slice(0, 200);
    if (wanted === '' || wanted === project.name) onDone();
    else {
      const label = `rename “${project.name}” to “${wanted}”`;
      void act(() => store.projects.update(project.id, label, { name: wanted }, project.revision)).then(
        (saved) => saved && onDone(),
      );
    }
  };
  return (
    <input
      className="project-name-field"
      aria-label={`New name for ${project.name}`}
      autoFocus
      maxLength={200}
      value={name}
      onChange={(event) => setName(event.currentTarget.value)}
      onBlur={save}
      onKeyDown={(event) => {
        if (event.key === 'Enter') save();
        if (event.key === 'Escape') onDone();
      }}
    />
  );
}
