import { Fragment } from 'react';
import { formulaPieces, spokenFormula } from './formulaPieces';
import './TermSymbol.css';

interface FormulaProps {
  /** Bracket formula on one line, `[Cr(NH3)5Cl]2+`. */
  readonly formula: string;
  /** Systematic or trivial name, read aloud in place of the letters and shown on hover. */
  readonly name?: string;
}

/** A bracket formula in type with sub- and superscripts, and a name that can be read aloud. */
export function Formula({ formula, name }: FormulaProps) {
  return (
    <span className="formula" title={name}>
      <span aria-hidden="true">
        {formulaPieces(formula).map(({ kind, text }, index) => (
          <Fragment key={index}>
            {kind === 'text' && text}
            {kind === 'subscript' && <sub>{text}</sub>}
            {kind === 'superscript' && <sup>{text}</sup>}
          </Fragment>
        ))}
      </span>
      <span className="visually-hidden">{name ?? spokenFormula(formula)}</span>
    </span>
  );
}
