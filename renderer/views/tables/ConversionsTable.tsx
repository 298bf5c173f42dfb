import type { FormulationEvaluation } from '../../../core/evaluation';
import { mV_from_V, nm_from_m } from '../../../core/quantities/convert';
import { useSettings } from '../../controls/settingsContext';
import { shortNumber, withUnit } from '../../format/numbers';
import { useSelectedResult } from './useSelectedResult';

type Row = readonly [string, number | null, string];

const MM_PER_DAY = 1000 * 86_400;

const mediumRows = ({ medium }: FormulationEvaluation): readonly Row[] => [
  ['Relative permittivity', medium.relativePermittivity, ''],
  ['Refractive index', medium.refractiveIndex, ''],
  ['Density', medium.density_kg_m3, 'kg/m³'],
  ['Viscosity', 1000 * medium.viscosity_Pa_s, 'mPa·s'],
  ['Ionic strength', medium.ionicStrength_mol_m3, 'mM'],
  ['Debye length', medium.debyeLength_m === null ? null : nm_from_m(medium.debyeLength_m), 'nm'],
  ['Bjerrum length', nm_from_m(medium.bjerrumLength_m), 'nm'],
  ...medium.ions.map(({ name, concentration_mol_m3 }): Row => [name, concentration_mol_m3, 'mM']),
];

const particleRows = ({ particles }: FormulationEvaluation): readonly Row[] =>
  particles.flatMap((particle): readonly Row[] => [
    [`${particle.name}: share by volume`, 100 * particle.volumeFraction, '%'],
    [`${particle.name}: share by mass`, 100 * particle.massFraction, '%'],
    [`${particle.name}: particles`, particle.numberDensity_per_m3, 'per m³'],
    [`${particle.name}: radius in Debye lengths, κa`, particle.kappaRadius, ''],
    [`${particle.name}: zeta potential`, particle.zeta_V === null ? null : mV_from_V(particle.zeta_V), 'mV'],
    [
      `${particle.name}: potential of the bare surface`,
      particle.surfacePotential_V === null ? null : mV_from_V(particle.surfacePotential_V),
      'mV',
    ],
    [`${particle.name}: settling alone`, particle.settling.stokesVelocity_m_s * MM_PER_DAY, 'mm/day'],
    [`${particle.name}: settling among others`, particle.settling.hinderedVelocity_m_s * MM_PER_DAY, 'mm/day'],
    [`${particle.name}: Péclet number of settling`, particle.settling.pecletNumber, ''],
    [`${particle.name}: yield stress that would hold it up`, 1000 * particle.settling.suspendingYieldStress_Pa, 'mPa'],
  ]);

const pairRows = ({ pairs, particles }: FormulationEvaluation): readonly Row[] =>
  pairs.map(({ first, second, layerNeeded_m }) => [
    `${particles[first].name} – ${particles[second].name}: layer on each that would hold them without charge`,
    nm_from_m(layerNeeded_m),
    'nm',
  ]);

/** The recipe in the terms the laws use. */
export function ConversionsTable() {
  const result = useSelectedResult();
  const decimalSign = useSettings().decimalSign.value;
  if (result === null) return <p class="hint">No result yet.</p>;
  return (
    <div class="columns">
      {[mediumRows(result), [...particleRows(result), ...pairRows(result)]].map((rows) => (
        <table class="numbers" key={rows[0][0]}>
          <caption class="visually-hidden">The recipe converted</caption>
          <tbody>
            {rows.map(([words, value, unit]) => (
              <tr key={words}>
                <th scope="row">{words}</th>
                <td>{unit === '' ? shortNumber(value, decimalSign) : withUnit(value, unit, decimalSign)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      ))}
    </div>
  );
}
