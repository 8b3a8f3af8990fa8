/**
 * One step per format version: takes the content of version n as parsed, gives that of n + 1. Steps are never changed
 * once a release has written the version they start from.
 */
const steps: Readonly<Record<number, (content: Record<string, unknown>) => Record<string, unknown>>> = {};

/** Content of an older version brought up to `target`, step by step. */
export function migrateContent(
  content: Record<string, unknown>,
  from: number,
  target: number,
): Record<string, unknown> {
  let current = content;
  for (let version = from; version < target; version++) {
    const step = steps[version];
    if (step === undefined) throw new Error(`no step from version ${version}`);
    current = step(current);
  }
  return current;
}
