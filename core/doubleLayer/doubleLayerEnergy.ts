import { CONTACT_SEPARATION_m } from '../constants';
import type { DoubleLayerModel } from '../scenario/scenario';
import { mustBeFinite, mustBePositive, mustNotBeNegative } from '../validity';
import { constantChargeEnergy } from './constantCharge';
import { constantPotentialEnergy } from './constantPotential';
import { debyeLength } from './debyeLength';
import { sphereEffectivePotential } from './effectivePotential';
import { type Ion, screeningSum } from './reducedField';
import { prepareSuperposition } from './superposition';

export interface DoubleLayerInput {
  readonly model: DoubleLayerModel;
  /** All ions of the medium, neutral together. */
  readonly ions: readonly Ion[];
  readonly relativePermittivity: number;
  readonly temperature_K: number;
  /** Of the bare particles. */
  readonly radius1_m: number;
  readonly radius2_m: number;
  readonly zeta1_V: number;
  readonly zeta2_V: number;
  readonly slipPlane1_m: number;
  readonly slipPlane2_m: number;
}

/**
 * Double-layer energy [J] of two particles against the gap between their bare surfaces.
 *
 * Zeta belongs to the slip plane, so that is where the double layer is taken to start: radii a + Δ, gap s − Δ₁ − Δ₂.
 * Inside the slip planes the energy is not known. It is held there at its value for a gap of `CONTACT_SEPARATION_m`, the
 * closest approach of bare surfaces: the force of the double layer is zero inside, and constant charge stays finite.
 * A barrier that lies inside gets the caveat of `barrierCaveats`.
 *
 * Whatever does not depend on the gap is worked out once.
 *
 * Source  the laws named in the imports; the slip plane as the electrostatic plane is our convention.
 * Throws  RangeError for ions that are none or not neutral, a negative slip-plane distance, a non-finite potential, or
 *         another input that is not positive; the function returned, for a separation that is not finite.
 */
export function prepareDoubleLayer(input: DoubleLayerInput): (separation_m: number) => number {
  const { model, ions, relativePermittivity, temperature_K, zeta1_V, zeta2_V, slipPlane1_m, slipPlane2_m } = input;
  mustBeFinite('prepareDoubleLayer', { zeta1_V, zeta2_V });
  mustNotBeNegative('prepareDoubleLayer', { slipPlane1_m, slipPlane2_m });
  mustBePositive('prepareDoubleLayer', { radius1_m: input.radius1_m, radius2_m: input.radius2_m });
  const ionicStrength_mol_m3 = screeningSum(ions) / 2;
  const kappa = 1 / debyeLength({ ionicStrength_mol_m3, relativePermittivity, temperature_K }); // 1/m
  const spheres = {
    radius1_m: input.radius1_m + slipPlane1_m,
    radius2_m: input.radius2_m + slipPlane2_m,
    potential1_V: zeta1_V,
    potential2_V: zeta2_V,
    inverseDebyeLength_per_m: kappa,
    relativePermittivity,
  };
  const slipPlanes_m = slipPlane1_m + slipPlane2_m;
  const gapAt = (separation_m: number): number => {
    if (!Number.isFinite(separation_m))
      throw new RangeError(`doubleLayer: separation_m must be finite, got ${separation_m}`);
    return Math.max(separation_m - slipPlanes_m, CONTACT_SEPARATION_m);
  };
  // The gap stands first: V8 copies a spread that ends a literal about ten times faster than one that begins it.
  switch (model) {
    case 'constant-potential':
      return (separation_m) => constantPotentialEnergy({ gap_m: gapAt(separation_m), ...spheres });
    case 'constant-charge':
      return (separation_m) => constantChargeEnergy({ gap_m: gapAt(separation_m), ...spheres });
    case 'superposition': {
      const effective = (potential_V: number, radius_m: number): number =>
        sphereEffectivePotential({ ions, potential_V, temperature_K, kappaRadius: kappa * radius_m });
      const effectivePotential1_V = effective(zeta1_V, spheres.radius1_m);
      const alike = zeta1_V === zeta2_V && spheres.radius1_m === spheres.radius2_m;
      const effectivePotential2_V = alike ? effectivePotential1_V : effective(zeta2_V, spheres.radius2_m);
      const energy = prepareSuperposition({ ...spheres, effectivePotential1_V, effectivePotential2_V });
      return (separation_m) => energy(gapAt(separation_m));
    }
  }
}
