import type { Page } from '@playwright/test';

/** What lies in the database, read past the program. */
export interface StoredState {
  readonly notes: string;
  readonly starred: number;
  readonly candidates: number;
  /** Steps of the journal, and lists of edits that belong to them. */
  readonly changes: number;
  readonly edits: number;
  /** Whether the last step of the journal agrees with the rows as they are. */
  readonly journalAgrees: boolean;
}

export const readStored = (page: Page, projectId: string, candidateId: string): Promise<StoredState> =>
  page.evaluate(
    async ([projectId, candidateId]) => {
      const db = await new Promise<IDBDatabase>((resolve, reject) => {
        const request = indexedDB.open('spinhue');
        request.onsuccess = () => resolve(request.result);
        request.onerror = () => reject(request.error);
      });
      const all = <T>(table: string): Promise<T[]> =>
        new Promise((resolve, reject) => {
          const request = db.transaction(table).objectStore(table).getAll();
          request.onsuccess = () => resolve(request.result as T[]);
          request.onerror = () => reject(request.error);
        });
      interface Row {
        id: string;
        projectId: string;
        notes: string;
        starred: boolean;
        revision: number;
      }
      interface Edits {
        order: number;
        edits: { table: string; id: string; after: Row | null }[];
      }
      const rows = (await all<Row>('candidates')).filter((row) => row.projectId === projectId);
      const changes = await all<{ order: number; scope: string }>('changes');
      const edits = await all<Edits>('edits');
      db.close();
      const byId = new Map(rows.map((row) => [row.id, row]));
      const last = edits.reduce<Edits | null>((a, b) => (a === null || b.order > a.order ? b : a), null);
      return {
        notes: byId.get(candidateId)?.notes ?? '',
        starred: rows.filter((row) => row.starred).length,
        candidates: rows.length,
        changes: changes.length,
        edits: edits.length,
        journalAgrees: (last?.edits ?? []).every(
          (edit) => edit.table !== 'candidates' || byId.get(edit.id)?.revision === edit.after?.revision,
        ),
      };
    },
    [projectId, candidateId] as const,
  );
