import { useState } from 'preact/hooks';
import { writeScenario } from '../../../core/scenario/write';
import { Dialog } from '../../controls/Dialog';
import { fileNameOf } from '../../state/fileActions';
import { useDeskTop } from '../deskTop';

function UnsavedQuestion() {
  const { workbench, files } = useDeskTop();
  return (
    <Dialog title="Save your changes?" onCancel={files.dismissQuestion}>
      <p>“{workbench.scenario.value.title}” has changes that are not saved.</p>
      <div class="dialog-actions">
        <button type="button" onClick={() => void files.answerUnsaved('discard')}>
          Don’t save
        </button>
        <button type="button" onClick={files.dismissQuestion}>
          Cancel
        </button>
        <button type="button" class="primary" onClick={() => void files.answerUnsaved('save')}>
          Save
        </button>
      </div>
    </Dialog>
  );
}

function DocumentChoice({ names }: { readonly names: readonly string[] }) {
  const { files } = useDeskTop();
  const folder = files.facts.value?.documentsFolderName ?? '';
  return (
    <Dialog title="Open a scenario" onCancel={files.dismissQuestion}>
      <p class="hint">{names.length === 0 ? `No scenarios in ${folder} yet.` : `From ${folder}`}</p>
      <ul class="documents">
        {names.map((name) => (
          <li key={name}>
            <button type="button" class="quiet" onClick={() => files.openNamed(name)}>
              {name}
            </button>
          </li>
        ))}
      </ul>
      <label class="field">
        <span class="field-label">Another file</span>
        <input
          type="file"
          accept=".json,application/json"
          onChange={(event) => {
            const file = event.currentTarget.files?.[0];
            if (file === undefined) return;
            files.dismissQuestion();
            files.openDropped(file);
          }}
        />
      </label>
      <div class="dialog-actions">
        <button type="button" onClick={files.dismissQuestion}>
          Cancel
        </button>
      </div>
    </Dialog>
  );
}

function NameQuestion({ suggested, exists }: { readonly suggested: string; readonly exists: string | null }) {
  const { workbench, files } = useDeskTop();
  const [name, setName] = useState(suggested);
  const folder = files.facts.value?.documentsFolderName ?? '';
  const overwrite = exists !== null && exists === name;
  const download = () => {
    const address = URL.createObjectURL(
      new Blob([writeScenario(workbench.scenario.peek())], { type: 'application/json' }),
    );
    const link = document.createElement('a');
    link.href = address;
    link.download = fileNameOf(workbench.scenario.peek().title);
    link.click();
    URL.revokeObjectURL(address);
  };
  return (
    <Dialog title="Save as" onCancel={files.dismissQuestion}>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          void files.saveNamed(name, overwrite);
        }}
      >
        <label class="field">
          <span class="field-label">Name, in {folder}</span>
          <input
            class="field-input field-text"
            type="text"
            value={name}
            maxLength={80}
            onInput={(event) => setName(event.currentTarget.value)}
          />
        </label>
        {overwrite && <p class="field-error">There is a file of this name already. Saving replaces it.</p>}
        <div class="dialog-actions">
          <button type="button" onClick={download}>
            Download a copy
          </button>
          <button type="button" onClick={files.dismissQuestion}>
            Cancel
          </button>
          <button type="submit" class="primary" disabled={name.trim() === ''}>
            {overwrite ? 'Replace' : 'Save'}
          </button>
        </div>
      </form>
    </Dialog>
  );
}

function ChangedOnDisk({ message }: { readonly message: string }) {
  const { files } = useDeskTop();
  return (
    <Dialog title="The file was changed by someone else" onCancel={files.dismissQuestion}>
      <p>{message}</p>
      <div class="dialog-actions">
        <button type="button" onClick={files.dismissQuestion}>
          Cancel
        </button>
        <button
          type="button"
          class="primary"
          onClick={() => {
            files.dismissQuestion();
            void files.saveAs();
          }}
        >
          Save under another name
        </button>
      </div>
    </Dialog>
  );
}

/** The question about files that is open now, if any. */
export function FileQuestions() {
  const question = useDeskTop().files.question.value;
  switch (question?.kind) {
    case 'unsaved':
      return <UnsavedQuestion />;
    case 'choose-document':
      return <DocumentChoice names={question.names} />;
    case 'name-document':
      return <NameQuestion key={question.exists} suggested={question.suggested} exists={question.exists} />;
    case 'changed-on-disk':
      return <ChangedOnDisk message={`${question.problem.message} ${question.problem.remedy}`} />;
    default:
      return null;
  }
}
