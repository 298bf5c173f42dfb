import type { LimitInput } from '../evaluation';
import { withHeldCharge } from '../formulation/heldCharge';
import type { Formulation, Particle } from '../scenario/scenario';
import { number } from './words';

/** An input that can be moved to find how far it may go, in the user's unit. */
export interface LimitLever {
  readonly input: LimitInput;
  readonly name: string;
  readonly unit: string;
  readonly current: number;
  readonly from: number;
  readonly to: number;
  readonly set: (value: number) => Formulation;
  /** The value now, in words: `12 mM`, or `none`. */
  readonly now: string;
  /** What is held while this moves, where that is not everything else; said beside the limit. */
  readonly proviso: string | null;
}

const withParticle = (formulation: Formulation, index: number, change: Partial<Particle>): Formulation => ({
  ...formulation,
  particles: formulation.particles.map((particle, at) => (at === index ? { ...particle, ...change } : particle)),
});

/** All salts together: with none the search adds sodium chloride, with several it keeps their proportions. */
function saltLever(formulation: Formulation): LimitLever | null {
  const doses = formulation.salts.filter(({ concentration_mM }) => concentration_mM > 0);
  const total_mM = doses.reduce((sum, dose) => sum + dose.concentration_mM, 0);
  const name =
    doses.length === 1
      ? 'salt concentration'
      : doses.length === 0
        ? 'concentration of added sodium chloride'
        : 'concentration of all salts together';
  return {
    input: 'salt',
    name,
    unit: 'mM',
    current: total_mM,
    now: total_mM === 0 ? 'none' : `${number(total_mM)} mM`,
    from: total_mM > 0 ? total_mM / 1000 : 0,
    to: Math.max(1000, 2 * total_mM),
    set: (value_mM) =>
      withHeldCharge(formulation, {
        ...formulation,
        salts:
          total_mM > 0
            ? formulation.salts.map((dose) => ({
                ...dose,
                concentration_mM: (dose.concentration_mM / total_mM) * value_mM,
              }))
            : [...formulation.salts, { salt: 'sodium-chloride', concentration_mM: value_mM }],
      }),
    proviso: 'at the same surface charge',
  };
}

const LARGEST_ZETA_mV = 150;

/** The weaker of the two potentials decides, so that one is moved; its sign stays. */
function zetaLever(formulation: Formulation, kinds: readonly number[]): LimitLever | null {
  const charged = kinds.filter((index) => formulation.particles[index].charge !== null);
  const size = (index: number): number => Math.abs(formulation.particles[index].charge?.zeta_mV ?? 0);
  const weakest = charged.sort((a, b) => size(a) - size(b)).at(0);
  const charge = weakest === undefined ? null : formulation.particles[weakest].charge;
  if (weakest === undefined || charge === null) return null;
  return {
    input: 'zeta',
    name: '|ζ|',
    unit: 'mV',
    current: Math.abs(charge.zeta_mV),
    now: `${number(Math.abs(charge.zeta_mV))} mV`,
    from: 0,
    to: LARGEST_ZETA_mV,
    set: (value_mV) =>
      withParticle(formulation, weakest, {
        charge: { ...charge, zeta_mV: (charge.zeta_mV > 0 ? 1 : -1) * value_mV },
      }),
    proviso: null,
  };
}

/** A layer that a formulator could buy, for asking what thickness would help where there is none yet. */
const TYPICAL_LAYER = {
  thickness_nm: 0.5,
  adsorbedAmount_mg_m2: 0.11, // a fifth of the layer is polymer
  chainMolarMass_g_mol: 5000,
  polymerDensity_kg_m3: 1100,
  floryChi: 0.4,
} as const;
const THICKEST_LAYER_nm = 60;

