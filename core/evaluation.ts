/**
 * What `evaluate` returns: every number the screens, the command line and reports show.
 * SI units, energies in kT at the formulation's temperature. Plain data, so that it passes between threads.
 */
import type { Problem } from './problem';
import type { DoubleLayerModel, HamakerRoute } from './scenario/scenario';
import type { Caveat } from './validity';

export interface Evaluation {
  /** In the order of the scenario's formulations. */
  readonly formulations: readonly FormulationOutcome[];
}

export type FormulationOutcome =
  | { readonly kind: 'evaluated'; readonly id: string; readonly result: FormulationEvaluation }
  | { readonly kind: 'refused'; readonly id: string; readonly name: string; readonly problems: readonly Problem[] };

export interface FormulationEvaluation {
  readonly name: string;
  readonly medium: MediumState;
  readonly particles: readonly ParticleState[];
  /** Every pair of particle kinds: 1–1, and with a second kind 1–2 and 2–2. */
  readonly pairs: readonly PairEvaluation[];
  /** Index into `pairs` of the pair that fails first; its curve and numbers stand for the formulation. */
  readonly weakestPair: number;
  readonly verdict: Verdict;
  readonly caveats: readonly Caveat[];
}

export interface MediumState {
  readonly temperature_K: number;
  readonly relativePermittivity: number;
  readonly refractiveIndex: number;
  readonly density_kg_m3: number;
  readonly viscosity_Pa_s: number;
  /** Which of the four were entered by the user rather than computed. */
  readonly measured: readonly ('relativePermittivity' | 'viscosity_Pa_s' | 'density_kg_m3')[];
  readonly ions: readonly IonState[];
  readonly ionicStrength_mol_m3: number;
  /** null when the medium holds no ions. */
  readonly debyeLength_m: number | null;
  readonly bjerrumLength_m: number;
}

export interface IonState {
  readonly name: string;
  readonly valence: number;
  readonly concentration_mol_m3: number;
}

export interface ParticleState {
  readonly name: string;
  readonly radius_m: number;
  readonly density_kg_m3: number;
  readonly volumeFraction: number;
  readonly massFraction: number;
  readonly numberDensity_per_m3: number;
  /** Radius over Debye length; null without ions. */
  readonly kappaRadius: number | null;
  readonly zeta_V: number | null;
  /** Diffuse-layer potential at the bare surface that would give this zeta at the slip plane; null when none can. */
  readonly surfacePotential_V: number | null;
  readonly layerThickness_m: number;
  /** Mean polymer volume fraction in the layer; null without a layer. */
  readonly layerVolumeFraction: number | null;
  readonly settling: SettlingState;
}

export interface SettlingState {
  /** Downward positive; negative means creaming. */
  readonly stokesVelocity_m_s: number;
  readonly hinderedVelocity_m_s: number;
  /** Time until the accepted clear layer has formed; Infinity when density is matched. */
  readonly timeToClear_s: number;
  readonly pecletNumber: number;
  readonly gravitationalLength_m: number;
  /** Yield stress of the medium that would hold a single particle up for good. */
  readonly suspendingYieldStress_Pa: number;
}

export interface PairEvaluation {
  /** Indices into `particles`. */
  readonly first: number;
  readonly second: number;
  readonly hamaker: HamakerReport;
  readonly doubleLayer: DoubleLayerReport;
  readonly curve: PairCurve;
  readonly features: CurveFeatures;
  readonly rates: PairRates;
  readonly barrierDoubt: BarrierDoubt;
  /** Polymer layer on each particle that, with no charge at all, would keep the attraction below 2 kT. */
  readonly layerNeeded_m: number;
}

/** Energies against the gap between the bare surfaces; all arrays have the same length. */
export interface PairCurve {
  readonly separation_m: Float64Array;
  readonly total_kT: Float64Array;
  readonly vanDerWaals_kT: Float64Array;
  readonly doubleLayer_kT: Float64Array;
  readonly stericLayer_kT: Float64Array;
}

export interface CurvePoint {
  readonly separation_m: number;
  readonly energy_kT: number;
}

