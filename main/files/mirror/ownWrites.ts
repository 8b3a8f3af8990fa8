import { createHash } from 'node:crypto';
import { createReadStream, readFileSync } from 'node:fs';
import { z } from 'zod';
import { writeAtomically } from '../atomicWrite';

const schema = z.record(z.string(), z.array(z.string()).max(10));

/**
 * Which contents this machine has written to each mirrored file, by hash. A file that holds anything else was changed by
 * somebody else. Noted before the write, so that a kill in between leaves both states known.
 */
export class OwnWrites {
  readonly #path: string;
  #hashes: Record<string, string[]>;

  constructor(path: string) {
    this.#path = path;
    this.#hashes = {};
    try {
      const read = schema.safeParse(JSON.parse(readFileSync(path, 'utf8')));
      if (read.success) this.#hashes = read.data;
    } catch {
      // Not knowing is safe: the file found is then put aside instead of replaced.
    }
  }

  isOurs(file: string, hash: string): boolean {
    return Object.hasOwn(this.#hashes, file) && this.#hashes[file]!.includes(hash);
  }

  /** The file lies under another name now. */
  async move(from: string, to: string): Promise<void> {
    if (!Object.hasOwn(this.#hashes, from)) return;
    const { [from]: known, ...others } = this.#hashes;
    this.#hashes = { ...others, [to]: known! };
    await writeAtomically(this.#path, JSON.stringify(this.#hashes));
  }

  async note(file: string, hash: string): Promise<void> {
    const known = Object.hasOwn(this.#hashes, file) ? this.#hashes[file]! : [];
    if (known.at(-1) === hash) return;
    this.#hashes[file] = [...known.filter((each) => each !== hash), hash].slice(-2);
    await writeAtomically(this.#path, JSON.stringify(this.#hashes));
  }
}

export const hashOf = (data: string | Uint8Array): string => createHash('sha256').update(data).digest('hex');

export async function hashOfFile(path: string): Promise<string> {
  const hash = createHash('sha256');
  for await (const chunk of createReadStream(path)) hash.update(chunk as Buffer);
  return hash.digest('hex');
}
