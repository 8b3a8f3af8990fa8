import { useMemo } from 'react';
import { linkTo, useRouter } from '../../app/router/RouterContext';
import { inputOf } from '../../app/session/candidateInput';
import { useVersion } from '../../app/session/observable';
import { useProject } from '../../app/session/ProjectSession';
import { usePrediction } from '../../app/session/usePrediction';
import { ViewHeader } from '../../app/shell/ViewHeader';
import { EmptyState, ErrorPanel } from '../../parts';
import type { Candidate } from '../../../core/record/project';
import { Sheet } from './Sheet';
import { SheetHeader } from './SheetHeader';
import { useViewing } from './viewing/useViewing';

/** Draws for the cloud of colours: enough for shares in words, asked for after the rest is on screen. */
const draws = 200;

export default function SheetView() {
  const { address } = useRouter();
  const { rows, project } = useProject();
  useVersion(rows);
  const candidate = rows.get(address.item ?? '');
  if (candidate) return <OfCandidate key={candidate.id} candidate={candidate} />;
  if (rows.state === 'reading') return <p className="soft">Opening…</p>;
  return (
    <>
      <ViewHeader title="Not found" />
      <EmptyState
        title="This candidate is not here"
        actions={
          <>
            <a className="button" href={linkTo({ view: 'candidates', project: project.id })}>
              All candidates
            </a>
            <a className="button" href={linkTo({ view: 'bin' })}>
              Look into the bin
            </a>
          </>
        }
      >
        It may have been deleted.
      </EmptyState>
    </>
  );
}

function OfCandidate({ candidate }: { readonly candidate: Candidate }) {
  const { conditions, project } = useProject();
  const input = useMemo(() => inputOf(candidate, conditions), [candidate, conditions]);
  const { counterIon } = candidate;
  const strength = useMemo(
    () => ({
      concentration_mM: candidate.concentration_mM ?? conditions.concentration_mM,
      path_cm: candidate.path_cm ?? conditions.path_cm,
    }),
    [candidate, conditions],
  );
  const { viewing, change, reset, keep } = useViewing(candidate, strength);
  const { concentration_mM, path_cm, temperature_K, illuminant, observer } = viewing;
  const looked = { ...input, concentration_mM, path_cm };
  const light = { counterIon, temperature_K, illuminant, observer };
  // What is frozen is the candidate at its own strength, however the sheet happens to look at it.
  const plain = usePrediction(input, { counterIon });
  const asked = usePrediction(looked, light);
  const withDraws = usePrediction(looked, { ...light, draws });
  const { outcome, error } = asked;
  const prediction = outcome?.ok ? outcome.prediction : null;
  const drawn = withDraws.outcome?.ok ? withDraws.outcome.prediction.cloud : undefined;
  return (
    <>
      <SheetHeader candidate={candidate} prediction={plain.outcome?.ok ? plain.outcome.prediction : null} />
      {error !== null && (
        <ErrorPanel
          title="No estimate"
          problems={[
            { code: 'not-estimated', field: '', message: error, remedy: 'Reload the window and try again.' },
          ]}
        />
      )}
      {outcome !== null && !outcome.ok && (
        <ErrorPanel problems={outcome.problems} title="This candidate cannot be estimated as it stands">
          <a className="button" href={linkTo({ view: 'entry', project: project.id, item: candidate.id })}>
            Correct it
          </a>
        </ErrorPanel>
      )}
      {outcome === null && error === null && <p className="soft">Estimating…</p>}
      {prediction && (
        <Sheet
          candidate={candidate}
          prediction={prediction}
          cloud={drawn}
          viewing={viewing}
          onViewing={change}
          onReset={reset}
          onKeep={keep}
        />
      )}
    </>
  );
}
