import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, render, screen } from '@testing-library/react';
import { Configuration, ConfigurationLabel } from './Configuration';
import { Formula } from './Formula';
import { formulaPieces, spokenFormula } from './formulaPieces';
import { spokenTerm } from './termLabel';
import { TermSymbol } from './TermSymbol';
import { TermText } from './TermText';

afterEach(cleanup);
const marked = (formula: string) =>
  formulaPieces(formula)
    .map(({ kind, text }) => ({ text, subscript: `_${text}`, superscript: `^${text}` })[kind])
    .join('|');

describe('a term symbol', () => {
  it('is set with its multiplicity raised and its irreducible representation lowered', () => {
    render(<TermSymbol label="4T2g" />);
    expect(document.querySelector('sup')!.textContent).toBe('4');
    expect(document.querySelector('sub')!.textContent).toBe('2g');
    expect(screen.getByText('quartet T two g')).toBeTruthy();
  });

  it('is spoken in every form the trade uses', () => {
    expect(spokenTerm('2E')).toBe('doublet E');
    expect(spokenTerm('3T1g(P)')).toBe('triplet T one g from P');
    expect(spokenTerm("3A2''")).toBe('triplet A two double prime');
    expect(spokenTerm('6A1g')).toBe('sextet A one g');
    expect(spokenTerm('4F')).toBe('quartet F');
  });

  it('leaves other labels as they are', () => {
    render(<TermSymbol label="Cl- -> Co (t2g)" />);
    expect(screen.getByText('Cl- -> Co (t2g)')).toBeTruthy();
    expect(document.querySelector('sup')).toBeNull();
  });

  it('has a form for SVG text', () => {
    render(
      <svg>
        <text data-testid="label">
          <TermText label="2T1g" />
        </text>
      </svg>,
    );
    expect(screen.getByTestId('label').textContent).toBe('2T1g');
  });
});

describe('a configuration', () => {
  it('names the lower orbitals first and is read aloud', () => {
    const { container, rerender } = render(<Configuration t2={4} e={2} geometry="octahedral" />);
    expect(container.querySelector('[aria-hidden]')!.textContent).toBe('t2g4eg2');
    expect(screen.getByText('t two g four, e g two')).toBeTruthy();
    rerender(<Configuration t2={0} e={1} geometry="tetrahedral" />);
    expect(container.querySelector('[aria-hidden]')!.textContent).toBe('e1');
  });
});

describe('a configuration as the core writes it', () => {
  it('is set in type, and other text left alone', () => {
    const { container, rerender } = render(<ConfigurationLabel text="t2g2 eg1" />);
    expect(container.querySelector('[aria-hidden]')!.textContent).toBe('t2g2eg1');
    rerender(<ConfigurationLabel text="charge transfer" />);
    expect(container.textContent).toBe('charge transfer');
  });
});

describe('a formula', () => {
  it('has counts lowered and the charge raised', () => {
    expect(marked('[Cr(NH3)5Cl]2+')).toBe('[Cr(NH|_3|)|_5|Cl]|^2+');
    expect(marked('[Fe(ox)3]3-')).toBe('[Fe(ox)|_3|]|^3−');
    expect(marked('[Co(en)2Cl2]+')).toBe('[Co(en)|_2|Cl|_2|]|^+');
    expect(marked('[Ni(CO)4]')).toBe('[Ni(CO)|_4|]');
  });

  it('counts counter-ions after the bracket below the line, and solvate on it', () => {
    expect(marked('[Ni(en)3]Cl2·2H2O')).toBe('[Ni(en)|_3|]Cl|_2|·2H|_2|O');
    expect(marked('K3[Fe(CN)6]')).toBe('K|_3|[Fe(CN)|_6|]');
    expect(marked('[Fe2(CN)10]6-')).toBe('[Fe|_2|(CN)|_10|]|^6−');
  });

  it('reads a charge on a plain ion', () => {
    expect(marked('Cl-')).toBe('Cl|^−');
    expect(marked('SO4^2-')).toBe('SO|_4|^2−');
  });

  it('is read aloud by its name, or else letter by letter with the charge said', () => {
    expect(spokenFormula('[Cr(NH3)5Cl]2+')).toBe('Cr NH 3 5 Cl charge 2 plus');
    render(<Formula formula="[Cr(NH3)6]3+" name="hexaamminechromium(III)" />);
    expect(screen.getByText('hexaamminechromium(III)')).toBeTruthy();
  });
});
