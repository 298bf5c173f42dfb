/** Two equal layers on spheres. For unlike spheres `meanRadius_m` is 2a₁a₂/(a₁+a₂), after Derjaguin. */
export interface LayerOverlap {
  readonly separation_m: number;
  readonly meanRadius_m: number;
  readonly thickness_m: number;
  /** Mean share of polymer in the layer by volume. */
  readonly volumeFraction: number;
}

/**
 * Osmotic (mixing) energy of two polymer layers [kT].
 *
 *     h ≥ 2δ:      0
 *     δ ≤ h < 2δ:  (4πa/v₁) φ² (½ − χ) (δ − h/2)²
 *     h < δ:       (4πa/v₁) φ² (½ − χ) δ² [ h/2δ − ¼ − ln(h/δ) ]
 *
 * Source  Vincent, Edwards, Emmett & Jones, Colloids Surf. 18 (1986) 261 (from memory; continuity checked).
 * Valid   δ ≪ a, uniform layers, firmly anchored. For χ > ½ the sign turns: attraction, and it is kept.
 */
export function osmoticEnergy(
  { separation_m, meanRadius_m, thickness_m, volumeFraction }: LayerOverlap,
  floryChi: number,
  solventMolecule_m3: number,
): number {
  const x = separation_m / thickness_m;
  if (x >= 2) return 0;
  const shape = x >= 1 ? (1 - x / 2) ** 2 : x / 2 - 0.25 - Math.log(x);
  const strength = ((4 * Math.PI * meanRadius_m) / solventMolecule_m3) * volumeFraction ** 2 * (0.5 - floryChi);
  return strength * thickness_m ** 2 * shape;
}

/**
 * Elastic energy of two compressed polymer layers [kT], for h < δ.
 *
 *     (2πa N_A φ δ² ρ/M) { x ln[x((3−x)/2)²] − 6 ln((3−x)/2) + 3(1 − x) },   x = h/δ
 *
 * The last sign is that for which energy and force vanish at h = δ; 3(1 + x), also seen in print, leaves a jump.
 * Since φ ρ N_A/M is the number of chains in unit volume of layer, φ δ ρ N_A/M is the grafting density.
 *
 * Source, Valid as {@link osmoticEnergy}.
 */
export function elasticEnergy(
  { separation_m, meanRadius_m, thickness_m }: LayerOverlap,
  chains_per_m2: number,
): number {
  const x = separation_m / thickness_m;
  if (x >= 1) return 0;
  const stretch = (3 - x) / 2;
  const shape = x * Math.log(x * stretch ** 2) - 6 * Math.log(stretch) + 3 * (1 - x);
  return 2 * Math.PI * meanRadius_m * chains_per_m2 * thickness_m * shape;
}
