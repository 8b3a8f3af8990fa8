import { SpinhueError, type Problem } from '../../../core/errors';
import { bundleLimits, readBundle, tableNames, type BundleContent } from '../../../core/record/bundle';
import type { Command, CommandIo } from '../command';

interface Checked {
  readonly file: string;
  readonly ok: boolean;
  readonly formatVersion: number | null;
  readonly projects: readonly string[];
  /** Rows that passed their own checks, by table; tables without any are left out. */
  readonly rows: Readonly<Record<string, number>>;
  readonly problems: readonly Problem[];
}

const rowsIn = (content: BundleContent | null): Record<string, number> =>
  Object.fromEntries(
    tableNames.flatMap((table) => {
      const count = content === null ? 0 : content[table].length;
      return count === 0 ? [] : [[table, count]];
    }),
  );

async function checkOne(file: string, io: CommandIo): Promise<Checked> {
  try {
    const reading = readBundle(await io.readBytes(file), bundleLimits);
    const content = reading.ok ? reading.content : reading.salvage;
    return {
      file,
      ok: reading.ok,
      formatVersion: reading.ok ? reading.fromVersion : null,
      projects: content?.projects.map(({ name }) => name) ?? [],
      rows: rowsIn(content),
      problems: reading.ok ? [] : reading.problems,
    };
  } catch (error) {
    if (!(error instanceof SpinhueError)) throw error;
    const { code, message, field, remedy } = error;
    const problem: Problem = { code, message, field, ...(remedy === undefined ? {} : { remedy }) };
    return { file, ok: false, formatVersion: null, projects: [], rows: {}, problems: [problem] };
  }
}

/** Reads project bundles as an import would and says whether they are whole: format, checksum, links, every row. */
export const checkProject: Command = {
  name: 'check-project',
  usage: 'FILE...',
  summary: 'check project bundles (exports, copies, snapshots); exit code 1 where one is not whole',
  options: {},
  operands: { min: 1, max: 10_000 },
  async run(args, io) {
    const results: Checked[] = [];
    for (const file of args.operands) results.push(await checkOne(file, io));
    const bad = results.filter(({ ok }) => !ok);
    for (const { file, problems } of bad) {
      io.note(
        `${file}: ${problems.length} problem${problems.length === 1 ? '' : 's'}, first: ${problems[0]!.message}`,
      );
    }
    if (bad.length > 0) io.fail?.();
    return results;
  },
};
