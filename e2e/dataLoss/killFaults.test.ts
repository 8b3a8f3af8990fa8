import { describe, expect, it } from 'vitest';
import { faultsOf, noteText, type Progress } from './killFaults';
import type { StoredState } from './storedState';

const progress: Progress = { confirmations: 7, attempted: 8, confirmed: 7, starred: false, starring: false };
const state: StoredState = {
  notes: noteText(7),
  starred: 0,
  candidates: 41,
  changes: 12,
  edits: 12,
  journalAgrees: true,
};

describe('what the kill test looks for', () => {
  it('finds nothing wrong with the confirmed edit, nor with one that was stored and not yet confirmed', () => {
    expect(faultsOf(state, progress)).toEqual([]);
    expect(faultsOf({ ...state, notes: noteText(8) }, progress)).toEqual([]);
    expect(faultsOf({ ...state, starred: 41 }, { ...progress, starring: true })).toEqual([]);
  });

  it.each([
    ['a confirmed edit that is gone', { notes: noteText(6) }],
    ['an edit that nobody made', { notes: noteText(9) }],
    ['half a text', { notes: noteText(7).slice(0, -5) }],
    ['half a step over many rows', { starred: 17 }],
    ['a confirmed step that is gone', { starred: 41 }],
    ['a step without its edits', { edits: 11 }],
    ['a journal that does not fit the rows', { journalAgrees: false }],
  ])('finds %s', (_, wrong) => {
    expect(faultsOf({ ...state, ...wrong }, progress).length).toBeGreaterThan(0);
  });
});
