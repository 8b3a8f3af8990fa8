import { readFile } from 'node:fs/promises';
import { SpinhueError } from '../../core/errors';
import { writeAtomically } from '../files/atomicWrite';
import { commands } from './commands';
import type { Command, CommandArguments, CommandIo } from './command';
import { parseJson } from './parseJson';

const exitUsage = 2;
const exitFailed = 1;

/** Where a run reads and writes; the process's own streams outside tests. */
export interface Streams {
  readonly input: AsyncIterable<Uint8Array>;
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
}

async function readAll(input: AsyncIterable<Uint8Array>): Promise<Uint8Array> {
  const chunks: Uint8Array[] = [];
  for await (const chunk of input) chunks.push(chunk);
  return Buffer.concat(chunks);
}

const commandIo = ({ input, err }: Streams, fail: () => void): CommandIo => ({
  async readBytes(path) {
    try {
      return path === '-' ? await readAll(input) : await readFile(path);
    } catch (cause) {
      throw new SpinhueError({
        code: 'unreadable-file',
        message: `cannot read ${path}: ${(cause as NodeJS.ErrnoException).code ?? String(cause)}`,
        field: path,
        remedy: 'check the path and that the file may be read',
      });
    }
  },
  async readText(path) {
    return new TextDecoder('utf-8').decode(await this.readBytes(path));
  },
  async readJson(path) {
    return parseJson(await this.readText(path), path);
  },
  note: (line) => err(`${line}\n`),
  fail,
});

function wrongUsage(message: string): SpinhueError {
  return new SpinhueError({ code: 'usage', message, field: 'arguments' });
}

function sortArguments(command: Command, words: readonly string[]): CommandArguments {
  const operands: string[] = [];
  const options = new Map<string, string | true>();
  const known: Record<string, 'flag' | 'value'> = { ...command.options, out: 'value' };
  for (let i = 0; i < words.length; i++) {
    const word = words[i]!;
    if (!word.startsWith('--')) {
      operands.push(word);
      continue;
    }
    const [name, inline] = word.slice(2).split(/=(.*)/s, 2) as [string, string | undefined];
    const kind = Object.hasOwn(known, name) ? known[name] : undefined;
    if (kind === undefined) throw wrongUsage(`${command.name}: unknown option --${name}`);
    if (kind === 'flag') {
      if (inline !== undefined) throw wrongUsage(`${command.name}: --${name} takes no value`);
      options.set(name, true);
      continue;
    }
    const value = inline ?? words[++i];
    if (value === undefined) throw wrongUsage(`${command.name}: --${name} needs a value`);
    options.set(name, value);
  }
  if (operands.length < command.operands.min || operands.length > command.operands.max) {
    throw wrongUsage(`${command.name}: usage: ${command.name} ${command.usage}`);
  }
  return { operands, options };
}

async function writeOut(path: string, text: string): Promise<void> {
  try {
    await writeAtomically(path, text);
  } catch (cause) {
    throw new SpinhueError({
      code: 'unreadable-file',
      message: (cause as Error).message.replace(/\.$/, ''),
      field: '--out',
      remedy: 'check that the folder exists and may be written to',
    });
  }
}

function help(): string {
  const width = Math.max(...commands.map((command) => command.name.length + command.usage.length + 1));
  const lines = commands.map(
    (command) => `  ${`${command.name} ${command.usage}`.padEnd(width)}  ${command.summary}`,
  );
  return [
    'usage: headless COMMAND ...   (a file named - is standard input; --out FILE writes atomically)',
    ...lines,
  ].join('\n');
}

/** Runs one command line; gives the exit code. */
export async function runHeadless(words: readonly string[], streams: Streams): Promise<number> {
  const { out, err } = streams;
  const [name, ...rest] = words;
  if (name === '--help' || name === 'help') {
    out(`${help()}\n`);
    return 0;
  }
  const command = commands.find((each) => each.name === name);
  try {
    if (command === undefined) {
      throw wrongUsage(
        name === undefined ? 'no command given; try --help' : `unknown command ${name}; try --help`,
      );
    }
    const args = sortArguments(command, rest);
    let failed = false;
    const io = commandIo(streams, () => {
      failed = true;
    });
    const answer = await command.run(args, io);
    const text = typeof answer === 'string' ? answer : JSON.stringify(answer, null, 1);
    const file = args.options.get('out');
    if (typeof file === 'string') await writeOut(file, `${text}\n`);
    else out(`${text}\n`);
    return failed ? exitFailed : 0;
  } catch (error) {
    if (!(error instanceof SpinhueError)) throw error;
    const remedy = error.remedy === undefined ? '' : ` (${error.remedy})`;
    err(`headless: ${error.message}${remedy}\n`);
    return error.code === 'usage' ? exitUsage : exitFailed;
  }
}
