import { describe, expect, it } from 'vitest';
import { patternKey, patternsFilling } from './pattern';

const shapes = (...denticities: number[]) =>
  denticities.map((denticity) => ({ key: String(denticity), denticity }));

describe('patterns that fill a coordination sphere', () => {
  it('with one kind of monodentate ligand there is one', () => {
    expect(patternsFilling(6, shapes(1), 1).map(patternKey)).toEqual(['1:6']);
  });

  it('with two kinds of monodentate ligand there are the partitions of six into at most two parts', () => {
    expect(patternsFilling(6, shapes(1), 2).map(patternKey)).toEqual([
      '1:6',
      '1:5 1:1',
      '1:4 1:2',
      '1:3 1:3',
    ]);
  });

  it('with three kinds there are the seven partitions of six into at most three parts (common practice)', () => {
    expect(patternsFilling(6, shapes(1), 3)).toHaveLength(7);
  });

  it('count a chelate once and let it take its denticity', () => {
    const keys = patternsFilling(6, shapes(1, 2, 3), 2).map(patternKey);
    expect(keys).toContain('3:2');
    expect(keys).toContain('2:2 1:2');
    expect(keys).toContain('3:1 1:3');
    expect(keys).not.toContain('3:3');
  });

  it('that cannot be filled do not exist: three tridentate ligands do not fit six places, nor two-fold chelates five', () => {
    expect(patternsFilling(5, shapes(2), 3)).toEqual([]);
  });
});
