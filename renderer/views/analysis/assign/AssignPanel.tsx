import { useMemo, useState } from 'react';
import { assignBands, type BandAssignment } from '../../../../core/measured/assignment/assignBands';
import { recordAssignment } from '../../../../core/measured/records';
import type { AssignedBand } from '../../../../core/record/analysis';
import type { FrozenPrediction } from '../../../../core/record/project';
import { bandsOf } from '../../agreement/recordPairs';
import { formatFigures, MeasuredNumber, NumberWithRange, TermSymbol } from '../../../parts';
import type { NamedBand } from './measuredBands';

interface AssignPanelProps {
  readonly measured: readonly NamedBand[];
  readonly frozen: FrozenPrediction | null;
  readonly kept: readonly AssignedBand[];
  readonly onSave: (assignment: AssignedBand[], label: string) => Promise<boolean>;
}

type Choice = number | null | undefined;

/** Choices that a person made earlier, found again by label and energy of the partner. */
function choicesOf(
  kept: readonly AssignedBand[],
  predicted: readonly { label: string; energy_cm1: number }[],
) {
  return kept.map(({ by, label, predicted_cm1 }): Choice => {
    if (by !== 'person') return undefined;
    if (label === null) return null;
    const place = predicted.findIndex((band) => band.label === label && band.energy_cm1 === predicted_cm1);
    return place < 0 ? undefined : place;
  });
}

const dragType = 'application/x-predicted-band';

/** Measured bands beside the predicted ones they are taken for, changed by list or by dragging. */
export function AssignPanel({ measured, frozen, kept, onSave }: AssignPanelProps) {
  const predicted = useMemo(() => bandsOf(frozen), [frozen]);
  const fixed = useMemo(
    () => measured.map((_, index) => choicesOf(kept, predicted)[index]),
    [measured, kept, predicted],
  );
  const [contradiction, setContradiction] = useState(false);
  const result = useMemo(() => assignBands(measured, predicted, { fixed }), [measured, predicted, fixed]);
  if (predicted.length === 0)
    return (
      <section className="panel" aria-labelledby="analysis-assign">
        <h2 id="analysis-assign">Assignment</h2>
        <p className="soft">
          No prediction with bands was frozen before this measurement: nothing to assign to.
        </p>
      </section>
    );
  const keep = (assignment: BandAssignment, choices: readonly Choice[]): void => {
    const byPerson = new Set(choices.flatMap((choice, index) => (choice === undefined ? [] : [index])));
    void onSave(recordAssignment(measured, predicted, assignment, byPerson), 'assign bands');
  };
  const choose = (index: number, choice: Choice): void => {
    const choices = fixed.map((each, place) =>
      place === index ? choice : each === choice && typeof choice === 'number' ? undefined : each,
    );
    const next = assignBands(measured, predicted, { fixed: choices });
    setContradiction(next === null);
    if (next !== null) keep(next.best, choices);
  };
  return (
    <section className="panel stack" aria-labelledby="analysis-assign">
      <h2 id="analysis-assign">Assignment</h2>
      <p className="soft">
        The matching with the smallest sum of squared deviations, in position and in strength. Choose another
        partner where you know better; drag a predicted band onto a measured one, or use the list.
      </p>
      <ul className="analysis-chips" aria-label="Predicted bands">
        {predicted.map(({ label, energy_cm1 }, place) => (
          <li
            key={place}
            draggable
            onDragStart={(event) => event.dataTransfer.setData(dragType, String(place))}
          >
            <TermSymbol label={label} /> {formatFigures(energy_cm1, 3)}
          </li>
        ))}
      </ul>
      {result !== null && (
        <table className="plain-table">
          <thead>
            <tr>
              <th scope="col">Measured</th>
              <th scope="col">Read as</th>
              <th scope="col">Taken for</th>
              <th scope="col">Predicted (68 % range)</th>
              <th scope="col">
                <abbr title="measured minus predicted over the joint standard deviation">Deviation/σ</abbr>
              </th>
            </tr>
          </thead>
          <tbody>
            {measured.map((band, index) => {
              const pair = result.best.pairs[index]!;
              const partner = pair.predicted === null ? null : predicted[pair.predicted]!;
              const name = `${formatFigures(band.energy_cm1, 4)} cm⁻¹`;
              return (
                <tr
                  key={index}
                  onDragOver={(event) =>
                    [...event.dataTransfer.types].includes(dragType) && event.preventDefault()
                  }
                  onDrop={(event) => {
                    event.preventDefault();
                    choose(index, Number(event.dataTransfer.getData(dragType)));
                  }}
                >
                  <th scope="row">
                    <MeasuredNumber value={band.energy_cm1} u={band.u_cm1} />
                  </th>
                  <td>{band.feature}</td>
                  <td>
                    <select
                      aria-label={`Partner of the band at ${name}`}
                      value={fixed[index] === undefined ? 'free' : (fixed[index] ?? 'none')}
                      onChange={(event) => choose(index, choiceOf(event.currentTarget.value))}
                    >
                      <option value="free">
                        matched:{' '}
                        {partner === null ? 'none' : `${partner.label} at ${Math.round(partner.energy_cm1)}`}
                      </option>
                      <option value="none">none, left alone on purpose</option>
                      {predicted.map(({ label, energy_cm1 }, place) => (
                        <option key={place} value={place}>
                          {label} at {Math.round(energy_cm1)} cm⁻¹
                        </option>
                      ))}
                    </select>
                  </td>
                  <td>
                    {partner === null ? (
                      '–'
                    ) : (
                      <NumberWithRange value={partner.energy_cm1} sigma={partner.sigma_cm1} />
                    )}
                  </td>
                  <td className="figures">{pair.z === null ? '–' : pair.z.toFixed(1)}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
      )}
      {contradiction && (
        <p className="field-error" role="alert">
          Two measured bands cannot be the same predicted one. Nothing was changed.
        </p>
      )}
      {result !== null && (
        <>
          <p>
            Cost {result.best.cost.toFixed(1)}
            {result.priceOfChoices > 0.05 &&
              `, ${result.priceOfChoices.toFixed(1)} more than without your choices`}
            .
          </p>
          <details>
            <summary>Other assignments</summary>
            <ul className="analysis-remarks">
              {result.alternatives.slice(1).map((other, index) => (
                <li key={index}>
                  {other.pairs
                    .map(({ predicted: place }) => (place === null ? 'none' : predicted[place]!.label))
                    .join(', ')}
                  : {(other.cost - result.best.cost).toFixed(1)} dearer{' '}
                  <button
                    type="button"
                    className="button-quiet"
                    onClick={() =>
                      keep(
                        other,
                        other.pairs.map(({ predicted: place }) => place),
                      )
                    }
                  >
                    Take this one
                  </button>
                </li>
              ))}
            </ul>
          </details>
          {kept.length !== measured.length && (
            <div>
              <button type="button" className="button-main" onClick={() => keep(result.best, fixed)}>
                Keep this assignment
              </button>
            </div>
          )}
        </>
      )}
    </section>
  );
}

const choiceOf = (value: string): Choice =>
  value === 'free' ? undefined : value === 'none' ? null : Number(value);
