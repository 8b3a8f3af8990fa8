import { useState } from 'react';
import { type CubicGeometry, type CubicLevel } from '../../../core/dshell/types';
import { Configuration, formatFigures, formatShare, NumberWithRange, TermSymbol } from '../../parts';

interface LevelTableProps {
  readonly levels: readonly CubicLevel[];
  readonly geometry: CubicGeometry;
}

/** Levels at the chosen field, from below, with what each is made of. */
export function LevelTable({ levels, geometry }: LevelTableProps) {
  const [sameSpin, setSameSpin] = useState(false);
  const ground = levels[0];
  if (!ground) return null;
  const shown = levels.filter(({ multiplicity }) => !sameSpin || multiplicity === ground.multiplicity);
  return (
    <section className="panel stack" aria-labelledby="diagram-levels">
      <div className="diagram-head">
        <h2 id="diagram-levels">Levels at this field</h2>
        <label className="diagram-check">
          <input type="checkbox" checked={sameSpin} onChange={() => setSameSpin(!sameSpin)} /> only the spin
          of the ground level
        </label>
      </div>
      <div className="diagram-scroll" tabIndex={0} role="group" aria-label="Levels at this field, table">
        <table className="plain-table">
          <thead>
            <tr>
              <th scope="col">Level</th>
              <th scope="col">Above the ground level</th>
              <th scope="col">From the ground level</th>
              <th scope="col">Leading configuration</th>
              <th
                scope="col"
                title="Change of energy with 10Dq: steep levels give broad bands, flat ones sharp lines"
              >
                dE/d(10Dq)
              </th>
            </tr>
          </thead>
          <tbody>
            {shown.map((level, index) => (
              <tr key={`${level.label}${index}`}>
                <th scope="row">
                  <TermSymbol label={level.label} />
                </th>
                <td>
                  {level === ground ? 'ground level' : <NumberWithRange value={level.energy} figures={5} />}
                </td>
                <td>
                  {level === ground
                    ? ''
                    : level.multiplicity === ground.multiplicity
                      ? 'spin-allowed'
                      : 'spin-forbidden'}
                </td>
                <td>
                  <Configuration
                    t2={level.configurations[0]!.t2}
                    e={level.configurations[0]!.e}
                    geometry={geometry}
                  />{' '}
                  <span className="soft">{formatShare(level.configurations[0]!.weight)}</span>
                </td>
                <td className="figures">{level === ground ? '' : formatFigures(level.slope.tenDq, 2)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}
