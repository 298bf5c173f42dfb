import { materials } from '../../../core/materials/catalogue';
import { MAX_PARTICLE_KINDS } from '../../../core/scenario/parse';
import type { Particle } from '../../../core/scenario/scenario';
import { ChoiceField, SwitchField, TextField } from '../../controls/fields';
import { Picker, type PickerOption } from '../../controls/Picker';
import { QuantityField } from '../../controls/QuantityField';
import { useSettings } from '../../controls/settingsContext';
import { shortNumber } from '../../format/numbers';
import { newCharge, newLayer, newParticle } from '../../state/templates';
import { ChargeFields } from './ChargeFields';
import { LayerFields } from './LayerFields';
import { useRecipe } from './recipe';

const solids: readonly PickerOption[] = materials
  .filter(({ kind }) => kind !== 'solvent')
  .map(({ id, name, kind }) => ({ id, name, hint: kind }));

function Kind({ particle, index }: { particle: Particle; index: number }) {
  const recipe = useRecipe();
  const decimalSign = useSettings().decimalSign.value;
  const path = `/particles/${index}`;
  const state = recipe.outcome?.kind === 'evaluated' ? recipe.outcome.result.particles[index] : undefined;
  const set = (label: string, key: keyof Particle, changed: Partial<Particle>) =>
    recipe.changeParticle(label, index, `${path}/${key}`, (now) => ({ ...now, ...changed }));
  return (
    <fieldset class="kind">
      <legend class="visually-hidden">{particle.name}</legend>
      <TextField
        label="Particle"
        value={particle.name}
        maxLength={80}
        onCommit={(name) => set('Rename particle', 'name', { name })}
      />
      <Picker
        label="Material"
        options={solids}
        value={particle.material}
        was={recipe.wasAt(`${path}/material`)}
        onPick={(material) => set('Change material', 'material', { material })}
      />
      <QuantityField
        label="Diameter"
        kind="diameter_nm"
        value={particle.diameter_nm}
        was={recipe.wasAt(`${path}/diameter_nm`)}
        slider={{ min: 10, max: 3000, logarithmic: true, decimals: 0 }}
        onCommit={(value) => {
          if (value !== null) set('Change diameter', 'diameter_nm', { diameter_nm: value });
        }}
      />
      <QuantityField
        label="Loading"
        kind={particle.loadingBasis === 'mass' ? 'massLoading_percent' : 'volumeLoading_percent'}
        value={particle.loading_percent}
        was={recipe.wasAt(`${path}/loading_percent`)}
        problem={recipe.problemAt(`${path}/loading_percent`)}
        onCommit={(value) => {
          if (value !== null) set('Change loading', 'loading_percent', { loading_percent: value });
        }}
      />
      <ChoiceField
        label="Loading is a share of the"
        value={particle.loadingBasis}
        choices={[
          ['volume', 'volume'],
          ['mass', 'mass'],
        ]}
        was={recipe.wasAt(`${path}/loadingBasis`)}
        onPick={(loadingBasis) => set('Change loading basis', 'loadingBasis', { loadingBasis })}
      />
      <QuantityField
        label="Density, if measured"
        kind="density_kg_m3"
        optional
        value={particle.density_kg_m3}
        placeholder={state === undefined ? '' : `≈ ${shortNumber(state.density_kg_m3, decimalSign, 4)}`}
        was={recipe.wasAt(`${path}/density_kg_m3`)}
        onCommit={(value) => set('Change density', 'density_kg_m3', { density_kg_m3: value })}
      />
      <SwitchField
        label="Charged"
        on={particle.charge !== null}
        was={recipe.wasAt(`${path}/charge`)}
        onTurn={(on) => set(on ? 'Count charge' : 'Leave charge out', 'charge', { charge: on ? newCharge : null })}
      />
      {particle.charge !== null && <ChargeFields charge={particle.charge} index={index} state={state} />}
      <SwitchField
        label="Polymer layer"
        on={particle.layer !== null}
        was={recipe.wasAt(`${path}/layer`)}
        onTurn={(on) =>
          set(on ? 'Add polymer layer' : 'Remove polymer layer', 'layer', { layer: on ? newLayer : null })
        }
      />
      {particle.layer !== null && <LayerFields layer={particle.layer} index={index} state={state} />}
    </fieldset>
  );
}

/** The pigment, and a second kind of particle where there is one. */
export function ParticlesGroup() {
  const recipe = useRecipe();
  const { particles } = recipe.formulation;
  return (
    <>
      {particles.map((particle, index) => (
        <Kind key={`${index}`} particle={particle} index={index} />
      ))}
      {particles.length < MAX_PARTICLE_KINDS ? (
        <button
          type="button"
          class="quiet add"
          onClick={() =>
            recipe.change('Add second particle', '/particles', (now) => ({
              ...now,
              particles: [...now.particles, { ...newParticle, name: 'Second particle', loading_percent: 5 }],
            }))
          }
        >
          Add a second kind of particle
        </button>
      ) : (
        <button
          type="button"
          class="quiet add"
          onClick={() =>
            recipe.change('Remove second particle', '/particles', (now) => ({
              ...now,
              particles: now.particles.slice(0, -1),
            }))
          }
        >
          Remove the second kind
        </button>
      )}
    </>
  );
}
