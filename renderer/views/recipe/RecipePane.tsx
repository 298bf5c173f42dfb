import { Group, TextField } from '../../controls/fields';
import { useSettings } from '../../controls/settingsContext';
import { useDeskTop } from '../deskTop';
import { ForcesGroup } from './ForcesGroup';
import { MediumGroup } from './MediumGroup';
import { ParticlesGroup } from './ParticlesGroup';
import { RecipeProvider, recipeOf } from './recipe';
import { SaltsGroup } from './SaltsGroup';

/** What is in the selected candidate; every entry that differs from its base says what it was. */
export function RecipePane() {
  const { workbench } = useDeskTop();
  const recipe = recipeOf(workbench, useSettings().decimalSign.value);
  const { formulation } = recipe;
  return (
    <section class="pane recipe" aria-label={`Recipe of ${formulation.name}`} key={formulation.id}>
      <h2 class="pane-title">Recipe</h2>
      <RecipeProvider value={recipe}>
        <TextField
          label="Name"
          value={formulation.name}
          maxLength={120}
          onCommit={(name) => recipe.change('Rename candidate', '/name', (now) => ({ ...now, name }))}
        />
        <Group title="Particles">
          <ParticlesGroup />
        </Group>
        <Group title="Medium">
          <MediumGroup />
        </Group>
        <Group title="Salts and pH">
          <SaltsGroup />
        </Group>
        <Group title="Forces">
          <ForcesGroup />
        </Group>
      </RecipeProvider>
    </section>
  );
}
