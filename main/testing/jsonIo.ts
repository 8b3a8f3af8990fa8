import type { CommandIo } from '../headless/command';

/** What a command sees when the file it is given holds `input`; nothing else can be read. */
export function jsonIo(input: unknown): CommandIo {
  const refuse = () => Promise.reject(new Error('not used'));
  return { readJson: () => Promise.resolve(input), readBytes: refuse, readText: refuse, note: () => {} };
}
