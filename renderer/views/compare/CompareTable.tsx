import type { ReactNode } from 'react';
import { colourDifference } from '../../../core/colour';
import { linkTo } from '../../app/router/RouterContext';
import { useProject } from '../../app/session/ProjectSession';
import { FlagList, Formula, NumberWithRange, SpinBar, Swatch, TermSymbol } from '../../parts';
import type { Compared } from './useCompared';

interface CompareTableProps {
  readonly compared: readonly Compared[];
  readonly onRemove: (name: string) => void;
}

type Cell = (each: Compared, all: readonly Compared[]) => ReactNode;

const rows: readonly (readonly [name: string, cell: Cell])[] = [
  ['Seen colour', ({ prediction }) => <Swatch colour={prediction.colour} text="words" />],
  ['ΔE00 to the first', differenceCell],
  ['10Dq', ({ prediction: { tenDq } }) => <NumberWithRange kind="interval" {...tenDq} />],
  ['B', ({ prediction: { racahB } }) => <NumberWithRange kind="interval" {...racahB} />],
  ['Spin state', ({ prediction }) => <SpinBar spin={prediction.spin} />],
  [
    'Moment',
    ({ prediction: { spin } }) => (
      <>
        {spin.momentRange_BM && (
          <>{spin.momentRange_BM.map((end) => end.toFixed(1)).join(' to ')} μB usual, </>
        )}
        <span className="soft">spin only {spin.momentSpinOnly_BM.toFixed(2)} μB</span>
      </>
    ),
  ],
  ['Ground term', ({ prediction }) => <TermSymbol label={prediction.groundTerm} />],
  ['Spin-allowed bands', bandCell('spin-allowed', 4)],
  ['Charge transfer', chargeTransferCell],
  ['Lowest spin-flip level', bandCell('spin-forbidden', 1)],
  ['Where it may fail', ({ prediction }) => <FlagList flags={prediction.flags} />],
];

/** Two to six complexes, one to a column, what is expected of each in rows. */
export function CompareTable({ compared, onRemove }: CompareTableProps) {
  const { project } = useProject();
  return (
    <div className="compare-table">
      <table
        className="plain-table compare-columns"
        style={{ minInlineSize: `${10 + 11 * compared.length}rem` }}
      >
        <thead>
          <tr>
            <td />
            {compared.map(({ name, candidateId, prediction }) => {
              const { formula, composition } = prediction;
              const kind = [composition.geometry.replaceAll('-', ' '), composition.isomer].filter(Boolean);
              return (
                <th key={name} scope="col">
                  {candidateId === null ? (
                    <Formula formula={formula} />
                  ) : (
                    <a href={linkTo({ view: 'sheet', project: project.id, item: candidateId })}>
                      <Formula formula={formula} />
                    </a>
                  )}
                  <span className="compare-kind">{kind.join(', ')}</span>
                  <button
                    type="button"
                    className="button-quiet"
                    aria-label={`Take ${formula} out of the comparison`}
                    onClick={() => onRemove(name)}
                  >
                    ✕
                  </button>
                </th>
              );
            })}
          </tr>
        </thead>
        <tbody>
          {rows.map(([name, cell]) => (
            <tr key={name}>
              <th scope="row">{name}</th>
              {compared.map((each) => (
                <td key={each.name}>{cell(each, compared)}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function differenceCell({ prediction }: Compared, all: readonly Compared[]): ReactNode {
  const first = all[0]!.prediction;
  if (prediction === first) return <span className="soft">the first</span>;
  if (first.colour === null || prediction.colour === null) return <span className="soft">not estimated</span>;
  const difference = colourDifference(prediction.colour.lab, first.colour.lab);
  return <span className="figures">{difference.toFixed(difference < 10 ? 1 : 0)}</span>;
}

function bandCell(kind: 'spin-allowed' | 'spin-forbidden', most: number): Cell {
  return function BandCell({ prediction }) {
    const bands = prediction.bands.filter((band) => band.kind === kind).slice(0, most);
    if (bands.length === 0) return <span className="soft">none</span>;
    return (
      <ul className="compare-bands">
        {bands.map(({ label, energy_cm1, sigma_cm1 }, i) => (
          <li key={i}>
            <TermSymbol label={label} /> <NumberWithRange value={energy_cm1} sigma={sigma_cm1} />
          </li>
        ))}
      </ul>
    );
  };
}

function chargeTransferCell({ prediction }: Compared): ReactNode {
  const band = prediction.bands.find(({ kind }) => kind !== 'spin-allowed' && kind !== 'spin-forbidden');
  if (band === undefined) return <span className="soft">none predicted</span>;
  return (
    <>
      {band.label} <NumberWithRange value={band.energy_cm1} sigma={band.sigma_cm1} />
    </>
  );
}
