import { useState } from 'react';
import type { FieldFit } from '../../../../core/measured/fieldFit/fitField';
import { recordFieldFit } from '../../../../core/measured/records';
import type { AssignedBand, FieldFitRecord } from '../../../../core/record/analysis';
import type { Candidate, FrozenPrediction } from '../../../../core/record/project';
import { fromWavenumber } from '../../../../core/units';
import {
  ErrorPanel,
  formatFigures,
  intervalUnit,
  NumberWithRange,
  Progress,
  unitText,
  useUnit,
} from '../../../parts';
import type { NamedBand } from '../assign/measuredBands';
import { useFitting } from '../useFitting';

interface FieldFitPanelProps {
  readonly candidate: Candidate;
  readonly frozen: FrozenPrediction | null;
  readonly measured: readonly NamedBand[];
  readonly assignment: readonly AssignedBand[];
  readonly kept: FieldFitRecord | null;
  readonly onSave: (fit: FieldFitRecord | null, label: string) => Promise<boolean>;
}

interface FrozenField {
  readonly dElectrons?: number;
  readonly spin?: { readonly multiplicity?: number };
  readonly tenDq?: Known;
  readonly racahB?: Known;
  readonly racahC?: Known;
}
interface Known {
  readonly value: number | null;
  readonly sigma: number | null;
}

const rows = [
  ['tenDq', '10Dq', 'tenDq'],
  ['B', 'B', 'racahB'],
  ['C', 'C', 'racahC'],
] as const;

