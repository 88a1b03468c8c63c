import type { Agent, ClientRequest, IncomingMessage as HttpResponse, RequestOptions } from 'node:http';

/** As much of `fetch` as the Bot API client uses. */
export interface LeanFetch {
  (url: string, init: LeanRequest): Promise<LeanResponse>;
  /** Closes the connections that wait for the next call. */
  close(): void;
}

/** As much of a request as the Bot API client hands in. */
export interface LeanRequest {
  readonly method?: string;
  readonly headers?: Record<string, string>;
  /** A text, or what comes in pieces: a file. */
  readonly body?: string | AsyncIterable<Uint8Array>;
  /** More of an answer than so many bytes is not read: then it has no bytes. */
  readonly longest_bytes?: number;
  /** Any thing with the shape of an AbortSignal: the client brings one of its own, which Node's fetch refuses. */
  readonly signal?: Pick<AbortSignal, 'aborted' | 'addEventListener' | 'removeEventListener'>;
}

/** As much of a response as the Bot API client looks at. */
export interface LeanResponse {
  readonly status: number;
  json(): Promise<unknown>;
  /** Undefined where there are more than were asked for. */
  bytes(): Uint8Array | undefined;
}

/** The Bot API was asked and did not answer in its own words. Holds no URL, as the URL holds the token. */
export class NoAnswer extends Error {
  override readonly name = 'NoAnswer';
}

/** What `node:http` and `node:https` have in common, as far as it is used. */
interface HttpModule {
  readonly Agent: new (options: { keepAlive: boolean; maxSockets: number }) => Agent;
  request(url: URL, options: RequestOptions): ClientRequest;
}

/** Beyond this many calls at once, the next one waits for a connection. */
const MOST_CONNECTIONS = 64;

/**
 * Makes a `fetch` over kept-alive connections of `node:http` and `node:https`: most of what an answer costs is the
 * client's own one. The modules are taken at the call, as they load slowly, and as a test may replace them.
 */
export function createLeanFetch(): LeanFetch {
  const agents = new Map<string, Agent>();
  const moduleOf = (protocol: string): HttpModule =>
    process.getBuiltinModule(protocol === 'https:' ? 'node:https' : 'node:http');
  const agentOf = (protocol: string): Agent => {
    const known = agents.get(protocol);
    if (known !== undefined) return known;
    const made = new (moduleOf(protocol).Agent)({ keepAlive: true, maxSockets: MOST_CONNECTIONS });
    agents.set(protocol, made);
    return made;
  };

  const call = (url: URL, init: LeanRequest, mayRepeat: boolean): Promise<LeanResponse> =>
    new Promise((resolve, reject) => {
      const { signal, body, method = 'GET', headers = {}, longest_bytes = Infinity } = init;
      if (signal?.aborted === true) return reject(new NoAnswer('the call was given up'));
      const options: RequestOptions = { method, headers, agent: agentOf(url.protocol) };
      const request = moduleOf(url.protocol).request(url, options);
      const giveUp = (): void => {
        const reason = new NoAnswer('the call was given up');
        request.destroy(reason);
        reject(reason);
      };
      const settle = (): void => signal?.removeEventListener('abort', giveUp);
      signal?.addEventListener('abort', giveUp);
      request.on('error', (error: NodeJS.ErrnoException) => {
        settle();
        // Most likely the other side closed a waiting connection just as we took it.
        const stale = request.reusedSocket && error.code === 'ECONNRESET';
        // What came in pieces is spent, and what was given up is wanted no more.
        const mayAgain = mayRepeat && signal?.aborted !== true && !isInPieces(body);
        if (stale && mayAgain) resolve(call(url, init, false));
        else reject(error);
      });
      request.on('response', (response) => {
        readWhole(response, longest_bytes).then(
          (whole) => {
            settle();
            const { statusCode: status = 0 } = response;
            resolve({ status, bytes: () => whole, json: async () => parse(whole, status) });
          },
          (error: Error) => {
            settle();
            reject(error);
          },
        );
      });
      if (isInPieces(body)) sendPieces(body, request).catch((error: Error) => request.destroy(error));
      else request.end(body);
    });

  return Object.assign((url: string, init: LeanRequest) => call(new URL(url), init, true), {
    close: () => {
      for (const agent of agents.values()) agent.destroy();
      agents.clear();
    },
  });
}

const isInPieces = (body: LeanRequest['body']): body is AsyncIterable<Uint8Array> => typeof body === 'object';

async function sendPieces(pieces: AsyncIterable<Uint8Array>, request: ClientRequest): Promise<void> {
  for await (const piece of pieces) {
    const isTaken = request.write(piece);
    if (!isTaken && !request.destroyed)
      await new Promise<void>((resolve) => {
        request.once('drain', resolve);
        request.once('close', resolve);
      });
    if (request.destroyed) return;
  }
  request.end();
}

/** The bytes of an answer; undefined where there are more than `longest_bytes`: then the rest stays unread. */
const readWhole = (response: HttpResponse, longest_bytes: number): Promise<Buffer | undefined> =>
  new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    let length = 0;
    response.on('data', (part: Buffer) => {
      length += part.length;
      if (length <= longest_bytes) return void parts.push(part);
      resolve(undefined);
      response.destroy();
    });
    response.on('end', () => resolve(Buffer.concat(parts)));
    response.on('error', reject);
  });

const parse = (whole: Buffer | undefined, status: number): unknown => {
  try {
    return JSON.parse(whole?.toString('utf8') ?? '');
  } catch (cause) {
    throw new NoAnswer(`status ${status} with a body that is not JSON`, { cause });
  }
};
