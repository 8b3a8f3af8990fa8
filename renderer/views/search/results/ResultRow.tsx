import { memo } from 'react';
import { formatShare, Formula, NumberWithRange, Swatch, TransmissionStrip } from '../../../parts';
import { firstBandOf } from '../../../workers/estimateSummary';
import type { ShownResult } from '../../../workers/search/protocol';
import { PartList } from './PartList';

interface ResultRowProps {
  readonly result: ShownResult;
  readonly place: number;
  /** Results that this row stands for where one of each idea is shown. */
  readonly variants: number;
  readonly chosen: boolean;
  readonly held: boolean;
  readonly onChoose: (result: ShownResult, chosen: boolean) => void;
  readonly onAdd: (result: ShownResult) => void;
}

/** Drawn again only when something in it changed: the list is reported four times a second. */
export const ResultRow = memo(function ResultRow(props: ResultRowProps) {
  const { result, place, variants, chosen, held, onChoose, onAdd } = props;
  const { summary, formula, geometry, isomer } = result;
  const band = summary.ok ? firstBandOf(summary) : null;
  const kind = [geometry === 'octahedral' ? null : geometry.replaceAll('-', ' '), isomer].filter(
    (part) => part !== null && part !== undefined,
  );
  return (
    <tr>
      <td>
        <label className="search-choose">
          <input
            type="checkbox"
            checked={chosen}
            aria-label={`Select ${formula} ${kind.join(', ')}, place ${place}`}
            onChange={(event) => onChoose(result, event.currentTarget.checked)}
          />
          <span className="figures soft">{place}</span>
        </label>
      </td>
      <td className="search-chance">
        <span className="figures">{formatShare(result.probability)}</span>
        <span className="search-chance-bar" aria-hidden="true">
          <span style={{ inlineSize: `${100 * result.probability}%` }} />
        </span>
      </td>
      <th scope="row">
        <Formula formula={formula} />
        {kind.length > 0 && <span className="search-detail">{kind.join(', ')}</span>}
        {variants > 1 && <span className="search-detail">and {variants - 1} more like it</span>}
      </th>
      <td className="search-expected">
        <TransmissionStrip transmittance={summary.ok ? summary.transmittance : null} />
        {summary.ok ? (
          <>
            <span className="search-colour">
              <Swatch colour={summary.colour} size="row" text="none" />
              {summary.colour?.words ?? 'colour not estimated'}
            </span>
            {band === null ? (
              <span className="search-detail">no spin-allowed band</span>
            ) : (
              <NumberWithRange value={band.energy} sigma={band.sigma} />
            )}
            <span className="search-detail">{summary.spin.words}</span>
          </>
        ) : (
          <span className="soft">not estimated</span>
        )}
      </td>
      <td>
        <PartList parts={result.parts} />
      </td>
      <td>
        {held ? (
          <span className="soft small">in the project</span>
        ) : (
          <button type="button" onClick={() => onAdd(result)}>
            Add<span className="visually-hidden"> {formula} to the project</span>
          </button>
        )}
      </td>
    </tr>
  );
}, sameRow);

function sameRow(before: ResultRowProps, after: ResultRowProps): boolean {
  return (
    before.result.id === after.result.id &&
    before.place === after.place &&
    before.variants === after.variants &&
    before.chosen === after.chosen &&
    before.held === after.held &&
    before.onChoose === after.onChoose &&
    before.onAdd === after.onAdd
  );
}
