import { type ChargedSpheres, derjaguinCapacity, mustBePotentials, mustBeSpheres } from './chargedSpheres';
import { logOneMinusExp } from './logOneMinusExp';

/**
 * Double-layer energy [J] of two spheres whose potentials stay as they are while they approach.
 *
 *     V = πε a₁a₂/(a₁+a₂) [ 2ψ₁ψ₂ ln((1+q)/(1−q)) + (ψ₁²+ψ₂²) ln(1−q²) ],   q = e^(−κh)
 *       = πε a₁a₂/(a₁+a₂) [ 4ψ₁ψ₂ ln(1+q) + (ψ₁−ψ₂)² ln(1−q²) ]
 *
 * The second form is used: its terms do not cancel. It also shows that unlike potentials of one sign attract close in,
 * which is real only where the charge can truly flow to hold the potential.
 *
 * Source  Hogg, Healy & Fuerstenau, Trans. Faraday Soc. 62 (1966) 1638 (from memory).
 * Valid   potentials below kT/e (25 mV), κa above 10, h ≪ a.
 * Throws  RangeError for a gap, radius, κ or permittivity that is not positive, or a non-finite potential.
 */
export function constantPotentialEnergy(spheres: ChargedSpheres): number {
  const { gap_m, potential1_V, potential2_V, inverseDebyeLength_per_m } = spheres;
  mustBeSpheres('constantPotentialEnergy', spheres);
  mustBePotentials('constantPotentialEnergy', potential1_V, potential2_V);
  const kappaGap = inverseDebyeLength_per_m * gap_m;
  const alike = 4 * potential1_V * potential2_V * Math.log1p(Math.exp(-kappaGap));
  const unlike = (potential1_V - potential2_V) ** 2 * logOneMinusExp(2 * kappaGap);
  return derjaguinCapacity(spheres) * (alike + unlike);
}
