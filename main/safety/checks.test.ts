import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

const root = join(import.meta.dirname, '../..');

/** Lines of both tables: number, and each named test with its file. */
async function listed() {
  const text = await readFile(join(import.meta.dirname, 'CHECKS.md'), 'utf8');
  const [rows, losses] = text.split('## Ways to lose data').map((part) =>
    part.split('\n').flatMap((line) => {
      const number = /^\| (\d+) \|/.exec(line)?.[1];
      if (number === undefined) return [];
      const cells = line.split('|').slice(3, 5);
      const tests = cells.flatMap((cell) => {
        const match = /`([^`]+)`: (.+)/.exec(cell.trim());
        return match ? [{ file: match[1]!, title: match[2]!.trim() }] : [];
      });
      return [{ number: Number(number), tests }];
    }),
  );
  return { rows: rows!, losses: losses! };
}

describe('the list of checks', () => {
  it('numbers 26 rows of the program and 23 ways to lose data, each with a test', async () => {
    const { rows, losses } = await listed();
    const upTo = (count: number) => Array.from({ length: count }, (_, index) => index + 1);
    expect(rows.map(({ number }) => number)).toEqual(upTo(26));
    expect(losses.map(({ number }) => number)).toEqual(upTo(23));
    for (const { number, tests } of [...rows, ...losses]) {
      expect(tests.length, `row ${number}`).toBeGreaterThan(0);
    }
  });

  it('names only tests that exist', async () => {
    const { rows, losses } = await listed();
    const missing: string[] = [];
    for (const { file, title } of [...rows, ...losses].flatMap(({ tests }) => tests)) {
      const text = await readFile(join(root, file), 'utf8').catch(() => '');
      if (!text.includes(`'${title}'`)) missing.push(`${file}: ${title}`);
    }
    expect(missing).toEqual([]);
  });

  it('is linked from the README', async () => {
    expect(await readFile(join(root, 'README.md'), 'utf8')).toContain('main/safety/CHECKS.md');
  });
});
