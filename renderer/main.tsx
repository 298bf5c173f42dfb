import { signal } from '@preact/signals';
import { render } from 'preact';
import type { OpenFile } from '../main/bridge/contract';
import { SettingsProvider } from './controls/settingsContext';
import { theDesk } from './desk/desk';
import type { DeskTop } from './state/deskTop';
import { createFileActions } from './state/fileActions';
import { obeyMenu } from './state/obeyMenu';
import { createSettings } from './state/settings';
import { newScenario } from './state/templates';
import { createWorkbench } from './state/workbench';
import './styles/tokens.css';
import './styles/layout.css';
import './styles/controls.css';
import './styles/results.css';
import { App } from './views/App';
import { DeskTopProvider } from './views/deskTop';
import { createEvaluator } from './worker/evaluator';
import { startWorker } from './worker/startWorker';

const now_ms = (): number => performance.now();
const after = (delay_ms: number, task: () => void) => {
  const timer = setTimeout(task, delay_ms);
  return () => clearTimeout(timer);
};

async function start(): Promise<void> {
  const root = document.getElementById('root');
  if (root === null) throw new Error('the page has no #root');
  const desk = theDesk();
  const settings = createSettings();
  const example = await desk.exampleScenario();
  const opened: OpenFile = example.ok
    ? example.value
    : { ticket: null, displayName: 'Untitled', scenario: newScenario() };
  const { evaluate } = createEvaluator(startWorker, { now_ms, after });
  const workbench = createWorkbench(opened, evaluate, { now_ms });
  const deskTop: DeskTop = { workbench, files: createFileActions(desk, workbench), shownDialog: signal(null) };
  obeyMenu(desk, deskTop);
  workbench.file.subscribe(({ displayName }) => {
    document.title = `${workbench.unsaved.peek() ? '* ' : ''}${displayName} — Sunder`;
  });
  workbench.unsaved.subscribe((unsaved) => {
    document.title = `${unsaved ? '* ' : ''}${workbench.file.peek().displayName} — Sunder`;
  });
  render(
    <SettingsProvider value={settings}>
      <DeskTopProvider value={deskTop}>
        <App />
      </DeskTopProvider>
    </SettingsProvider>,
    root,
  );
}

void start();
