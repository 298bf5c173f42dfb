import type { SolvedFormulation } from '../../../core/formulation/solve';
import { solve } from '../../../core/formulation/solve';
import type { AdsorbedLayer, Formulation, Particle, ParticleCharge } from '../../../core/scenario/scenario';

export const charge: ParticleCharge = { zeta_mV: -40, zetaUncertainty_mV: 5, slipPlane_nm: 0 };
export const layer: AdsorbedLayer = {
  thickness_nm: 8,
  adsorbedAmount_mg_m2: 2,
  chainMolarMass_g_mol: 10_000,
  polymerDensity_kg_m3: 1100,
  floryChi: 0.4,
};
export const pigment: Particle = {
  name: 'White pigment',
  material: 'tio2-rutile',
  diameter_nm: 300,
  loadingBasis: 'volume',
  loading_percent: 20,
  density_kg_m3: 4100,
  charge,
  layer: null,
};

/** A titania dispersion in salt water whose Hamaker constant is entered, so that nothing else moves with the data. */
export const whiteBase: Formulation = {
  id: 'base',
  name: 'White base',
  copiedFrom: null,
  temperature_degC: 25,
  medium: {
    components: [{ material: 'water', volumeParts: 100 }],
    measuredRelativePermittivity: 78.3,
    measuredViscosity_mPa_s: 0.89,
    measuredDensity_kg_m3: null,
  },
  salts: [{ salt: 'sodium-chloride', concentration_mM: 5 }],
  hardness_dH: 0,
  pH: 7,
  particles: [pigment],
  hamaker: { route: 'entered', entered_zJ: 53.5 },
  doubleLayerModel: 'superposition',
};

export const withParticles = (...changes: readonly Partial<Particle>[]): Formulation => ({
  ...whiteBase,
  particles: changes.map((change) => ({ ...pigment, ...change })),
});

export function solved(formulation: Formulation, hamakerScale = 1): SolvedFormulation {
  const answer = solve(formulation, hamakerScale);
  if (!answer.ok) throw new Error(JSON.stringify(answer.problems));
  return answer.value;
}
