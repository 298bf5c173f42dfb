import { done, type Problem, type Result, refused } from '../../core/problem';
import { parseScenario } from '../../core/scenario/parse';
import type { Desk, Notices, OpenFile, Requests } from '../../main/bridge/contract';

const MAX_FILE_bytes = 5_000_000;

const problem = (code: string, message: string, remedy: string): Problem => ({ code, at: '', message, remedy });
const HOST_GONE = problem(
  'host-gone',
  'The part of Sunder that keeps the files does not answer.',
  'Leave this window open, start Sunder anew and copy your entries over.',
);
const TOO_LARGE = problem('too-large', 'The file is larger than 5 MB.', 'No scenario is that large: choose another.');
const NOT_UTF8 = problem('not-utf8', 'The file is not UTF-8 text.', 'Choose another file, or save it as UTF-8.');

const ask =
  <C extends keyof Requests>(request: C) =>
  async (...given: Parameters<Requests[C]>): Promise<Awaited<ReturnType<Requests[C]>>> => {
    let answer: unknown = refused(HOST_GONE);
    try {
      const response = await fetch(`/desk/${request}`, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json', 'X-Sunder': '1' },
        body: JSON.stringify(given),
      });
      if (response.ok) answer = await response.json();
    } catch {
      // No connection, or one that broke: the answer stays "host gone".
    }
    return answer as Awaited<ReturnType<Requests[C]>>;
  };

/**
 * One stream for all notices, opened with the page: it also tells the host that the page is there. What comes before
 * the page listens, a file named at the start, waits for the first listener.
 */
function hear(stream: EventSource) {
  return <N extends keyof Notices>(notice: N) => {
    type Payload = Parameters<Notices[N]>;
    const listeners = new Set<(...payload: Payload) => void>();
    const waiting: Payload[] = [];
    stream.addEventListener(notice, (event: MessageEvent<string>) => {
      const payload = JSON.parse(event.data) as Payload;
      if (listeners.size === 0) waiting.push(payload);
      for (const listener of [...listeners]) listener(...payload);
    });
    return (listener: (...payload: Payload) => void): (() => void) => {
      const own = (...payload: Payload) => listener(...payload);
      listeners.add(own);
      for (const payload of waiting.splice(0)) queueMicrotask(() => own(...payload));
      return () => {
        listeners.delete(own);
      };
    };
  };
}

/** A file dropped on the page has no place here that the host knows: saving asks for a name. */
async function openDropped(file: File): Promise<Result<OpenFile>> {
  if (file.size > MAX_FILE_bytes) return refused(TOO_LARGE);
  let text: string;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(await file.arrayBuffer());
  } catch {
    return refused(NOT_UTF8);
  }
  const scenario = parseScenario(text);
  if (!scenario.ok) return scenario;
  return done({ ticket: null, displayName: file.name.replace(/(\.sunder)?\.json$/i, ''), scenario: scenario.value });
}

/** The desk of a page that runs in a browser window: the host is asked over the loopback interface. */
export function createLoopbackDesk(): Desk {
  const on = hear(new EventSource('/notices'));
  const noteUnsaved = ask('window:unsaved');
  let unsaved = false;
  // The host cannot hold a browser window open; the browser asks.
  window.addEventListener('beforeunload', (event) => {
    if (unsaved) event.preventDefault();
  });
  return {
    hostFacts: ask('host:facts'),
    exampleScenario: ask('scenario:example'),
    openScenario: ask('scenario:open'),
    openRecent: ask('scenario:open-recent'),
    openDropped,
    saveScenario: ask('scenario:save'),
    saveScenarioAs: ask('scenario:save-as'),
    recentFiles: ask('recent:list'),
    documentNames: ask('documents:list'),
    noteUnsaved: (isUnsaved, displayName) => {
      unsaved = isUnsaved;
      return noteUnsaved(isUnsaved, displayName);
    },
    closeWindow: ask('window:close'),
    onMenuCommand: on('menu:command'),
    onScenarioOpened: on('scenario:opened'),
    onWindowClosing: on('window:closing'),
  };
}
