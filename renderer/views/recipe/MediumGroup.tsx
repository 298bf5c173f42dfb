import { materials } from '../../../core/materials/catalogue';
import { MAX_COMPONENTS } from '../../../core/scenario/parse';
import type { MediumComponent, MediumRecipe } from '../../../core/scenario/scenario';
import { Picker, type PickerOption } from '../../controls/Picker';
import { QuantityField } from '../../controls/QuantityField';
import { useSettings } from '../../controls/settingsContext';
import { shortNumber } from '../../format/numbers';
import { useRecipe } from './recipe';

const liquids: readonly PickerOption[] = materials
  .filter(({ kind }) => kind === 'solvent' || kind === 'polymer')
  .map(({ id, name, kind }) => ({ id, name, hint: kind === 'polymer' ? 'binder' : 'liquid' }));

function Component({ component, index, last }: { component: MediumComponent; index: number; last: boolean }) {
  const recipe = useRecipe();
  const path = `/medium/components/${index}`;
  const change = (label: string, at: string, changed: Partial<MediumComponent>) =>
    recipe.change(label, at, (now) => ({
      ...now,
      medium: {
        ...now.medium,
        components: now.medium.components.map((one, position) => (position === index ? { ...one, ...changed } : one)),
      },
    }));
  const remove = () =>
    recipe.change('Remove liquid', path, (now) => ({
      ...now,
      medium: { ...now.medium, components: now.medium.components.filter((_, position) => position !== index) },
    }));
  return (
    <div class="row">
      <Picker
        label={`Liquid ${index + 1}`}
        hiddenLabel
        options={liquids}
        value={component.material}
        was={recipe.wasAt(`${path}/material`)}
        onPick={(material) => change('Change liquid', `${path}/material`, { material })}
      />
      <QuantityField
        label="Parts by volume"
        kind="volumeParts"
        value={component.volumeParts}
        was={recipe.wasAt(`${path}/volumeParts`)}
        problem={recipe.problemAt(path)}
        onCommit={(volumeParts) => {
          if (volumeParts !== null) change('Change parts', `${path}/volumeParts`, { volumeParts });
        }}
      />
      {!last && (
        <button type="button" class="quiet" aria-label={`Remove liquid ${index + 1}`} onClick={remove}>
          ×
        </button>
      )}
    </div>
  );
}

type Measured = 'measuredRelativePermittivity' | 'measuredViscosity_mPa_s' | 'measuredDensity_kg_m3';

/** The liquid the particles are in: its components, its temperature, and what was measured of it. */
export function MediumGroup() {
  const recipe = useRecipe();
  const decimalSign = useSettings().decimalSign.value;
  const { medium, temperature_degC } = recipe.formulation;
  const state = recipe.outcome?.kind === 'evaluated' ? recipe.outcome.result.medium : null;
  const computed = (value: number | null): string => (value === null ? '' : `≈ ${shortNumber(value, decimalSign)}`);
  const measured = (key: Measured) => ({
    value: medium[key],
    optional: true,
    was: recipe.wasAt(`/medium/${key}`),
    problem: recipe.problemAt(`/medium/${key}`),
    onCommit: (value: number | null) =>
      recipe.change('Change measured value', `/medium/${key}`, (now) => ({
        ...now,
        medium: { ...now.medium, [key]: value } satisfies MediumRecipe,
      })),
  });
  return (
    <>
      {medium.components.map((component, index) => (
        // Components have no identity of their own but their place.
        <Component key={`${index}`} component={component} index={index} last={medium.components.length === 1} />
      ))}
      {medium.components.length < MAX_COMPONENTS && (
        <button
          type="button"
          class="quiet add"
          onClick={() =>
            recipe.change('Add liquid', '/medium/components', (now) => ({
              ...now,
              medium: {
                ...now.medium,
                components: [...now.medium.components, { material: 'propylene-glycol', volumeParts: 10 }],
              },
            }))
          }
        >
          Add liquid
        </button>
      )}
      <QuantityField
        label="Temperature"
        kind="temperature_degC"
        value={temperature_degC}
        was={recipe.wasAt('/temperature_degC')}
        slider={{ min: 0, max: 80, decimals: 0 }}
        onCommit={(value) => {
          if (value !== null)
            recipe.change('Change temperature', '/temperature_degC', (now) => ({ ...now, temperature_degC: value }));
        }}
      />
      <QuantityField
        label="Viscosity at rest, if measured"
        kind="viscosity_mPa_s"
        placeholder={computed(state === null ? null : 1000 * state.viscosity_Pa_s)}
        {...measured('measuredViscosity_mPa_s')}
      />
      <QuantityField
        label="Permittivity, if measured"
        kind="relativePermittivity"
        placeholder={computed(state?.relativePermittivity ?? null)}
        {...measured('measuredRelativePermittivity')}
      />
      <QuantityField
        label="Density, if measured"
        kind="mediumDensity_kg_m3"
        placeholder={computed(state?.density_kg_m3 ?? null)}
        {...measured('measuredDensity_kg_m3')}
      />
    </>
  );
}
