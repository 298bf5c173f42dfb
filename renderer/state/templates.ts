import {
  type AdsorbedLayer,
  type Formulation,
  type Particle,
  type ParticleCharge,
  SCENARIO_FORMAT,
  SCENARIO_SCHEMA,
  type Scenario,
} from '../../core/scenario/scenario';

/** Sensible starting entries, to be replaced by the user's own: a white pigment in water. */
export const newCharge: ParticleCharge = { zeta_mV: -40, zetaUncertainty_mV: 5, slipPlane_nm: 0.3 };

export const newLayer: AdsorbedLayer = {
  thickness_nm: 8,
  adsorbedAmount_mg_m2: 2,
  chainMolarMass_g_mol: 5000,
  polymerDensity_kg_m3: 1100,
  floryChi: 0.42,
};

export const newParticle: Particle = {
  name: 'White pigment',
  material: 'tio2-rutile',
  diameter_nm: 300,
  loadingBasis: 'volume',
  loading_percent: 15,
  density_kg_m3: null,
  charge: newCharge,
  layer: null,
};

/** An identity that no formulation has yet. */
export function freeId(taken: readonly { readonly id: string }[]): string {
  let number = taken.length + 1;
  while (taken.some(({ id }) => id === `f${number}`)) number += 1;
  return `f${number}`;
}

/** A name that no formulation has yet: `Name`, `Name 2`, … */
export function freeName(wanted: string, taken: readonly { readonly name: string }[]): string {
  const stem = wanted.replace(/ \d+$/, '').slice(0, 110);
  let name = wanted.slice(0, 120);
  for (let number = 2; taken.some((one) => one.name === name); number += 1) name = `${stem} ${number}`;
  return name;
}

export const newFormulation = (taken: readonly Formulation[]): Formulation => ({
  id: freeId(taken),
  name: freeName('New candidate', taken),
  copiedFrom: null,
  temperature_degC: 25,
  medium: {
    components: [{ material: 'water', volumeParts: 100 }],
    measuredRelativePermittivity: null,
    measuredViscosity_mPa_s: null,
    measuredDensity_kg_m3: null,
  },
  salts: [{ salt: 'sodium-chloride', concentration_mM: 10 }],
  hardness_dH: 0,
  pH: 9,
  particles: [newParticle],
  hamaker: { route: 'lifshitz', entered_zJ: null },
  doubleLayerModel: 'by-validity',
});

export const newScenario = (): Scenario => ({
  format: SCENARIO_FORMAT,
  schema: SCENARIO_SCHEMA,
  title: 'New scenario',
  notes: '',
  requirement: { shelfLife_days: 365, acceptedLoss_percent: 10, fillHeight_mm: 100, acceptedClearLayer_percent: 10 },
  formulations: [newFormulation([])],
});
