/**
 * A scenario as it is saved and edited: the question, and every candidate formulation.
 * Units are the user's and stand in the key; `core/evaluate.ts` converts them once, at the door.
 * Values are immutable: an edit makes a new scenario, undo goes back to an old one.
 */
export const SCENARIO_FORMAT = 'sunder-scenario';
export const SCENARIO_SCHEMA = 1;

export interface Scenario {
  readonly format: typeof SCENARIO_FORMAT;
  readonly schema: typeof SCENARIO_SCHEMA;
  readonly title: string;
  readonly notes: string;
  readonly requirement: Requirement;
  readonly formulations: readonly Formulation[];
}

/** What every candidate has to survive. */
export interface Requirement {
  readonly shelfLife_days: number;
  /** Share of the single particles that may have aggregated by the end of the shelf life. */
  readonly acceptedLoss_percent: number;
  readonly fillHeight_mm: number;
  /** Share of the fill height that may have cleared by the end of the shelf life. */
  readonly acceptedClearLayer_percent: number;
}

export interface Formulation {
  /** Identity within the scenario; stays when the name changes. */
  readonly id: string;
  readonly name: string;
  /** `id` of the formulation this one was duplicated from: the base that its differences are shown against. */
  readonly copiedFrom: string | null;
  readonly temperature_degC: number;
  readonly medium: MediumRecipe;
  readonly salts: readonly SaltDose[];
  /** Calcium and magnesium brought by the water, German degrees of hardness. */
  readonly hardness_dH: number;
  /** null where pH has no meaning (medium without water). */
  readonly pH: number | null;
  /** One or two kinds of particle. */
  readonly particles: readonly Particle[];
  readonly hamaker: HamakerChoice;
  readonly doubleLayerModel: DoubleLayerModelChoice;
}

export interface MediumRecipe {
  readonly components: readonly MediumComponent[];
  /** Measured values win over the mixing rules; null means: compute. */
  readonly measuredRelativePermittivity: number | null;
  readonly measuredViscosity_mPa_s: number | null;
  readonly measuredDensity_kg_m3: number | null;
}

export interface MediumComponent {
  /** Key into `core/materials`. */
  readonly material: string;
  /** Parts by volume before mixing; only the ratios count. */
  readonly volumeParts: number;
}

export interface SaltDose {
  /** Key into `core/medium/salts.ts`. */
  readonly salt: string;
  readonly concentration_mM: number;
}

export interface Particle {
  readonly name: string;
  /** Key into `core/materials`. */
  readonly material: string;
  readonly diameter_nm: number;
  readonly loadingBasis: 'volume' | 'mass';
  readonly loading_percent: number;
  /** Measured density, or null for the handbook value of the material. */
  readonly density_kg_m3: number | null;
  /** null: no charge is counted on this particle. */
  readonly charge: ParticleCharge | null;
  /** null: no polymer layer. */
  readonly layer: AdsorbedLayer | null;
}

export interface ParticleCharge {
  readonly zeta_mV: number;
  readonly zetaUncertainty_mV: number;
  /** Distance of the slip plane, where zeta is measured, from the bare surface. */
  readonly slipPlane_nm: number;
}

export interface AdsorbedLayer {
  readonly thickness_nm: number;
  readonly adsorbedAmount_mg_m2: number;
  /** Molar mass of one stabilising chain. */
  readonly chainMolarMass_g_mol: number;
  readonly polymerDensity_kg_m3: number;
  /** Flory–Huggins interaction parameter of chain and medium. */
  readonly floryChi: number;
}

export const hamakerRoutes = ['lifshitz', 'two-point', 'molecular', 'combining', 'entered'] as const;
export type HamakerRoute = (typeof hamakerRoutes)[number];

export interface HamakerChoice {
  readonly route: HamakerRoute;
  /** Used when the route is `entered`, kept otherwise; 1 zJ = 1e-21 J. */
  readonly entered_zJ: number | null;
}

export const doubleLayerModels = ['constant-potential', 'constant-charge', 'superposition'] as const;
export type DoubleLayerModel = (typeof doubleLayerModels)[number];
/** `by-validity`: the model whose validity range covers the case; the screen says which and why. */
export type DoubleLayerModelChoice = 'by-validity' | DoubleLayerModel;
