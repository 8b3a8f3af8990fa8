import { afterEach, describe, expect, it } from 'vitest';
import { cleanup, render, screen } from '@testing-library/react';
import { SpinBar } from './SpinBar';

afterEach(cleanup);

describe('the spin bar', () => {
  it('draws both probabilities as extents and says them', () => {
    render(
      <SpinBar
        spin={{ probabilityHigh: 0.57, words: 'cannot say', unpairedElectrons: 4, nearCrossover: true }}
      />,
    );
    const bar = screen.getByRole('img', { name: /high spin 57.%, low spin 43.%/ });
    expect((bar.firstElementChild as HTMLElement).style.inlineSize).toMatch(/^56\.99|^57/);
    expect(screen.getByText('cannot say')).toBeTruthy();
    expect(
      screen.getByText(/4 unpaired electrons at the central estimate; near the spin crossover/),
    ).toBeTruthy();
  });

  it('draws no bar where the d count leaves no choice', () => {
    render(
      <SpinBar
        spin={{ probabilityHigh: null, words: 'one spin only', unpairedElectrons: 3, nearCrossover: false }}
      />,
    );
    expect(screen.queryByRole('img')).toBeNull();
    expect(screen.getByText('3 unpaired electrons')).toBeTruthy();
  });

  it('is one line in a table row', () => {
    render(
      <SpinBar
        compact
        spin={{
          probabilityHigh: 0.999,
          words: 'high spin expected',
          unpairedElectrons: 1,
          nearCrossover: false,
        }}
      />,
    );
    expect(screen.queryByText(/unpaired/)).toBeNull();
    expect(screen.getByRole('img', { name: /high spin >.99.%, low spin <.1.%/ })).toBeTruthy();
  });
});
