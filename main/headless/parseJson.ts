import { SpinhueError } from '../../core/errors';

/** Parses JSON; the error names line and column where the engine tells the position. */
export function parseJson(text: string, name: string): unknown {
  if (text.trim() === '') {
    throw new SpinhueError({
      code: 'empty-input',
      message: `${name} is empty`,
      field: name,
      remedy: 'give a JSON array of entries',
    });
  }
  try {
    return JSON.parse(text);
  } catch (cause) {
    const reason = (cause as Error).message;
    const position = /position (\d+)/.exec(reason);
    let where = '';
    if (position) {
      const before = text.slice(0, Number(position[1])).split('\n');
      where = ` at line ${before.length}, column ${before.at(-1)!.length + 1}`;
    }
    throw new SpinhueError({
      code: 'malformed-json',
      message: `${name} is not valid JSON${where}: ${reason.split(' (line')[0]}`,
      field: name,
      remedy: 'mend the file at that place',
    });
  }
}
