import { useSettings } from '../../controls/settingsContext';
import { shortNumber } from '../../format/numbers';
import { doubleLayerWords } from '../../format/words';
import { useSelectedResult } from './useSelectedResult';

/** Which double-layer model was used, why, and what the others would give. */
export function DoubleLayerTable() {
  const result = useSelectedResult();
  const decimalSign = useSettings().decimalSign.value;
  if (result === null) return <p class="hint">No result yet.</p>;
  return (
    <>
      {result.pairs.map(({ first, second, doubleLayer }) => (
        <div key={`${first}${second}`}>
          <p>
            <strong>
              {result.particles[first].name} – {result.particles[second].name}
            </strong>
            : {doubleLayer.reason}
          </p>
          {doubleLayer.alternatives.length > 0 && (
            <table class="numbers">
              <caption class="visually-hidden">Barrier under each double-layer model</caption>
              <thead>
                <tr>
                  <th scope="col">Model</th>
                  <th scope="col">Barrier / kT</th>
                  <th scope="col">Range</th>
                </tr>
              </thead>
              <tbody>
                {doubleLayer.alternatives.map(({ model, barrier_kT, insideValidity, note }) => (
                  <tr key={model} data-chosen={model === doubleLayer.model ? 'true' : undefined}>
                    <th scope="row">
                      {doubleLayerWords[model]}
                      {model === doubleLayer.model && ' (used)'}
                    </th>
                    <td>{shortNumber(barrier_kT, decimalSign)}</td>
                    <td class="words">
                      {insideValidity ? '' : 'Outside: '}
                      {note}
                    </td>
                  </tr>
                ))}
              </tbody>
            </table>
          )}
        </div>
      ))}
    </>
  );
}
