import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { CautionList } from './CautionList';
import { FlagList, FlagMark } from './FlagList';
import { SourceNote } from './SourceNote';
import { Why } from './Why';

afterEach(cleanup);

describe('a source note', () => {
  it('says how far the value was checked', () => {
    render(<SourceNote source="A. Author, A Book, 1962, p. 110" status="memory" />);
    expect(screen.getByText('from memory').title).toMatch(/not checked/);
    expect(screen.getByText(/A Book, 1962/)).toBeTruthy();
  });

  it('says "no source" rather than nothing', () => {
    render(<SourceNote source={null} status="page" />);
    expect(screen.getByText('no source')).toBeTruthy();
  });
});

describe('the account behind a number', () => {
  const reasons = [
    { kind: 'doubt', text: 'factor by donor class', sigma: 1_204 },
    { kind: 'source', text: 'f and g from a table' },
    { kind: 'settle', text: 'one spectrum in water' },
  ] as const;

  it('is folded away until asked for, then groups sources, doubts and what would settle it', async () => {
    render(<Why reasons={reasons} of="10Dq" />);
    const details = document.querySelector('details')!;
    expect(details.open).toBe(false);
    await userEvent.click(screen.getByText('Why'));
    expect(details.open).toBe(true);
    expect(screen.getAllByRole('term').map((term) => term.textContent)).toEqual([
      'Comes from',
      'In doubt because',
      'Would be settled by',
    ]);
    expect(screen.getByText(/± 1.200 cm⁻¹/)).toBeTruthy();
  });

  it('shows nothing where there is no account', () => {
    const { container } = render(<Why reasons={[]} of="B" />);
    expect(container.textContent).toBe('');
  });
});

describe('flags', () => {
  const flags = [
    { code: 'a', severity: 'note', message: 'spin-orbit coupling left out' },
    { code: 'b', severity: 'invalid', message: 'cyanide on a divalent ion' },
  ] as const;

  it('come gravest first, each in words', () => {
    render(<FlagList flags={flags} />);
    expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
      '✕Do not trust: cyanide on a divalent ion',
      'iNote: spin-orbit coupling left out',
    ]);
  });

  it('shrink to one mark that carries every message', () => {
    render(<FlagMark flags={flags} />);
    expect(screen.getByRole('img', { name: /spin-orbit.*cyanide/ }).textContent).toBe('✕');
  });
});

describe('cautions', () => {
  it('show substance, text, codes and source, and defer to the safety data sheet', () => {
    render(
      <CautionList
        cautions={[
          {
            id: 'perchlorate',
            about: 'Perchlorate',
            text: 'Salts with ammine ligands can explode.',
            codes: ['H271'],
            source: 'J. Chem. Educ. 1985',
          },
        ]}
      />,
    );
    expect(screen.getByRole('region', { name: 'Safety cautions' }).textContent).toMatch(/can explode.*H271/);
    expect(screen.getByText(/safety data sheets/)).toBeTruthy();
  });

  it('never call the absence of a caution safe', () => {
    render(<CautionList cautions={[]} />);
    expect(screen.getByText(/not assessed, not safe/)).toBeTruthy();
  });
});
