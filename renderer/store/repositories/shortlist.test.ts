// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { predict } from '../../../core/prediction';
import { testStore } from '../testing/testStore';

describe('the shortlist of a search', () => {
  it('keeps candidates with the prediction frozen and the wish inside it, as one step that can be undone', async () => {
    const { store } = await testStore();
    const project = await store.projects.create('Filter');
    const composition = {
      metal: 'Cr',
      oxidationState: 3,
      geometry: 'octahedral',
      ligands: { nh3: 6 },
    } as const;
    const outcome = predict({ ...composition, id: 'found' });
    if (!outcome.ok) throw new Error('not estimated');
    const wish = { name: 'green', bands: [{ from_nm: 440, to_nm: 480 }] };
    const [candidate] = await store.shortlist.add(project.id, [
      {
        composition,
        prediction: outcome.prediction,
        reason: 'found for the wish “green”, chance 70 %',
        shortlistedFor: { wish, probability: 0.7, parts: [] },
      },
    ]);
    const [frozen] = await store.frozenPredictions.of(candidate!.id);
    expect(frozen!.parameterHash).toBe(outcome.prediction.madeWith.parameterHash);
    expect(frozen!.modelVersion).toBe(outcome.prediction.madeWith.modelVersion);
    expect(frozen!.prediction).toMatchObject({
      formula: '[Cr(NH3)6]3+',
      shortlistedFor: { wish, probability: 0.7 },
    });
    await store.journal.undo(project.id);
    expect(await store.candidates.allOf(project.id)).toEqual([]);
    expect(await store.frozenPredictions.of(candidate!.id)).toEqual([]);
  });
});
