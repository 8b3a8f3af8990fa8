import type { Project } from '../../../core/record/project';
import type { SpinhueDatabase } from '../database';
import type { Journal } from '../journal/journal';
import type { Clock } from '../journal/writer';
import type { NewRow } from '../rows';
import { counted } from '../words';

export type ProjectFields = Partial<Pick<Project, 'name' | 'notes' | 'targetLab' | 'parameterSetId'>>;

export class ProjectRepository {
  readonly #db: SpinhueDatabase;
  readonly #journal: Journal;
  readonly #clock: Clock;

  constructor(db: SpinhueDatabase, journal: Journal, clock: Clock) {
    this.#db = db;
    this.#journal = journal;
    this.#clock = clock;
  }

  get(id: string): Promise<Project | undefined> {
    return this.#db.projects.get(id);
  }

  /** Not in the bin, last changed first. */
  async list(): Promise<Project[]> {
    const all = await this.#db.projects.toArray();
    return all
      .filter((project) => project.deletedAt === null)
      .sort((one, other) => other.updatedAt.localeCompare(one.updatedAt));
  }

  /** The same with how many candidates each holds outside the bin. */
  async listWithCounts(): Promise<(Project & { readonly candidateCount: number })[]> {
    const projects = await this.list();
    const inBin = await this.#db.candidates.where('deletedAt').above('').toArray();
    return Promise.all(
      projects.map(async (project) => {
        const all = await this.#db.candidates.where('projectId').equals(project.id).count();
        const gone = inBin.filter(({ projectId }) => projectId === project.id).length;
        return { ...project, candidateCount: all - gone };
      }),
    );
  }

  async create(name: string, fields: ProjectFields = {}): Promise<Project> {
    const id = this.#clock.newId();
    return this.#journal.record(id, `create project "${name}"`, async (writer) => {
      const row = { notes: '', targetLab: null, parameterSetId: null, demo: false, ...fields, id, name };
      return (await writer.create('projects', [row]))[0]!;
    });
  }

  /** A project with everything in it as one step. */
  async createWhole(
    project: NewRow<'projects'>,
    candidates: readonly Omit<NewRow<'candidates'>, 'projectId'>[],
  ): Promise<Project> {
    const id = project.id ?? this.#clock.newId();
    return this.#journal.record(id, `create project "${project.name}"`, async (writer) => {
      const [row] = await writer.create('projects', [{ ...project, id }]);
      await writer.create(
        'candidates',
        candidates.map((candidate) => ({ ...candidate, projectId: id })),
      );
      return row!;
    });
  }

  update(id: string, label: string, fields: ProjectFields, basedOn?: number): Promise<Project> {
    return this.#journal.record(id, label, (writer) => writer.update('projects', id, fields, basedOn));
  }

  /** Into the bin, with all it holds; the rows themselves stay as they are and come back with it. */
  async remove(id: string): Promise<void> {
    const project = await this.#db.projects.get(id);
    const count = await this.#db.candidates.where('projectId').equals(id).count();
    const label = `delete project "${project?.name ?? id}" with ${counted(count, 'candidate')}`;
    await this.#journal.record(id, label, (writer) =>
      writer.update('projects', id, { deletedAt: writer.now }),
    );
  }

  async restore(id: string): Promise<void> {
    const project = await this.#db.projects.get(id);
    await this.#journal.record(id, `restore project "${project?.name ?? id}"`, (writer) =>
      writer.update('projects', id, { deletedAt: null }),
    );
  }
}
