/** What a command may do to the outside world; handed in, so that tests need no process and no disk. */
export interface CommandIo {
  /** Bytes of a file, or of standard input for `-`. Throws a SpinhueError with code `unreadable-file`. */
  readBytes(path: string): Promise<Uint8Array>;
  /** The same as text (UTF-8, a byte-order mark dropped). */
  readText(path: string): Promise<string>;
  /** The same parsed as JSON. Throws a SpinhueError with code `malformed-json` that names line and column. */
  readJson(path: string): Promise<unknown>;
  /** A line for a person, on standard error. */
  note(line: string): void;
  /** The answer is printed all the same, but the exit code says that not all is well. */
  fail?(): void;
}

/** The arguments after the command's name, sorted into operands and `--name [value]` options. */
export interface CommandArguments {
  readonly operands: readonly string[];
  readonly options: ReadonlyMap<string, string | true>;
}

export interface Command {
  readonly name: string;
  /** `FILE.json [--top K]` */
  readonly usage: string;
  readonly summary: string;
  /** Options and whether each takes a value; anything else is refused as wrong usage. `--out FILE` is common to all. */
  readonly options: Readonly<Record<string, 'flag' | 'value'>>;
  readonly operands: { readonly min: number; readonly max: number };
  /** Returns what is printed: a value is printed as JSON, a string as it is. */
  run(args: CommandArguments, io: CommandIo): Promise<unknown>;
}
