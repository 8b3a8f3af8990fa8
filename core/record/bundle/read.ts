import type { Problem } from '../../errors';
import { decodeUtf8 } from '../text';
import { problemsFromZod } from '../zodProblems';
import { bundleFormat, bundleLimits, bundleVersion, type BundleLimits } from './format';
import { findTraps } from './guard';
import { migrateContent } from './migrate';
import {
  emptyContent,
  rowsOf,
  tableNames,
  tableOf,
  type AnyRow,
  type BundleContent,
  type TableName,
} from './tables';
import { contentChecksum } from './write';

export type BundleReading =
  | { readonly ok: true; readonly content: BundleContent; readonly fromVersion: number }
  | {
      readonly ok: false;
      readonly problems: readonly Problem[];
      /** Rows that passed their own checks, to be taken only after the user has seen the problems; null where none. */
      readonly salvage: BundleContent | null;
    };

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const stop = (...problems: Problem[]): BundleReading => ({ ok: false, problems, salvage: null });

function parse(input: string | Uint8Array, limits: BundleLimits): { value: unknown } | Problem {
  const remedyEarlier = 'choose another copy of the file, for instance an earlier snapshot';
  if (input.length > limits.bytes) {
    return {
      code: 'too-large',
      message: `the bundle has ${Math.round(input.length / 1e6)} MB; at most ${limits.bytes / 1e6} MB are read`,
      field: 'bundle',
      remedy: 'export the project without its raw files',
    };
  }
  const text = typeof input === 'string' ? input.replace(/^\uFEFF/, '') : decodeUtf8(input);
  if (text === null) {
    return {
      code: 'malformed-json',
      message: 'the bundle is not UTF-8 text',
      field: 'bundle',
      remedy: remedyEarlier,
    };
  }
  if (text.trim() === '') {
    return { code: 'empty-input', message: 'the bundle is empty', field: 'bundle', remedy: remedyEarlier };
  }
  try {
    return { value: JSON.parse(text) as unknown };
  } catch (cause) {
    const reason = (cause as Error).message.slice(0, 200);
    return {
      code: 'malformed-json',
      message: `the bundle is not valid JSON (cut off or edited?): ${reason}`,
      field: 'bundle',
      remedy: remedyEarlier,
    };
  }
}

function checkHead(value: Record<string, unknown>): Problem | null {
  if (value.format !== bundleFormat) {
    return {
      code: 'unknown-field-value',
      message: `format is ${JSON.stringify(value.format)?.slice(0, 100) ?? 'missing'}; expected "${bundleFormat}"`,
      field: 'format',
      remedy: 'choose a project bundle written by this program',
    };
  }
  const version = value.version;
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return { code: 'wrong-type', message: 'version must be a whole number from 1', field: 'version' };
  }
  if (version > bundleVersion) {
    return {
      code: 'newer-format',
      message: `the bundle has format version ${version}; this program reads up to ${bundleVersion}`,
      field: 'version',
      remedy: 'update the program; nothing was changed',
    };
  }
  return isObject(value.content)
    ? null
    : { code: 'missing-field', message: 'content is missing or not an object', field: 'content' };
}

/** Rows of one table that pass their schema; appends what was wrong with the others. */
function readRows(table: TableName, rows: unknown, problems: Problem[]): AnyRow[] {
  if (rows === undefined) return [];
  if (!Array.isArray(rows)) {
    problems.push({ code: 'wrong-type', message: `${table} is not a list`, field: table });
    return [];
  }
  const good: AnyRow[] = [];
  const firstIndex = new Map<string, number>();
  for (const [i, row] of rows.entries()) {
    const place = `${table}[${i}]`;
    const checked = tableOf(table).schema.safeParse(row, { reportInput: true });
    if (!checked.success) {
      problems.push(...problemsFromZod(checked.error, place));
      continue;
    }
    const earlier = firstIndex.get(checked.data.id);
    if (earlier !== undefined) {
      problems.push({
        code: 'integrity',
        message: `${place}.id ${checked.data.id} is also the id of ${table}[${earlier}]`,
        field: `${place}.id`,
      });
      continue;
    }
    const flaw = tableOf(table).check?.(checked.data) ?? null;
    if (flaw !== null) {
      problems.push({ code: 'integrity', message: `${place}: ${flaw}`, field: place });
      continue;
    }
    firstIndex.set(checked.data.id, i);
    good.push(checked.data);
  }
  return good;
}

/** Rows whose links lead nowhere, one table at a time until nothing more falls out. */
function dropBrokenLinks(content: Record<TableName, AnyRow[]>, problems: Problem[]): void {
  for (let changed = true; changed;) {
    changed = false;
    const ids = Object.fromEntries(
      tableNames.map((table) => [table, new Set(content[table].map((row) => row.id))]),
    ) as Record<TableName, Set<string>>;
    for (const table of tableNames) {
      const kept = content[table].filter((row) => {
        const broken = tableOf(table)
          .links(row)
          .find((link) => link.id !== null && !ids[link.table].has(link.id));
        if (broken === undefined) return true;
        problems.push({
          code: 'integrity',
          message: `${table} ${row.id}: ${broken.field} names a row of ${broken.table} that the bundle does not hold`,
          field: `${table}.${row.id}.${broken.field}`,
        });
        return false;
      });
      if (kept.length !== content[table].length) changed = true;
      content[table] = kept;
    }
  }
}

/**
 * Reads a project bundle from text or UTF-8 bytes. Never throws: whatever is wrong comes back as problems whose
 * `field` names the place. Rows that are good in themselves are offered as `salvage`.
 */
export function readBundle(input: string | Uint8Array, limits: BundleLimits = bundleLimits): BundleReading {
  const parsed = parse(input, limits);
  if (!('value' in parsed)) return stop(parsed);
  const { value } = parsed;
  if (!isObject(value)) {
    return stop({ code: 'wrong-type', message: 'the bundle is not a JSON object', field: 'bundle' });
  }
  const head = checkHead(value);
  if (head !== null) return stop(head);
  const traps = findTraps(value, limits);
  if (traps.length > 0) return stop(...traps);

  const fromVersion = value.version as number;
  const raw = migrateContent(value.content as Record<string, unknown>, fromVersion, bundleVersion);
  const problems: Problem[] = [];
  for (const key of Object.keys(raw)) {
    if (!(tableNames as string[]).includes(key)) {
      problems.push({
        code: 'unknown-field-value',
        message: `content.${key} is not a table of this format`,
        field: `content.${key}`,
      });
    }
  }
  const content = emptyContent() as unknown as Record<TableName, AnyRow[]>;
  for (const table of tableNames) content[table] = readRows(table, raw[table], problems);
  dropBrokenLinks(content, problems);
  const typed = content as unknown as BundleContent;

  if (problems.length === 0 && fromVersion === bundleVersion && value.checksum !== contentChecksum(typed)) {
    problems.push({
      code: 'integrity',
      message: 'the checksum does not fit the content: the bundle was edited or damaged after it was written',
      field: 'checksum',
      remedy: 'take the rows only after looking through them, or choose an earlier snapshot',
    });
  }
  if (problems.length === 0) return { ok: true, content: typed, fromVersion };
  const anything = tableNames.some((table) => rowsOf(typed, table).length > 0);
  return { ok: false, problems: problems.slice(0, limits.problems), salvage: anything ? typed : null };
}
