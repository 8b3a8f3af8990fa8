import { describe, expect, it } from 'vitest';
import { add, countBrowser, countUnit, none, summary } from './counts';

describe('counting checks from the runners’ own reports', () => {
  it('counts tests, and a file that could not be loaded as one failure', () => {
    const counts = countUnit({
      testResults: [
        {
          name: 'a.test.ts',
          status: 'failed',
          assertionResults: [
            { status: 'passed', fullName: 'one' },
            { status: 'failed', fullName: 'two', failureMessages: ['expected 1\nat'] },
            { status: 'pending', fullName: 'three' },
            { status: 'todo', fullName: 'four' },
          ],
        },
        { name: 'b.test.ts', status: 'failed', message: 'Cannot find module\nx', assertionResults: [] },
      ],
    });
    expect(counts).toEqual({
      passed: 1,
      failed: 2,
      skipped: 2,
      failures: ['two: expected 1', 'b.test.ts: Cannot find module'],
      skips: ['three', 'four'],
    });
  });

  it('counts nested browser tests with the reasons of skipped ones; flaky and outer errors are failures', () => {
    const test = (status: 'expected' | 'unexpected' | 'flaky' | 'skipped', reason?: string) => ({
      title: status,
      tests: [
        {
          status,
          annotations: reason === undefined ? [] : [{ type: 'skip', description: reason }],
          results: [{ error: { message: 'boom\nat' } }],
        },
      ],
    });
    const counts = countBrowser({
      errors: [{ message: 'no such file' }],
      suites: [
        {
          title: 'file',
          specs: [test('expected')],
          suites: [
            { title: 'inner', specs: [test('unexpected'), test('flaky'), test('skipped', 'no binary')] },
          ],
        },
      ],
    });
    expect(counts).toMatchObject({ passed: 1, failed: 3, skipped: 1, skips: ['skipped (no binary)'] });
    expect(summary(add(counts, none()))).toBe('1 passed, 3 failed, 1 skipped');
  });
});
