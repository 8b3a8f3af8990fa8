import { act } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { Dialog } from './Dialog';
import { EmptyState } from './EmptyState';
import { ErrorPanel } from './ErrorPanel';
import { Progress } from './Progress';
import { ToastProvider, useToast } from './Toasts';

afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

describe('the error panel', () => {
  it('names place, fault and remedy of every problem at once', () => {
    render(
      <ErrorPanel
        problems={[
          {
            code: 'coordination-number',
            field: '[0].ligands',
            message: 'Three terpy occupy 9 places, octahedral has 6.',
            remedy: 'Take two terpy.',
          },
          { code: 'unknown-metal', field: '[1].metal', message: '"Xx" is no element.' },
        ]}
      />,
    );
    const alert = screen.getByRole('alert');
    expect(alert.textContent).toMatch(/These 2 points.*9 places.*\[0\]\.ligands.*Take two terpy.*"Xx"/);
  });

  it('is absent without a problem', () => {
    render(<ErrorPanel problems={[]} />);
    expect(screen.queryByRole('alert')).toBeNull();
  });
});

describe('progress', () => {
  it('shows how far it is and can be stopped', () => {
    const stop = vi.fn();
    render(<Progress label="Estimating candidates" done={12_000} total={50_000} onCancel={stop} />);
    expect(screen.getByRole('progressbar', { name: 'Estimating candidates' })).toHaveProperty(
      'value',
      12_000,
    );
    expect(screen.getByText(/12.000 of 50.000/)).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Stop' }));
    expect(stop).toHaveBeenCalledOnce();
  });

  it('has no value while the end is not known', () => {
    render(<Progress label="Reading" done={3} total={null} />);
    expect(screen.getByRole('progressbar').hasAttribute('value')).toBe(false);
  });
});

describe('a dialog', () => {
  it('opens as a named modal and asks to be closed by its button and by Escape', () => {
    const close = vi.fn();
    render(
      <Dialog open title="Delete project" onClose={close} actions={<button>Delete</button>}>
        It can be brought back for thirty days.
      </Dialog>,
    );
    const dialog = screen.getByRole('dialog', { name: 'Delete project' });
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    fireEvent(dialog, new Event('cancel', { cancelable: true }));
    expect(close).toHaveBeenCalledTimes(2);
  });

  it('holds nothing while closed', () => {
    render(
      <Dialog open={false} title="Hidden" onClose={() => undefined}>
        secret
      </Dialog>,
    );
    expect(screen.queryByText('secret')).toBeNull();
  });
});

function Deleter({ undo }: { readonly undo: () => void }) {
  const show = useToast();
  return <button onClick={() => show({ message: 'Deleted one candidate', undo })}>Delete</button>;
}

describe('a toast', () => {
  it('offers undo and leaves once it is taken', () => {
    const undo = vi.fn();
    render(
      <ToastProvider>
        <Deleter undo={undo} />
      </ToastProvider>,
    );
    fireEvent.click(screen.getByRole('button', { name: 'Delete' }));
    fireEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(undo).toHaveBeenCalledOnce();
    expect(screen.queryByText('Deleted one candidate')).toBeNull();
  });

  it('leaves by itself, but not while the pointer rests on it', () => {
    vi.useFakeTimers();
    render(
      <ToastProvider>
        <Deleter undo={() => undefined} />
      </ToastProvider>,
    );
    fireEvent.click(screen.getByRole('button', { name: 'Delete' }));
    fireEvent.pointerEnter(screen.getByText('Deleted one candidate').parentElement!);
    act(() => vi.advanceTimersByTime(60_000));
    expect(screen.getByText('Deleted one candidate')).toBeTruthy();
    fireEvent.pointerLeave(screen.getByText('Deleted one candidate').parentElement!);
    act(() => vi.advanceTimersByTime(60_000));
    expect(screen.queryByText('Deleted one candidate')).toBeNull();
  });
});

describe('an empty state', () => {
  it('says what belongs here and offers to make it', () => {
    render(
      <EmptyState title="No candidates yet" actions={<button>Add a candidate</button>}>
        Choose a metal and its ligands.
      </EmptyState>,
    );
    expect(screen.getByRole('heading', { name: 'No candidates yet' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Add a candidate' })).toBeTruthy();
  });
});
