import { complexFormula } from '../../../../core/library/complexFormula';
import { cautionsFor } from '../../../../core/library/cautions';
import type { Candidate, FrozenPrediction } from '../../../../core/record/project';
import { currentContent } from '../../../../core/record/revisions';
import { dayOf, minuteOf } from '../../../app/services';
import { useProject } from '../../../app/session/ProjectSession';
import { useLibrary } from '../../../app/session/useLibrary';
import {
  EmptyState,
  ErrorPanel,
  formatFigures,
  Formula,
  MeasuredNumber,
  NumberWithRange,
  TermSymbol,
} from '../../../parts';
import { linkTo } from '../../../app/router/RouterContext';
import { shareText } from '../../agreement/figureText';
import { agreementOf, type BandPair } from '../../agreement/recordPairs';
import { useRecordPairs } from '../../agreement/useRecordPairs';
import { contentText } from '../../record/contentText';
import { Paper, setsOf, type MadeWith, type SheetOfPaper } from '../paper/Paper';

interface RecordPageProps {
  readonly candidate: Candidate;
  readonly sheet: SheetOfPaper;
}

/** What a frozen prediction was made with; older ones may not name their set. */
export function madeWithOf({ parameterHash, modelVersion, prediction }: FrozenPrediction): MadeWith {
  const named = (prediction as { madeWith?: { parameterSet?: unknown } }).madeWith?.parameterSet;
  return { parameterSet: typeof named === 'string' ? named : 'not named', parameterHash, modelVersion };
}

/** What was expected of a complex and what was found, on one page. */
export function RecordPage({ candidate, sheet }: RecordPageProps) {
  const { project } = useProject();
  const library = useLibrary();
  const { value, error } = useRecordPairs();
  if (error !== null)
    return (
      <ErrorPanel
        title="The record cannot be read"
        problems={[{ code: 'integrity', field: '', message: error }]}
      />
    );
  if (!value) return <p className="soft">Opening…</p>;
  const mine = ({ candidateId }: { candidateId: string }): boolean => candidateId === candidate.id;
  const measurements = value.measurements.filter(mine);
  const pairs = value.pairs.filter(mine);
  const frozen = [...value.frozen.values()].filter(
    (each) => mine(each) && measurements.some(({ frozenPredictionId }) => frozenPredictionId === each.id),
  );
  const formula = complexFormula(candidate.composition, library);
  if (measurements.length === 0)
    return (
      <EmptyState
        title="Nothing measured yet"
        actions={
          <a className="button" href={linkTo({ view: 'record', project: project.id, item: candidate.id })}>
            To its lab record
          </a>
        }
      >
        A record page shows what was measured on <Formula formula={formula} /> beside what was expected.
      </EmptyState>
    );
  const agreement = agreementOf(pairs);
  return (
    <Paper
      {...sheet}
      kind="Record page"
      title={<Formula formula={formula} />}
      about={
        <>
          {[candidate.composition.geometry.replaceAll('-', ' '), candidate.composition.isomer]
            .filter(Boolean)
            .join(', ')}
          <br />
          {project.name}
        </>
      }
      madeWith={setsOf(frozen.map(madeWithOf))}
      cautions={cautionsFor(candidate.composition, candidate.counterIon, library)}
      reading="Predicted: 68 % range in brackets, as it stood when it was frozen. Measured: ± standard uncertainty where somebody stated one."
    >
      <h2>Expected</h2>
      {frozen.length === 0 && <p>No prediction stood when these were measured.</p>}
      {frozen.map((each) => (
        <ExpectedLine key={each.id} frozen={each} />
      ))}
      <h2>Measured</h2>
      <table>
        <thead>
          <tr>
            <th scope="col">What</th>
            <th scope="col">Conditions</th>
            <th scope="col">By</th>
          </tr>
        </thead>
        <tbody>
          {measurements.slice(0, 12).map((measurement) => {
            const content = currentContent(measurement);
            const { date, operator, solvent, temperature_K, concentration_mM, path_cm, instrument } =
              content.conditions;
            const revisions = measurement.revisions.length - 1;
            const around = [
              solvent,
              temperature_K && `${temperature_K.value} K`,
              concentration_mM && `${concentration_mM.value} mM`,
              path_cm && `${path_cm.value} cm`,
              instrument,
            ].filter(Boolean);
            return (
              <tr key={measurement.id}>
                <th scope="row">{contentText(content)}</th>
                <td>{around.join(', ') || 'not written down'}</td>
                <td>
                  {[operator, date && dayOf(date)].filter(Boolean).join(', ') || 'not written down'}
                  {revisions > 0 && `; corrected ${revisions}×`}
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
      {measurements.length > 12 && <p>{measurements.length - 12} more stand in the record.</p>}
      <h2>Expected beside found</h2>
      {pairs.length === 0 ? <p>No measured band has a partner yet.</p> : <PairLines pairs={pairs} />}
      {agreement && (
        <p>
          Mean absolute error {formatFigures(agreement.errors.meanAbsolute, 3)} cm⁻¹ over {agreement.errors.n}
          ; inside the 68 % range {shareText(agreement.within68)}.
        </p>
      )}
      <h2>Remarks</h2>
      <p className="paper-lines" />
    </Paper>
  );
}

function ExpectedLine({ frozen }: { readonly frozen: FrozenPrediction }) {
  const { tenDq, spin } = frozen.prediction as {
    readonly tenDq?: { readonly value: number | null; readonly sigma: number | null };
    readonly spin?: { readonly words?: string };
  };
  return (
    <p>
      Frozen {minuteOf(frozen.frozenAt)} ({frozen.reason})
      {tenDq && (
        <>
          : 10Dq <NumberWithRange kind="interval" value={tenDq.value} sigma={tenDq.sigma} />
        </>
      )}
      {spin?.words !== undefined && `, ${spin.words}`}
    </p>
  );
}

const whyNot = (pair: BandPair): string =>
  [
    pair.predicted === null && 'no partner',
    pair.feature === 'shoulder' && 'shoulder',
    pair.frozenAfterwards && 'measured before freezing',
    pair.isInSample && 'in-sample',
  ]
    .filter(Boolean)
    .join(', ') || 'yes';

function PairLines({ pairs }: { readonly pairs: readonly BandPair[] }) {
  return (
    <table>
      <thead>
        <tr>
          <th scope="col">Band</th>
          <th scope="col">Expected</th>
          <th scope="col">Found</th>
          <th scope="col">Found − expected / cm⁻¹</th>
          <th scope="col">In standard deviations</th>
          <th scope="col">Counts</th>
        </tr>
      </thead>
      <tbody>
        {pairs.slice(0, 14).map((pair) => (
          <tr key={pair.id}>
            <th scope="row">
              {pair.predicted ? <TermSymbol label={pair.predicted.label} /> : 'not assigned'}
            </th>
            <td>
              {pair.predicted ? (
                <NumberWithRange value={pair.predicted.energy_cm1} sigma={pair.predicted.sigma_cm1} />
              ) : (
                '–'
              )}
            </td>
            <td>
              <MeasuredNumber value={pair.measured} u={pair.u} />
            </td>
            <td className="figures">{pair.residual === null ? '–' : formatFigures(pair.residual, 2)}</td>
            <td className="figures">{pair.score === null ? '–' : formatFigures(pair.score, 2)}</td>
            <td>{whyNot(pair)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
