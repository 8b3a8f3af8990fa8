import { useCallback } from 'react';
import { complexFormula } from '../../../core/library/complexFormula';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { useStored } from '../../app/services';
import { useProject } from '../../app/session/ProjectSession';
import { useLibrary } from '../../app/session/useLibrary';
import { EmptyState, ErrorPanel, Formula } from '../../parts';
import { ParityPlot } from '../../plots';
import type { Store } from '../../store';
import { AgreementFigures } from '../agreement/AgreementFigures';
import { PairTable } from '../agreement/PairTable';
import { countedPairs, pairsOf } from '../agreement/recordPairs';

const shared = ['measurements', 'frozenPredictions'] as const;

/** Agreement over all candidates of the project. */
export function ProjectRecord() {
  const { project, rows } = useProject();
  const { go } = useRouter();
  const library = useLibrary();
  const ask = useCallback(
    async (store: Store) => ({
      measurements: await store.measurements.ofProject(project.id),
      frozen: await store.frozenPredictions.ofProject(project.id),
    }),
    [project.id],
  );
  const { value, error } = useStored(ask, shared);
  if (error !== null)
    return (
      <ErrorPanel
        title="The record cannot be read"
        problems={[{ code: 'integrity', field: '', message: error }]}
      />
    );
  if (!value) return <p className="soft">Opening…</p>;
  const pairs = value.measurements
    // Measurements of a candidate in the bin are in the bin with it.
    .filter(({ candidateId }) => rows.get(candidateId)?.deletedAt === null)
    .flatMap((each) => pairsOf(each, value.frozen.get(each.frozenPredictionId ?? '') ?? null));
  if (pairs.length === 0)
    return (
      <EmptyState title="No pair yet">
        Choose a candidate above and add a measured band: it is held against the prediction frozen before.
      </EmptyState>
    );
  const nameOf = (id: string): string => complexFormula(rows.get(id)!.composition, library);
  const counted = countedPairs(pairs);
  return (
    <section className="panel stack" aria-labelledby="record-whole">
      <h2 id="record-whole">The whole project</h2>
      <AgreementFigures pairs={pairs} />
      {counted.length > 0 && (
        <ParityPlot
          quantity="band position"
          pairs={counted.map(({ id, candidateId, predicted, measured, u }) => ({
            id,
            name: `${nameOf(candidateId)} ${predicted.label}`,
            predicted: predicted.energy_cm1,
            sigma: predicted.sigma_cm1,
            measured,
            u,
            group: rows.get(candidateId)!.composition.metal,
          }))}
          onOpen={(id) =>
            go({
              view: 'record',
              project: project.id,
              item: pairs.find((pair) => pair.id === id)!.candidateId,
            })
          }
        />
      )}
      <PairTable
        pairs={pairs}
        complexOf={({ candidateId }) => (
          <a href={linkTo({ view: 'record', project: project.id, item: candidateId })}>
            <Formula formula={nameOf(candidateId)} />
          </a>
        )}
      />
    </section>
  );
}
