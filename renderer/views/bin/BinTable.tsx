import { complexFormula } from '../../../core/library/complexFormula';
import { defaultLibrary } from '../../../core/library/parameterLibrary';
import { minuteOf, useAction, useStore } from '../../app/services';
import { Formula } from '../../parts';
import { type BinContent } from '../../store';

/** What lies in the bin, latest first, each with its way back. */
export function BinTable({ content }: { readonly content: BinContent }) {
  const store = useStore();
  const act = useAction();
  return (
    <table className="plain-table">
      <thead>
        <tr>
          <th scope="col">Deleted</th>
          <th scope="col">What</th>
          <th scope="col">From</th>
          <th scope="col">
            <span className="visually-hidden">Bring back</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {content.projects.map((project) => (
          <tr key={project.id}>
            <td>{minuteOf(project.deletedAt!)}</td>
            <td>Project “{project.name}”</td>
            <td>–</td>
            <td>
              <button
                type="button"
                onClick={() => void act(() => store.projects.restore(project.id))}
                aria-label={`Bring back the project ${project.name}`}
              >
                Bring back
              </button>
            </td>
          </tr>
        ))}
        {content.candidates.map((candidate) => (
          <tr key={candidate.id}>
            <td>{minuteOf(candidate.deletedAt!)}</td>
            <td>
              <Formula formula={complexFormula(candidate.composition, defaultLibrary)} /> {candidate.name}
            </td>
            <td>{candidate.projectName}</td>
            <td>
              <button
                type="button"
                onClick={() => void act(() => store.candidates.restore(candidate.projectId, [candidate.id]))}
                aria-label={`Bring back ${complexFormula(candidate.composition, defaultLibrary)}`}
              >
                Bring back
              </button>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
