import { cautionsFor } from '../../../../core/library/cautions';
import { linkTo } from '../../../app/router/RouterContext';
import { useProject } from '../../../app/session/ProjectSession';
import { useLibrary } from '../../../app/session/useLibrary';
import { EmptyState, ErrorPanel, formatFigures } from '../../../parts';
import { AgreementFigures } from '../../agreement/AgreementFigures';
import { groupName } from '../../agreement/groupings';
import { GroupTable } from '../../agreement/GroupTable';
import { countedPairs, type Counted } from '../../agreement/recordPairs';
import { useRecordPairs } from '../../agreement/useRecordPairs';
import { eachOnce, Paper, setsOf, type SheetOfPaper } from '../paper/Paper';
import { madeWithOf } from './RecordPage';

/** How good the predictions of a project have been, on one page. */
export function AgreementReport({ sheet }: { readonly sheet: SheetOfPaper }) {
  const { project, rows } = useProject();
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
  const { pairs } = value;
  const counted = countedPairs(pairs);
  if (counted.length === 0)
    return (
      <EmptyState
        title="No pair that counts yet"
        actions={
          <a className="button" href={linkTo({ view: 'record', project: project.id })}>
            To the lab record
          </a>
        }
      >
        The report holds measured bands against predictions that were frozen before them.
      </EmptyState>
    );
  const compounds = [...new Set(pairs.map(({ candidateId }) => candidateId))].map(
    (id) => rows.get(id)!.composition,
  );
  const used = new Set(value.measurements.flatMap(({ frozenPredictionId }) => frozenPredictionId ?? []));
  const groupOf = ({ candidateId }: { candidateId: string }): string =>
    groupName(rows.get(candidateId)!.composition, 'metal', library);
  return (
    <Paper
      {...sheet}
      kind="Agreement report"
      title={project.name}
      about={`${compounds.length} complexes, ${value.measurements.length} measurements`}
      madeWith={setsOf([...value.frozen.values()].filter(({ id }) => used.has(id)).map(madeWithOf))}
      cautions={eachOnce(compounds.map((composition) => cautionsFor(composition, null, library)))}
      reading="Each pair is a measured band and the prediction frozen before it. Errors are predicted − measured; intervals of shares after Wilson (1927)."
    >
      <h2>Bands</h2>
      <AgreementFigures pairs={pairs} />
      <h2>By metal</h2>
      <GroupTable pairs={pairs} groupOf={groupOf} />
      <h2>Predicted against measured</h2>
      <PaperParity pairs={counted} />
    </Paper>
  );
}

const side = 300;
const gap = { left: 62, bottom: 40, top: 8, right: 24 };

/** Measured against predicted with the 68 % range of each prediction as a bar; on the line they agree. */
function PaperParity({ pairs }: { readonly pairs: readonly Counted[] }) {
  const values = pairs.flatMap(({ measured, predicted: { energy_cm1, sigma_cm1 } }) => [
    measured,
    energy_cm1 - sigma_cm1,
    energy_cm1 + sigma_cm1,
  ]);
  const low = Math.floor(Math.min(...values) / 5000) * 5000;
  const high = Math.ceil(Math.max(...values) / 5000) * 5000;
  const x = (value: number): number =>
    gap.left + ((value - low) / (high - low)) * (side - gap.left - gap.right);
  const y = (value: number): number =>
    side - gap.bottom - ((value - low) / (high - low)) * (side - gap.bottom - gap.top);
  const every = Math.max(5000, Math.ceil((high - low) / 5 / 5000) * 5000);
  const ticks = Array.from({ length: Math.floor((high - low) / every) + 1 }, (_, i) => low + i * every);
  return (
    <figure className="paper-figure paper-parity">
      <svg
        viewBox={`0 0 ${side} ${side}`}
        role="img"
        aria-label={`${pairs.length} measured bands against their predictions with 68 % ranges`}
        fontSize="9"
      >
        <path
          d={`M${gap.left} ${gap.top}V${side - gap.bottom}H${side - gap.right}`}
          fill="none"
          stroke="#000000"
        />
        <path
          d={`M${x(low)} ${y(low)}L${x(high)} ${y(high)}`}
          stroke="#777777"
          strokeDasharray="4 3"
          fill="none"
        />
        {pairs.map(({ id, measured, predicted: { energy_cm1, sigma_cm1 } }) => (
          <g key={id} stroke="#000000" strokeWidth="0.8">
            <path d={`M${x(energy_cm1 - sigma_cm1)} ${y(measured)}H${x(energy_cm1 + sigma_cm1)}`} />
            <circle cx={x(energy_cm1)} cy={y(measured)} r="2.4" fill="#ffffff" />
          </g>
        ))}
        {ticks.map((tick) => (
          <g key={tick}>
            <text x={x(tick)} y={side - gap.bottom + 13} textAnchor="middle">
              {formatFigures(tick, 3)}
            </text>
            <text x={gap.left - 5} y={y(tick) + 3} textAnchor="end">
              {formatFigures(tick, 3)}
            </text>
          </g>
        ))}
        <text x={(gap.left + side) / 2} y={side - 8} textAnchor="middle">
          predicted / cm⁻¹, bar: 68 % range
        </text>
        <text transform={`translate(11 ${side / 2 - 16}) rotate(-90)`} textAnchor="middle">
          measured / cm⁻¹
        </text>
      </svg>
    </figure>
  );
}
