import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../library';
import { checkWish } from './checkWish';

const problemsOf = (input: unknown) => {
  const checked = checkWish(input, defaultLibrary);
  return checked.ok ? [] : checked.problems;
};

describe('a wish', () => {
  it('needs a name only; the rest has defaults', () => {
    const checked = checkWish({ name: 'anything' }, defaultLibrary);
    expect(checked.ok && checked.value).toMatchObject({
      ions: 'all',
      ligands: { allow: 'all', maxKinds: 2 },
    });
  });

  it('with a mistyped field is refused with the place', () => {
    expect(problemsOf({ name: 'x', bands: [{ from_nm: 560, to_nm: '590' }] })[0]).toMatchObject({
      code: 'wrong-type',
      field: 'bands[0].to_nm',
    });
    expect(problemsOf({ name: 'x', bnds: [] })[0]!.message).toContain('bnds');
  });

  it('with an unknown ion or ligand says which and what may be meant', () => {
    const problems = problemsOf({ name: 'x', ions: ['fe2+'], ligands: { allow: ['nh3', 'NOPE'] } });
    expect(problems.map(({ field, remedy }) => [field, remedy])).toEqual([
      ['ions[0]', 'did you mean Fe2+?'],
      ['ligands.allow[1]', 'see the library for the ids it has'],
    ]);
  });

  it('with a window upside down is refused', () => {
    expect(problemsOf({ name: 'x', bands: [{ from_nm: 600, to_nm: 500 }] })[0]!.field).toBe('bands[0].to_nm');
  });

  it('that wants a band where it also wants transparency contradicts itself', () => {
    const [problem] = problemsOf({
      name: 'x',
      bands: [{ from_nm: 560, to_nm: 590, minMolarAbsorptivity: 50 }],
      clear: [{ from_nm: 500, to_nm: 700, maxMolarAbsorptivity: 5 }],
    });
    expect(problem).toMatchObject({ code: 'contradictory-wish', field: 'bands[0]' });
  });

  it('for low-spin d9 or for four unpaired electrons on chromium(III) can not be met', () => {
    expect(problemsOf({ name: 'x', ions: ['Cu2+'], spin: 'low' })[0]!.code).toBe('contradictory-wish');
    expect(problemsOf({ name: 'x', ions: ['Cr3+'], unpaired: { min: 4, max: 4 } })[0]!.code).toBe(
      'contradictory-wish',
    );
  });

  it('that leaves no ligand says so', () => {
    expect(problemsOf({ name: 'x', ligands: { allow: [] } })[0]).toMatchObject({ field: 'ligands' });
  });
});
