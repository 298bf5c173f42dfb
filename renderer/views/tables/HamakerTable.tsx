import { zJ_from_J } from '../../../core/quantities/convert';
import { CAUTION } from '../../../core/report/caution';
import { useSettings } from '../../controls/settingsContext';
import { shortNumber, withUnit } from '../../format/numbers';
import { routeWords } from '../../format/words';
import { CopyButton } from './CopyButton';
import { useSelectedResult } from './useSelectedResult';

/** Which route the Hamaker constant came by, and what the others give. */
export function HamakerTable() {
  const result = useSelectedResult();
  const decimalSign = useSettings().decimalSign.value;
  if (result === null) return <p class="hint">No result yet.</p>;
  return (
    <>
      {result.pairs.map(({ first, second, hamaker }) => {
        const value_zJ = zJ_from_J(hamaker.hamakerConstant_J);
        return (
          <div key={`${first}${second}`}>
            <p>
              <strong>
                {result.particles[first].name} – {result.particles[second].name}: {shortNumber(value_zJ, decimalSign)} ±{' '}
                {withUnit(Math.abs(value_zJ) * hamaker.relativeUncertainty, 'zJ', decimalSign, 2)}
              </strong>
              , of which {withUnit(zJ_from_J(hamaker.zeroFrequency_J), 'zJ', decimalSign, 2)} at zero frequency, which
              salt screens. {hamaker.reason} Retarded with a wavelength of{' '}
              {withUnit(hamaker.retardationWavelength_m * 1e9, 'nm', decimalSign)}.
            </p>
            <table class="numbers">
              <caption class="visually-hidden">Hamaker constant by every route</caption>
              <thead>
                <tr>
                  <th scope="col">Route</th>
                  <th scope="col">A / zJ</th>
                  <th scope="col">Note</th>
                </tr>
              </thead>
              <tbody>
                {hamaker.routes.map(({ route, hamakerConstant_J, note }) => (
                  <tr key={route} data-chosen={route === hamaker.route ? 'true' : undefined}>
                    <th scope="row">
                      {routeWords[route]}
                      {route === hamaker.route && ' (used)'}
                    </th>
                    <td>
                      {shortNumber(hamakerConstant_J === null ? null : zJ_from_J(hamakerConstant_J), decimalSign)}
                    </td>
                    <td class="words">{note}</td>
                  </tr>
                ))}
              </tbody>
            </table>
          </div>
        );
      })}
      <CopyButton
        rows={() => [
          ['pair', 'route', 'hamakerConstant_zJ', 'note'],
          ...result.pairs.flatMap(({ first, second, hamaker }) =>
            hamaker.routes.map(({ route, hamakerConstant_J, note }) => [
              `${result.particles[first].name} – ${result.particles[second].name}`,
              route,
              hamakerConstant_J === null ? null : zJ_from_J(hamakerConstant_J),
              note,
            ]),
          ),
          [CAUTION],
        ]}
      />
    </>
  );
}