/** Same polymer, longer chains: the share of polymer in the layer stays as it is. */
function layerLever(formulation: Formulation, kinds: readonly number[]): LimitLever {
  const layers = kinds.map((index) => formulation.particles[index].layer).filter((layer) => layer !== null);
  const thinnest = layers.sort((a, b) => a.thickness_nm - b.thickness_nm).at(0);
  const current_nm = layers.length === kinds.length ? (thinnest?.thickness_nm ?? 0) : 0;
  return {
    input: 'layerThickness',
    name: thinnest === undefined ? 'swollen polymer layer (χ 0.4)' : 'polymer layer',
    unit: 'nm',
    current: current_nm === 0 ? TYPICAL_LAYER.thickness_nm : current_nm,
    now: current_nm === 0 ? 'none' : `${number(current_nm)} nm`,
    from: Math.min(TYPICAL_LAYER.thickness_nm, current_nm || TYPICAL_LAYER.thickness_nm),
    to: Math.max(THICKEST_LAYER_nm, 2 * current_nm),
    set: (value_nm) => ({
      ...formulation,
      particles: formulation.particles.map((particle, index) => {
        if (!kinds.includes(index)) return particle;
        const layer = particle.layer ?? thinnest ?? TYPICAL_LAYER;
        return {
          ...particle,
          layer: {
            ...layer,
            thickness_nm: value_nm,
            adsorbedAmount_mg_m2: (layer.adsorbedAmount_mg_m2 / layer.thickness_nm) * value_nm,
          },
        };
      }),
    }),
    proviso: null,
  };
}

function diameterLever(formulation: Formulation, kinds: readonly number[]): LimitLever {
  const index = kinds[0];
  const { diameter_nm } = formulation.particles[index];
  return {
    input: 'diameter',
    name: 'diameter',
    unit: 'nm',
    current: diameter_nm,
    now: `${number(diameter_nm)} nm`,
    from: Math.max(2, diameter_nm / 20),
    to: diameter_nm * 20,
    set: (value_nm) => withParticle(formulation, index, { diameter_nm: value_nm }),
    proviso: null,
  };
}

function viscosityLever(formulation: Formulation, viscosity_mPa_s: number): LimitLever {
  return {
    input: 'viscosity',
    name: 'viscosity at rest',
    unit: 'mPa·s',
    current: viscosity_mPa_s,
    now: `${number(viscosity_mPa_s)} mPa·s`,
    from: viscosity_mPa_s / 10,
    to: viscosity_mPa_s * 1e6,
    set: (value_mPa_s) => ({
      ...formulation,
      medium: { ...formulation.medium, measuredViscosity_mPa_s: value_mPa_s },
    }),
    proviso: null,
  };
}

export interface LeverQuestion {
  readonly formulation: Formulation;
  /** Indices of the kinds of particle in question. */
  readonly kinds: readonly number[];
  readonly viscosity_mPa_s: number;
}

/** The levers of one verdict line that exist for this formulation. */
export function leversFor(inputs: readonly LimitInput[], question: LeverQuestion): readonly LimitLever[] {
  const { formulation, viscosity_mPa_s } = question;
  const kinds = [...new Set(question.kinds)];
  const charged = kinds.every((index) => formulation.particles[index].charge !== null);
  return inputs
    .map((input) => {
      switch (input) {
        case 'salt':
          return charged ? saltLever(formulation) : null;
        case 'zeta':
          return charged ? zetaLever(formulation, kinds) : null;
        case 'layerThickness':
          return layerLever(formulation, kinds);
        case 'diameter':
          return diameterLever(formulation, kinds);
        case 'viscosity':
          return viscosityLever(formulation, viscosity_mPa_s);
        default:
          return null;
      }
    })
    .filter((lever) => lever !== null);
}

/** `Holds up to a salt concentration of 35 mM (now 12 mM)`, `Needs a |ζ| of at least 38 mV (now 20 mV)`, or that none helps. */
export function limitSentence(
  { name, unit, now, from, to, proviso }: LimitLever,
  found: { readonly value: number; readonly holds: 'above' | 'below' } | null,
  holdsNow: boolean,
): string {
  if (found === null) return `No ${name} between ${number(from)} and ${number(to)} ${unit} makes this hold.`;
  const bound = `${number(found.value)} ${unit}`;
  const aside = proviso === null ? `(now ${now})` : `(now ${now}; ${proviso})`;
  return holdsNow
    ? `Holds ${found.holds === 'above' ? 'down' : 'up'} to a ${name} of ${bound} ${aside}.`
    : `Needs a ${name} of at ${found.holds === 'above' ? 'least' : 'most'} ${bound} ${aside}.`;
}
