import { join, resolve } from 'node:path';
import { version } from '../../package.json';
import { createHandlers } from '../bridge/handlers';
import { documentsFolder } from '../files/documentsFolder';
import { createRecentFiles } from '../files/recentFiles';
import { createScenarioFiles } from '../files/scenarioFiles';
import { createTickets } from '../files/tickets';
import { userFolders } from '../files/userFolders';
import { type BrowserWindow, findBrowser, hasDisplay, isRoot, openWindow } from './browser';
import { createHeartbeat } from './heartbeat';
import { type LoopbackServer, startServer } from './server';

/** How long a window may take to show the page. */
const START_ms = 30_000;
/** How long the host stays when no page is there, since one may come back, as on a reload. */
const LINGER_ms = 30_000;
/** Connections of a window that ended are seen closed a moment later. */
const SETTLE_ms = 1_000;

const say = (line: string): void => {
  process.stdout.write(`${line}\n`);
};

let server: LoopbackServer | null = null;
let window: BrowserWindow | null = null;
let ending = false;

async function end(exitCode = 0): Promise<void> {
  if (ending) return;
  ending = true;
  heartbeat.stop();
  await server?.close();
  await window?.close();
  process.exit(exitCode);
}

/** Without a window of ours the user opens the page, and ends the program here. */
function offerAddress(reason: string, { startAddress }: LoopbackServer): void {
  say(reason);
  say(`Open this address in a browser on this computer; it works once: ${startAddress}`);
  say('Ctrl-C ends Sunder.');
}

/**
 * Ends the program when the last page is gone, even if the browser stays, as browsers do on a Mac. Without a window of
 * ours the page may be opened again: the browser has forgotten its pass once it was closed.
 */
const heartbeat = createHeartbeat(LINGER_ms, () => {
  if (window !== null) void end();
  else if (server !== null) say(`To open the page again: ${server.renewStartAddress()}`);
});

async function showWindow(browser: string, { startAddress, isStarted, streams }: LoopbackServer): Promise<void> {
  if (isRoot()) say('Started as root: the browser window runs without its sandbox (--no-sandbox).');
  const opened = await openWindow(browser, startAddress);
  window = opened;
  const late = setTimeout(() => void giveUp(), START_ms);
  const giveUp = async (): Promise<void> => {
    clearTimeout(late);
    if (isStarted() || ending || server === null) return;
    window = null;
    await opened.close();
    offerAddress('The browser window did not open.', server);
  };
  const onEnd = (): void => {
    if (!isStarted()) void giveUp();
    else setTimeout(() => (streams.count() === 0 ? void end() : undefined), SETTLE_ms);
  };
  opened.process.once('exit', onEnd);
  opened.process.once('error', onEnd);
}

async function start(): Promise<void> {
  const folders = userFolders();
  const files = createScenarioFiles(createTickets(), createRecentFiles(folders.data));
  const handlers = createHandlers({
    facts: { kind: 'loopback', appVersion: version, documentsFolderName: folders.documents },
    places: documentsFolder(folders.documents),
    files,
    window: {
      // The page itself asks before it is left.
      noteUnsaved: () => undefined,
      // After the answer has left.
      close: () => setTimeout(() => window !== null && void end(), 100),
    },
  });
  const started = await startServer({
    handlers,
    pageRoot: join(import.meta.dirname, '..', 'renderer'),
    onStreams: heartbeat.note,
  });
  server = started;
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => void end());

  const named = process.argv.slice(2).find((word) => !word.startsWith('-'));
  if (named !== undefined) {
    const file = await files.openAt(resolve(named));
    if (file.ok) started.streams.notify('scenario:opened', file.value);
    else
      for (const { message, remedy } of file.problems.slice(0, 5))
        process.stderr.write(`${named}: ${message} ${remedy}\n`);
  }

  const browser = findBrowser();
  if (!hasDisplay()) offerAddress('There is no display for a window.', started);
  else if (browser === null) offerAddress('There is no browser for a window.', started);
  else await showWindow(browser, started);
}

await start();
