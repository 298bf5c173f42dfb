import { mustNotBeNegative } from '../validity';
import type { DielectricBody, OpticalLimit } from './dielectricBody';

export interface BlendPart {
  readonly body: DielectricBody;
  readonly volumeFraction: number;
}

/** Rounding left over from recipes; anything larger is a part forgotten. */
const volumeFractionSlack = 1e-6;

/**
 * A mixture of liquids as one body: relative permittivity ε(iξ) [dimensionless] for ξ > 0.
 *
 *     (ε − 1)/(ε + 2) = Σ φ_i (ε_i − 1)/(ε_i + 2)      at every imaginary frequency
 *
 * The static value is the caller's, since it holds the orientation of dipoles, which this rule does not know.
 * The optical limit of the blend is the single oscillator with the same polarizability and the same sum of oscillator
 * strengths: in terms of L = (n² − 1)/(n² + 2) an oscillator stays one, with ω_L² = ω²/(1 − L).
 *
 * Source  Lorentz–Lorenz (Clausius–Mossotti), Born & Wolf, Principles of Optics, section 2.3.3 (from memory);
 *         optical limit: our own derivation.
 * Valid   liquids that mix without much change of volume. For water with alcohols or glycols the index comes out
 *         low by up to 0.01 (from memory of handbook tables for ethanol).
 * Throws  RangeError when fractions are negative or do not add up to one.
 */
export function blendBodies(parts: readonly BlendPart[], staticPermittivity: number): DielectricBody {
  let total = 0;
  for (const { volumeFraction } of parts) {
    mustNotBeNegative('blendBodies', { volumeFraction });
    total += volumeFraction;
  }
  if (Math.abs(total - 1) > volumeFractionSlack) {
    throw new RangeError(`blendBodies: volume fractions must add up to 1, got ${total}`);
  }
  if (!(staticPermittivity >= 1)) {
    throw new RangeError(`blendBodies: staticPermittivity must be at least 1, got ${staticPermittivity}`);
  }
  const present = parts.filter(({ volumeFraction }) => volumeFraction > 0);
  if (present.length === 1) return { ...present[0].body, staticPermittivity };

  return {
    name: present.map(({ body }) => body.name).join(' + '),
    staticPermittivity,
    permittivityAt: (frequency_rad_s) => {
      let polarization = 0;
      for (const { body, volumeFraction } of present) {
        const permittivity = body.permittivityAt(frequency_rad_s);
        polarization += (volumeFraction * (permittivity - 1)) / (permittivity + 2);
      }
      return (1 + 2 * polarization) / (1 - polarization);
    },
    opticalLimit: blendOpticalLimits(present),
    relativeUncertainty: {
      acrossVacuum: mean(present, ({ body }) => body.relativeUncertainty.acrossVacuum),
      acrossLiquid: mean(present, ({ body }) => body.relativeUncertainty.acrossLiquid),
    },
  };
}

function blendOpticalLimits(parts: readonly BlendPart[]): OpticalLimit | null {
  let polarization = 0; // L of the blend
  let strengthSum = 0; // Σ φ L ω_L²
  for (const { body, volumeFraction } of parts) {
    if (body.opticalLimit === null) return null;
    const { refractiveIndex: n, frequency_rad_s: omega } = body.opticalLimit;
    const own = (n * n - 1) / (n * n + 2);
    polarization += volumeFraction * own;
    strengthSum += (volumeFraction * own * omega * omega) / (1 - own);
  }
  return {
    refractiveIndex: Math.sqrt((1 + 2 * polarization) / (1 - polarization)),
    frequency_rad_s: Math.sqrt((strengthSum / polarization) * (1 - polarization)),
  };
}

function mean(parts: readonly BlendPart[], of: (part: BlendPart) => number): number {
  return parts.reduce((sum, part) => sum + part.volumeFraction * of(part), 0);
}
