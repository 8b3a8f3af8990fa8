import { afterEach, describe, expect, it, vi } from 'vitest';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Keys } from './Keys';
import { matchOptions, type SelectOption } from './matchOptions';
import { SearchableSelect } from './SearchableSelect';

afterEach(cleanup);

const ligands: readonly SelectOption[] = [
  { id: 'nh3', label: 'NH3', detail: 'ammine' },
  { id: 'en', label: 'en', detail: 'ethane-1,2-diamine' },
  { id: 'bpy', label: 'bpy', detail: "2,2'-bipyridine" },
  { id: 'py', label: 'py', detail: 'pyridine' },
  { id: 'x', label: 'x', detail: 'not offered', disabled: true },
];

describe('matching options', () => {
  it('puts the exact label first, then beginnings, then the rest', () => {
    expect(matchOptions(ligands, 'py').map(({ id }) => id)).toEqual(['py', 'bpy']);
    expect(matchOptions(ligands, 'diamine').map(({ id }) => id)).toEqual(['en']);
  });

  it('needs every word, in any order, whatever the case and accents', () => {
    expect(matchOptions(ligands, 'AMMINE nh3').map(({ id }) => id)).toEqual(['nh3']);
    expect(matchOptions([{ id: 'a', label: 'Évans' }], 'evans')).toHaveLength(1);
    expect(matchOptions(ligands, 'nh3 pyridine')).toHaveLength(0);
  });
});

describe('the searchable select', () => {
  const setup = (value: string | null = null) => {
    const onChange = vi.fn();
    render(<SearchableSelect label="Ligand" options={ligands} value={value} onChange={onChange} />);
    return { onChange, field: screen.getByRole('combobox', { name: 'Ligand' }) as HTMLInputElement };
  };

  it('is filled by typing, arrows and Enter', async () => {
    const { onChange, field } = setup();
    await userEvent.type(field, 'py{ArrowDown}');
    expect(field.getAttribute('aria-expanded')).toBe('true');
    const active = document.getElementById(field.getAttribute('aria-activedescendant')!)!;
    expect(active.textContent).toContain('bpy');
    await userEvent.keyboard('{Enter}');
    expect(onChange).toHaveBeenCalledWith('bpy');
    expect(field.getAttribute('aria-expanded')).toBe('false');
  });

  it('is filled by the pointer', async () => {
    const { onChange, field } = setup();
    await userEvent.click(field);
    await userEvent.click(screen.getByRole('option', { name: /ethane/ }));
    expect(onChange).toHaveBeenCalledWith('en');
  });

  it('keeps what was chosen when Escape leaves the list', async () => {
    const { onChange, field } = setup('en');
    await userEvent.type(field, 'zzz');
    expect(screen.getByText('Nothing matches “zzz”.')).toBeTruthy();
    await userEvent.keyboard('{Escape}');
    expect(field.value).toBe('en');
    expect(onChange).not.toHaveBeenCalled();
  });

  it('does not take an option that is switched off', async () => {
    const { onChange, field } = setup();
    await userEvent.type(field, 'not offered{Enter}');
    expect(onChange).not.toHaveBeenCalled();
  });

  it('shows a long list in part and says so', async () => {
    const many = Array.from({ length: 250 }, (_, index) => ({ id: `l${index}`, label: `ligand ${index}` }));
    render(<SearchableSelect label="Many" options={many} value={null} onChange={() => undefined} />);
    await userEvent.click(screen.getByRole('combobox', { name: 'Many' }));
    expect(screen.getAllByRole('option')).toHaveLength(100);
    expect(screen.getByText('100 of 250 shown; type to narrow.')).toBeTruthy();
  });

  it('ties its error to the field', () => {
    render(
      <SearchableSelect
        label="Metal"
        options={[]}
        value={null}
        onChange={() => undefined}
        error="Choose a metal."
      />,
    );
    const field = screen.getByRole('combobox', { name: 'Metal' });
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect(document.getElementById(field.getAttribute('aria-describedby')!)!.textContent).toBe(
      'Choose a metal.',
    );
  });
});

describe('key caps', () => {
  it('show each key of a combination and of a sequence', () => {
    render(<Keys combo="Ctrl+K g" />);
    expect(Array.from(document.querySelectorAll('kbd'), (cap) => cap.textContent)).toEqual([
      'Ctrl',
      'K',
      'g',
    ]);
    expect(screen.getByText('then')).toBeTruthy();
  });
});
