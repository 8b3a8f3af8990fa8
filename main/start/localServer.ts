import { readFile } from 'node:fs/promises';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { loopbackHeader, loopbackMark, loopbackPath } from '../../renderer/host/loopback';
import { listBuiltFiles, lookUp } from '../serving/builtFiles';
import { securityHeaders } from '../serving/contentPolicy';
import { answerLoopback, type LoopbackHandlers } from './loopbackCalls';
import { LocalSession } from './localSession';

export const address = '127.0.0.1';
/** Fixed: the browser keeps the projects under this origin, and under another port they would be out of sight. */
export const defaultPort = 47341;
/** Tells our own server from any other that holds the port. */
export const serverMark = 'spinhue-local';

export interface LocalServer {
  readonly port: number;
  readonly origin: string;
  /** An address that opens the page once with access to the copies. */
  windowAddress(): string;
  close(): Promise<void>;
}

function refuse(response: ServerResponse, status: number, reason: string): void {
  response.writeHead(status, { ...securityHeaders, 'content-type': 'text/plain; charset=utf-8' });
  response.end(`${reason}\n`);
}

/**
 * Serves the built page to this machine alone. A request under another host name is refused (a name that points to
 * 127.0.0.1 would otherwise let a foreign page in), and calls that touch files need the cookie, our origin and a header
 * that no foreign page can send.
 */
export async function startLocalServer(
  folder: string,
  handlers: LoopbackHandlers,
  wantedPort: number = defaultPort,
): Promise<LocalServer> {
  const files = listBuiltFiles(folder);
  const session = new LocalSession();
  let origin = '';

  const page = async (request: IncomingMessage, response: ServerResponse, known: boolean): Promise<void> => {
    const found = lookUp(files, {
      method: request.method ?? '',
      rawAddress: request.url ?? '',
      isOurs: true,
    });
    if (found.status !== 200) return refuse(response, found.status, found.reason);
    let body: string | Buffer = await readFile(found.file.path);
    if (known && found.file.path.endsWith('index.html')) {
      body = body.toString('utf8').replace('<head>', `<head><meta name="${loopbackMark}" content="1">`);
    }
    response.writeHead(200, { ...securityHeaders, 'content-type': found.file.mediaType });
    response.end(request.method === 'HEAD' ? '' : body);
  };

  const answer = async (request: IncomingMessage, response: ServerResponse): Promise<void> => {
    const { method = '', url = '', headers } = request;
    response.setHeader('server', serverMark);
    if (headers.host !== origin.slice('http://'.length)) return refuse(response, 403, 'wrong host');
    const site = headers['sec-fetch-site'];
    if (site === 'cross-site' || site === 'same-site')
      return refuse(response, 403, 'asked for by another page');
    if (url.startsWith('/open/')) {
      const cookie = method === 'GET' ? session.redeem(url.slice('/open/'.length)) : null;
      response.writeHead(302, {
        ...securityHeaders,
        location: '/',
        ...(cookie === null ? {} : { 'set-cookie': cookie }),
      });
      response.end();
      return;
    }
    const known = session.isKnown(headers.cookie);
    if (url.startsWith(loopbackPath)) {
      if (method !== 'POST') return refuse(response, 405, 'only POST');
      if (!known || headers.origin !== origin || headers[loopbackHeader] !== '1') {
        return refuse(response, 403, 'only from the window that the program opened');
      }
      return answerLoopback(url.slice(loopbackPath.length), request, response, handlers);
    }
    return page(request, response, known);
  };

  const server: Server = createServer((request, response) => {
    answer(request, response).catch((error: unknown) => {
      if (!response.headersSent) refuse(response, 500, 'the local server failed');
      process.stderr.write(`spinhue: ${String(error)}\n`);
    });
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen({ host: address, port: wantedPort, exclusive: true }, resolve);
  });
  const { port } = server.address() as AddressInfo;
  origin = `http://${address}:${port}`;
  return {
    port,
    origin,
    windowAddress: () => `${origin}/open/${session.newCode()}`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}
