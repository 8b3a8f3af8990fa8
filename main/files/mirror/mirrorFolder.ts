import { mkdir, readdir, readFile, rename, rm, stat } from 'node:fs/promises';
import { join } from 'node:path';
import type {
  MirroredProject,
  MirrorReceipt,
  MirrorStatus,
  ProjectCopy,
  Snapshot,
  SnapshotReason,
} from '../../../renderer/host/bridge';
import { HostError } from '../../../renderer/host/hostError';
import { writeAtomically } from '../atomicWrite';
import { asHostError } from '../fileProblem';
import { readHead } from './bundleHead';
import {
  bundleFile,
  note,
  noteFile,
  projectFolder,
  projectMark,
  snapshotsFolder,
  tablesFolder,
} from './layout';
import { hashOf, hashOfFile, OwnWrites } from './ownWrites';
import { isSnapshotDue, keepSnapshot, listSnapshots, readSnapshot } from './snapshots';
import { sweep } from './sweep';

export interface MirrorFolderOptions {
  readonly folder: string;
  /** The default folder is made when it is missing; a chosen one that is missing is a disk that is not connected. */
  readonly create: boolean;
  /** File on this machine that remembers what was written. */
  readonly stateFile: string;
  readonly now?: () => Date;
  readonly onStatus?: (status: MirrorStatus) => void;
}

/** The folder of open files beside the database. One operation at a time. */
export class MirrorFolder {
  readonly #options: MirrorFolderOptions;
  readonly #own: OwnWrites;
  readonly #swept = new Set<string>();
  /** What the file looked like right after our own write: spares reading it all again. */
  readonly #seen = new Map<string, { size: number; mtimeMs: number; ino: number }>();
  #queue: Promise<unknown> = Promise.resolve();
  #lastWrittenAt: string | null = null;
  #problem: MirrorStatus['problem'] = null;

  constructor(options: MirrorFolderOptions) {
    this.#options = options;
    this.#own = new OwnWrites(options.stateFile);
  }

  get folder(): string {
    return this.#options.folder;
  }

  status(): MirrorStatus {
    return {
      state: this.#problem === null ? 'ready' : 'failing',
      folder: this.#options.folder,
      lastWrittenAt: this.#lastWrittenAt,
      problem: this.#problem,
    };
  }

  /** Resolves once everything asked for so far is done. */
  async idle(): Promise<void> {
    await this.#queue;
  }

  write(copy: ProjectCopy): Promise<MirrorReceipt> {
    return this.#next('write', () => this.#write(copy));
  }

