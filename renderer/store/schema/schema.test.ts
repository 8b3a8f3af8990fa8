// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { tableNames } from '../../../core/record/bundle';
import { ownership, recordTables } from '../rows';
import { testStore } from '../testing/testStore';
import { schemaVersions } from './versions';

/** Frozen once released: a table, key or index that is gone would leave shipped data unreadable. */
const shipped: Record<number, Record<string, string>> = {
  1: {
    projects: 'id, deletedAt',
    candidates: 'id, projectId, [projectId+id], deletedAt',
    parameterSets: 'id, projectId, deletedAt',
    frozenPredictions: 'id, projectId, candidateId, deletedAt',
    samples: 'id, projectId, candidateId, deletedAt',
    measurements: 'id, projectId, candidateId, sampleId, deletedAt',
    analyses: 'id, projectId, measurementId, deletedAt',
    wishes: 'id, projectId, deletedAt',
    curves: 'id',
    files: 'id',
    log: 'id, projectId',
    changes: '++order, [scope+undone+order], [undone+turn], [scope+undone+turn]',
    edits: 'order',
    settings: 'key',
    estimates: 'key, madeWith',
  },
};

describe('the schema', () => {
  it('is for every version what was shipped', () => {
    expect(Object.fromEntries(schemaVersions.map(({ version, stores }) => [version, stores]))).toEqual(
      shipped,
    );
  });

  it('has ascending versions and a table for every kind of row that a bundle holds', () => {
    const versions = schemaVersions.map(({ version }) => version);
    expect(versions).toEqual([...new Set(versions)].sort((one, other) => one - other));
    const tables = new Set(schemaVersions.flatMap(({ stores }) => Object.keys(stores)));
    for (const table of tableNames) expect(tables).toContain(table);
  });

  it('indexes every link by which a row belongs to another, its project, and the time of deletion', async () => {
    const { store } = await testStore();
    const indexesOf = (table: string) => store.db.table(table).schema.indexes.map(({ name }) => name);
    for (const { table, field } of ownership) expect(indexesOf(table)).toContain(field);
    for (const table of recordTables) {
      expect(indexesOf(table)).toContain('deletedAt');
      if (table !== 'projects') expect(indexesOf(table)).toContain('projectId');
    }
  });
});
