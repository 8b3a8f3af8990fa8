import { act, renderHook } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { Candidate } from '../../../core/record/project';
import { drafts } from '../../store';
import { useNotesDraft } from './useNotesDraft';

const update = vi.fn(async () => undefined);
vi.mock('../../app/services', () => ({
  useStore: () => ({ candidates: { update } }),
  inWords: (error: Error) => error.message,
}));

const candidate = (notes: string, revision: number) => ({ id: 'c1', notes, revision }) as Candidate;
const start = (notes = 'old', revision = 1) =>
  renderHook(({ of }) => useNotesDraft(of), { initialProps: { of: candidate(notes, revision) } });

beforeEach(() => {
  localStorage.clear();
  update.mockClear();
});

describe('notes being written', () => {
  it('are stored when one leaves the field, based on the state they were written over', () => {
    const { result } = start();
    act(() => result.current.write('new'));
    act(() => result.current.save());
    expect(update).toHaveBeenCalledWith(expect.anything(), 'write notes', { notes: 'new' }, 1);
  });

  it('follow what is stored as long as nothing was typed', () => {
    const { result, rerender } = start();
    rerender({ of: candidate('from elsewhere', 2) });
    expect(result.current).toMatchObject({ text: 'from elsewhere', unsaved: false, theirs: null });
  });

  it('are not stored over notes that came from elsewhere meanwhile, until one says so', () => {
    const { result, rerender } = start();
    act(() => result.current.write('mine'));
    rerender({ of: candidate('theirs', 2) });
    expect(result.current).toMatchObject({ text: 'mine', theirs: 'theirs' });
    act(() => result.current.save());
    expect(update).not.toHaveBeenCalled();
    act(() => result.current.keepMine());
    expect(update).toHaveBeenCalledWith(expect.anything(), 'write notes', { notes: 'mine' }, 2);
  });

  it('give way to theirs when one says so', () => {
    const { result, rerender } = start();
    act(() => result.current.write('mine'));
    rerender({ of: candidate('theirs', 2) });
    act(() => result.current.takeTheirs());
    expect(result.current).toMatchObject({ text: 'theirs', unsaved: false, theirs: null });
    expect(drafts.read('notes:c1')).toBeNull();
  });

  it('are not disturbed by a change of another field', () => {
    const { result, rerender } = start();
    act(() => result.current.write('mine'));
    rerender({ of: candidate('old', 2) });
    act(() => result.current.save());
    expect(update).toHaveBeenCalledWith(expect.anything(), 'write notes', { notes: 'mine' }, 2);
  });

  it('come back after a crash; a draft older than what is stored is shown as such', () => {
    drafts.keep('notes:c1', { text: 'typed before the crash', over: 'old' });
    expect(start().result.current).toMatchObject({ text: 'typed before the crash', theirs: null });
    expect(start('stored later', 5).result.current).toMatchObject({ theirs: 'stored later' });
    drafts.keep('notes:c1', { text: 'stored later', over: 'old' });
    expect(start('stored later', 5).result.current).toMatchObject({ unsaved: false, theirs: null });
  });
});
