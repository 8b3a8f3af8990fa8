import { expect, it } from 'vitest';
import { draw, trueSpectra } from '../../testing/bands/coverage';
import { compareCounts } from './compareCounts';

it('the comparison of band counts suggests the number that made the spectrum', () => {
  for (const [name, count] of [
    ['three bands, one a shoulder', 3],
    ['two close bands', 2],
  ] as const) {
    const list = compareCounts({ ...draw(trueSpectra[name]!, 21), baseline: 'none' }, count + 1);
    const best = list.find((each) => each.suggested)!;
    expect(best.count).toBe(count);
    expect(best.caution).toBeNull();
    const centres = best.fit.bands.map((band) => band.centre_cm1).sort((a, b) => a - b);
    trueSpectra[name]!.bands.forEach((band, k) =>
      expect(Math.abs(centres[k]! - band.centre_cm1)).toBeLessThan(200),
    );
    expect(list.slice(0, count - 1).every((each) => each.above > 10)).toBe(true);
  }
});
