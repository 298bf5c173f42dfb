/** Loading of one kind of particle as the recipe gives it: a share of the whole formulation. */
export interface Loading {
  readonly basis: 'volume' | 'mass';
  /** Share of the whole, 0 to 1. */
  readonly fraction: number;
  readonly density_kg_m3: number;
}

export interface ParticleShares {
  readonly volumeFraction: number;
  readonly massFraction: number;
}

/**
 * Volume and mass fractions of each kind of particle in the whole formulation.
 *
 * For one cubic metre of formulation of mass M, with volume shares φ given for some kinds and mass shares w for others:
 *     M = Σ φᵢ ρᵢ + Σ wⱼ M + ρ_medium (1 − Σ φᵢ − Σ wⱼ M / ρⱼ)
 * solved for M; then φⱼ = wⱼ M / ρⱼ and wᵢ = φᵢ ρᵢ / M.
 *
 * Source  mass balance; volumes are taken to add up.
 * Returns null when the shares leave no room for the medium.
 */
export function sharesOf(loadings: readonly Loading[], mediumDensity_kg_m3: number): readonly ParticleShares[] | null {
  let givenVolume = 0;
  let givenVolumeMass_kg = 0;
  let givenMass = 0;
  let volumePerMass_m3_kg = 0;
  for (const { basis, fraction, density_kg_m3 } of loadings) {
    if (basis === 'volume') {
      givenVolume += fraction;
      givenVolumeMass_kg += fraction * density_kg_m3;
    } else {
      givenMass += fraction;
      volumePerMass_m3_kg += fraction / density_kg_m3;
    }
  }
  const mediumIfAlone_kg = mediumDensity_kg_m3 * (1 - givenVolume);
  const mass_kg = (givenVolumeMass_kg + mediumIfAlone_kg) / (1 - givenMass + mediumDensity_kg_m3 * volumePerMass_m3_kg);
  if (givenMass >= 1 || givenVolume >= 1 || !(mass_kg > 0)) return null;
  const shares = loadings.map(({ basis, fraction, density_kg_m3 }) =>
    basis === 'volume'
      ? { volumeFraction: fraction, massFraction: (fraction * density_kg_m3) / mass_kg }
      : { volumeFraction: (fraction * mass_kg) / density_kg_m3, massFraction: fraction },
  );
  const solids = shares.reduce((sum, share) => sum + share.volumeFraction, 0);
  return solids < 1 ? shares : null;
}
