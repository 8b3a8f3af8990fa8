import { readFile } from 'node:fs/promises';
import { protocol } from 'electron';
import { isOurUrl, scheme } from '../guard/origin';
import { listBuiltFiles, lookUp } from './builtFiles';
import { securityHeaders } from './contentPolicy';

/** To be called before the program is ready. Without `standard` the page would have no database at all. */
export function registerScheme(): void {
  protocol.registerSchemesAsPrivileged([
    { scheme, privileges: { standard: true, secure: true, supportFetchAPI: true, codeCache: true } },
  ]);
}

/** Serves the built page; to be called once the program is ready. */
export function serveScheme(folder: string): void {
  const files = listBuiltFiles(folder);
  protocol.handle(scheme, async (request) => {
    const found = lookUp(files, {
      method: request.method,
      rawAddress: request.url,
      isOurs: isOurUrl(request.url),
    });
    if (found.status !== 200) {
      return new Response(found.reason, { status: found.status, headers: { ...securityHeaders } });
    }
    return new Response(new Uint8Array(await readFile(found.file.path)), {
      headers: { ...securityHeaders, 'content-type': found.file.mediaType },
    });
  });
}
