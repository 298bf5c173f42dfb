import type { LayerOverlap } from './vincent1986';

/**
 * Osmotic energy of one polymer layer squeezed by a bare surface [kT], for h < δ.
 *
 *     (2πR/v₁) φ² (½ − χ) δ² [ ln(δ/h) − 1 + h/δ ],   R = a₁a₂/(a₁+a₂)
 *
 * The layer is thinned from δ to h at constant amount, so that the mixing energy of unit area is
 * (kT/v₁)(½ − χ) φ² δ² (1/h − 1/δ); integrated after Derjaguin. Two such layers give back the compression branch of
 * Vincent et al. 1986.
 *
 * Source  own derivation by the construction of Vincent, Edwards, Emmett & Jones 1986.
 * Valid   as there; `meanRadius_m` = 2R.
 */
export function oneSidedOsmoticEnergy(
  { separation_m, meanRadius_m, thickness_m, volumeFraction }: LayerOverlap,
  floryChi: number,
  solventMolecule_m3: number,
): number {
  const x = separation_m / thickness_m;
  if (x >= 1) return 0;
  const strength = ((Math.PI * meanRadius_m) / solventMolecule_m3) * volumeFraction ** 2 * (0.5 - floryChi);
  return strength * thickness_m ** 2 * (x - 1 - Math.log(x));
}
