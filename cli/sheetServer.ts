import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';

/** The address of this machine for itself; nothing else is listened on. */
export const LOOPBACK = '127.0.0.1';
const OWN_NAMES = [LOOPBACK, 'localhost'];

/** What every answer says: keep nothing, guess no type, be shown in no frame, tell nobody where one came from. */
const HEADERS = {
  'Cache-Control': 'no-store',
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  'Referrer-Policy': 'no-referrer',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
};

/**
 * A server of one page, for this machine alone.
 *
 * It answers requests that name it by its own address, so that no page from elsewhere can reach it under another name, and
 * hands out its page and nothing else.
 *
 * @param page HTML
 */
export function sheetServer(page: Uint8Array): Server {
  return createServer((request, response) => answer(request, response, page));
}

function answer(request: IncomingMessage, response: ServerResponse, page: Uint8Array): void {
  const port = request.socket.localPort;
  if (!OWN_NAMES.some((name) => request.headers.host === `${name}:${port}`)) refuse(response, 421);
  else if (request.method !== 'GET' && request.method !== 'HEAD') refuse(response, 405, { Allow: 'GET, HEAD' });
  else if (request.url !== '/') refuse(response, 404);
  else {
    response.writeHead(200, { ...HEADERS, 'Content-Type': 'text/html; charset=utf-8', 'Content-Length': page.length });
    response.end(request.method === 'HEAD' ? undefined : page);
  }
}

function refuse(response: ServerResponse, status: number, more: Record<string, string> = {}): void {
  response.writeHead(status, { ...HEADERS, ...more, 'Content-Length': 0 });
  response.end();
}

/**
 * Begins to listen.
 *
 * @param server of the page
 * @param port 0 takes one that is free
 * @returns the port; or the fault for which it cannot be had
 */
export function listen(server: Server, port: number): Promise<number | NodeJS.ErrnoException> {
  return new Promise((resolve) => {
    server.once('error', resolve);
    server.listen({ host: LOOPBACK, port, exclusive: true }, () => {
      const address = server.address();
      resolve(typeof address === 'object' && address !== null ? address.port : port);
    });
  });
}
