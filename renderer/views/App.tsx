import { useEffect, useState } from 'preact/hooks';
import { CandidateList } from './candidates/CandidateList';
import { RequirementPane } from './candidates/RequirementPane';
import { CurvePane } from './curve/CurvePane';
import { useDeskTop } from './deskTop';
import { FileQuestions } from './files/FileQuestions';
import { TroublePanel } from './files/TroublePanel';
import { Head } from './Head';
import { belongsToText, keyCommands } from './keys';
import { RecipePane } from './recipe/RecipePane';
import { Tables } from './tables/Tables';
import { VerdictPane } from './verdict/VerdictPane';

function useKeys(): void {
  const deskTop = useDeskTop();
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (document.querySelector('dialog[open]') !== null) return;
      const command = keyCommands.find(({ matches }) => matches(event));
      if (command === undefined || belongsToText(event)) return;
      event.preventDefault();
      command.run(deskTop);
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [deskTop]);
}

const holdsFiles = (event: DragEvent): boolean => event.dataTransfer?.types.includes('Files') ?? false;

/** The whole window: candidates, their recipe, what becomes of them, and why. A file can be dropped anywhere. */
export function App() {
  const { files } = useDeskTop();
  const [dropping, setDropping] = useState(false);
  useKeys();
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: dropping a file is a second way to open one
    <div
      class="window"
      onDragOver={(event) => {
        if (!holdsFiles(event)) return;
        event.preventDefault();
        setDropping(true);
      }}
      onDragLeave={(event) => {
        if (event.relatedTarget === null) setDropping(false);
      }}
      onDrop={(event) => {
        event.preventDefault();
        setDropping(false);
        const file = event.dataTransfer?.files[0];
        if (file !== undefined) files.openDropped(file);
      }}
    >
      <Head />
      <TroublePanel />
      <main class="panes">
        <div class="column column-candidates">
          <RequirementPane />
          <CandidateList />
        </div>
        <div class="column column-recipe">
          <RecipePane />
        </div>
        <div class="column column-results">
          <VerdictPane />
          <CurvePane />
          <Tables />
        </div>
      </main>
      <FileQuestions />
      {dropping && (
        <div class="drop-zone" aria-hidden="true">
          Drop a scenario file to open it
        </div>
      )}
    </div>
  );
}
