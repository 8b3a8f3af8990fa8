export interface StartWords {
  readonly headless: boolean;
  readonly port: number | null;
  readonly mirror: string | null;
  readonly profile: string | null;
  /** Serve and say the address, open no window: for tests and for a browser of one's own. */
  readonly serveOnly: boolean;
  readonly browser: boolean;
  readonly help: boolean;
  readonly files: readonly string[];
}

export const usage = `npm start [-- OPTIONS]
  --headless        print the ranked table of the demo project, open no window
  --browser         use Chromium even where Electron is present
  --mirror FOLDER   folder for copies of the projects (remembered)
  --port N          port of the local server; projects belong to their port
  --profile FOLDER  data folder, instead of the user's own
  --serve-only      serve the page and print its address, open no window
  --help            this text`;

/** Sorts the words of the command line; a string says what is wrong with them. */
export function readWords(words: readonly string[]): StartWords | string {
  const flags = { headless: false, serveOnly: false, browser: false, help: false };
  const values: Record<'port' | 'mirror' | 'profile', string | null> = {
    port: null,
    mirror: null,
    profile: null,
  };
  const files: string[] = [];
  for (let i = 0; i < words.length; i++) {
    const word = words[i]!;
    if (!word.startsWith('--')) {
      files.push(word);
      continue;
    }
    const [dashed, inline] = word.slice(2).split(/=(.*)/s, 2) as [string, string | undefined];
    const name = dashed.replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase());
    if (Object.hasOwn(flags, name)) flags[name as keyof typeof flags] = true;
    else if (Object.hasOwn(values, name)) {
      const value = inline ?? words[++i];
      if (value === undefined || value === '') return `--${dashed} needs a value`;
      values[name as keyof typeof values] = value;
    } else return `unknown option --${dashed}`;
  }
  let port: number | null = null;
  if (values.port !== null) {
    port = Number(values.port);
    if (!Number.isInteger(port) || port < 0 || port > 65535) return `--port ${values.port} is not a port`;
  }
  return { ...flags, port, mirror: values.mirror, profile: values.profile, files };
}
