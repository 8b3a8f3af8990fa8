import { createReadStream } from 'node:fs';
import { createInterface } from 'node:readline';

const tableStart = /^,?"projects":\[$/;

/** Which project a mirrored bundle holds; null where it is not a bundle or is damaged there. Reads line by line. */
export async function readHead(path: string): Promise<{ projectId: string; name: string } | null> {
  const stream = createReadStream(path, { encoding: 'utf8' });
  const failed = new Promise<null>((resolve) => stream.once('error', () => resolve(null)));
  try {
    return await Promise.race([findProject(createInterface({ input: stream, crlfDelay: Infinity })), failed]);
  } catch {
    return null;
  } finally {
    stream.destroy();
  }
}

async function findProject(
  lines: AsyncIterable<string>,
): Promise<{ projectId: string; name: string } | null> {
  let first = true;
  let here = false;
  for await (const line of lines) {
    if (first && !line.startsWith('{"format":"spinhue-project"')) return null;
    first = false;
    if (here) {
      const row = JSON.parse(line.replace(/\]$/, '')) as { id?: unknown; name?: unknown };
      return typeof row.id === 'string' && typeof row.name === 'string'
        ? { projectId: row.id, name: row.name }
        : null;
    }
    here = tableStart.test(line);
  }
  return null;
}
