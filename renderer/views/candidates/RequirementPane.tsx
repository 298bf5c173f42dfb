import type { Requirement } from '../../../core/scenario/scenario';
import { QuantityField } from '../../controls/QuantityField';
import { useDeskTop } from '../deskTop';

const labels: Readonly<Record<keyof Requirement, string>> = {
  shelfLife_days: 'Shelf life',
  acceptedLoss_percent: 'Accepted loss of singles',
  fillHeight_mm: 'Fill height',
  acceptedClearLayer_percent: 'Accepted clear layer',
};

/** What every candidate must survive. */
export function RequirementPane() {
  const { workbench } = useDeskTop();
  const { requirement } = workbench.scenario.value;
  return (
    <section class="pane requirement" aria-label="Requirement">
      <h2 class="pane-title">Must survive</h2>
      {(Object.keys(labels) as (keyof Requirement)[]).map((key) => (
        <QuantityField
          key={key}
          label={labels[key]}
          kind={key}
          value={requirement[key]}
          onCommit={(value) => {
            if (value === null) return;
            workbench.edit(
              `Change ${labels[key].toLowerCase()}`,
              (now) => ({ ...now, requirement: { ...now.requirement, [key]: value } }),
              key,
            );
          }}
        />
      ))}
    </section>
  );
}
