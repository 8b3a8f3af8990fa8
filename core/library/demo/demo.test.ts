import { describe, expect, it } from 'vitest';
import { checkCandidate } from '../../record/candidateCheck';
import { demoProject } from '.';

describe('the demo project', () => {
  it('holds about forty candidates that pass every check, each once', () => {
    const ids = new Set(demoProject.candidates.map(({ id }) => id));
    expect(ids.size).toBe(demoProject.candidates.length);
    expect(ids.size).toBeGreaterThanOrEqual(38);
    for (const { id, composition, concentration_mM, path_cm } of demoProject.candidates) {
      expect(checkCandidate({ id, ...composition, concentration_mM, path_cm }), id).toMatchObject({
        ok: true,
      });
    }
  });

  it('keeps to its own conditions: no cobalt and no chromium(VI)', () => {
    for (const { composition } of demoProject.candidates) {
      expect(composition.metal).not.toBe('Co');
      expect(`${composition.metal}${composition.oxidationState}`).not.toBe('Cr6');
    }
  });

  it('is marked as made up', () => {
    expect(demoProject.name).toMatch(/^Demo/);
    expect(demoProject.notes).toMatch(/^Made-up/);
  });
});
