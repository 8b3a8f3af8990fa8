import type { SavedWish } from '../../../core/record/wish';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';

/** What searches of a project look for, kept under names. */
export class WishRepository {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;

  constructor(db: SpinhueDatabase, journal: Journal) {
    this.#db = db;
    this.#journal = journal;
  }

  /** By name. */
  async of(projectId: string): Promise<SavedWish[]> {
    const all = await this.#db.wishes.where('projectId').equals(projectId).toArray();
    return all
      .filter(({ deletedAt }) => deletedAt === null)
      .sort((one, other) => one.name.localeCompare(other.name) || one.id.localeCompare(other.id));
  }

  create(projectId: string, name: string, wish: SavedWish['wish']): Promise<SavedWish> {
    return this.#journal.record(projectId, `save the wish “${name}”`, async (writer) => {
      const [row] = await writer.create('wishes', [{ projectId, name, wish }]);
      return row!;
    });
  }

  /**
   * Puts a wish in place of the one that was saved.
   *
   * @throws {StoreError} `changed-meanwhile` where another window saved it since `before` was read.
   */
  replace(before: SavedWish, name: string, wish: SavedWish['wish']): Promise<SavedWish> {
    return this.#journal.record(before.projectId, `change the wish “${name}”`, (writer) =>
      writer.update('wishes', before.id, { name, wish }, before.revision),
    );
  }

  /** Into the bin, from where undo brings it back. */
  remove(wish: SavedWish): Promise<void> {
    return this.#journal.record(wish.projectId, `delete the wish “${wish.name}”`, (writer) =>
      writer.updateMany('wishes', [wish.id], () => ({ deletedAt: writer.now })),
    );
  }
}
