import type { ParticleState } from '../../../core/evaluation';
import type { QuantityKind } from '../../../core/quantities/quantityKinds';
import type { AdsorbedLayer } from '../../../core/scenario/scenario';
import { QuantityField } from '../../controls/QuantityField';
import type { SliderRange } from '../../controls/Slider';
import { useSettings } from '../../controls/settingsContext';
import { withUnit } from '../../format/numbers';
import { useRecipe } from './recipe';

interface Entry {
  readonly key: keyof AdsorbedLayer;
  readonly label: string;
  readonly kind: QuantityKind;
  readonly slider?: SliderRange;
}

const entries: readonly Entry[] = [
  { key: 'thickness_nm', label: 'Thickness', kind: 'layerThickness_nm', slider: { min: 0.5, max: 40, decimals: 1 } },
  { key: 'adsorbedAmount_mg_m2', label: 'Adsorbed amount', kind: 'adsorbedAmount_mg_m2' },
  { key: 'chainMolarMass_g_mol', label: 'Molar mass of a chain', kind: 'chainMolarMass_g_mol' },
  { key: 'polymerDensity_kg_m3', label: 'Density of the polymer', kind: 'polymerDensity_kg_m3' },
  { key: 'floryChi', label: 'Flory–Huggins χ', kind: 'floryChi', slider: { min: 0, max: 0.7, decimals: 2 } },
];

interface LayerFieldsProps {
  readonly layer: AdsorbedLayer;
  readonly index: number;
  readonly state: ParticleState | undefined;
}

export function LayerFields({ layer, index, state }: LayerFieldsProps) {
  const recipe = useRecipe();
  const decimalSign = useSettings().decimalSign.value;
  const path = `/particles/${index}/layer`;
  return (
    <div class="nested">
      {entries.map(({ key, label, kind, slider }) => (
        <QuantityField
          key={key}
          label={label}
          kind={kind}
          value={layer[key]}
          was={recipe.wasAt(`${path}/${key}`)}
          problem={recipe.problemAt(`${path}/${key}`)}
          {...(slider === undefined ? {} : { slider })}
          onCommit={(value) => {
            if (value === null) return;
            recipe.changeParticle(`Change ${label.toLowerCase()}`, index, `${path}/${key}`, (now) =>
              now.layer === null ? now : { ...now, layer: { ...now.layer, [key]: value } },
            );
          }}
        />
      ))}
      {state?.layerVolumeFraction != null && (
        <p class="hint">
          The layer is {withUnit(100 * state.layerVolumeFraction, '%', decimalSign, 2)} polymer by volume.
        </p>
      )}
    </div>
  );
}
