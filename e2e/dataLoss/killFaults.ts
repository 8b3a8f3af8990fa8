import type { StoredState } from './storedState';

/** Grows with the number, so that half a text would be noticed. */
export const noteText = (number: number): string =>
  `edit ${number}: ${String(number)
    .padStart(6, '0')
    .repeat(20 + (number % 50))} end ${number}`;
export const numberOf = (text: string): number => Number(/^edit (\d+):/.exec(text)?.[1] ?? 0);

export interface Progress {
  /** Edits that the screen confirmed, over all kills. */
  confirmations: number;
  attempted: number;
  confirmed: number;
  /** Whether all are starred, as the screen last confirmed, and whether a change of it is under way. */
  starred: boolean;
  starring: boolean;
}

/** What must not be after a kill, in words; empty where all is well. */
export function faultsOf(state: StoredState, progress: Progress): string[] {
  const faults: string[] = [];
  const number = numberOf(state.notes);
  if (number < progress.confirmed)
    faults.push(`note ${progress.confirmed} was confirmed, ${number} is stored`);
  if (number > progress.attempted) faults.push(`note ${number} was never written`);
  if (number > 0 && state.notes !== noteText(number)) faults.push(`note ${number} is half there`);
  if (state.starred !== 0 && state.starred !== state.candidates) {
    faults.push(`${state.starred} of ${state.candidates} candidates are starred: half a step`);
  }
  if (!progress.starring && state.starred > 0 !== progress.starred) {
    faults.push(`the stars were confirmed as ${progress.starred} and are not`);
  }
  if (state.changes !== state.edits) faults.push(`${state.changes} steps but ${state.edits} lists of edits`);
  if (!state.journalAgrees) faults.push('the last step of the journal does not fit the rows');
  return faults;
}
