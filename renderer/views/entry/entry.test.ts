import { describe, expect, it } from 'vitest';
import { defaultLibrary } from '../../../core/library/parameterLibrary';
import {
  compositionOf,
  emptyDraft,
  likelyState,
  placesTaken,
  possibleStates,
  tagsOf,
  withCount,
  withMetal,
} from './draft';
import { isomerNames } from './isomerNames';
import { ligandLabel } from './ligands/ligandLabel';

const octahedral = (ligands: Record<string, number>) => ({
  metal: 'Co',
  oxidationState: 3,
  geometry: 'octahedral' as const,
  ligands,
  isomer: null,
});
const isomers = (ligands: Record<string, number>) =>
  [...isomerNames(octahedral(ligands), defaultLibrary)].sort();

describe('a candidate in the making', () => {
  it('offers only oxidation states that the metal can have', () => {
    // Sc is known from 0 to 3, Zn up to 2: N. N. Greenwood and A. Earnshaw, Chemistry of the Elements (1997).
    expect(possibleStates('Sc')).toEqual([0, 1, 2, 3]);
    expect(possibleStates('Zn')).not.toContain(3);
    expect(possibleStates('Xx')).toEqual([]);
  });

  it('begins with a state whose field strength is on file', () => {
    for (const metal of ['Cr', 'Ni', 'Co', 'V']) {
      const state = likelyState(metal, defaultLibrary)!;
      expect(defaultLibrary.ions.get(`${metal}${state}+`)?.g.value).not.toBeNull();
    }
  });

  it('keeps the oxidation state when the next metal can have it', () => {
    const nickel = { ...withMetal(emptyDraft, 'Ni', defaultLibrary), oxidationState: 3 };
    expect(withMetal(nickel, 'Co', defaultLibrary).oxidationState).toBe(3);
    expect(
      withMetal({ ...nickel, oxidationState: 4 }, 'Zn', defaultLibrary).oxidationState,
    ).toBeLessThanOrEqual(2);
  });

  it('counts a chelate for all its donors and drops a ligand at zero', () => {
    const two = withCount(withCount(emptyDraft, 'en', 2), 'cl', 2);
    expect(placesTaken(two.ligands, defaultLibrary)).toBe(6);
    expect(withCount(two, 'en', 0).ligands).toEqual({ cl: 2 });
  });

  it('is nothing to ask about before metal, state and a ligand are chosen', () => {
    expect(compositionOf(emptyDraft)).toBeNull();
    expect(compositionOf(withMetal(emptyDraft, 'Cr', defaultLibrary))).toBeNull();
    expect(compositionOf(withCount(withMetal(emptyDraft, 'Cr', defaultLibrary), 'nh3', 6))).not.toBeNull();
  });

  it('takes tags apart by commas or by their marks, each once', () => {
    expect(tagsOf('order, #short list; order')).toEqual(['order', 'short list']);
    expect(tagsOf('#one #two')).toEqual(['one', 'two']);
    expect(tagsOf(' , ')).toEqual([]);
  });
});

describe('isomers on offer', () => {
  // Textbook counts of stereoisomers: IUPAC Red Book 2005, IR-9.3.
  it('are cis and trans for MA4B2 and M(AA)2B2, fac and mer for MA3B3, none where there is no choice', () => {
    expect(isomers({ nh3: 4, cl: 2 })).toEqual(['cis', 'trans']);
    expect(isomers({ en: 2, cl: 2 })).toEqual(['cis', 'trans']);
    expect(isomers({ nh3: 3, cl: 3 })).toEqual(['fac', 'mer']);
    expect(isomers({ nh3: 6 })).toEqual([]);
    expect(isomers({ nh3: 5, cl: 1 })).toEqual([]);
    expect(isomers({ en: 3 })).toEqual([]);
  });
});

describe('ligands on buttons', () => {
  it('stand as short formulas or by their abbreviation', () => {
    const label = (id: string) => ligandLabel(defaultLibrary.ligands.get(id)!);
    expect(['h2o', 'nh3', 'cn', 'en', 'bipy'].map(label)).toEqual(['H2O', 'NH3', 'CN', 'en', 'bpy']);
  });
});
