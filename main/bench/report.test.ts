import { describe as suite, expect, it } from 'vitest';
import { measure } from './measure';
import { atLeast, atMost, describe, figure, isMet } from './report';
import { spinComponentBlocks } from './plainMatrices';
import { benches } from './benches';

suite('the report of a bench', () => {
  it('says of each figure with an aim whether it is met', () => {
    expect(isMet(figure('faster', 51, 'times', atLeast(50)))).toBe(true);
    expect(isMet(figure('slower', 2.1, 'times', atMost(2)))).toBe(false);
    expect(isMet(figure('rate', 7, 'a second'))).toBeNull();
    const text = describe({
      title: 'title',
      timings: [{ what: 'engine', milliseconds: 0.0123456, repeats: 5 }],
      figures: [figure('faster', 51, 'times', atLeast(50)), figure('slower', 2.1, 'times', atMost(2))],
      skipped: ['LAPACK'],
    });
    expect(text).toMatch(/engine +0\.01235 ms \(best of 5\)/);
    expect(text).toMatch(/51 times {2}\(at least 50: met\)/);
    expect(text).toMatch(/2\.1 times {2}\(at most 2: NOT met\)/);
    expect(text).toMatch(/skipped: LAPACK/);
  });
});

suite('measuring', () => {
  it('runs a long contestant once a round and once before, a short one five times a round after a warm-up', () => {
    let long = 0;
    let short = 0;
    const timings = measure(
      [
        { what: 'long', run: () => void (long += 1) },
        { what: 'short', run: () => void (short += 1), batch: 3 },
      ],
      4,
    );
    expect(long).toBe(5);
    expect(short).toBeGreaterThan(60);
    expect(timings.map(({ repeats }) => repeats)).toEqual([4, 60]);
    for (const { milliseconds } of timings) expect(Number.isFinite(milliseconds)).toBe(true);
  });
});

suite('the plain matrices', () => {
  it('are the M_S blocks of d5: 1, 25, 100, 100, 25, 1', () => {
    const blocks = spinComponentBlocks({ dElectrons: 5, B: 1, C: 4, field: { type: 'oct', tenDq: 10 } });
    expect(blocks.map(({ size }) => size).sort((a, b) => a - b)).toEqual([1, 1, 25, 25, 100, 100]);
  });
});

suite('the list of benches', () => {
  it('has names that can be typed, each once', () => {
    const names = benches.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    for (const name of names) expect(name).toMatch(/^[a-z-]+$/);
  });
});
