import { isDeepStrictEqual } from 'node:util';
import type { Problem } from '../../core/errors';
import { defaultLibrary } from '../../core/library';
import { type BundleContent, readBundle, tableNames, writeBundle } from '../../core/record/bundle';
import { checkWish } from '../../core/search/wish/checkWish';
import { seeded } from '../../core/testing/seeded';
import { readImport } from '../../renderer/app/exchange/readImport';
import type { Store } from '../../renderer/store';
import { mutateBytes, mutateJson } from './mutate';
import { wholeBundle } from './wholeBundle';

export interface SoakReport {
  readonly bundles: number;
  readonly wishes: number;
  readonly accepted: number;
  readonly refused: number;
  readonly slowest: { readonly ms: number; readonly seed: number };
  readonly faults: readonly string[];
}

const wishText = JSON.stringify({
  name: 'violet filter',
  ions: ['Cr3+', 'Ni2+'],
  geometries: ['octahedral'],
  ligands: { allow: 'all', exclude: ['cn'], maxKinds: 2, donorAtoms: ['N', 'O'], denticities: [1, 2] },
  charge: { min: -3, max: 3 },
  bands: [{ from_nm: 540, to_nm: 580, minMolarAbsorptivity: 20 }],
  clear: [{ from_nm: 420, to_nm: 480, maxMolarAbsorptivity: 5 }],
  colour: { lab: [70, 28, -41], tolerance: 10, concentration_mM: 20, path_cm: 2 },
});

const badProblem = (problem: Problem): boolean =>
  typeof problem.message !== 'string' ||
  problem.message.length === 0 ||
  problem.message.length > 2000 ||
  typeof problem.field !== 'string' ||
  problem.field.length === 0;

/** Writing puts the rows in order of id; nothing else may differ. */
const ordered = (content: BundleContent): unknown =>
  tableNames.map((table) => [...content[table]].sort((a, b) => (a.id < b.id ? -1 : a.id > b.id ? 1 : 0)));

/** Reads one bundle; what is wrong with how it was read, null where all is well. */
function judge(input: string | Uint8Array): { readonly ok: boolean; readonly fault: string | null } {
  const reading = readBundle(input);
  if (!reading.ok) {
    if (reading.problems.length === 0) return { ok: false, fault: 'refused without a reason' };
    const bad = reading.problems.find(badProblem);
    return {
      ok: false,
      fault: bad ? `a refusal that names no place: ${JSON.stringify(bad).slice(0, 300)}` : null,
    };
  }
  const again = readBundle(writeBundle(reading.content));
  const same = again.ok && isDeepStrictEqual(ordered(again.content), ordered(reading.content));
  return { ok: true, fault: same ? null : 'accepted, but not the same after writing and reading again' };
}

function judgeWish(text: string): { readonly ok: boolean; readonly fault: string | null } {
  let input: unknown;
  try {
    input = JSON.parse(text);
  } catch {
    return { ok: false, fault: null };
  }
  const checked = checkWish(input, defaultLibrary);
  if (checked.ok) return { ok: true, fault: null };
  const bad = checked.problems.find((problem) => problem.message === '' || typeof problem.field !== 'string');
  return {
    ok: false,
    fault: checked.problems.length === 0 || bad ? 'a wish refused without reason or place' : null,
  };
}

/** Everything that lies in the database, in a fixed order. */
async function fingerprint(store: Store): Promise<string> {
  const tables = await Promise.all(store.db.tables.map(async (table) => [table.name, await table.toArray()]));
  return JSON.stringify(tables);
}

/**
 * Hands mutated bundles to the import as it runs before anybody confirmed anything, and mutated wishes to their check:
 * nothing may throw, every refusal names a place, what is accepted is whole, and the database stays as it was.
 */
export async function soakBundles(
  count: number,
  seed: number,
  store: Store,
  onBatch: (done: number, faults: number) => void = () => undefined,
): Promise<SoakReport> {
  const faults: string[] = [];
  const before = await fingerprint(store);
  let accepted = 0;
  let slowest = { ms: 0, seed: 0 };
  const wishes = Math.floor(count / 5);
  for (let i = 0; i < count; i++) {
    const random = seeded(seed + i);
    const began = performance.now();
    try {
      if (i < wishes) {
        const { ok, fault } = judgeWish(mutateJson(wishText, random));
        if (ok) accepted += 1;
        if (fault !== null) faults.push(`seed ${seed + i}: ${fault}`);
      } else {
        const input =
          random.next() < 0.6 ? mutateJson(wholeBundle, random) : mutateBytes(wholeBundle, random);
        const { ok, fault } = judge(input);
        if (ok) accepted += 1;
        if (fault !== null) faults.push(`seed ${seed + i}: ${fault}`);
        if (i % 10 === 0) {
          const bytes = typeof input === 'string' ? new TextEncoder().encode(input) : input;
          await readImport(store, { name: 'x.spinhue', bytes });
        }
      }
    } catch (error) {
      faults.push(`seed ${seed + i}: threw ${String(error).slice(0, 300)}`);
    }
    const took_ms = performance.now() - began;
    if (took_ms > slowest.ms) slowest = { ms: took_ms, seed: seed + i };
    if ((i + 1) % 1000 === 0) {
      if ((await fingerprint(store)) !== before) faults.push(`before seed ${seed + i}: the database changed`);
      onBatch(i + 1, faults.length);
    }
  }
  if ((await fingerprint(store)) !== before) faults.push('the database changed');
  if (Object.hasOwn(Object.prototype, 'polluted')) faults.push('the prototype of all objects was changed');
  return { bundles: count - wishes, wishes, accepted, refused: count - accepted, slowest, faults };
}