export interface CurveFeatures {
  /** Closest approach that the curve and the rates use: bare contact, or the compressed polymer layers. */
  readonly contact_m: number;
  /** Highest point between contact and infinity, above zero; null when nothing holds the particles apart. */
  readonly barrier: CurvePoint | null;
  /** Deepest negative point on the contact side of the barrier; null when contact is not attractive. */
  readonly primaryMinimum: CurvePoint | null;
  /** Deepest negative point outside the barrier; null when there is none. */
  readonly outerMinimum: CurvePoint | null;
}

export interface HamakerReport {
  readonly route: HamakerRoute;
  /** A of particle 1 across the medium against particle 2, not retarded, not screened. */
  readonly hamakerConstant_J: number;
  readonly zeroFrequency_J: number;
  readonly dispersion_J: number;
  /** About one standard deviation over the value, from the data of both materials. */
  readonly relativeUncertainty: number;
  readonly retardationWavelength_m: number;
  readonly reason: string;
  /** Every route, the chosen one included. */
  readonly routes: readonly HamakerRouteValue[];
}

export interface HamakerRouteValue {
  readonly route: HamakerRoute;
  /** null when the route cannot be used here; `note` says why. */
  readonly hamakerConstant_J: number | null;
  readonly note: string;
}

export interface DoubleLayerReport {
  /** null when no double layer acts: no charge, or no ions. */
  readonly model: DoubleLayerModel | null;
  readonly reason: string;
  /** Barrier under each model, so that the choice can be judged; empty when no double layer acts. */
  readonly alternatives: readonly {
    readonly model: DoubleLayerModel;
    readonly barrier_kT: number;
    readonly insideValidity: boolean;
    readonly note: string;
  }[];
}

export interface PairRates {
  /** Natural and decimal logarithm of the Fuchs stability ratio, against Smoluchowski's collision rate. */
  readonly lnStabilityRatio: number;
  readonly log10StabilityRatio: number;
  readonly collisionRate_m3_s: number;
  /** Time in which half the particles are lost at this loading; Infinity when it exceeds the number range. */
  readonly halfLife_s: number;
  /** Its decimal logarithm, always finite. */
  readonly log10HalfLife_s: number;
  /** What the shelf life asks for. */
  readonly requiredLog10StabilityRatio: number;
  readonly requiredBarrier_kT: number;
}

/** How sure the barrier is: each input moved by its own uncertainty, the effects added in quadrature. */
export interface BarrierDoubt {
  readonly standardUncertainty_kT: number;
  readonly standardUncertaintyLog10W: number;
  readonly low_kT: number;
  readonly high_kT: number;
  /** Largest first. */
  readonly contributions: readonly {
    readonly input: 'hamakerConstant' | 'zeta' | 'ionicStrength' | 'size' | 'layerThickness' | 'floryChi';
    readonly change: string;
    readonly effect_kT: number;
  }[];
}

export const verdictSubjects = ['coagulation', 'flocculation', 'settling'] as const;
export type VerdictSubject = (typeof verdictSubjects)[number];

/** `borderline`: the margin is smaller than its doubt. */
export type VerdictLevel = 'holds' | 'borderline' | 'fails';

export interface Verdict {
  /** The worst of the three lines. */
  readonly level: VerdictLevel;
  /** One line each for irreversible coagulation, reversible flocculation in the outer minimum, settling. */
  readonly lines: readonly VerdictLine[];
  /** What this estimate leaves out, for this formulation. */
  readonly notConsidered: readonly string[];
}

export interface VerdictLine {
  readonly subject: VerdictSubject;
  readonly level: VerdictLevel;
  /** A full sentence with the numbers that led to the level. */
  readonly statement: string;
  /** Actual value, needed value and their difference in the same unit; positive margin is good. */
  readonly margin: {
    readonly quantity: string;
    readonly unit: string;
    readonly actual: number;
    readonly needed: number;
    readonly margin: number;
  };
  /** Nearest limits found on the full model. */
  readonly limits: readonly Limit[];
}

export interface Limit {
  readonly input: LimitInput;
  /** Value at which the level turns, in the unit named; null when no value within the searched range does. */
  readonly value: number | null;
  readonly unit: string;
  /** `Holds up to a salt concentration of 35 mM (now 12 mM)`, `Needs a |ζ| of at least 38 mV (now 20 mV)`, or that none helps. */
  readonly statement: string;
}

export type LimitInput = 'salt' | 'zeta' | 'layerThickness' | 'diameter' | 'viscosity';