/** 10Dq, B and C that reproduce the assigned bands, with what these bands cannot tell. */
export function FieldFitPanel(props: FieldFitPanelProps) {
  const { candidate, frozen, measured, assignment, kept, onSave } = props;
  const { running, error, fit, stop } = useFitting<'field'>();
  const [latest, setLatest] = useState<FieldFit | null>(null);
  // After undo, or with another assignment, the latest fit is not the one that is kept.
  const last = latest !== null && kept !== null && latest.tenDq.value === kept.tenDq.value ? latest : null;
  const prediction = (frozen?.prediction ?? {}) as FrozenField;
  const { dElectrons } = prediction;
  const usable = assignment.length === measured.length ? dBands(assignment) : [];
  const { metal, oxidationState, geometry } = candidate.composition;
  const run = (): void => {
    if (dElectrons === undefined) return;
    const groundMultiplicity = prediction.spin?.multiplicity;
    const request = {
      dElectrons,
      geometry,
      metal,
      oxidationState,
      bands: usable,
      ...(groundMultiplicity === undefined ? {} : { groundMultiplicity }),
    };
    void fit({ kind: 'field', request }).then(async (result) => {
      if (result === null) return;
      setLatest(result);
      await onSave(recordFieldFit(request, result), 'fit the field of one complex');
    });
  };
  return (
    <section className="panel stack" aria-labelledby="analysis-field">
      <h2 id="analysis-field">Field of this complex</h2>
      {usable.length === 0 ? (
        <p className="soft">
          {assignment.length === 0
            ? 'Keep an assignment first: the fit needs to know which level each band belongs to.'
            : 'None of these bands is assigned to a d–d transition, so they say nothing about the field.'}
        </p>
      ) : (
        <div className="analysis-actions">
          <button
            type="button"
            className="button-main"
            disabled={running || dElectrons === undefined}
            onClick={run}
          >
            Fit the field to {usable.length} {usable.length === 1 ? 'band' : 'bands'}
          </button>
          {kept !== null && (
            <button
              type="button"
              className="button-quiet"
              onClick={() => void onSave(null, 'remove a field fit')}
            >
              Remove the fit
            </button>
          )}
        </div>
      )}
      {running && <Progress label="Fitting the field" done={0} total={null} onCancel={stop} />}
      {error !== null && (
        <ErrorPanel title="No fit" problems={[{ code: 'no-convergence', field: '', message: error }]} />
      )}
      {kept !== null && (
        <>
          <table className="plain-table">
            <caption>
              Fitted beside frozen prediction
              {kept.rms_cm1 !== null && deviationText(kept.rms_cm1)}
            </caption>
            <thead>
              <tr>
                <th scope="col">Parameter</th>
                <th scope="col">Fitted ± standard error</th>
                <th scope="col">Status</th>
                <th scope="col">Frozen prediction (68 % range)</th>
              </tr>
            </thead>
            <tbody>
              {rows.map(([key, name, predicted]) => (
                <tr key={key}>
                  <th scope="row">{name}</th>
                  <td>
                    <FittedValue value={kept[key].value} se={kept[key].se} />
                  </td>
                  <td className="soft">{kept[key].status}</td>
                  <td>
                    <NumberWithRange
                      kind="interval"
                      value={prediction[predicted]?.value ?? null}
                      sigma={prediction[predicted]?.sigma ?? null}
                    />
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
          <Sentences title="These bands cannot tell" sentences={kept.notDetermined} />
          <Sentences title="Against physics" sentences={kept.warnings} />
        </>
      )}
      {last !== null && <Sentences title="Remarks" sentences={last.remarks} />}
      {last?.correlation && last.correlation.names.length > 1 && (
        <p className="soft">Correlation: {correlationText(last.correlation)}.</p>
      )}
      {last?.textbook && (
        <p className="soft">
          By the closed formula of textbooks ({last.textbook.rule}): 10Dq{' '}
          {formatFigures(last.textbook.tenDq, 4)}
          {last.textbook.B !== null && `, B ${formatFigures(last.textbook.B, 3)}`} cm⁻¹.
        </p>
      )}
      {last !== null && last.alternatives.length > 0 && (
        <details>
          <summary>Other readings of the same bands</summary>
          <ul className="analysis-remarks">
            {last.alternatives.map(({ labels, tenDq, B, rms_cm1 }, index) => (
              <li key={index}>
                {labels.join(', ')}: 10Dq {formatFigures(tenDq, 3)}, B {formatFigures(B, 3)}, off by{' '}
                {formatFigures(rms_cm1, 2)} cm⁻¹
              </li>
            ))}
          </ul>
        </details>
      )}
    </section>
  );
}

/** A fitted splitting with its standard error; never written as a wavelength. */
function FittedValue({ value, se }: { readonly value: number | null; readonly se: number | null }) {
  const unit = intervalUnit(useUnit().unit);
  if (value === null) return <span className="soft">not determined</span>;
  return (
    <span className="figures">
      <strong>{formatFigures(fromWavenumber(value, unit), 4)}</strong>
      {se !== null && ` ± ${formatFigures(fromWavenumber(se, unit), 2)}`} {unitText[unit]}
    </span>
  );
}

const correlationText = ({ names, matrix }: NonNullable<FieldFit['correlation']>): string =>
  names
    .map((name) => (name === 'tenDq' ? '10Dq' : name))
    .flatMap((one, row, all) =>
      all.slice(row + 1).map((other, i) => `${one} with ${other} ${matrix[row]![row + 1 + i]!.toFixed(2)}`),
    )
    .join(', ');

/** As many bands as parameters are always met exactly: that is no praise. */
const deviationText = (rms_cm1: number): string =>
  rms_cm1 < 0.01
    ? '; met exactly, so that nothing is left to check the fit by'
    : `; root mean square deviation ${formatFigures(rms_cm1, 2)} cm⁻¹`;

function Sentences({ title, sentences }: { readonly title: string; readonly sentences: readonly string[] }) {
  if (sentences.length === 0) return null;
  return (
    <div>
      <h3>{title}</h3>
      <ul className="analysis-remarks">
        {sentences.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </div>
  );
}

/** Bands assigned to levels of the d shell. */
const dBands = (assignment: readonly AssignedBand[]) =>
  assignment.flatMap(({ energy_cm1, label, multiplicity }) =>
    label === null || multiplicity === null
      ? []
      : [{ energy_cm1: energy_cm1.value, se_cm1: energy_cm1.u, multiplicity, label }],
  );
