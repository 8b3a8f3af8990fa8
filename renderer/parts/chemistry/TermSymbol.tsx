import { parseTermLabel, spokenTerm } from './termLabel';
import './TermSymbol.css';

/** A term label in type, `⁴T₂g`, that is read aloud as `quartet T two g`. Other labels stay plain text. */
export function TermSymbol({ label }: { readonly label: string }) {
  const term = parseTermLabel(label);
  if (!term) return <span className="term-symbol">{label}</span>;
  return (
    <span className="term-symbol">
      <span aria-hidden="true">
        <sup>{term.multiplicity}</sup>
        {term.letter}
        {term.primes}
        <sub>{term.subscript}</sub>
        {term.parent !== null && ` (${term.parent})`}
      </span>
      <span className="visually-hidden">{spokenTerm(label)}</span>
    </span>
  );
}
