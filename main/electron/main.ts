import { join, resolve } from 'node:path';
import { app, dialog, session } from 'electron';
import { createHandlers } from '../bridge/handlers';
import { listen } from '../bridge/listen';
import { openPathHandler } from '../bridge/openPathHandler';
import { createRecentFiles } from '../files/recentFiles';
import { createScenarioFiles, type ScenarioFiles } from '../files/scenarioFiles';
import { createTickets } from '../files/tickets';
import { userFolders } from '../files/userFolders';
import { dialogPlaces } from './dialogPlaces';
import { setMenu } from './menu';
import { registerPageScheme, servePage } from './page';
import { denyPermissions } from './permissions';
import { type DeskWindow, openDeskWindow } from './window';

/** The scenario file named when the program was started, if one was. */
function fileArgument(commandLine: readonly string[], folder: string): string | null {
  const named = commandLine.slice(1).find((word) => !word.startsWith('-') && word.toLowerCase().endsWith('.json'));
  return named === undefined ? null : resolve(folder, named);
}

/** Awaited by `npm start`, which has another way to show the page when this does not come. */
const WINDOW_IS_OPEN = 'Sunder: the window is open.';

let desk: DeskWindow | null = null;
let files: ScenarioFiles | null = null;
/** A file the system asked us to open before the window was there. */
let asked: string | null = fileArgument(process.argv, process.cwd());

async function openFromOutside(path: string): Promise<void> {
  if (desk === null || files === null) {
    asked = path;
    return;
  }
  desk.focus();
  const file = await files.openAt(path);
  if (file.ok) {
    desk.notify('scenario:opened', file.value);
    return;
  }
  const [problem] = file.problems;
  await dialog.showMessageBox(desk.window, {
    type: 'warning',
    message: problem === undefined ? 'The file cannot be opened.' : problem.message,
    detail: problem === undefined ? '' : `${problem.at === '' ? '' : `At ${problem.at}. `}${problem.remedy}`,
  });
}

function start(): void {
  const built = import.meta.dirname;
  denyPermissions(session.defaultSession);
  servePage(join(built, '..', 'renderer'));
  const folders = userFolders();
  const own = process.env.SUNDER_DOCUMENTS_DIR;
  const startFolder = own === undefined || own === '' ? app.getPath('documents') : own;
  const recent = createRecentFiles(folders.data);
  const noteRecent = (path: string): Promise<void> => {
    // The system's own list, where it has one.
    app.addRecentDocument(path);
    return recent.note(path);
  };
  files = createScenarioFiles(createTickets(), { ...recent, note: noteRecent });
  const opened = openDeskWindow(join(built, 'preload.cjs'), () => {
    if (process.env.SUNDER_SAY_WHEN_OPEN === '1') process.stdout.write(`${WINDOW_IS_OPEN}\n`);
  });
  desk = opened;
  opened.window.on('closed', () => {
    desk = null;
  });
  const handlers = createHandlers({
    facts: { kind: 'electron', appVersion: app.getVersion(), documentsFolderName: null },
    places: dialogPlaces(() => opened.window, startFolder),
    files,
    window: opened,
  });
  listen({ ...handlers, ...openPathHandler(files) }, () => desk?.window.webContents ?? null);
  setMenu((command) => desk?.notify('menu:command', command));
  if (asked !== null) void openFromOutside(asked);
}

app.enableSandbox();
registerPageScheme();
// Two starts with different data folders are two programs, for tests and for portable use.
if ((process.env.SUNDER_DATA_DIR ?? '') !== '') app.setPath('userData', join(userFolders().data, 'electron'));

if (app.requestSingleInstanceLock()) {
  app.on('second-instance', (_event, commandLine, folder) => {
    const path = fileArgument(commandLine, folder);
    if (path === null) desk?.focus();
    else void openFromOutside(path);
  });
  app.on('open-file', (event, path) => {
    event.preventDefault();
    void openFromOutside(path);
  });
  // One window, one program, on every platform.
  app.on('window-all-closed', () => app.quit());
  // Not awaited: Electron becomes ready only once this module has run to its end.
  void app.whenReady().then(start);
} else {
  app.quit();
}
