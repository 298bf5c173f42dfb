import { flatSurfaceCharge } from '../doubleLayer/surfaceCharge';
import { mV_from_V, V_from_mV } from '../quantities/convert';
import type { Formulation, Particle } from '../scenario/scenario';
import { type FormulationModel, formulationModel } from './formulationModel';

/** Zeta potentials beyond this are not reached in any liquid. */
const HIGHEST_V = 0.3;
const STEPS = 50; // halves 0.3 V down to the last digit of a double

function chargeAt({ medium, temperature_K }: FormulationModel, potential_V: number): number {
  const { ions, relativePermittivity } = medium;
  return flatSurfaceCharge({ ions, potential_V, relativePermittivity, temperature_K });
}

/** Potential that gives a charge in this medium; charge grows with potential, so halving finds it. */
function potentialFor(model: FormulationModel, charge_C_m2: number): number {
  const sign = Math.sign(charge_C_m2);
  let low_V = 0;
  let high_V = HIGHEST_V;
  for (let step = 0; step < STEPS; step += 1) {
    const middle_V = (low_V + high_V) / 2;
    if (Math.abs(chargeAt(model, sign * middle_V)) < Math.abs(charge_C_m2)) low_V = middle_V;
    else high_V = middle_V;
  }
  return (sign * (low_V + high_V)) / 2;
}

/**
 * A formulation whose salt was changed, with the zeta potential that the same charge at the slip plane then gives: more
 * salt lowers zeta. Where either cannot be built, zeta stays as entered.
 *
 * Source  Grahame, Chem. Rev. 41 (1947) 441, in {@link flatSurfaceCharge}.
 * Valid   indifferent ions: those that bind to the surface change its charge too.
 */
export function withHeldCharge(before: Formulation, changed: Formulation): Formulation {
  const original = formulationModel(before);
  const altered = formulationModel(changed);
  if (!original.ok || !altered.ok) return changed;
  const held = (particle: Particle): Particle => {
    if (particle.charge === null || particle.charge.zeta_mV === 0) return particle;
    const charge_C_m2 = chargeAt(original.value, V_from_mV(particle.charge.zeta_mV));
    const zeta_mV = mV_from_V(potentialFor(altered.value, charge_C_m2));
    return { ...particle, charge: { ...particle.charge, zeta_mV } };
  };
  return { ...changed, particles: changed.particles.map(held) };
}
