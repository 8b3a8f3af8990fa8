import type { ParameterLibrary } from '../../../../core/library/parameterLibrary';
import { Formula } from '../../../parts';
import type { Draft } from '../draft';
import { ligandLabel } from './ligandLabel';

interface PlaceMeterProps {
  readonly ligands: Draft['ligands'];
  readonly places: number;
  readonly library: ParameterLibrary;
}

/** Coordination places and what fills them; a chelate spans as many as it has donors. */
export function PlaceMeter({ ligands, places, library }: PlaceMeterProps) {
  const pieces = Object.entries(ligands).flatMap(([id, count]) => {
    const ligand = library.ligands.get(id);
    return Array.from({ length: count }, () => ({
      name: ligand ? ligandLabel(ligand) : id,
      size: ligand?.denticity ?? 1,
    }));
  });
  const taken = pieces.reduce((sum, { size }) => sum + size, 0);
  const free = Math.max(0, places - taken);
  const words =
    taken === places
      ? `All ${places} places are filled.`
      : taken < places
        ? `${taken} of ${places} places filled, ${free} free.`
        : `${taken} places filled, but there are only ${places}: ${taken - places} too many.`;
  return (
    <div className="place-meter" data-state={taken === places ? 'full' : taken > places ? 'over' : 'free'}>
      <div className="place-meter-places" aria-hidden="true">
        {pieces.map(({ name, size }, index) => (
          <span key={index} className="place-taken" style={{ flexGrow: size }}>
            <Formula formula={name} />
          </span>
        ))}
        {Array.from({ length: free }, (_, index) => (
          <span key={`free-${index}`} className="place-free" style={{ flexGrow: 1 }} />
        ))}
      </div>
      <p role="status">{words}</p>
    </div>
  );
}
