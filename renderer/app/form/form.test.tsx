import { afterEach, describe, expect, it, vi } from 'vitest';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { NumberField } from './NumberField';
import { readNumber } from './readNumber';

afterEach(cleanup);

describe('numbers as typed', () => {
  it('are read with a point or a comma, and nothing else is', () => {
    expect(readNumber('0,5')).toBe(0.5);
    expect(readNumber(' 21 700 ')).toBe(21_700);
    expect(readNumber('1e-3')).toBe(0.001);
    for (const junk of ['', '1.2.3', '1,000,5', 'NaN', 'Infinity', '12 mM', '0x10'])
      expect(readNumber(junk)).toBeNull();
  });
});

describe('a number field', () => {
  it('takes what makes sense and says what does not', async () => {
    const onChange = vi.fn();
    render(<NumberField label="Path" unit="cm" value={1} onChange={onChange} most={100} />);
    const field = screen.getByRole('textbox', { name: 'Path' });
    await userEvent.clear(field);
    await userEvent.type(field, '0,5');
    expect(onChange).toHaveBeenLastCalledWith(0.5);
    await userEvent.clear(field);
    await userEvent.type(field, '-3');
    expect(screen.getByText('Enter a number above zero.')).toBeTruthy();
    expect(onChange).toHaveBeenLastCalledWith(0.5);
  });
});
