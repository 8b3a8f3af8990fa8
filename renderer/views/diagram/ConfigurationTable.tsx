import { configurationsOf } from '../../../core/symmetry';
import { type CubicGeometry } from '../../../core/dshell/types';
import { Configuration, TermSymbol } from '../../parts';

interface ConfigurationTableProps {
  readonly dElectrons: number;
  readonly geometry: CubicGeometry;
}

/** Which terms each strong-field configuration gives, and how many microstates they hold. */
export function ConfigurationTable({ dElectrons, geometry }: ConfigurationTableProps) {
  const configurations = configurationsOf(dElectrons, geometry === 'octahedral' ? 'Oh' : 'Td');
  const all = configurations.reduce((sum, { microstates }) => sum + microstates, 0);
  return (
    <section className="panel stack" aria-labelledby="diagram-configurations">
      <h2 id="diagram-configurations">Terms of each configuration</h2>
      <div
        className="diagram-scroll"
        tabIndex={0}
        role="group"
        aria-label="Terms of each configuration, table"
      >
        <table className="plain-table">
          <thead>
            <tr>
              <th scope="col">Configuration</th>
              <th scope="col">Terms</th>
              <th scope="col">Microstates</th>
            </tr>
          </thead>
          <tbody>
            {configurations.map(({ t2g, eg, terms, microstates }) => (
              <tr key={`${t2g} ${eg}`}>
                <th scope="row">
                  <Configuration t2={t2g} e={eg} geometry={geometry} />
                </th>
                <td className="diagram-terms">
                  {terms.map(({ label, times }) => (
                    <span key={label}>
                      {times > 1 && `${times} × `}
                      <TermSymbol label={label} />
                    </span>
                  ))}
                </td>
                <td className="figures">{microstates}</td>
              </tr>
            ))}
          </tbody>
          <tfoot>
            <tr>
              <th scope="row" colSpan={2}>
                d{dElectrons} together
              </th>
              <td className="figures">{all}</td>
            </tr>
          </tfoot>
        </table>
      </div>
      <p className="soft small">
        By the Pauli principle alone; the order of the terms in energy is that of the diagram, not of this
        list.
      </p>
    </section>
  );
}
