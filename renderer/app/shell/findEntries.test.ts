import { describe, expect, it } from 'vitest';
import type { Candidate } from '../../../core/record/project';
import type { Command } from '../commands';
import { findCandidates, findCommands } from './findEntries';

const row = (id: string, more: Partial<Candidate> = {}): Candidate =>
  ({ id, name: '', tags: [], notes: '', composition: { metal: 'Cr' }, ...more }) as unknown as Candidate;
const formulas: Record<string, string> = { a: '[Cr(en)3]3+', b: '[Ti(H2O)6]3+', c: '[Ni(phen)3]2+' };
const find = (query: string, rows: readonly Candidate[]) =>
  findCandidates(rows, (id) => ({ ok: true, formula: formulas[id]! }) as never, query).map(({ id }) => id);

describe('finding candidates', () => {
  it('puts a ligand of that name before letters inside another, and those before notes', () => {
    const rows = [row('b', { notes: 'seen when fresh' }), row('c'), row('a')];
    expect(find('en', rows)).toEqual(['a', 'c', 'b']);
  });

  it('needs every word, and takes tags with or without their mark', () => {
    const rows = [row('a', { tags: ['order'] }), row('c')];
    expect(find('cr #order', rows)).toEqual(['a']);
    expect(find('cr copper', rows)).toEqual([]);
  });
});

describe('finding commands', () => {
  it('lists one of several with the same id, the one of the view on screen', () => {
    const command = (group: string): Command => ({ id: 'x', label: 'Star', group, run: () => undefined });
    expect(findCommands([command('view'), command('frame')], 'star').map(({ detail }) => detail)).toEqual([
      'view',
    ]);
  });
});
