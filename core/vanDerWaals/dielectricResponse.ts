import type { DielectricResponse } from '../materials/material';

/**
 * Relative permittivity at imaginary frequency ε(iξ) [dimensionless] as a function of ξ [rad/s].
 *
 *     ε(iξ) = 1 + Σ C_j / (1 + (ξ/ω_j)²) + Σ f_j / (ω_j² + g_j ξ + ξ²)
 *
 * Microwave terms are left out: they act only at ξ = 0, through the static permittivity of the body, and would
 * otherwise be counted twice.
 *
 * Source  Ninham & Parsegian, Biophys. J. 10 (1970) 646; Parsegian, Van der Waals Forces, 2006, level 2 (from memory).
 * Valid   ξ at or above the first Matsubara frequency, 2.45e14 rad/s at 25 °C.
 */
export function responseOf(response: DielectricResponse): (frequency_rad_s: number) => number {
  const oscillators = response.oscillators.filter(({ band }) => band !== 'microwave');
  const damped = response.dampedOscillators;
  // ω² and C ω² up front: the Lifshitz sum asks for thousands of values.
  const square = Float64Array.from(oscillators, ({ frequency_rad_s: omega }) => omega * omega);
  const weight = Float64Array.from(oscillators, ({ strength, frequency_rad_s: omega }) => strength * omega * omega);
  const dampedSquare = Float64Array.from(damped, ({ frequency_rad_s: omega }) => omega * omega);
  const dampedWeight = Float64Array.from(damped, ({ strength_rad2_s2 }) => strength_rad2_s2);
  const damping = Float64Array.from(damped, ({ damping_rad_s }) => damping_rad_s);

  return (frequency_rad_s) => {
    const xiSquared = frequency_rad_s * frequency_rad_s;
    let permittivity = 1;
    for (let j = 0; j < square.length; j++) permittivity += weight[j] / (square[j] + xiSquared);
    for (let j = 0; j < dampedSquare.length; j++) {
      permittivity += dampedWeight[j] / (dampedSquare[j] + damping[j] * frequency_rad_s + xiSquared);
    }
    return permittivity;
  };
}
