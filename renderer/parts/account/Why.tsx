import { type Reason } from '../../../core/estimation/types';
import { formatFigures } from '../number';
import './Why.css';

const headings: readonly (readonly [Reason['kind'], string])[] = [
  ['source', 'Comes from'],
  ['assumption', 'Assumes'],
  ['doubt', 'In doubt because'],
  ['settle', 'Would be settled by'],
];

interface WhyProps {
  readonly reasons: readonly Reason[];
  /** What the account is of, `10Dq`; completes the name of the disclosure. */
  readonly of: string;
  /** Unit of the contributions to the standard deviation. */
  readonly unit?: string;
  readonly open?: boolean;
}

/** The account behind a number, folded away: sources, assumptions, doubts with their size, what would settle it. */
export function Why({ reasons, of, unit = 'cm⁻¹', open = false }: WhyProps) {
  if (reasons.length === 0) return null;
  return (
    <details className="why" open={open}>
      <summary>
        Why<span className="visually-hidden"> this value of {of}</span>
      </summary>
      <dl>
        {headings.map(([kind, heading]) => {
          const lines = reasons.filter((reason) => reason.kind === kind);
          if (lines.length === 0) return null;
          return (
            <div key={kind} className="why-group" data-kind={kind}>
              <dt>{heading}</dt>
              {lines.map(({ text, sigma }, index) => (
                <dd key={index}>
                  {text}
                  {sigma !== undefined && (
                    <span className="why-sigma">
                      {' '}
                      (± {formatFigures(sigma, 2)} {unit})
                    </span>
                  )}
                </dd>
              ))}
            </div>
          );
        })}
      </dl>
    </details>
  );
}
