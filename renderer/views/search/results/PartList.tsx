import type { WishPart } from '../../../../core/search';
import { formatShare, parseTermLabel, TermSymbol } from '../../../parts';
import { partName } from './partNames';

/** The chance of each part of a wish as number and extent, with what it rests on. */
export function PartList({ parts }: { readonly parts: readonly WishPart[] }) {
  return (
    <ul className="search-parts">
      {parts.map(({ part, probability, because }) => (
        <li key={part}>
          <span className="search-part-name">{partName(part)}</span>
          <span className="figures search-part-share">{formatShare(probability)}</span>
          <span className="search-chance-bar" aria-hidden="true">
            <span style={{ inlineSize: `${100 * probability}%` }} />
          </span>
          <span className="soft search-part-why">
            <Reason text={because} />
          </span>
        </li>
      ))}
    </ul>
  );
}

/** Term symbols in the sentence are set as such. */
function Reason({ text }: { readonly text: string }) {
  const [first, ...rest] = text.split(' ');
  if (first === undefined || parseTermLabel(first) === null) return text;
  return (
    <>
      <TermSymbol label={first} /> {rest.join(' ')}
    </>
  );
}
