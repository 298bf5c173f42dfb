import { describe, expect, it } from 'vitest';
import type { Evaluation } from '../../../core/evaluation';
import type { Scenario } from '../../../core/scenario/scenario';
import { newScenario } from '../../../renderer/state/templates';
import { createWorkbench } from '../../../renderer/state/workbench';

/** A workbench whose evaluations are answered by hand. */
function trial() {
  const asked: { scenario: Scenario; resolve: (evaluation: Evaluation) => void; reject: (fault: Error) => void }[] = [];
  let time_ms = 0;
  const workbench = createWorkbench(
    { ticket: null, displayName: 'Untitled', scenario: newScenario() },
    (scenario) => new Promise((resolve, reject) => asked.push({ scenario, resolve, reject })),
    {
      now_ms: () => {
        time_ms += 2000;
        return time_ms;
      },
    },
  );
  const rest = () => new Promise((done) => setTimeout(done, 0));
  return { workbench, asked, rest };
}

const empty = (): Evaluation => ({ formulations: [] });
const title = (workbench: ReturnType<typeof trial>['workbench'], text: string) =>
  workbench.edit('Change title', (now) => ({ ...now, title: text }));

describe('evaluation follows the scenario', () => {
  it('asks at the start and after each edit', () => {
    const { workbench, asked } = trial();
    title(workbench, 'one');
    expect(asked.map(({ scenario }) => scenario.title)).toEqual(['New scenario', 'one']);
    expect(workbench.evaluationState.value.kind).toBe('computing');
  });

  it('drops the late answer to an old question', async () => {
    const { workbench, asked, rest } = trial();
    title(workbench, 'one');
    const newest = empty();
    asked[1].resolve(newest);
    await rest();
    asked[0].resolve(empty());
    await rest();
    expect(workbench.evaluation.value).toBe(newest);
  });

  it('shows an answer that lags behind, as not the last word', async () => {
    const { workbench, asked, rest } = trial();
    title(workbench, 'one');
    const first = empty();
    asked[0].resolve(first);
    await rest();
    expect(workbench.evaluation.value).toBe(first);
    expect(workbench.evaluationState.value.kind).toBe('computing');
  });

  it('drops the answer to a question about another file', async () => {
    const { workbench, asked, rest } = trial();
    workbench.load({ ticket: null, displayName: 'b', scenario: { ...newScenario(), title: 'loaded' } });
    asked[0].resolve(empty());
    await rest();
    expect(workbench.evaluation.value).toBeNull();
  });

  it('keeps the last answer and says so when a calculation fails', async () => {
    const { workbench, asked, rest } = trial();
    const first = empty();
    asked[0].resolve(first);
    await rest();
    title(workbench, 'one');
    asked[1].reject(new Error('It broke off.'));
    await rest();
    expect(workbench.evaluation.value).toBe(first);
    expect(workbench.evaluationState.value).toEqual({
      kind: 'failed',
      message: 'It broke off. Your entries are kept.',
    });
  });
});

describe('unsaved work', () => {
  it('is told apart by position: undoing back to the saved state clears it', () => {
    const { workbench } = trial();
    title(workbench, 'one');
    expect(workbench.unsaved.value).toBe(true);
    workbench.undo();
    expect(workbench.unsaved.value).toBe(false);
    workbench.redo();
    workbench.markSaved({ ticket: null, displayName: 'a' }, workbench.scenario.value);
    expect(workbench.unsaved.value).toBe(false);
    workbench.undo();
    expect(workbench.unsaved.value).toBe(true);
  });

  it('remains when the user typed on while the file was written', () => {
    const { workbench } = trial();
    title(workbench, 'one');
    const written = workbench.scenario.value;
    title(workbench, 'two');
    workbench.markSaved({ ticket: null, displayName: 'a' }, written);
    expect(workbench.unsaved.value).toBe(true);
  });

  it('starts afresh with a loaded file, which undo does not leave', () => {
    const { workbench } = trial();
    title(workbench, 'one');
    workbench.load({ ticket: null, displayName: 'b', scenario: { ...newScenario(), title: 'loaded' } });
    workbench.undo();
    expect(workbench.scenario.value.title).toBe('loaded');
    expect(workbench.unsaved.value).toBe(false);
  });
});

describe('candidates', () => {
  it('a duplicate stands behind its base, is selected, and has a name and id of its own', () => {
    const { workbench } = trial();
    const [base] = workbench.scenario.value.formulations;
    workbench.duplicateFormulation(base.id);
    const [, copy] = workbench.scenario.value.formulations;
    expect(copy).toMatchObject({ copiedFrom: base.id, medium: base.medium });
    expect(copy.id).not.toBe(base.id);
    expect(copy.name).not.toBe(base.name);
    expect(workbench.selected.value).toBe(copy);
  });

  it('removing a base frees its copies, and the last candidate stays', () => {
    const { workbench } = trial();
    const [base] = workbench.scenario.value.formulations;
    workbench.duplicateFormulation(base.id);
    workbench.removeFormulation(base.id);
    const [left, ...others] = workbench.scenario.value.formulations;
    expect(others).toEqual([]);
    expect(left.copiedFrom).toBeNull();
    workbench.removeFormulation(left.id);
    expect(workbench.scenario.value.formulations).toHaveLength(1);
  });

  it('moves up and down, and not beyond the ends', () => {
    const { workbench } = trial();
    workbench.addFormulation();
    const [first, second] = workbench.scenario.value.formulations;
    workbench.moveFormulation(second.id, -1);
    expect(workbench.scenario.value.formulations).toEqual([second, first]);
    workbench.moveFormulation(second.id, -1);
    expect(workbench.scenario.value.formulations).toEqual([second, first]);
  });

  it('undoing an addition leaves something selected', () => {
    const { workbench } = trial();
    workbench.addFormulation();
    workbench.undo();
    expect(workbench.selected.value).toBe(workbench.scenario.value.formulations[0]);
  });
});
