import { createServer, type RequestListener, type Server } from 'node:http';
import type { AddressInfo, Socket } from 'node:net';

import { afterEach, describe, expect, test } from 'vitest';

import { createLeanFetch, type LeanFetch } from '../../../src/edge/telegram/lean-fetch.ts';

let server: Server | undefined;
let fetch: LeanFetch = createLeanFetch();

const serve = async (listener: RequestListener): Promise<string> => {
  server = createServer(listener);
  await new Promise<void>((resolve) => server?.listen(0, '127.0.0.1', resolve));
  return `http://127.0.0.1:${(server.address() as AddressInfo).port}/x`;
};

afterEach(() => {
  fetch.close();
  server?.closeAllConnections();
  server?.close();
  fetch = createLeanFetch();
});

describe('the lean fetch', () => {
  test('sends method, headers and body, and reads JSON whatever the status', async () => {
    const url = await serve((request, response) => {
      let body = '';
      request.on('data', (part) => (body += String(part)));
      const { method, headers } = request;
      request.on('end', () =>
        response.writeHead(418).end(JSON.stringify({ method, type: headers['content-type'], body })),
      );
    });
    const init = { method: 'POST', headers: { 'content-type': 'application/json' }, body: '{"a":"ü"}' };
    const answer = await fetch(url, init);
    expect(answer.status).toBe(418);
    expect(await answer.json()).toEqual({ method: 'POST', type: 'application/json', body: '{"a":"ü"}' });
  });

  test('uses one connection for calls that follow each other', async () => {
    const sockets = new Set<Socket>();
    const url = await serve((request, response) => {
      sockets.add(request.socket);
      response.end('{}');
    });
    for (let i = 0; i < 5; i += 1) await (await fetch(url, {})).json();
    expect(sockets.size).toBe(1);
  });

  test('makes a call anew when the connection that waited was closed meanwhile', async () => {
    let calls = 0;
    const url = await serve((request, response) => {
      calls += 1;
      if (calls === 2) request.socket.destroy();
      else response.end('{"ok":true}');
    });
    await (await fetch(url, {})).json();
    expect(await (await fetch(url, {})).json()).toEqual({ ok: true });
    expect(calls).toBe(3);
  });

  test.each<[string, RequestListener, RegExp]>([
    ['a connection that is cut', (request) => void request.socket.destroy(), /ECONNRESET|socket hang up/],
    [
      'an answer that is cut in the middle',
      (request, response) => {
        response.writeHead(200, { 'content-length': 100 }).write('{"ok":');
        setImmediate(() => request.socket.destroy());
      },
      /aborted/,
    ],
    [
      'a page that is no JSON',
      (_, response) => void response.writeHead(502).end('<html>'),
      /status 502 with a body that is not JSON/,
    ],
  ])('rejects with the reason and without the address after %s', async (_, listener, reason) => {
    const url = await serve(listener);
    const error = await fetch(`${url}/bot1:SECRET`, {})
      .then((answer) => answer.json())
      .catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(Error);
    expect((error as Error).message).toMatch(reason);
    expect(String((error as Error).stack)).not.toContain('SECRET');
  });

  test('gives up when it is told to, before and during the call', async () => {
    const url = await serve(() => undefined);
    await expect(fetch(url, { signal: AbortSignal.abort() })).rejects.toThrow('given up');
    const controller = new AbortController();
    const call = fetch(url, { signal: controller.signal });
    server?.on('request', () => controller.abort());
    await expect(call).rejects.toThrow('given up');
  });
});
