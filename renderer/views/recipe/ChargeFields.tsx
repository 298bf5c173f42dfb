import type { ParticleState } from '../../../core/evaluation';
import { mV_from_V } from '../../../core/quantities/convert';
import type { ParticleCharge } from '../../../core/scenario/scenario';
import { QuantityField } from '../../controls/QuantityField';
import { useSettings } from '../../controls/settingsContext';
import { withUnit } from '../../format/numbers';
import { useRecipe } from './recipe';

interface ChargeFieldsProps {
  readonly charge: ParticleCharge;
  readonly index: number;
  readonly state: ParticleState | undefined;
}

const labels = {
  zeta_mV: 'Zeta potential',
  zetaUncertainty_mV: 'Zeta known to ±',
  slipPlane_nm: 'Slip plane at',
} as const satisfies Readonly<Record<keyof ParticleCharge, string>>;

const sliders = {
  zeta_mV: { min: -100, max: 100, decimals: 0 },
  zetaUncertainty_mV: undefined,
  slipPlane_nm: undefined,
} as const;

const keys = ['zeta_mV', 'zetaUncertainty_mV', 'slipPlane_nm'] as const;

export function ChargeFields({ charge, index, state }: ChargeFieldsProps) {
  const recipe = useRecipe();
  const decimalSign = useSettings().decimalSign.value;
  const path = `/particles/${index}/charge`;
  const problem = recipe.problemAt(path);
  return (
    <div class="nested">
      {problem !== null && <p class="field-error">{problem}</p>}
      {keys.map((key) => (
        <QuantityField
          key={key}
          label={labels[key]}
          kind={key}
          value={charge[key]}
          was={recipe.wasAt(`${path}/${key}`)}
          {...(sliders[key] === undefined ? {} : { slider: sliders[key] })}
          onCommit={(value) => {
            if (value === null) return;
            recipe.changeParticle(`Change ${labels[key].toLowerCase()}`, index, `${path}/${key}`, (now) =>
              now.charge === null ? now : { ...now, charge: { ...now.charge, [key]: value } },
            );
          }}
        />
      ))}
      {state !== undefined && (
        <p class="hint">
          Zeta belongs to the slip plane.{' '}
          {state.surfacePotential_V === null
            ? 'No potential of the bare surface would give it at that distance.'
            : `The bare surface would have ${withUnit(mV_from_V(state.surfacePotential_V), 'mV', decimalSign)}.`}
        </p>
      )}
    </div>
  );
}
