import type { Desk, MenuCommand } from '../../main/bridge/contract';
import type { DeskTop } from './deskTop';

/** What the host's menu does in the page. */
export function obeyMenu(desk: Desk, { workbench, files, shownDialog }: DeskTop): () => void {
  const actions: Readonly<Record<MenuCommand, () => void>> = {
    new: files.newFile,
    open: files.open,
    save: () => void files.save(),
    'save-as': () => void files.saveAs(),
    undo: workbench.undo,
    redo: workbench.redo,
    'duplicate-formulation': () => workbench.duplicateFormulation(workbench.selected.peek().id),
    about: () => {
      shownDialog.value = 'about';
    },
    shortcuts: () => {
      shownDialog.value = 'keys';
    },
  };
  return desk.onMenuCommand((command) => actions[command]());
}
