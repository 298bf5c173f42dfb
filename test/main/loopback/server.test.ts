import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { request } from 'node:http';
import { connect } from 'node:net';
import { networkInterfaces, tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { createHandlers } from '../../../main/bridge/handlers';
import { documentsFolder } from '../../../main/files/documentsFolder';
import { createRecentFiles } from '../../../main/files/recentFiles';
import { createScenarioFiles } from '../../../main/files/scenarioFiles';
import { createTickets } from '../../../main/files/tickets';
import { type LoopbackServer, startServer } from '../../../main/loopback/server';

let folder = '';
let server: LoopbackServer;

async function started(): Promise<LoopbackServer> {
  const handlers = createHandlers({
    facts: { kind: 'loopback', appVersion: '1.2.3', documentsFolderName: 'Documents' },
    places: documentsFolder(join(folder, 'documents')),
    files: createScenarioFiles(createTickets(), createRecentFiles(join(folder, 'data'))),
    window: { noteUnsaved: () => undefined, close: () => undefined },
  });
  return startServer({ handlers, pageRoot: join(folder, 'renderer') });
}

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
  await mkdir(join(folder, 'renderer'));
  await writeFile(join(folder, 'renderer', 'index.html'), 'the page');
  await writeFile(join(folder, 'package.json'), 'outside');
  server = await started();
});
afterEach(async () => {
  await server.close();
  await rm(folder, { recursive: true, force: true });
});

type Headers = Readonly<Record<string, string | undefined>>;
interface Answer {
  readonly status: number;
  readonly headers: Readonly<Record<string, string | readonly string[] | undefined>>;
  readonly body: string;
}

/** A request with exactly these headers; `undefined` leaves one out. */
const ask = (method: string, path: string, headers: Headers = {}, body = ''): Promise<Answer> =>
  new Promise((resolve, reject) => {
    const given = Object.entries(headers).filter((entry): entry is [string, string] => entry[1] !== undefined);
    const call = request(
      { host: '127.0.0.1', port: server.port, method, path, headers: Object.fromEntries(given), agent: false },
      (response) => {
        const pieces: Buffer[] = [];
        response.on('data', (piece: Buffer) => pieces.push(piece));
        response.once('error', reject);
        response.once('end', () =>
          resolve({
            status: response.statusCode ?? 0,
            headers: response.headers,
            body: Buffer.concat(pieces).toString('utf8'),
          }),
        );
      },
    );
    call.once('error', reject);
    call.end(body);
  });

/** The first line of the answer to a request written by hand. */
const askRaw = (text: string): Promise<string> =>
  new Promise((resolve, reject) => {
    const socket = connect(server.port, '127.0.0.1', () => socket.write(text));
    let heard = '';
    socket.setEncoding('latin1');
    socket.on('data', (piece: string) => {
      heard += piece;
    });
    socket.once('error', reject);
    socket.once('close', () => resolve(heard.split('\r\n', 1)[0] ?? ''));
  });

const startPath = () => server.startAddress.replace(/^http:\/\/[^/]+/, '');
const origin = () => `http://127.0.0.1:${server.port}`;

async function cookie(): Promise<string> {
  const { headers } = await ask('GET', startPath());
  return String(headers['set-cookie']?.[0]).split(';')[0] ?? '';
}

const proper = async (): Promise<Headers> => ({
  cookie: await cookie(),
  origin: origin(),
  'content-type': 'application/json',
  'x-sunder': '1',
  'sec-fetch-site': 'same-origin',
});

describe('the ticket', () => {
  it('opens the page once and turns into a strict cookie', async () => {
    const first = await ask('GET', startPath());
    expect(first.status).toBe(303);
    expect(first.headers.location).toBe('/');
    const [set] = first.headers['set-cookie'] ?? [];
    expect(set).toMatch(new RegExp(`^s_${server.port}=[\\w-]{43}; HttpOnly; SameSite=Strict; Path=/$`));
    expect((await ask('GET', startPath())).status).toBe(403);
    expect((await ask('GET', '/', { cookie: set?.split(';')[0] })).body).toBe('the page');
  });

  it('from a start page on disk leads on without a redirect', async () => {
    const first = await ask('GET', startPath(), { 'sec-fetch-site': 'cross-site' });
    expect([first.status, first.headers.refresh]).toEqual([200, '0; url=/']);
  });

  it.each(['/start', '/start?ticket=', '/start?ticket=wrong'])('cannot be guessed: %s', async (path) => {
    expect((await ask('GET', path)).status).toBe(403);
    expect(server.isStarted()).toBe(false);
  });

  it('is another at each start', async () => {
    const other = await started();
    expect(other.startAddress.split('=')[1]).not.toBe(server.startAddress.split('=')[1]);
    expect(other.port).not.toBe(server.port);
    await other.close();
  });
});

