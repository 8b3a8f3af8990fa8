// @vitest-environment node
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { commandTable } from './host/commands';

const text = readFileSync(join(import.meta.dirname, 'LABELS.md'), 'utf8');

describe('the list of labels', () => {
  it.each(commandTable.map(({ id, title }) => [id, title.replace('…', '')]))(
    'has a line with a reason for %s',
    (id, title) => {
      const line = text.split('\n').find((each) => each.includes(`\`${id}\``)) ?? '';
      expect(line).toContain(`| ${title} |`);
      expect(line.split('|')[3]).toMatch(/^ [TSPO]\b/);
    },
  );
});
