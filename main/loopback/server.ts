import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { answer } from '../bridge/answer';
import { pageHeaders } from '../bridge/contentPolicy';
import type { Handlers } from '../bridge/contract';
import { readPageFile } from '../bridge/pageFiles';
import { createNoticeStreams, type NoticeStreams } from './noticeStreams';
import { createPass } from './pass';

const ADDRESS = '127.0.0.1';
const MAX_BODY_bytes = 6_000_000;
const START_PATH = '/start';

export interface LoopbackServer {
  readonly port: number;
  /** Carries the ticket: it opens the page once. */
  readonly startAddress: string;
  /** Another such address, when the first was used and the page is gone. */
  readonly renewStartAddress: () => string;
  readonly isStarted: () => boolean;
  readonly streams: NoticeStreams;
  readonly close: () => Promise<void>;
}

interface Settings {
  readonly handlers: Handlers;
  readonly pageRoot: string;
  readonly onStreams?: (count: number) => void;
}

type Handler = Handlers[keyof Handlers];

/** Without a prototype, so that no inherited name is a request. */
const tableOf = (handlers: Handlers): Readonly<Record<string, Handler | undefined>> =>
  Object.assign(Object.create(null), handlers);

function send(response: ServerResponse, status: number, type?: string, body: string | Uint8Array = ''): void {
  response.writeHead(status, type === undefined ? pageHeaders : { ...pageHeaders, 'Content-Type': type });
  response.end(body);
}

/** Refuses and hangs up: the rest of the request is not read. */
function hangUp(response: ServerResponse, status: number): void {
  response.setHeader('Connection', 'close');
  send(response, status);
}

async function bodyOf(request: IncomingMessage): Promise<string | 'too-large' | 'not-utf8'> {
  if (Number(request.headers['content-length'] ?? 0) > MAX_BODY_bytes) return 'too-large';
  const pieces: Uint8Array[] = [];
  let size_bytes = 0;
  for await (const piece of request.iterator({ destroyOnReturn: false })) {
    size_bytes += piece.length;
    if (size_bytes > MAX_BODY_bytes) return 'too-large';
    pieces.push(piece);
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(pieces));
  } catch {
    return 'not-utf8';
  }
}

function listIn(text: string): unknown[] | null {
  try {
    const value: unknown = JSON.parse(text);
    return Array.isArray(value) ? value : null;
  } catch {
    return null;
  }
}

/** Why a request may not be what our own page sends, as a status; null when it may. */
function refusalOfPost({ headers }: IncomingMessage, origin: string): number | null {
  if (headers.origin !== origin) return 403;
  if (headers['sec-fetch-site'] !== undefined && headers['sec-fetch-site'] !== 'same-origin') return 403;
  if (headers['x-sunder'] !== '1') return 403;
  return headers['content-type'] === 'application/json' ? null : 415;
}

const isFromElsewhere = ({ headers }: IncomingMessage): boolean =>
  headers['sec-fetch-site'] !== undefined && !['same-origin', 'none'].includes(String(headers['sec-fetch-site']));

/** Serves the page and the bridge on this computer only, to whoever holds the ticket. */
export async function startServer({
  handlers,
  pageRoot,
  onStreams = () => undefined,
}: Settings): Promise<LoopbackServer> {
  const table = tableOf(handlers);
  const streams = createNoticeStreams(onStreams);
  let port = 0;
  const pass = createPass(() => port);
  const origin = () => `http://${ADDRESS}:${port}`;

  const admit = ({ headers, url = '' }: IncomingMessage, response: ServerResponse): void => {
    const cookie = pass.exchange(new URLSearchParams(url.split('?', 2)[1]).get('ticket') ?? '');
    if (cookie === null) {
      send(response, 403, 'text/plain; charset=utf-8', 'This address has been used already.\n');
      return;
    }
    response.setHeader('Set-Cookie', cookie);
    if (headers['sec-fetch-site'] === 'cross-site') {
      // From the start page, a file: the browser keeps a strict cookie back on a redirect, not on a visit of our own.
      response.setHeader('Refresh', '0; url=/');
      send(response, 200, 'text/html; charset=utf-8', '<!doctype html><title>Sunder</title>');
      return;
    }
    response.setHeader('Location', '/');
    send(response, 303);
  };

  const answerPost = async (request: IncomingMessage, response: ServerResponse, path: string): Promise<void> => {
    const refusal = refusalOfPost(request, origin());
    if (refusal !== null) return hangUp(response, refusal);
    const name = path.startsWith('/desk/') ? path.slice('/desk/'.length) : '';
    const handler = table[name];
    if (handler === undefined) return hangUp(response, 404);
    const body = await bodyOf(request);
    if (body === 'too-large') return hangUp(response, 413);
    const untrusted = listIn(body);
    if (untrusted === null) return send(response, 400);
    const result = await answer(name, handler, untrusted);
    send(response, 200, 'application/json; charset=utf-8', JSON.stringify(result));
  };

  const answerRequest = async (request: IncomingMessage, response: ServerResponse): Promise<void> => {
    const { method, url = '', headers } = request;
    if (headers.host !== `${ADDRESS}:${port}`) return hangUp(response, 421);
    if (!url.startsWith('/')) return hangUp(response, 400);
    if (method !== 'GET' && method !== 'POST') return hangUp(response, 405);
    const [path = ''] = url.split('?', 1);
    if (method === 'GET' && path === START_PATH) return admit(request, response);
    if (!pass.admits(headers.cookie)) return hangUp(response, 403);
    if (method === 'POST') return answerPost(request, response, path);
    if (isFromElsewhere(request)) return hangUp(response, 403);
    if (path === '/notices') {
      if (!streams.add(response)) send(response, 503);
      return;
    }
    const file = await readPageFile(pageRoot, path);
    if (file === null) send(response, 404);
    else send(response, 200, file.type, file.bytes);
  };

  const server = createServer({ requestTimeout: 10_000, headersTimeout: 5_000 }, (request, response) => {
    answerRequest(request, response).catch((error: unknown) => {
      // A connection that broke half-way needs no answer; anything else is ours to know.
      if (!request.destroyed) process.stderr.write(`Fault in the loopback host: ${String(error)}\n`);
      if (response.headersSent) response.destroy();
      else hangUp(response, 500);
    });
  });
  server.maxConnections = 32;
  await new Promise<void>((listening, failed) => {
    server.once('error', failed);
    server.listen({ host: ADDRESS, port: 0, exclusive: true }, listening);
  });
  port = (server.address() as AddressInfo).port;
  const startAddress = () => `${origin()}${START_PATH}?ticket=${pass.ticket()}`;
  return {
    port,
    startAddress: startAddress(),
    renewStartAddress: () => {
      pass.renew();
      return startAddress();
    },
    isStarted: pass.isUsed,
    streams,
    close: async () => {
      streams.close();
      server.closeAllConnections();
      await new Promise((closed) => server.close(closed));
    },
  };
}
