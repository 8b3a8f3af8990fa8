import { afterEach, describe, expect, it, vi } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { Axes } from './Axes';
import { Plot, type PlotProps } from './Plot';
import { tableText } from './PlotTable';

afterEach(cleanup);

const props: Omit<PlotProps, 'children'> = {
  title: 'Growth',
  summary: 'A line that rises.',
  x: { label: 'time / s', domain: [0, 10] },
  y: { label: 'height / cm', domain: [0, 100] },
  zoom: 'xy',
  series: [{ id: 'a', name: 'a', xs: [0, 5, 10], ys: [0, 50, 100], text: (index) => `point ${index}` }],
  table: {
    columns: ['time / s', 'height / cm'],
    rows: [
      [0, 0],
      [5, null],
    ],
  },
};
const show = (more: Partial<PlotProps> = {}) =>
  render(
    <Plot {...props} {...more}>
      {(view) => (
        <svg>
          <Axes view={view} />
        </svg>
      )}
    </Plot>,
  );
const stage = () => screen.getByRole('application');

describe('a plot', () => {
  it('is named by its title and what it shows', () => {
    show();
    expect(screen.getByRole('application', { name: 'Growth. A line that rises.' })).toBeTruthy();
    expect(screen.getByText('time / s')).toBeTruthy();
  });

  it('is read point by point with the arrow keys', () => {
    show();
    fireEvent.keyDown(stage(), { key: 'ArrowRight' });
    fireEvent.keyDown(stage(), { key: 'ArrowRight' });
    expect(screen.getByRole('status').textContent).toBe('point 1');
    fireEvent.keyDown(stage(), { key: 'Escape' });
    expect(screen.queryByText('point 1')).toBeNull();
  });

  it('is read under the pointer', () => {
    show();
    stage().getBoundingClientRect = () => ({ left: 0, top: 0 }) as DOMRect;
    fireEvent.pointerMove(stage(), { clientX: 600, clientY: 100 });
    expect(screen.getByText('point 2')).toBeTruthy();
    fireEvent.pointerLeave(stage());
    expect(screen.queryByText('point 2')).toBeNull();
  });

  it('leaves keys it does not use, and combinations, to the page', () => {
    show();
    expect(fireEvent.keyDown(stage(), { key: 'Tab' })).toBe(true);
    expect(fireEvent.keyDown(stage(), { key: '0', ctrlKey: true })).toBe(true);
    expect(fireEvent.keyDown(stage(), { key: 'ArrowRight' })).toBe(false);
  });

  it('zooms by key, by drag, and shows all again', () => {
    show();
    const all = screen.getByRole('button', { name: 'All' }) as HTMLButtonElement;
    expect(all.disabled).toBe(true);
    fireEvent.keyDown(stage(), { key: '+' });
    expect(all.disabled).toBe(false);
    fireEvent.click(all);
    expect(all.disabled).toBe(true);
    stage().getBoundingClientRect = () => ({ left: 0, top: 0 }) as DOMRect;
    fireEvent.pointerDown(stage(), { clientX: 200, clientY: 60, button: 0 });
    fireEvent.pointerMove(stage(), { clientX: 400, clientY: 200 });
    fireEvent.pointerUp(stage(), { clientX: 400, clientY: 200 });
    expect(all.disabled).toBe(false);
  });

  it('opens the point being read by Enter or a click', () => {
    const onOpen = vi.fn();
    show({ onOpen });
    fireEvent.keyDown(stage(), { key: 'End' });
    fireEvent.keyDown(stage(), { key: 'Enter' });
    expect(onOpen).toHaveBeenCalledWith({ series: 0, index: 2 });
  });

  it('has its data as a table behind it', () => {
    show();
    expect(screen.queryByRole('table')).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Table' }));
    expect(screen.getByRole('columnheader', { name: 'height / cm' })).toBeTruthy();
    expect(screen.getAllByRole('row')).toHaveLength(3);
    expect(tableText(props.table)).toBe('time / s\theight / cm\n0\t0\n5\t');
  });

  it('says what is missing in place of an empty drawing', () => {
    show({ empty: 'Nothing measured yet.' });
    expect(screen.getByText('Nothing measured yet.')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Table' })).toBeNull();
  });
});
