import { type ChargedSpheres, derjaguinCapacity, mustBePotentials, mustBeSpheres } from './chargedSpheres';
import { logOneMinusExp } from './logOneMinusExp';

/**
 * Double-layer energy [J] of two spheres whose charge stays as it is while they approach; ψ are their potentials far apart.
 *
 *     V = πε a₁a₂/(a₁+a₂) [ 2ψ₁ψ₂ ln((1+q)/(1−q)) − (ψ₁²+ψ₂²) ln(1−q²) ],   q = e^(−κh)
 *       = πε a₁a₂/(a₁+a₂) [ −4ψ₁ψ₂ ln(1−q) − (ψ₁−ψ₂)² ln(1−q²) ]
 *
 * It grows without bound, as ln(1/κh), towards contact: the gap must be above zero.
 *
 * Source  Wiese & Healy, Trans. Faraday Soc. 66 (1970) 490 (from memory).
 * Valid   potentials below kT/e (25 mV), κa above 10, h ≪ a. The potentials rise on approach, so that the linear theory
 *         is left when κh falls below about 1.
 * Throws  RangeError for a gap, radius, κ or permittivity that is not positive, or a non-finite potential.
 */
export function constantChargeEnergy(spheres: ChargedSpheres): number {
  const { gap_m, potential1_V, potential2_V, inverseDebyeLength_per_m } = spheres;
  mustBeSpheres('constantChargeEnergy', spheres);
  mustBePotentials('constantChargeEnergy', potential1_V, potential2_V);
  const kappaGap = inverseDebyeLength_per_m * gap_m;
  const alike = -4 * potential1_V * potential2_V * logOneMinusExp(kappaGap);
  const unlike = -((potential1_V - potential2_V) ** 2) * logOneMinusExp(2 * kappaGap);
  return derjaguinCapacity(spheres) * (alike + unlike);
}
