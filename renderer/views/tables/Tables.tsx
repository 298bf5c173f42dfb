import { useId, useState } from 'preact/hooks';
import { ComparisonTable } from './ComparisonTable';
import { ConversionsTable } from './ConversionsTable';
import { DoubleLayerTable } from './DoubleLayerTable';
import { HamakerTable } from './HamakerTable';
import { KeyPointsTable } from './KeyPointsTable';

const tabs = [
  ['Comparison', ComparisonTable],
  ['Key points', KeyPointsTable],
  ['Hamaker constant', HamakerTable],
  ['Double layer', DoubleLayerTable],
  ['Recipe converted', ConversionsTable],
] as const;

/** The numbers behind the picture. Arrow keys move between the tabs. */
export function Tables() {
  const [shown, setShown] = useState(0);
  const id = useId();
  const Shown = tabs[shown][1];
  const onKey = (event: KeyboardEvent): void => {
    const step = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
    if (step === 0) return;
    const next = (shown + step + tabs.length) % tabs.length;
    setShown(next);
    document.getElementById(`${id}-${next}`)?.focus();
  };
  return (
    <section class="pane tables" aria-label="Numbers">
      <div class="tabs" role="tablist" aria-label="Numbers" onKeyDown={onKey}>
        {tabs.map(([name], index) => (
          <button
            key={name}
            id={`${id}-${index}`}
            type="button"
            role="tab"
            aria-selected={index === shown}
            aria-controls={`${id}-panel`}
            tabIndex={index === shown ? 0 : -1}
            onClick={() => setShown(index)}
          >
            {name}
          </button>
        ))}
      </div>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a panel without controls must be reachable to be scrolled by keys */}
      <div class="tab-panel" id={`${id}-panel`} role="tabpanel" aria-labelledby={`${id}-${shown}`} tabIndex={0}>
        <Shown />
      </div>
    </section>
  );
}