describe('a proper request', () => {
  it('is answered, and the page comes with its policy', async () => {
    const headers = await proper();
    const answer = await ask('POST', '/desk/host:facts', headers, '[]');
    expect(JSON.parse(answer.body)).toMatchObject({ ok: true, value: { kind: 'loopback' } });
    const page = await ask('GET', '/', headers);
    expect(page.headers['content-security-policy']).toContain("default-src 'none'");
    for (const { headers: sent } of [answer, page]) {
      expect(Object.keys(sent).filter((name) => name.startsWith('access-control'))).toEqual([]);
    }
  });

  it('hears notices, also those from before', async () => {
    server.streams.notify('menu:command', 'save');
    const headers = await proper();
    const heard = await new Promise<string>((resolve, reject) => {
      const call = request({
        host: '127.0.0.1',
        port: server.port,
        path: '/notices',
        headers: { cookie: headers.cookie },
      });
      call.once('response', (response) => {
        let text = '';
        response.on('data', (piece: Buffer) => {
          text += piece.toString('utf8');
          if (!text.includes('data:')) return;
          resolve(text);
          call.destroy();
        });
      });
      call.once('error', reject);
      call.end();
    });
    expect(heard).toContain('event: menu:command\ndata: ["save"]\n\n');
  });
});

describe('a hostile request', () => {
  const large = `["${'a'.repeat(6_500_000)}"]`;
  it.each<[string, string, string, Headers, string, number]>([
    ['another host name', 'GET', '/', { host: 'foreign.example' }, '', 421],
    ['the name localhost', 'GET', '/', { host: 'localhost' }, '', 421],
    ['no cookie', 'GET', '/', { cookie: undefined }, '', 403],
    ['a wrong cookie', 'GET', '/', { cookie: 's_1=wrong' }, '', 403],
    ['a visit from another page', 'GET', '/', { 'sec-fetch-site': 'cross-site' }, '', 403],
    ['a visit from another port', 'GET', '/', { 'sec-fetch-site': 'same-site' }, '', 403],
    ['a path out of the folder', 'GET', '/..%2fpackage.json', {}, '', 404],
    ['a path out, twice encoded', 'GET', '/%252e%252e%252fpackage.json', {}, '', 404],
    ['a request by GET', 'GET', '/desk/host:facts', {}, '', 404],
    ['a question before the request', 'OPTIONS', '/desk/host:facts', {}, '', 405],
    ['another method', 'PUT', '/desk/host:facts', {}, '[]', 405],
    ['no cookie on a request', 'POST', '/desk/host:facts', { cookie: undefined }, '[]', 403],
    ['a foreign origin', 'POST', '/desk/host:facts', { origin: 'https://foreign.example' }, '[]', 403],
    ['no origin', 'POST', '/desk/host:facts', { origin: undefined }, '[]', 403],
    ['the origin null', 'POST', '/desk/host:facts', { origin: 'null' }, '[]', 403],
    ['a form', 'POST', '/desk/host:facts', { 'content-type': 'text/plain' }, '[]', 415],
    ['no header of ours', 'POST', '/desk/host:facts', { 'x-sunder': undefined }, '[]', 403],
    ['a request from another site', 'POST', '/desk/host:facts', { 'sec-fetch-site': 'cross-site' }, '[]', 403],
    ['a request from another port', 'POST', '/desk/host:facts', { 'sec-fetch-site': 'same-site' }, '[]', 403],
    ['an inherited name', 'POST', '/desk/__proto__', {}, '[]', 404],
    ['another inherited name', 'POST', '/desk/constructor', {}, '[]', 404],
    ['a request only Electron has', 'POST', '/desk/scenario:open-path', {}, '["/etc/passwd"]', 404],
    ['no list', 'POST', '/desk/host:facts', {}, '{}', 400],
    ['no JSON', 'POST', '/desk/host:facts', {}, '[', 400],
    ['a body too large', 'POST', '/desk/host:facts', { 'content-length': String(large.length) }, '', 413],
  ])('is refused: %s', async (_name, method, path, changes, body, status) => {
    const headers = { ...(await proper()), ...changes };
    expect((await ask(method, path, headers, body)).status).toBe(status);
  });

  it('is cut off when it sends too much without saying so', async () => {
    const headers = { ...(await proper()), 'transfer-encoding': 'chunked' };
    const outcome = await ask('POST', '/desk/host:facts', headers, large).then(
      ({ status }) => status,
      // The host hangs up while the rest is still being sent.
      () => 413,
    );
    expect(outcome).toBe(413);
  });

  it('is refused when it names no host or another address', async () => {
    expect(await askRaw('GET / HTTP/1.0\r\n\r\n')).toContain(' 421 ');
    const host = `127.0.0.1:${server.port}`;
    expect(await askRaw(`GET http://${host}/ HTTP/1.1\r\nHost: ${host}\r\n\r\n`)).toContain(' 400 ');
  });

  it('from another address of the machine finds nobody', async () => {
    const others = Object.values(networkInterfaces())
      .flatMap((list) => list ?? [])
      .filter(({ internal, family }) => !internal && family === 'IPv4');
    for (const { address } of [...others, { address: '127.0.0.2' }]) {
      const outcome = await new Promise((resolve) => {
        const socket = connect({ host: address, port: server.port, timeout: 2000 }, () => resolve('connected'));
        socket.once('error', () => resolve('refused'));
        socket.once('timeout', () => resolve('refused'));
      });
      expect(outcome).toBe('refused');
    }
  });
});
