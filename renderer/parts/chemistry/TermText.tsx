import { parseTermLabel } from './termLabel';

/** A term label for use inside an SVG `text` element, where `sup` and `sub` do not exist. */
export function TermText({ label }: { readonly label: string }) {
  const term = parseTermLabel(label);
  if (!term) return <tspan>{label}</tspan>;
  return (
    <>
      <tspan dy="-0.42em" fontSize="0.72em">
        {term.multiplicity}
      </tspan>
      <tspan dy="0.3em">
        {term.letter}
        {term.primes}
      </tspan>
      {term.subscript !== '' && (
        <tspan dy="0.28em" fontSize="0.72em">
          {term.subscript}
        </tspan>
      )}
      {term.parent !== null && <tspan dy="-0.2em">{` (${term.parent})`}</tspan>}
    </>
  );
}
