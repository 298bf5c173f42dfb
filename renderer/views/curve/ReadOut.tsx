import { useSettings } from '../../controls/settingsContext';
import { withUnit } from '../../format/numbers';
import { energyAt, type ShownCurve } from './curvePicture';

interface ReadOutProps {
  readonly curves: readonly ShownCurve[];
  readonly gap_nm: number | null;
}

/** Every visible curve at the cursor, in kT and joule. */
export function ReadOut({ curves, gap_nm }: ReadOutProps) {
  const decimalSign = useSettings().decimalSign.value;
  if (gap_nm === null)
    return <p class="hint read-out">Point at the chart, or move the slider, to read the curves off.</p>;
  return (
    <dl class="read-out">
      <div class="read-out-gap">
        <dt>Gap</dt>
        <dd>{withUnit(gap_nm, 'nm', decimalSign)}</dd>
      </div>
      {curves.map((curve) => {
        const energy_kT = energyAt(curve, gap_nm);
        return (
          <div key={curve.key}>
            <dt>{curve.label}</dt>
            <dd>
              {energy_kT === null
                ? 'out of reach'
                : `${withUnit(energy_kT, 'kT', decimalSign)} (${withUnit(energy_kT * curve.thermalEnergy_J, 'J', decimalSign)})`}
            </dd>
          </div>
        );
      })}
    </dl>
  );
}
