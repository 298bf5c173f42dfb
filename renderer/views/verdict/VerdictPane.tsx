import { useEffect, useState } from 'preact/hooks';
import type { FormulationEvaluation, VerdictLine } from '../../../core/evaluation';
import type { Problem } from '../../../core/problem';
import { useSettings } from '../../controls/settingsContext';
import { shortNumber, withUnit } from '../../format/numbers';
import { doubtWords, levelWords, subjectQuestions, subjectWords } from '../../format/words';
import { useDeskTop } from '../deskTop';
import { LevelMark } from '../LevelMark';

function Line({ line }: { readonly line: VerdictLine }) {
  const decimalSign = useSettings().decimalSign.value;
  const { margin } = line;
  const show = (value: number) => shortNumber(value, decimalSign);
  return (
    <li class="verdict-line" data-level={line.level}>
      <h3>
        {subjectWords[line.subject]} <LevelMark level={line.level} />
      </h3>
      <p class="question">{subjectQuestions[line.subject]}</p>
      <p>{line.statement}</p>
      <p class="margin">
        {margin.quantity}: {show(margin.actual)}, {line.subject === 'flocculation' ? 'at most' : 'at least'}{' '}
        {show(margin.needed)} {margin.unit} wanted
      </p>
      {line.limits.length > 0 && (
        <ul class="limits">
          {line.limits.map((limit) => (
            <li key={limit.input}>{limit.statement}</li>
          ))}
        </ul>
      )}
    </li>
  );
}

function Doubt({ result }: { readonly result: FormulationEvaluation }) {
  const decimalSign = useSettings().decimalSign.value;
  const { barrierDoubt, features } = result.pairs[result.weakestPair];
  if (features.barrier === null) return null;
  return (
    <details class="doubt">
      <summary>
        How sure: barrier {shortNumber(barrierDoubt.low_kT, decimalSign)} to{' '}
        {withUnit(barrierDoubt.high_kT, 'kT', decimalSign)}
        {barrierDoubt.contributions.length > 0 && `, mostly from ${doubtWords[barrierDoubt.contributions[0].input]}`}
      </summary>
      <table class="plain">
        <thead>
          <tr>
            <th scope="col">Moved by its doubt</th>
            <th scope="col">by</th>
            <th scope="col">moves the barrier by</th>
          </tr>
        </thead>
        <tbody>
          {barrierDoubt.contributions.map(({ input, change, effect_kT }) => (
            <tr key={input}>
              <th scope="row">{doubtWords[input]}</th>
              <td>{change}</td>
              <td>± {withUnit(effect_kT, 'kT', decimalSign, 2)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p class="hint">The uppermost is the measurement that would settle most.</p>
    </details>
  );
}

function Notes({ title, notes }: { readonly title: string; readonly notes: readonly string[] }) {
  if (notes.length === 0) return null;
  return (
    <details class="notes">
      <summary>
        {title} ({notes.length})
      </summary>
      <ul>
        {notes.map((note) => (
          <li key={note}>{note}</li>
        ))}
      </ul>
    </details>
  );
}

function Refused({ problems }: { readonly problems: readonly Problem[] }) {
  return (
    <div class="refused" role="alert">
      <h3>This candidate cannot be evaluated as it stands</h3>
      <ul>
        {problems.map(({ at, message, remedy }) => (
          <li key={`${at}${message}`}>
            {message} {remedy}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** Tells screen readers the outcome, once entries have rested for half a second. */
function Announcement({ words }: { readonly words: string }) {
  const [said, setSaid] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSaid(words), 500);
    return () => clearTimeout(timer);
  }, [words]);
  return (
    <p class="visually-hidden" role="status">
      {said}
    </p>
  );
}

/** What becomes of the selected candidate, line by line, with margins, limits and doubt. */
export function VerdictPane() {
  const { workbench } = useDeskTop();
  const formulation = workbench.selected.value;
  const outcome = workbench.outcomeOf(formulation.id);
  const state = workbench.evaluationState.value;
  const result = outcome?.kind === 'evaluated' ? outcome.result : null;
  const summary = result === null ? '' : `${formulation.name}: ${levelWords[result.verdict.level]}`;
  return (
    <section
      class="pane verdict"
      aria-label={`Verdict on ${formulation.name}`}
      aria-busy={state.kind === 'computing'}
      data-stale={state.kind === 'done' ? undefined : 'true'}
    >
      <Announcement words={summary} />
      <div class="verdict-head">
        <h2 class="pane-title">{formulation.name}</h2>
        {result !== null && <LevelMark level={result.verdict.level} />}
        <span class="busy" aria-hidden="true">
          {state.kind === 'computing' ? 'calculating…' : ''}
        </span>
      </div>
      {state.kind === 'failed' && (
        <p class="refused" role="alert">
          {state.message}
        </p>
      )}
      {outcome?.kind === 'refused' && <Refused problems={outcome.problems} />}
      {result !== null && (
        <>
          <ol class="verdict-lines">
            {result.verdict.lines.map((line) => (
              <Line key={line.subject} line={line} />
            ))}
          </ol>
          <div class="verdict-notes">
            <Doubt result={result} />
            <Notes title="Caveats" notes={result.caveats.map(({ message }) => message)} />
            <Notes title="Not considered" notes={result.verdict.notConsidered} />
          </div>
        </>
      )}
    </section>
  );
}
