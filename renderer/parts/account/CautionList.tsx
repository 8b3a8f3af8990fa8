import { standingCaution } from '../../../core/library/cautions';
import { type Caution } from '../../../core/prediction/types';
import './CautionList.css';

interface CautionListProps {
  readonly cautions: readonly Caution[];
  /** Complex or list they belong to, where a page shows several. */
  readonly of?: string;
}

/** General cautions about the substances in play. They inform, print with the page and cannot be folded away. */
export function CautionList({ cautions, of }: CautionListProps) {
  return (
    <section
      className="caution-list"
      aria-label={of === undefined ? 'Safety cautions' : `Safety cautions: ${of}`}
    >
      <p className="caution-title">Before anything is made</p>
      {cautions.length === 0 ? (
        <p className="caution-none">
          No caution on file for these substances. That means not assessed, not safe.
        </p>
      ) : (
        <ul>
          {cautions.map(({ id, about, text, codes, source }) => (
            <li key={id}>
              <strong>{about}.</strong> {text}
              {codes.length > 0 && <span className="caution-codes"> {codes.join(', ')}</span>}
              <span className="caution-source"> {source}</span>
            </li>
          ))}
        </ul>
      )}
      <p className="caution-standing">{standingCaution}</p>
    </section>
  );
}
