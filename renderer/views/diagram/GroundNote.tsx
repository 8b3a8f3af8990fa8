import { type CubicLevel } from '../../../core/dshell/types';
import { formatFigures, NumberWithRange, TermSymbol } from '../../parts';
import { type Crossover } from '../../plots';
import { type DiagramSettings } from './diagramSettings';

interface GroundNoteProps {
  readonly settings: DiagramSettings;
  readonly ground: CubicLevel | undefined;
  /** In 10Dq/B, ascending. */
  readonly crossovers: readonly Crossover[];
}

/** The ground level at the chosen field, and where it changes. */
export function GroundNote({ settings, ground, crossovers }: GroundNoteProps) {
  const { tenDq, B } = settings;
  return (
    <section className="panel stack" aria-labelledby="diagram-ground">
      <h2 id="diagram-ground">Ground level</h2>
      {ground && (
        <p>
          <TermSymbol label={ground.label} /> at 10Dq/B {formatFigures(tenDq / B)}, {ground.multiplicity - 1}{' '}
          unpaired electron{ground.multiplicity === 2 ? '' : 's'}.
        </p>
      )}
      {crossovers.length === 0 ? (
        <p>It does not change up to 10Dq/B = 80.</p>
      ) : (
        <ul className="diagram-crossovers">
          {crossovers.map(({ x, from, to }) => (
            <li key={x}>
              <TermSymbol label={from} /> to <TermSymbol label={to} /> at 10Dq/B {formatFigures(x, 4)}, that
              is <NumberWithRange kind="interval" value={x * B} figures={4} />
              {tenDq > 0 && (
                <span className="soft">
                  {' '}
                  ({formatFigures(Math.abs(tenDq / (x * B) - 1) * 100, 2)} %{' '}
                  {tenDq > x * B ? 'below' : 'above'} the chosen field)
                </span>
              )}
            </li>
          ))}
        </ul>
      )}
      <p className="soft small">
        Exact for these parameters: all terms of d{settings.dElectrons} in one cubic field. Left out:
        spin–orbit coupling, distortion, a B that differs between t2 and e. A real 10Dq carries several per
        cent of doubt.
      </p>
    </section>
  );
}
