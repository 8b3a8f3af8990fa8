import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { Explain, quantities, quantityIds } from '.';

afterEach(cleanup);
beforeAll(() => {
  // The test's page knows no modal dialogs.
  HTMLDialogElement.prototype.showModal ??= function (this: HTMLDialogElement) {
    this.open = true;
  };
  HTMLDialogElement.prototype.close ??= function (this: HTMLDialogElement) {
    this.open = false;
  };
});

describe('the account of a quantity', () => {
  it.each(quantityIds)('%s names a dated source and a case in which it fails', (id) => {
    const { source, fails, what, how } = quantities[id];
    expect(source).toMatch(/\b(19|20)\d\d\b|CIE 15/);
    for (const text of [what, how, fails]) expect(text.length).toBeGreaterThan(20);
  });

  it('opens from its question mark', () => {
    render(<Explain quantity="tenDq" />);
    expect(screen.queryByText('When it fails')).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'What is 10Dq?' }));
    expect(screen.getByText('When it fails')).toBeTruthy();
  });
});
