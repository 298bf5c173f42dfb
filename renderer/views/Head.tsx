import { TextField } from '../controls/fields';
import { useSettings } from '../controls/settingsContext';
import type { Theme } from '../state/settings';
import { AboutDialog } from './AboutDialog';
import { useDeskTop } from './deskTop';
import { KeysDialog } from './KeysDialog';

const themeWords: readonly (readonly [Theme, string])[] = [
  ['system', 'as the system'],
  ['light', 'light'],
  ['dark', 'dark'],
];

function RecentFiles() {
  const { files } = useDeskTop();
  const recent = files.recent.value;
  return (
    <details class="menu">
      <summary>Recent</summary>
      <ul>
        {recent.length === 0 && <li class="hint">No files yet</li>}
        {recent.map(({ ticket, displayName, folderName }) => (
          <li key={ticket}>
            <button
              type="button"
              class="quiet"
              onClick={(event) => {
                event.currentTarget.closest('details')?.removeAttribute('open');
                files.openRecent(ticket);
              }}
            >
              {displayName} <small>{folderName}</small>
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
}

function Preferences() {
  const { theme, decimalSign } = useSettings();
  return (
    <details class="menu">
      <summary>View</summary>
      <div class="menu-body">
        <label class="field">
          <span class="field-label">Colours</span>
          <select
            class="field-input field-choice"
            value={theme.value}
            onChange={(event) => {
              const picked = themeWords.find(([key]) => key === event.currentTarget.value);
              if (picked !== undefined) theme.value = picked[0];
            }}
          >
            {themeWords.map(([key, words]) => (
              <option key={key} value={key}>
                {words}
              </option>
            ))}
          </select>
        </label>
        <label class="field">
          <span class="field-label">Decimal sign shown</span>
          <select
            class="field-input field-choice"
            value={decimalSign.value}
            onChange={(event) => {
              decimalSign.value = event.currentTarget.value === ',' ? ',' : '.';
            }}
          >
            <option value=".">point (1.5)</option>
            <option value=",">comma (1,5)</option>
          </select>
        </label>
      </div>
    </details>
  );
}

/** The scenario's title and file, and what can be done with the whole of it. */
export function Head() {
  const { workbench, files, shownDialog } = useDeskTop();
  const show = (dialog: 'about' | 'keys' | null) => {
    shownDialog.value = dialog;
  };
  const shown = shownDialog.value;
  const undoLabel = workbench.undoLabel.value;
  const redoLabel = workbench.redoLabel.value;
  const unsaved = workbench.unsaved.value;
  return (
    <header class="head">
      <span class="brand" aria-hidden="true">
        Sunder
      </span>
      <div class="head-title">
        <TextField
          label="Title of the scenario"
          hiddenLabel
          mayBeEmpty
          value={workbench.scenario.value.title}
          maxLength={200}
          onCommit={(title) => workbench.edit('Change title', (now) => ({ ...now, title }), 'title')}
        />
        <span class="file-name">
          {workbench.file.value.displayName}
          {unsaved && <span class="unsaved"> · not saved</span>}
        </span>
      </div>
      <nav class="head-actions" aria-label="File">
        <button type="button" onClick={files.newFile}>
          New
        </button>
        <button type="button" onClick={files.open}>
          Open…
        </button>
        <RecentFiles />
        <button type="button" onClick={() => void files.save()}>
          Save
        </button>
        <button type="button" onClick={() => void files.saveAs()}>
          Save as…
        </button>
        <button type="button" disabled={undoLabel === null} title={undoLabel ?? ''} onClick={workbench.undo}>
          Undo
        </button>
        <button type="button" disabled={redoLabel === null} title={redoLabel ?? ''} onClick={workbench.redo}>
          Redo
        </button>
        <Preferences />
        <button type="button" onClick={() => show('keys')}>
          Keys
        </button>
        <button type="button" onClick={() => show('about')}>
          About
        </button>
      </nav>
      {shown === 'about' && <AboutDialog onClose={() => show(null)} />}
      {shown === 'keys' && <KeysDialog onClose={() => show(null)} />}
    </header>
  );
}
