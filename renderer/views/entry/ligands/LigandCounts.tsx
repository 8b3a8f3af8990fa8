import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { Formula } from '../../../parts';
import type { Draft } from '../draft';
import { ligandLabel } from './ligandLabel';

interface LigandCountsProps {
  readonly ligands: Draft['ligands'];
  /** Places not yet taken. */
  readonly free: number;
  readonly library: ParameterLibrary;
  readonly onCount: (ligand: string, count: number) => void;
}

export function LigandCounts({ ligands, free, library, onCount }: LigandCountsProps) {
  const entries = Object.entries(ligands);
  if (entries.length === 0)
    return <p className="soft">None yet. Choose one below; each click adds one more.</p>;
  return (
    <ul className="ligand-counts">
      {entries.map(([id, count]) => {
        const ligand = library.ligands.get(id);
        const name = ligand ? ligandLabel(ligand) : id;
        const size = ligand?.denticity ?? 1;
        const more = Math.floor(free / size);
        return (
          <li key={id}>
            <button type="button" onClick={() => onCount(id, count - 1)} aria-label={`One ${name} less`}>
              −
            </button>
            <output aria-label={`Number of ${name}`}>{count}</output>
            <button type="button" onClick={() => onCount(id, count + 1)} aria-label={`One ${name} more`}>
              +
            </button>
            <span className="ligand-name">
              <strong>
                <Formula formula={name} />
              </strong>{' '}
              <span className="soft">{ligand?.commonName ?? 'not in the library'}</span>
            </span>
            {more > 0 && (
              <button type="button" className="button-quiet" onClick={() => onCount(id, count + more)}>
                fill up with {more} more
              </button>
            )}
            <button
              type="button"
              className="button-quiet"
              onClick={() => onCount(id, 0)}
              aria-label={`Take out ${name}`}
            >
              ✕
            </button>
          </li>
        );
      })}
    </ul>
  );
}
