import { describe, expect, it } from 'vitest';
import { SpinhueError } from '../../../core/errors';
import { writeBundle } from '../../../core/record/bundle';
import type { CommandIo } from '../command';
import { checkProject } from './checkProject';

const row = {
  revision: 0,
  createdAt: '2026-01-01T00:00:00.000Z',
  updatedAt: '2026-01-01T00:00:00.000Z',
  deletedAt: null,
};
const whole = writeBundle({
  projects: [
    { ...row, id: 'p', name: 'Filter', notes: '', demo: false, targetLab: null, parameterSetId: null },
  ],
});

async function check(files: Record<string, string>) {
  const notes: string[] = [];
  let failed = false;
  const io = {
    readBytes: async (path: string) => {
      const text = files[path];
      if (text === undefined) {
        throw new SpinhueError({ code: 'unreadable-file', message: `cannot read ${path}`, field: path });
      }
      return new TextEncoder().encode(text);
    },
    note: (line: string) => notes.push(line),
    fail: () => {
      failed = true;
    },
  } as unknown as CommandIo;
  const results = (await checkProject.run({ operands: Object.keys(files), options: new Map() }, io)) as {
    ok: boolean;
    rows: Record<string, number>;
    projects: string[];
    problems: { code: string; field: string }[];
  }[];
  return { results, notes, failed };
}

describe('check-project', () => {
  it('says that a whole bundle is whole, what it holds, and does not fail', async () => {
    const { results, failed } = await check({ 'a.spinhue': whole });
    expect(results[0]).toMatchObject({ ok: true, projects: ['Filter'], rows: { projects: 1 }, problems: [] });
    expect(failed).toBe(false);
  });

  it('finds a changed letter by the checksum, a cut, a foreign file and a newer format, naming the place', async () => {
    const { results, notes, failed } = await check({
      changed: whole.replace('Filter', 'Fitler'),
      cut: whole.slice(0, -20),
      foreign: '{"format":"else"}',
      newer: whole.replace('"version":1', '"version":99'),
      empty: '',
    });
    expect(results.map(({ problems }) => [problems[0]!.code, problems[0]!.field])).toEqual([
      ['integrity', 'checksum'],
      ['malformed-json', 'bundle'],
      ['unknown-field-value', 'format'],
      ['newer-format', 'version'],
      ['empty-input', 'bundle'],
    ]);
    expect(results.every(({ ok }) => !ok)).toBe(true);
    expect(notes).toHaveLength(5);
    expect(failed).toBe(true);
  });

  it('says which rows can still be read', async () => {
    const { results } = await check({ changed: whole.replace('Filter', 'Fitler') });
    expect(results[0]).toMatchObject({ ok: false, rows: { projects: 1 }, projects: ['Fitler'] });
  });

  it('a file that cannot be read does not stop the others', async () => {
    const files = { gone: undefined as unknown as string, good: whole };
    const { results, failed } = await check(files);
    expect(results.map(({ ok }) => ok)).toEqual([false, true]);
    expect(failed).toBe(true);
  });
});
