import { useEffect, useMemo, useState } from 'react';
import type { CubicGeometry } from '../../../core/dshell/types';
import type { Prediction } from '../../../core/prediction/types';
import { useServices } from '../../app/services';
import { LevelDiagram, type LevelLine } from '../../plots';
import type { DiagramRequest } from '../../workers/protocol';

type Axes = DiagramRequest['axes'];

/** The diagram shows the field from nothing to well beyond the complex, and beyond the change of spin. */
function requestFor(prediction: Prediction, axes: Axes): DiagramRequest | null {
  const { dElectrons, tenDq, racahB, racahC, composition, levels, spin } = prediction;
  if (levels.length === 0 || tenDq.value === null) return null;
  const B = racahB.value ?? 0;
  const crossover = (spin.crossoverTenDqOverB ?? 0) * B;
  const geometry: CubicGeometry = composition.geometry === 'tetrahedral' ? 'tetrahedral' : 'octahedral';
  const upTo = Math.ceil(Math.max(1.5 * tenDq.value, 1.3 * crossover) / 1000) * 1000;
  return { dElectrons, geometry, B, C: racahC.value ?? 0, upTo, axes };
}

function useLines(request: DiagramRequest | null): readonly LevelLine[] | null {
  const { pool } = useServices();
  const [answer, setAnswer] = useState<{ request: DiagramRequest; lines: readonly LevelLine[] } | null>(null);
  useEffect(() => {
    if (request === null) return;
    const stop = new AbortController();
    pool.diagram(request, stop.signal).then(
      (lines) => setAnswer({ request, lines }),
      () => undefined,
    );
    return () => stop.abort();
  }, [pool, request]);
  return answer !== null && answer.request === request ? answer.lines : null;
}

/** Level energies against the field with the place of the complex. */
export function LevelPanel({ prediction }: { readonly prediction: Prediction }) {
  const [axes, setAxes] = useState<Axes>('absolute');
  const canDivide = (prediction.racahB.value ?? 0) > 0;
  const request = useMemo(() => requestFor(prediction, axes), [prediction, axes]);
  const lines = useLines(request);
  const B = prediction.racahB.value ?? 1;
  const scale = axes === 'over-B' ? 1 / B : 1;
  const { value, sigma } = prediction.tenDq;
  return (
    <section className="panel sheet-wide" aria-label="Level diagram">
      {request === null ? (
        <>
          <h2>Level diagram</h2>
          <p className="soft">
            Drawn for d<sup>1</sup> to d<sup>9</sup> in octahedral and tetrahedral fields whose parameters
            could be estimated.
          </p>
        </>
      ) : (
        <>
          {canDivide && (
            <label className="check">
              <input
                type="checkbox"
                checked={axes === 'over-B'}
                onChange={(event) => setAxes(event.currentTarget.checked ? 'over-B' : 'absolute')}
              />
              in units of B
            </label>
          )}
          {lines === null ? (
            <p className="soft">Computing the levels…</p>
          ) : (
            <LevelDiagram
              title={`Levels of d${prediction.dElectrons} in ${request.geometry === 'octahedral' ? 'an octahedral' : 'a tetrahedral'} field`}
              lines={lines}
              axes={axes}
              candidate={
                value === null
                  ? null
                  : {
                      x: value * scale,
                      sigma: sigma === null ? null : sigma * scale,
                      name: prediction.formula,
                    }
              }
              note={`B ${Math.round(request.B)} cm⁻¹, C ${Math.round(request.C)} cm⁻¹; all levels by diagonalising repulsion and field together.`}
            />
          )}
        </>
      )}
    </section>
  );
}
