import { spawn } from 'node:child_process';
import { addressOf } from '../guard/externalLinks';

/** Shows a link of the fixed table in the user's own browser: the program's window reaches no network. */
export function openLink(link: string): void {
  const url = addressOf(link);
  const [command, words] =
    process.platform === 'win32'
      ? ['explorer.exe', [url]]
      : [process.platform === 'darwin' ? 'open' : 'xdg-open', [url]];
  const child = spawn(command as string, words as string[], { detached: true, stdio: 'ignore' });
  child.on('error', () => process.stdout.write(`Open in a browser: ${url}\n`));
  child.unref();
}
