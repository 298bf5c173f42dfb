import type { DeskTop } from '../state/deskTop';

/** One key, what it does, in the order of the list that is shown. The host's menu has the same keys. */
export interface KeyCommand {
  readonly keys: string;
  readonly words: string;
  readonly matches: (event: KeyboardEvent) => boolean;
  readonly run: (deskTop: DeskTop) => void;
}

const control =
  (key: string, shift = false) =>
  (event: KeyboardEvent) =>
    (event.ctrlKey || event.metaKey) && !event.altKey && event.shiftKey === shift && event.key.toLowerCase() === key;

export const keyCommands: readonly KeyCommand[] = [
  { keys: 'Ctrl+N', words: 'New scenario', matches: control('n'), run: ({ files }) => files.newFile() },
  { keys: 'Ctrl+O', words: 'Open a scenario', matches: control('o'), run: ({ files }) => files.open() },
  { keys: 'Ctrl+S', words: 'Save', matches: control('s'), run: ({ files }) => void files.save() },
  {
    keys: 'Ctrl+Shift+S',
    words: 'Save under another name',
    matches: control('s', true),
    run: ({ files }) => void files.saveAs(),
  },
  { keys: 'Ctrl+Z', words: 'Undo', matches: control('z'), run: ({ workbench }) => workbench.undo() },
  {
    keys: 'Ctrl+Shift+Z or Ctrl+Y',
    words: 'Redo',
    matches: (event) => control('z', true)(event) || control('y')(event),
    run: ({ workbench }) => workbench.redo(),
  },
  {
    keys: 'Ctrl+D',
    words: 'Duplicate the selected candidate',
    matches: control('d'),
    run: ({ workbench }) => workbench.duplicateFormulation(workbench.selected.peek().id),
  },
];

/** Keys that act inside a region, for the list only. */
export const otherKeys: readonly (readonly [string, string])[] = [
  ['Tab, Shift+Tab', 'Next and previous entry'],
  ['Enter', 'Show the entry as it was read'],
  ['Escape', 'Give up what was typed; close a question'],
  ['← →, Home, End, Page Up, Page Down', 'Move the read-out along the curve, or a slider'],
];

/** While a text is being typed, undo is the browser's and undoes typing; once it was read, undo is ours. */
export const belongsToText = (event: KeyboardEvent): boolean =>
  event.target instanceof HTMLInputElement &&
  event.target.dataset.typing === 'true' &&
  ['z', 'y'].includes(event.key.toLowerCase());
