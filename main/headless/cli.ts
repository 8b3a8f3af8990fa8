import { open, readFile, rename, rm } from 'node:fs/promises';
import { basename, dirname, join } from 'node:path';
import { SpinhueError } from '../../core/errors';
import { commands } from './commands';
import type { Command, CommandArguments, CommandIo } from './command';
import { parseJson } from './parseJson';

const exitUsage = 2;
const exitFailed = 1;

async function readStandardInput(): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of process.stdin) chunks.push(chunk as Buffer);
  return Buffer.concat(chunks);
}

const io: CommandIo = {
  async readBytes(path) {
    try {
      return path === '-' ? await readStandardInput() : await readFile(path);
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
  note: (line) => process.stderr.write(`${line}\n`),
};

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

/** Temporary file beside the target, flushed, then renamed: a reader sees the old file or the new one, never half. */
async function writeAtomically(path: string, text: string): Promise<void> {
  const temporary = join(dirname(path), `.${basename(path)}.${process.pid}.part`);
  try {
    const handle = await open(temporary, 'w');
    try {
      await handle.writeFile(text, 'utf8');
      await handle.sync();
    } finally {
      await handle.close();
    }
    await rename(temporary, path);
  } catch (cause) {
    await rm(temporary, { force: true });
    throw new SpinhueError({
      code: 'unreadable-file',
      message: `cannot write ${path}: ${(cause as NodeJS.ErrnoException).code ?? String(cause)}`,
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

async function main(words: readonly string[]): Promise<number> {
  const [name, ...rest] = words;
  if (name === '--help' || name === 'help') {
    process.stdout.write(`${help()}\n`);
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
    const answer = await command.run(args, io);
    const text = typeof answer === 'string' ? answer : JSON.stringify(answer, null, 1);
    const out = args.options.get('out');
    if (typeof out === 'string') await writeAtomically(out, `${text}\n`);
    else process.stdout.write(`${text}\n`);
    return 0;
  } catch (error) {
    if (!(error instanceof SpinhueError)) throw error;
    const remedy = error.remedy === undefined ? '' : ` (${error.remedy})`;
    process.stderr.write(`headless: ${error.message}${remedy}\n`);
    return error.code === 'usage' ? exitUsage : exitFailed;
  }
}

process.exitCode = await main(process.argv.slice(2));
