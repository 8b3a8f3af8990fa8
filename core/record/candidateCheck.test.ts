import { describe, expect, it } from 'vitest';
import { checkCandidate } from './candidateCheck';

const good = { id: 'a', metal: 'Cr', oxidationState: 3, geometry: 'octahedral', ligands: { nh3: 5, cl: 1 } };

function problemOf(change: Record<string, unknown>) {
  const checked = checkCandidate({ ...good, ...change });
  if (checked.ok) throw new Error('was accepted');
  return checked.problems[0]!;
}

describe('a candidate that is in order', () => {
  it('comes back in one spelling', () => {
    const checked = checkCandidate({ ...good, geometry: 'Octahedral', concentration_mM: 5, path_cm: null });
    expect(checked).toEqual({ ok: true, value: { ...good, isomer: null, concentration_mM: 5 } });
  });

  it('may carry further fields, as records of measurements do', () => {
    expect(checkCandidate({ ...good, formula: '[Cr(NH3)5Cl]2+', bands: [] }).ok).toBe(true);
  });

  it.each([
    [{ nh3: 4, cl: 2 }, 'trans'],
    [{ en: 2, cl: 2 }, 'CIS'],
    [{ py: 3, cl: 3 }, 'mer'],
    [{ gly: 3 }, 'fac'],
    [{ dien: 2 }, 'mer'],
  ] as const)('may name an isomer that its ligand set %j has: %s', (ligands, isomer) => {
    expect(checkCandidate({ ...good, ligands, isomer }).ok).toBe(true);
  });
});

describe('a candidate that cannot be', () => {
  it.each([
    ['no metal', { metal: undefined }, 'missing-field', 'metal'],
    ['a metal in full', { metal: 'iron' }, 'unknown-metal', 'metal'],
    ['a main-group metal', { metal: 'Pb' }, 'unknown-metal', 'metal'],
    ['a number for a metal', { metal: 26 }, 'wrong-type', 'metal'],
    [
      'an oxidation state beyond the group',
      { oxidationState: 8 },
      'impossible-oxidation-state',
      'oxidationState',
    ],
    ['a half oxidation state', { oxidationState: 2.5 }, 'wrong-type', 'oxidationState'],
    ['NaN for an oxidation state', { oxidationState: NaN }, 'not-finite', 'oxidationState'],
    ['a text for an oxidation state', { oxidationState: 'III' }, 'wrong-type', 'oxidationState'],
    ['no such geometry', { geometry: 'banana' }, 'unknown-geometry', 'geometry'],
    ['no such ligand', { ligands: { nh4: 6 } }, 'unknown-ligand', 'ligands.nh4'],
    ['half a ligand', { ligands: { nh3: 5.5 } }, 'bad-ligand-count', 'ligands.nh3'],
    ['no ligand', { ligands: { nh3: 0 } }, 'bad-ligand-count', 'ligands.nh3'],
    ['a billion ligands', { ligands: { nh3: 1e9 } }, 'bad-ligand-count', 'ligands.nh3'],
    ['infinitely many ligands', { ligands: { nh3: Infinity } }, 'not-finite', 'ligands.nh3'],
    ['an empty ligand set', { ligands: {} }, 'missing-field', 'ligands'],
    ['a list of ligands', { ligands: ['nh3'] }, 'wrong-type', 'ligands'],
    [
      'three tridentate ligands around six places',
      { ligands: { terpy: 3 } },
      'coordination-number',
      'ligands',
    ],
    ['four places filled of six', { ligands: { nh3: 4 } }, 'coordination-number', 'ligands'],
    ['an isomer the set does not have', { isomer: 'trans' }, 'unknown-isomer', 'isomer'],
    ['a negative concentration', { concentration_mM: -1 }, 'out-of-range', 'concentration_mM'],
    ['no path', { path_cm: 0 }, 'out-of-range', 'path_cm'],
    ['NaN for a path', { path_cm: NaN }, 'not-finite', 'path_cm'],
    ['no id', { id: undefined }, 'missing-field', 'id'],
    ['a misspelt field', { isomr: 'cis' }, 'unknown-field-value', 'isomr'],
  ] as const)('is refused with code, field and remedy: %s', (_, change, code, field) => {
    const problem = problemOf(change);
    expect(problem.code).toBe(code);
    expect(problem.field).toBe(field);
    expect(problem.remedy).toMatch(/\w/);
  });

  it.each([
    [{ ligands: { NH3: 6 } }, 'nh3'],
    [{ ligands: { bpy: 3 } }, 'bipy'],
    [{ ligands: { ammonia: 6 } }, 'nh3'],
    [{ metal: 'chromium' }, 'Cr'],
    [{ geometry: 'octahedrl' }, 'octahedral'],
  ])('%j is answered with what was probably meant: %s', (change, meant) => {
    expect(problemOf(change).remedy).toContain(meant);
  });

  it('is told everything at once', () => {
    const checked = checkCandidate({ id: '', metal: 'Qq', oxidationState: 99, geometry: 7, ligands: null });
    expect(checked.ok ? 0 : checked.problems.length).toBeGreaterThanOrEqual(4);
  });

  it.each([null, 7, 'x', [], undefined])('need not even be an object: %j', (input) => {
    const checked = checkCandidate(input, { place: '[2]' });
    expect(checked.ok ? '' : checked.problems[0]!.field).toBe('[2]');
  });

  it('cannot reach into the prototype', () => {
    const ligands = JSON.parse('{"__proto__": 3, "constructor": 3}') as unknown;
    expect(problemOf({ ligands }).code).toBe('unknown-ligand');
  });
});
