/**
 * Tables and indexes of schema version 1. Once shipped this file is never edited: a change is a new file beside it.
 * Derived data (`estimates`) may be thrown away at any time; everything else is the user's.
 */
export const schemaV1 = {
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
} as const;
