import type { FormulationOutcome, VerdictLine } from '../../../core/evaluation';
import { findMaterial } from '../../../core/materials/catalogue';
import type { Formulation } from '../../../core/scenario/scenario';
import { subjectWords } from '../../format/words';
import { differencesFromBase } from '../../state/differences';
import { useDeskTop } from '../deskTop';
import { LevelMark } from '../LevelMark';

const gistOf = ({ medium, salts, temperature_degC }: Formulation): string => {
  const liquids = medium.components.map(({ material }) => findMaterial(material)?.name ?? material).join(' + ');
  const total_mM = salts.reduce((sum, { concentration_mM }) => sum + concentration_mM, 0);
  return `${liquids}, ${temperature_degC} °C${total_mM > 0 ? `, ${Number(total_mM.toPrecision(3))} mM` : ''}`;
};

/** The lines that decide: all that are as bad as the verdict itself. */
const decidingWords = (lines: readonly VerdictLine[], level: string): string =>
  level === 'holds'
    ? ''
    : lines
        .filter((line) => line.level === level)
        .map(({ subject }) => subjectWords[subject].toLowerCase())
        .join(', ');

function Outcome({ outcome }: { readonly outcome: FormulationOutcome | undefined }) {
  if (outcome === undefined) return <span class="hint">Calculating…</span>;
  if (outcome.kind === 'refused')
    return (
      <span class="level" data-level="refused">
        ✕ Needs mending
      </span>
    );
  const { level, lines } = outcome.result.verdict;
  return (
    <>
      <LevelMark level={level} /> <span class="hint">{decidingWords(lines, level)}</span>
    </>
  );
}

function Candidate({ formulation, index, count }: { formulation: Formulation; index: number; count: number }) {
  const { workbench } = useDeskTop();
  const { id, name, copiedFrom } = formulation;
  const base = workbench.scenario.value.formulations.find((one) => one.id === copiedFrom);
  const differences = base === undefined ? 0 : differencesFromBase(formulation, base).length;
  const chosen = workbench.selected.value.id === id;
  return (
    <li class="candidate" data-chosen={chosen ? 'true' : undefined}>
      <button type="button" class="candidate-pick" aria-pressed={chosen} onClick={() => workbench.select(id)}>
        <span class="candidate-name">{name}</span>
        <span class="candidate-gist">{gistOf(formulation)}</span>
        <span class="candidate-outcome">
          <Outcome outcome={workbench.outcomeOf(id)} />
        </span>
        {base !== undefined && (
          <span class="candidate-base">
            from “{base.name}”, {differences === 1 ? '1 difference' : `${differences} differences`}
          </span>
        )}
      </button>
      {chosen && (
        <span class="candidate-actions">
          <button type="button" class="quiet" onClick={() => workbench.duplicateFormulation(id)}>
            Duplicate
          </button>
          <button type="button" class="quiet" disabled={index === 0} onClick={() => workbench.moveFormulation(id, -1)}>
            Up
          </button>
          <button
            type="button"
            class="quiet"
            disabled={index === count - 1}
            onClick={() => workbench.moveFormulation(id, 1)}
          >
            Down
          </button>
          <button type="button" class="quiet" disabled={count === 1} onClick={() => workbench.removeFormulation(id)}>
            Remove
          </button>
        </span>
      )}
    </li>
  );
}

/** Which candidates there are, and which of them hold. */
export function CandidateList() {
  const { workbench } = useDeskTop();
  const { formulations } = workbench.scenario.value;
  return (
    <section class="pane candidates" aria-label="Candidates">
      <h2 class="pane-title">Candidates</h2>
      <ul>
        {formulations.map((formulation, index) => (
          <Candidate key={formulation.id} formulation={formulation} index={index} count={formulations.length} />
        ))}
      </ul>
      <button type="button" class="quiet add" onClick={workbench.addFormulation}>
        Add candidate
      </button>
    </section>
  );
}
