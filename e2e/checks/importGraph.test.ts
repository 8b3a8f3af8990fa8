import { resolve } from 'node:path';
import { describe, expect, it } from 'vitest';
import { cycles, importGraph } from './importGraph';

const root = resolve(import.meta.dirname, '../..');

describe('imports', () => {
  it('the search for cycles finds one when there is one', () => {
    const graph = new Map([
      ['a', ['b']],
      ['b', ['c', 'd']],
      ['c', ['a']],
      ['d', []],
      ['e', ['e']],
    ]);
    expect(cycles(graph)).toEqual([['a', 'b', 'c'], ['e']]);
  });

  const graph = importGraph(root, ['core', 'renderer', 'main']);

  it('the graph is the project’s: known imports are in it', () => {
    expect(graph.size).toBeGreaterThan(100);
    expect(graph.get('main/main.ts')).toContain('main/ipc/answerCalls.ts');
    expect(graph.get('renderer/host/index.ts')).toContain('renderer/host/browserHost.ts');
  });

  it('core, renderer and main hold no import cycle', () => {
    expect(cycles(graph)).toEqual([]);
  });
});
