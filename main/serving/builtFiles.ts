import { readdirSync } from 'node:fs';
import { extname, join } from 'node:path';

const mediaTypes: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.ico': 'image/x-icon',
  '.woff2': 'font/woff2',
  '.json': 'application/json',
  '.wasm': 'application/wasm',
  '.txt': 'text/plain; charset=utf-8',
};

export interface BuiltFile {
  readonly path: string;
  readonly mediaType: string;
}

/**
 * The files of the built page by the path of their address (`/index.html`). The list is made once; only what is on it
 * can be served, so no address, however written, reaches another file. Files of unknown type are left out.
 */
export function listBuiltFiles(folder: string): ReadonlyMap<string, BuiltFile> {
  const files = new Map<string, BuiltFile>();
  const visit = (inside: string): void => {
    for (const entry of readdirSync(join(folder, inside), { withFileTypes: true })) {
      const address = `${inside}/${entry.name}`;
      if (entry.isDirectory()) visit(address);
      else if (entry.isFile()) {
        const mediaType = mediaTypes[extname(entry.name)];
        if (mediaType !== undefined) files.set(address, { path: join(folder, address), mediaType });
      }
    }
  };
  visit('');
  return files;
}

export type Lookup =
  | { readonly status: 200; readonly file: BuiltFile }
  | { readonly status: 400 | 403 | 404 | 405; readonly reason: string };

/** Which file answers a request; everything that is not plainly one of ours is refused. */
export function lookUp(
  files: ReadonlyMap<string, BuiltFile>,
  request: { readonly method: string; readonly rawAddress: string; readonly isOurs: boolean },
): Lookup {
  if (request.method !== 'GET' && request.method !== 'HEAD') return { status: 405, reason: 'only reading' };
  if (!request.isOurs) return { status: 403, reason: 'another host' };
  const path = request.rawAddress.replace(/^[a-z]+:\/\/[^/]*/i, '').split(/[?#]/, 1)[0]!;
  // Our own file names never need escapes: whatever holds one, a backslash or a step upwards is an attempt.
  if (/%|\\|\/\/|(^|\/)\.\.?(\/|$)|\0/.test(path)) return { status: 400, reason: 'not a plain path' };
  const file = files.get(path === '' || path === '/' ? '/index.html' : path);
  return file ? { status: 200, file } : { status: 404, reason: 'no such file' };
}
