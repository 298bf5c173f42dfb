import { salts } from '../../../core/medium/salts';
import { MAX_SALTS } from '../../../core/scenario/parse';
import type { SaltDose } from '../../../core/scenario/scenario';
import { SwitchField } from '../../controls/fields';
import { Picker, type PickerOption } from '../../controls/Picker';
import { QuantityField } from '../../controls/QuantityField';
import { useRecipe } from './recipe';

const options: readonly PickerOption[] = salts.map(({ id, name }) => ({ id, name, hint: '' }));

function Dose({ dose, index }: { dose: SaltDose; index: number }) {
  const recipe = useRecipe();
  const path = `/salts/${index}`;
  const change = (label: string, at: string, changed: Partial<SaltDose>) =>
    recipe.change(label, at, (now) => ({
      ...now,
      salts: now.salts.map((one, position) => (position === index ? { ...one, ...changed } : one)),
    }));
  return (
    <div class="row">
      <Picker
        label={`Salt ${index + 1}`}
        hiddenLabel
        options={options}
        value={dose.salt}
        was={recipe.wasAt(`${path}/salt`)}
        onPick={(salt) => change('Change salt', `${path}/salt`, { salt })}
      />
      <QuantityField
        label="Concentration"
        kind="concentration_mM"
        value={dose.concentration_mM}
        was={recipe.wasAt(`${path}/concentration_mM`)}
        slider={{ min: 0.1, max: 500, logarithmic: true, decimals: 1 }}
        onCommit={(value) => {
          if (value !== null)
            change('Change salt concentration', `${path}/concentration_mM`, { concentration_mM: value });
        }}
      />
      <button
        type="button"
        class="quiet"
        aria-label={`Remove salt ${index + 1}`}
        onClick={() =>
          recipe.change('Remove salt', path, (now) => ({
            ...now,
            salts: now.salts.filter((_, position) => position !== index),
          }))
        }
      >
        ×
      </button>
    </div>
  );
}

/** What is dissolved: salts, the hardness of the water, acid or base. */
export function SaltsGroup() {
  const recipe = useRecipe();
  const { formulation } = recipe;
  return (
    <>
      {formulation.salts.map((dose, index) => (
        <Dose key={`${index}`} dose={dose} index={index} />
      ))}
      {formulation.salts.length < MAX_SALTS && (
        <button
          type="button"
          class="quiet add"
          onClick={() =>
            recipe.change('Add salt', '/salts', (now) => ({
              ...now,
              salts: [...now.salts, { salt: 'sodium-chloride', concentration_mM: 5 }],
            }))
          }
        >
          Add salt
        </button>
      )}
      <QuantityField
        label="Water hardness"
        kind="hardness_dH"
        value={formulation.hardness_dH}
        was={recipe.wasAt('/hardness_dH')}
        slider={{ min: 0, max: 40, decimals: 1 }}
        onCommit={(value) => {
          if (value !== null)
            recipe.change('Change hardness', '/hardness_dH', (now) => ({ ...now, hardness_dH: value }));
        }}
      />
      <SwitchField
        label="The medium has a pH"
        on={formulation.pH !== null}
        was={recipe.wasAt('/pH') === 'none' ? 'none' : null}
        onTurn={(on) => recipe.change('Change pH', '/pH', (now) => ({ ...now, pH: on ? 8.5 : null }))}
      />
      {formulation.pH !== null && (
        <QuantityField
          label="pH"
          kind="pH"
          value={formulation.pH}
          was={recipe.wasAt('/pH')}
          slider={{ min: 2, max: 12, decimals: 1 }}
          onCommit={(value) => {
            if (value !== null) recipe.change('Change pH', '/pH', (now) => ({ ...now, pH: value }));
          }}
        />
      )}
    </>
  );
}
