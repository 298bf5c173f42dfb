import { computed, effect, type ReadonlySignal, signal } from '@preact/signals';
import type { Evaluation, FormulationOutcome } from '../../core/evaluation';
import type { Formulation, Scenario } from '../../core/scenario/scenario';
import type { OpenFile } from '../../main/bridge/contract';
import type { Evaluator } from '../worker/evaluator';
import { edited, type History, redone, startHistory, undone } from './history';
import { freeId, freeName, newFormulation } from './templates';

export type EvaluationState =
  | { readonly kind: 'computing' }
  | { readonly kind: 'done' }
  | { readonly kind: 'failed'; readonly message: string };

export type FilePlace = Pick<OpenFile, 'ticket' | 'displayName'>;
export type FormulationChange = (formulation: Formulation) => Formulation;

export interface Workbench {
  readonly scenario: ReadonlySignal<Scenario>;
  readonly selected: ReadonlySignal<Formulation>;
  /** The newest answer that has arrived; it stays while the next one is computed. */
  readonly evaluation: ReadonlySignal<Evaluation | null>;
  readonly evaluationState: ReadonlySignal<EvaluationState>;
  readonly file: ReadonlySignal<FilePlace>;
  readonly unsaved: ReadonlySignal<boolean>;
  /** What undo and redo would do, in words; null when there is nothing to do. */
  readonly undoLabel: ReadonlySignal<string | null>;
  readonly redoLabel: ReadonlySignal<string | null>;
  outcomeOf(id: string): FormulationOutcome | undefined;
  select(id: string): void;
  /** Edits with the same `stepKey` shortly after one another are one step of undo. */
  edit(label: string, change: (scenario: Scenario) => Scenario, stepKey?: string): void;
  editFormulation(label: string, id: string, change: FormulationChange, stepKey?: string): void;
  undo(): void;
  redo(): void;
  load(file: OpenFile): void;
  /** The scenario that was written; the user may have typed on meanwhile. */
  markSaved(place: FilePlace, written: Scenario): void;
  addFormulation(): void;
  duplicateFormulation(id: string): void;
  removeFormulation(id: string): void;
  moveFormulation(id: string, step: -1 | 1): void;
  close(): void;
}

export interface Clock {
  now_ms(): number;
}

/** scenario → evaluation → views. This file owns the only writable signals of the work; views read and call. */
export function createWorkbench(start: OpenFile, evaluateInWorker: Evaluator, clock: Clock): Workbench {
  const history = signal<History<Scenario>>(startHistory(start.scenario));
  const saved = signal<Scenario | null>(start.scenario);
  const file = signal<FilePlace>({ ticket: start.ticket, displayName: start.displayName });
  const selectedId = signal(start.scenario.formulations[0].id);
  const evaluation = signal<Evaluation | null>(null);
  const evaluationState = signal<EvaluationState>({ kind: 'computing' });

  const scenario = computed(() => history.value.present);
  const selected = computed(() => {
    const { formulations } = scenario.value;
    return formulations.find(({ id }) => id === selectedId.value) ?? formulations[0];
  });

  let newest = 0;
  /** Answers up to this question are of no use: a newer one is shown, or another file. */
  let shown = 0;
  const close = effect(() => {
    const question = scenario.value;
    newest += 1;
    const asked = newest;
    evaluationState.value = { kind: 'computing' };
    evaluateInWorker(question).then(
      (answer) => {
        // While a slider is dragged answers lag behind; each is shown as long as it is newer than the last.
        if (asked <= shown) return;
        shown = asked;
        evaluation.value = answer;
        if (asked === newest) evaluationState.value = { kind: 'done' };
      },
      (fault: unknown) => {
        if (asked !== newest) return;
        const message = fault instanceof Error ? fault.message : 'The calculation stopped unexpectedly.';
        evaluationState.value = { kind: 'failed', message: `${message} Your entries are kept.` };
      },
    );
  });

  const edit: Workbench['edit'] = (label, change, stepKey) => {
    const value = change(scenario.peek());
    if (value === scenario.peek()) return;
    history.value = edited(history.peek(), { label, value, stepKey: stepKey ?? null, time_ms: clock.now_ms() });
  };
  const editFormulations = (label: string, change: (all: readonly Formulation[]) => readonly Formulation[]) =>
    edit(label, (now) => ({ ...now, formulations: change(now.formulations) }));

  return {
    scenario,
    selected,
    evaluation,
    evaluationState,
    file,
    unsaved: computed(() => saved.value !== scenario.value),
    undoLabel: computed(() => history.value.past.at(-1)?.label ?? null),
    redoLabel: computed(() => history.value.future[0]?.label ?? null),
    outcomeOf: (id) => evaluation.value?.formulations.find((outcome) => outcome.id === id),
    select: (id) => {
      selectedId.value = id;
    },
    edit,
    editFormulation: (label, id, change, stepKey) =>
      edit(
        label,
        (now) => ({ ...now, formulations: now.formulations.map((one) => (one.id === id ? change(one) : one)) }),
        stepKey === undefined ? undefined : `${id}${stepKey}`,
      ),
    undo: () => {
      history.value = undone(history.peek());
    },
    redo: () => {
      history.value = redone(history.peek());
    },
    load: (opened) => {
      shown = newest;
      evaluation.value = null;
      history.value = startHistory(opened.scenario);
      saved.value = opened.scenario;
      file.value = { ticket: opened.ticket, displayName: opened.displayName };
      selectedId.value = opened.scenario.formulations[0].id;
    },
    markSaved: (place, written) => {
      saved.value = written;
      file.value = { ticket: place.ticket, displayName: place.displayName };
    },
    addFormulation: () => {
      const added = newFormulation(scenario.peek().formulations);
      editFormulations('Add candidate', (all) => [...all, added]);
      selectedId.value = added.id;
    },
    duplicateFormulation: (id) => {
      const all = scenario.peek().formulations;
      const index = all.findIndex((one) => one.id === id);
      if (index < 0) return;
      const original = all[index];
      const copy = { ...original, id: freeId(all), name: freeName(`${original.name} 2`, all), copiedFrom: id };
      editFormulations('Duplicate candidate', () => [...all.slice(0, index + 1), copy, ...all.slice(index + 1)]);
      selectedId.value = copy.id;
    },
    removeFormulation: (id) => {
      const all = scenario.peek().formulations;
      const index = all.findIndex((one) => one.id === id);
      if (index < 0 || all.length === 1) return;
      editFormulations('Remove candidate', () =>
        all.filter((one) => one.id !== id).map((one) => (one.copiedFrom === id ? { ...one, copiedFrom: null } : one)),
      );
      if (selectedId.peek() === id) selectedId.value = (all[index + 1] ?? all[index - 1]).id;
    },
    moveFormulation: (id, step) => {
      const all = scenario.peek().formulations;
      const index = all.findIndex((one) => one.id === id);
      const target = index + step;
      if (index < 0 || target < 0 || target >= all.length) return;
      const reordered = all.filter((one) => one.id !== id);
      editFormulations('Move candidate', () => [...reordered.slice(0, target), all[index], ...reordered.slice(target)]);
    },
    close,
  };
}
