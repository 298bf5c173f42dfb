import { doubleLayerModels, hamakerRoutes } from '../../../core/scenario/scenario';
import { ChoiceField } from '../../controls/fields';
import { QuantityField } from '../../controls/QuantityField';
import { doubleLayerWords, routeWords } from '../../format/words';
import { useRecipe } from './recipe';

/** Which published route is taken for attraction and repulsion. */
export function ForcesGroup() {
  const recipe = useRecipe();
  const { hamaker, doubleLayerModel } = recipe.formulation;
  return (
    <>
      <ChoiceField
        label="Hamaker constant"
        value={hamaker.route}
        choices={hamakerRoutes.map((route) => [route, routeWords[route]])}
        was={recipe.wasAt('/hamaker/route')}
        problem={recipe.problemAt('/hamaker')}
        onPick={(route) =>
          recipe.change('Change Hamaker route', '/hamaker/route', (now) => ({
            ...now,
            // An entered route needs a value to start from; a usual one for a pigment in a liquid.
            hamaker: {
              route,
              entered_zJ: route === 'entered' ? (now.hamaker.entered_zJ ?? 50) : now.hamaker.entered_zJ,
            },
          }))
        }
      />
      {hamaker.route === 'entered' && (
        <QuantityField
          label="Entered value"
          kind="entered_zJ"
          value={hamaker.entered_zJ}
          was={recipe.wasAt('/hamaker/entered_zJ')}
          onCommit={(value) => {
            if (value === null) return;
            recipe.change('Change Hamaker constant', '/hamaker/entered_zJ', (now) => ({
              ...now,
              hamaker: { ...now.hamaker, entered_zJ: value },
            }));
          }}
        />
      )}
      <ChoiceField
        label="Double layer"
        value={doubleLayerModel}
        choices={[
          ['by-validity', 'by validity'] as const,
          ...doubleLayerModels.map((model) => [model, doubleLayerWords[model]] as const),
        ]}
        was={recipe.wasAt('/doubleLayerModel')}
        onPick={(model) =>
          recipe.change('Change double-layer model', '/doubleLayerModel', (now) => ({
            ...now,
            doubleLayerModel: model,
          }))
        }
      />
    </>
  );
}