  takeSnapshot(copy: ProjectCopy, reason: SnapshotReason): Promise<Snapshot> {
    return this.#next('write', async () => {
      await this.#write(copy);
      const folder = await this.#folderOf(copy.projectId);
      return keepSnapshot(join(folder, snapshotsFolder), join(folder, bundleFile), reason, this.#now());
    });
  }

  projects(): Promise<readonly MirroredProject[]> {
    return this.#next('read', async () => {
      const found: MirroredProject[] = [];
      for (const entry of await readdir(this.folder, { withFileTypes: true }).catch(() => [])) {
        if (!entry.isDirectory()) continue;
        const path = join(this.folder, entry.name, bundleFile);
        const head = await readHead(path);
        if (head === null) continue;
        const stats = await stat(path);
        const snapshots = await listSnapshots(join(this.folder, entry.name, snapshotsFolder));
        found.push({
          ...head,
          writtenAt: stats.mtime.toISOString(),
          bytes: stats.size,
          snapshots: snapshots.length,
        });
      }
      return found.sort((a, b) => (a.writtenAt < b.writtenAt ? 1 : -1));
    });
  }

  read(projectId: string): Promise<string> {
    return this.#next('read', async () =>
      readFile(join(await this.#folderOf(projectId), bundleFile), 'utf8'),
    );
  }

  snapshots(projectId: string): Promise<readonly Snapshot[]> {
    return this.#next('read', async () => {
      const folder = await this.#find(projectId);
      return folder === null ? [] : listSnapshots(join(folder, snapshotsFolder));
    });
  }

  readSnapshot(projectId: string, id: string): Promise<string> {
    return this.#next('read', async () =>
      readSnapshot(join(await this.#folderOf(projectId), snapshotsFolder), id),
    );
  }

  #now(): Date {
    return this.#options.now?.() ?? new Date();
  }

  #next<T>(action: 'read' | 'write', work: () => Promise<T>): Promise<T> {
    const result = this.#queue.then(async () => {
      try {
        const value = await work();
        if (action === 'write') this.#tell(null);
        return value;
      } catch (error) {
        const problem = asHostError(error, action, this.folder);
        if (action === 'write') this.#tell({ message: problem.message, remedy: problem.remedy });
        throw problem;
      }
    });
    this.#queue = result.catch(() => undefined);
    return result;
  }

  #tell(problem: MirrorStatus['problem']): void {
    this.#problem = problem;
    this.#options.onStatus?.(this.status());
  }

  async #write({ projectId, projectName, bundle, extras = [] }: ProjectCopy): Promise<MirrorReceipt> {
    if (!bundle.startsWith('{"format":"spinhue-project"')) {
      throw new HostError({
        code: 'refused',
        message: 'What was to be copied is not a project bundle.',
        remedy: 'The copy in the folder is unchanged. Export the project and report this as a fault.',
      });
    }
    await this.#prepareRoot();
    const folder = await this.#projectFolder(projectName, projectId);
    const file = join(folder, bundleFile);
    const snapshots = join(folder, snapshotsFolder);
    const hash = hashOf(bundle);
    const found = await this.#stateOf(file);
    let putAside: string | null = null;
    if (found.state === 'foreign' && found.hash !== hash) {
      putAside = (await keepSnapshot(snapshots, file, 'changed-elsewhere', this.#now())).id;
    } else if (found.state === 'ours' && isSnapshotDue(await listSnapshots(snapshots), this.#now())) {
      await keepSnapshot(snapshots, file, 'continuous', this.#now());
    }
    await this.#own.note(file, hash);
    await writeAtomically(file, bundle);
    const { size, mtimeMs, ino } = await stat(file);
    this.#seen.set(file, { size, mtimeMs, ino });
    await this.#writeTables(folder, extras);
    this.#lastWrittenAt = this.#now().toISOString();
    return { writtenAt: this.#lastWrittenAt, putAside };
  }

  async #writeTables(folder: string, extras: NonNullable<ProjectCopy['extras']>): Promise<void> {
    if (extras.length === 0) return;
    await mkdir(join(folder, tablesFolder), { recursive: true });
    for (const { name, data } of extras) {
      const path = join(folder, tablesFolder, name);
      const hash = hashOf(data);
      if ((await hashOfFile(path).catch(() => null)) !== hash) await writeAtomically(path, data);
    }
  }

  async #prepareRoot(): Promise<void> {
    if (this.#options.create) await mkdir(this.folder, { recursive: true });
    const stats = await stat(this.folder);
    if (!stats.isDirectory()) throw Object.assign(new Error('not a folder'), { code: 'ENOTDIR' });
    const path = join(this.folder, noteFile);
    await stat(path).catch(() => writeAtomically(path, note));
  }

  /** The project's folder, made or renamed where needed; a folder that cannot be renamed keeps its old name. */
  async #projectFolder(projectName: string, projectId: string): Promise<string> {
    const wanted = join(this.folder, projectFolder(projectName, projectId));
    const present = await this.#find(projectId);
    let folder = present ?? wanted;
    if (present === null) await mkdir(wanted, { recursive: true });
    else if (present !== wanted) {
      const moved = await rename(present, wanted).then(
        () => true,
        () => false,
      );
      if (moved) {
        folder = wanted;
        await this.#own.move(join(present, bundleFile), join(wanted, bundleFile));
      }
    }
    if (!this.#swept.has(folder)) {
      this.#swept.add(folder);
      await sweep([folder, join(folder, snapshotsFolder), join(folder, tablesFolder)], this.#now());
    }
    return folder;
  }

  async #stateOf(file: string): Promise<{ state: 'none' | 'ours' } | { state: 'foreign'; hash: string }> {
    const stats = await stat(file).catch(() => null);
    if (stats === null) return { state: 'none' };
    const seen = this.#seen.get(file);
    if (seen && seen.size === stats.size && seen.mtimeMs === stats.mtimeMs && seen.ino === stats.ino) {
      return { state: 'ours' };
    }
    const hash = await hashOfFile(file);
    return this.#own.isOurs(file, hash) ? { state: 'ours' } : { state: 'foreign', hash };
  }

  async #find(projectId: string): Promise<string | null> {
    const mark = `-${projectMark(projectId)}`;
    const entries = await readdir(this.folder, { withFileTypes: true }).catch(() => []);
    const entry = entries.find((each) => each.isDirectory() && each.name.endsWith(mark));
    return entry === undefined ? null : join(this.folder, entry.name);
  }

  async #folderOf(projectId: string): Promise<string> {
    const folder = await this.#find(projectId);
    if (folder !== null) return folder;
    throw new HostError({
      code: 'not-found',
      message: `The folder ${this.folder} holds no copy of this project.`,
      remedy: 'Choose the folder that the copies were written to.',
    });
  }
}

/** Proves that a folder chosen by the user can be written to. */
export async function tryFolder(folder: string): Promise<void> {
  const probe = join(folder, `.spinhue-probe-${process.pid}`);
  try {
    const stats = await stat(folder);
    if (!stats.isDirectory()) throw Object.assign(new Error('not a folder'), { code: 'ENOTDIR' });
    await writeAtomically(probe, 'probe');
  } catch (error) {
    throw asHostError(error, 'write', folder);
  } finally {
    await rm(probe, { force: true }).catch(() => undefined);
  }
}
