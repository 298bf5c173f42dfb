import { type ReadonlySignal, signal } from '@preact/signals';
import type { Problem, Result } from '../../core/problem';
import type { Cancelled, Desk, FileTicket, HostFacts, OpenFile, RecentFile } from '../../main/bridge/contract';
import { newScenario } from './templates';
import type { Workbench } from './workbench';

/** What the page asks the user about files; one question at a time. */
export type FileQuestion =
  | { readonly kind: 'unsaved'; readonly goOn: () => void }
  | { readonly kind: 'choose-document'; readonly names: readonly string[] }
  | { readonly kind: 'name-document'; readonly suggested: string; readonly exists: string | null }
  | { readonly kind: 'changed-on-disk'; readonly problem: Problem };

/** A file that could not be opened or saved. The work on screen is as it was. */
export interface FileTrouble {
  readonly title: string;
  readonly problems: readonly Problem[];
}

export interface FileActions {
  readonly facts: ReadonlySignal<HostFacts | null>;
  readonly recent: ReadonlySignal<readonly RecentFile[]>;
  readonly question: ReadonlySignal<FileQuestion | null>;
  readonly trouble: ReadonlySignal<FileTrouble | null>;
  newFile(): void;
  open(): void;
  openNamed(name: string): void;
  openRecent(ticket: FileTicket): void;
  openDropped(file: File): void;
  save(): Promise<boolean>;
  saveAs(): Promise<boolean>;
  saveNamed(name: string, overwrite: boolean): Promise<boolean>;
  /** Goes on with what was asked, after asking about unsaved work. */
  whenSafe(goOn: () => void): void;
  answerUnsaved(answer: 'save' | 'discard' | 'cancel'): Promise<void>;
  dismissQuestion(): void;
  dismissTrouble(): void;
  close(): void;
}

const EXTENSION = '.sunder.json';

/** A file name made of the title: what any file system takes. */
export function fileNameOf(title: string): string {
  const plain = title
    .replace(/[^\p{L}\p{N} ._-]+/gu, ' ')
    .replace(/\s+/g, ' ')
    .replace(/^[. ]+/, '')
    .slice(0, 60)
    .replace(/[. ]+$/, '');
  return `${plain === '' ? 'Scenario' : plain}${EXTENSION}`;
}

export function createFileActions(desk: Desk, workbench: Workbench): FileActions {
  const facts = signal<HostFacts | null>(null);
  const recent = signal<readonly RecentFile[]>([]);
  const question = signal<FileQuestion | null>(null);
  const trouble = signal<FileTrouble | null>(null);

  const refuse = (title: string, problems: readonly Problem[]): false => {
    trouble.value = { title, problems };
    return false;
  };
  const refreshRecent = async (): Promise<void> => {
    const listed = await desk.recentFiles();
    if (listed.ok) recent.value = listed.value;
  };
  const take = (answer: Result<OpenFile | Cancelled>): void => {
    if (!answer.ok) {
      refuse('The file could not be opened', answer.problems);
      return;
    }
    if (answer.value === 'cancelled') return;
    trouble.value = null;
    question.value = null;
    workbench.load(answer.value);
    void refreshRecent();
  };

  const whenSafe = (goOn: () => void): void => {
    if (workbench.unsaved.peek()) question.value = { kind: 'unsaved', goOn };
    else goOn();
  };

  const open = (): void =>
    whenSafe(async () => {
      if (facts.peek()?.kind === 'loopback') {
        const names = await desk.documentNames();
        if (names.ok) question.value = { kind: 'choose-document', names: names.value };
        else refuse('The documents cannot be listed', names.problems);
      } else take(await desk.openScenario(null));
    });

  const saveNamed = async (name: string, overwrite: boolean): Promise<boolean> => {
    const written = workbench.scenario.peek();
    const answer = await desk.saveScenarioAs(written, name, overwrite);
    if (!answer.ok) return refuse('The file could not be saved', answer.problems);
    if (answer.value === 'cancelled') return false;
    if (answer.value === 'exists') {
      question.value = { kind: 'name-document', suggested: name, exists: name };
      return false;
    }
    question.value = null;
    trouble.value = null;
    workbench.markSaved(answer.value, written);
    await refreshRecent();
    return true;
  };

  const saveAs = async (): Promise<boolean> => {
    const suggested = fileNameOf(workbench.scenario.peek().title);
    if (facts.peek()?.kind !== 'loopback') return saveNamed(suggested, false);
    question.value = { kind: 'name-document', suggested, exists: null };
    return false;
  };

  const save = async (): Promise<boolean> => {
    const { ticket, displayName } = workbench.file.peek();
    if (ticket === null) return saveAs();
    const written = workbench.scenario.peek();
    const answer = await desk.saveScenario(ticket, written);
    if (answer.ok) {
      trouble.value = null;
      workbench.markSaved({ ticket, displayName }, written);
      return true;
    }
    const changed = answer.problems.find(({ code }) => code === 'changed-on-disk');
    if (changed !== undefined) {
      question.value = { kind: 'changed-on-disk', problem: changed };
      return false;
    }
    return refuse('The file could not be saved', answer.problems);
  };

  const stopListening = [
    desk.onScenarioOpened((file) => whenSafe(() => take({ ok: true, value: file }))),
    desk.onWindowClosing(() => whenSafe(() => void desk.closeWindow())),
    workbench.unsaved.subscribe((unsaved) => {
      void desk.noteUnsaved(unsaved, workbench.file.peek().displayName);
    }),
    workbench.file.subscribe(({ displayName }) => {
      void desk.noteUnsaved(workbench.unsaved.peek(), displayName);
    }),
  ];
  void desk.hostFacts().then((answer) => {
    if (answer.ok) facts.value = answer.value;
  });
  void refreshRecent();

  return {
    facts,
    recent,
    question,
    trouble,
    newFile: () => whenSafe(() => workbench.load({ ticket: null, displayName: 'Untitled', scenario: newScenario() })),
    open,
    openNamed: (name) => void desk.openScenario(name).then(take),
    openRecent: (ticket) => whenSafe(() => void desk.openRecent(ticket).then(take)),
    openDropped: (file) => whenSafe(() => void desk.openDropped(file).then(take)),
    save,
    saveAs,
    saveNamed,
    whenSafe,
    answerUnsaved: async (answer) => {
      const asked = question.peek();
      if (asked?.kind !== 'unsaved') return;
      question.value = null;
      if (answer === 'discard' || (answer === 'save' && (await save()))) asked.goOn();
    },
    dismissQuestion: () => {
      question.value = null;
    },
    dismissTrouble: () => {
      trouble.value = null;
    },
    close: () => {
      for (const stop of stopListening) stop();
    },
  };
}
