import type { IncomingHttpHeaders, IncomingMessage, Server, ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';

import type { Log } from '../logging.ts';

/** What is answered to a request. */
export interface HttpAnswer {
  readonly status: number;
  readonly body?: string;
  /** The type of the body; plain text unless it is said. */
  readonly type?: string;
}

/** A request whose body is read only by whoever wants it. */
export interface HttpRequest {
  readonly headers: IncomingHttpHeaders;
  /** The body; undefined where it is longer than is taken, or was cut off. */
  readonly body: () => Promise<string | undefined>;
}

/** Answers a request. Where it rejects the answer is 500. */
export type HttpHandler = (request: HttpRequest) => Promise<HttpAnswer>;

/** What serving needs. */
export interface HttpOptions {
  /** 0 takes any that is free. */
  readonly port: number;
  /** By method and path, `GET /healthz`; all others are 404. */
  readonly routes: Readonly<Record<string, HttpHandler>>;
  readonly longestBody_bytes: number;
  readonly log: Log;
}

/** A server at work. */
export interface HttpServer {
  readonly port: number;
  /** Takes no more requests; resolves when those in hand are answered. */
  readonly close: () => Promise<void>;
}

/** A request has so long to arrive, in milliseconds. */
const LONGEST_REQUEST_MS = 10_000;
const LONGEST_HEADERS_MS = 5_000;
/** A connection that waits for its next request is closed after so long. */
const IDLE_MS = 65_000;

/** Serves HTTP. Rejects where the port cannot be had. */
export async function serveHttp(options: HttpOptions): Promise<HttpServer> {
  // By this way, and not by an import, as that would load the client of the web's own `fetch` too.
  const { createServer } = process.getBuiltinModule('node:http');
  const timeouts = {
    requestTimeout: LONGEST_REQUEST_MS,
    headersTimeout: LONGEST_HEADERS_MS,
    keepAliveTimeout: IDLE_MS,
  };
  const server = createServer(timeouts, (request, response) => void answer(request, response, options));
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(options.port, resolve);
  });
  return { port: (server.address() as AddressInfo).port, close: () => close(server) };
}

async function answer(
  request: IncomingMessage,
  response: ServerResponse,
  { routes, longestBody_bytes, log }: HttpOptions,
): Promise<void> {
  const [path] = (request.url ?? '').split('?', 1);
  const name = `${request.method} ${path}`;
  const handler = Object.hasOwn(routes, name) ? routes[name] : undefined;
  let answered: HttpAnswer = { status: 404, body: 'not found\n' };
  try {
    const body = (): Promise<string | undefined> => readBody(request, longestBody_bytes);
    if (handler !== undefined) answered = await handler({ headers: request.headers, body });
  } catch (err) {
    log.error({ err }, 'a request failed');
    answered = { status: 500 };
  }
  const { status, body = '', type = 'text/plain; charset=utf-8' } = answered;
  // What was not read to its end cannot be followed by another request on the same connection.
  const connection = request.readableEnded || request.method === 'GET' ? {} : { connection: 'close' };
  response.writeHead(status, { 'content-type': type, ...connection }).end(body);
}

function readBody(request: IncomingMessage, longest_bytes: number): Promise<string | undefined> {
  const { promise, resolve } = Promise.withResolvers<string | undefined>();
  const parts: Buffer[] = [];
  let length_bytes = 0;
  request.on('data', (part: Buffer) => {
    length_bytes += part.length;
    if (length_bytes <= longest_bytes) return void parts.push(part);
    request.pause();
    resolve(undefined);
  });
  request.on('end', () => resolve(Buffer.concat(parts).toString('utf8')));
  request.on('error', () => resolve(undefined));
  request.on('close', () => resolve(undefined));
  return promise;
}

function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeIdleConnections();
  });
}
