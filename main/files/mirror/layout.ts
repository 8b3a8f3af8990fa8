import { createHash } from 'node:crypto';

/**
 * How the folder of open files is laid out:
 *
 *     read-me.txt
 *     <name of the project>-<12 hex digits of its id's hash>/
 *       project.spinhue        the whole project, one JSON file
 *       tables/                the same in pieces for people and spreadsheets
 *       snapshots/             earlier states, one whole project each
 */
export const bundleFile = 'project.spinhue';
export const tablesFolder = 'tables';
export const snapshotsFolder = 'snapshots';
export const noteFile = 'read-me.txt';

export const note = `Copies of Spinhue projects, written while you work.

Each folder is one project. "project.spinhue" is the whole project as JSON text; the folder "snapshots" holds earlier
states of it. Spinhue opens both (File, Import project). "tables" holds pieces for reading and for spreadsheets; nothing
is read back from there. The program replaces its own files here and removes snapshots by age. It deletes nothing else.
`;

/** Ends the folder's name, so that a project is found again after it was renamed. */
export const projectMark = (projectId: string): string =>
  createHash('sha256').update(projectId).digest('hex').slice(0, 12);

export function projectFolder(projectName: string, projectId: string): string {
  const plain = projectName
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 50);
  return `${plain || 'project'}-${projectMark(projectId)}`;
}
