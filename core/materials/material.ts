import type { Span } from '../validity';
import type { Provenance, Sourced } from './provenance';

export type MaterialKind = 'solvent' | 'pigment' | 'filler' | 'polymer';

/** A pigment, filler, polymer or liquid as published. `id` is stored in users' files: never renamed, never reused. */
export interface Material {
  readonly id: string;
  readonly name: string;
  readonly kind: MaterialKind;
  readonly cas: string | null;
  /** Free charges: reflects fully at zero frequency, `staticPermittivity` is then null. */
  readonly conductor: boolean;
  readonly staticPermittivity: StaticPermittivity | null;
  /** n_D, the sodium line. */
  readonly refractiveIndex: Sourced | null;
  /** False in or near an absorption band, where n_D says nothing about the optical limit. */
  readonly refractiveIndexIsOpticalLimit: boolean;
  readonly molarMass_kg_mol: Sourced | null;
  readonly density_kg_m3: Sourced;
  readonly viscosity_Pa_s: Sourced | null;
  /** 1 Å³ = 1e-30 m³ */
  readonly polarizabilityVolume_A3: Sourced | null;
  readonly ionizationEnergy_eV: Sourced | null;
  readonly dipoleMoment_D: Sourced | null;
  /** Rival published responses stand side by side, never averaged; the first is the recommended one. */
  readonly dielectricResponses: readonly [DielectricResponse, ...DielectricResponse[]];
  /** Relative uncertainty expected of A across vacuum and across a liquid, from this material's data. */
  readonly hamakerUncertainty: { readonly acrossVacuum: number; readonly acrossLiquid: number };
  /** For example orientation averages, surface treatment, porosity. */
  readonly note: string | null;
}

export interface StaticPermittivity extends Sourced {
  /** ε_r(T) = Σ coefficients[i] · T^i, T in K; null when only the one value is known. */
  readonly temperaturePolynomial: { readonly coefficients: readonly number[]; readonly valid_K: Span } | null;
}

/**
 * ε(iξ) = 1 + Σ strength/(1 + (ξ/ω)²) + Σ f/(ω² + g ξ + ξ²), ξ in rad/s.
 * The microwave (Debye) part lies below the first Matsubara frequency and acts only through the static permittivity.
 */
export interface DielectricResponse extends Provenance {
  readonly id: string;
  /** Two bodies and a medium are best compared on the same level of detail. */
  readonly level: 'single-uv' | 'full-spectrum';
  readonly relativeUncertainty: number;
  readonly oscillators: readonly Oscillator[];
  readonly dampedOscillators: readonly DampedOscillator[];
}

export interface Oscillator {
  readonly strength: number;
  readonly frequency_rad_s: number;
  readonly band: 'microwave' | 'infrared' | 'ultraviolet' | 'fitted';
}

export interface DampedOscillator {
  readonly strength_rad2_s2: number;
  readonly frequency_rad_s: number;
  readonly damping_rad_s: number;
}
