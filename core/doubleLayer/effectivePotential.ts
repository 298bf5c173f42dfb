import { mustBeFinite, mustBePositive, mustNotBeNegative } from '../validity';
import { curvatureFactor } from './curvatureFactor';
import { fieldExcessOverPotential, type Ion, reducedField } from './reducedField';
import { thermalVoltage } from './thermalVoltage';

/** Charge that the rounding of the concentrations may leave, as a share of all charges. */
const NEUTRAL_WITHIN = 1e-6;

/** A mixture that is not neutral has no far field, and one without counter-ions would be summed for ever. */
function mustBeNeutral(where: string, ions: readonly Ion[]): void {
  let charge_mol_m3 = 0;
  let charges_mol_m3 = 0;
  for (const { valence, concentration_mol_m3 } of ions) {
    mustBeFinite(where, { valence });
    mustNotBeNegative(where, { concentration_mol_m3 });
    charge_mol_m3 += valence * concentration_mol_m3;
    charges_mol_m3 += Math.abs(valence) * concentration_mol_m3;
  }
  mustBePositive(where, { charges_mol_m3 });
  if (Math.abs(charge_mol_m3) > NEUTRAL_WITHIN * charges_mol_m3) {
    throw new RangeError(
      `${where}: the ions must be neutral together, got ${charge_mol_m3} of ${charges_mol_m3} mol/m³`,
    );
  }
}

interface Surface {
  /** Neutral together: they are the ions of a bulk. */
  readonly ions: readonly Ion[];
  readonly potential_V: number;
  readonly temperature_K: number;
}

/** Gauss–Legendre, 12 points on [−1, 1]: the positive half. Abramowitz & Stegun 1964, table 25.4. */
const nodes = [
  0.1252334085114689, 0.3678314989981802, 0.5873179542866175, 0.7699026741943047, 0.9041172563704749,
  0.9815606342467192,
] as const;
const weights = [
  0.2491470458134028, 0.2334925365383548, 0.2031674267230659, 0.1600783285433462, 0.1069393259953184,
  0.04717533638651183,
] as const;

function integral(of: (y: number) => number, from: number, to: number): number {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  let sum = 0;
  for (let i = 0; i < nodes.length; i++) {
    const step = half * nodes[i];
    sum += weights[i] * (of(middle - step) + of(middle + step));
  }
  return half * sum;
}

/** Below this reduced potential the integrand is written without its pole, above it the plain one is harmless. */
const POLE = 1;
/** 1/field below this adds nothing that a double can hold. */
const SPENT = 1e-17;
/** The integrand dies away as e^(−zy/2): the farther out, the coarser the panels may be. */
const GROWTH = 1.2;

/** One entry for each valence, as a surface of positive potential sees it. */
function gathered(ions: readonly Ion[], sign: number): readonly Ion[] {
  const byValence = new Map<number, number>();
  for (const { valence, concentration_mol_m3 } of ions) {
    byValence.set(sign * valence, (byValence.get(sign * valence) ?? 0) + concentration_mol_m3);
  }
  return [...byValence].map(([valence, concentration_mol_m3]) => ({ valence, concentration_mol_m3 }));
}

/** ln of the effective reduced potential: first of the surface itself, then of the highest any surface can have. */
function logFarPotentials(ions: readonly Ion[], height: number) {
  const valences = ions.map(({ valence }) => valence);
  // The nearest zeros of the field in the complex plane lie about 2π/(z₊ + z₋) off the axis.
  const panel = 2 / Math.max(1, Math.max(...valences) - Math.min(...valences));
  const smooth = (y: number): number => {
    const rate = fieldExcessOverPotential(ions, y);
    const root = Math.sqrt(1 + rate * y);
    return -rate / (root * (1 + root));
  };
  const plain = (y: number): number => 1 / reducedField(ions, y);
  const nearPole = (from: number, to: number): number => {
    let sum = 0;
    for (let low = from; low < to; low += panel) sum += integral(smooth, low, Math.min(low + panel, to));
    return sum;
  };
  const beyondPole = (from: number, to: number): number => {
    let sum = 0;
    let width = panel;
    for (let low = from; low < to && plain(low) > SPENT; low += width, width *= GROWTH) {
      sum += integral(plain, low, Math.min(low + width, to));
    }
    return sum;
  };
  if (height > POLE) {
    const own = Math.log(POLE) + nearPole(0, POLE) + beyondPole(POLE, height);
    return [own, own + beyondPole(height, Infinity)] as const;
  }
  const shared = nearPole(0, height);
  const toPole = Math.log(POLE) + nearPole(height, POLE);
  return [Math.log(height) + shared, shared + toPole + beyondPole(POLE, Infinity)] as const;
}

/**
 * Far-field potential of one flat surface in any mixture of ions [V], and its share of the highest one possible.
 *
 * Far from the surface the potential falls as ψ → Ψ e^(−κx). From the first integral of the Poisson–Boltzmann equation,
 * with y = eψ/kT and F(y) its field in units of κkT/e,
 *
 *     ln(eΨ/kT) = ln y₀ + ∫₀^{y₀} (1/F − 1/y) dy
 *
 * the pole at y = 0 taken out in closed form. For z:z this is (4kT/ze) tanh(zeψ/4kT). A surface whose counter-ions carry
 * two charges has a far smaller Ψ than its opposite in the same salt.
 *
 * Source  Gouy, J. Phys. 9 (1910) 457, and Chapman 1913 (from memory); our own quadrature, within 1e-13 of a 45-digit
 *         quadrature and of the closed form for 2:1.
 * Valid   point ions of a neutral bulk.
 * Throws  RangeError when the ions are none or not neutral, for a non-finite potential, or a temperature not above zero.
 */
export function flatEffectivePotential({ ions, potential_V, temperature_K }: Surface): {
  readonly effectivePotential_V: number;
  readonly saturation: number;
} {
  mustBeFinite('flatEffectivePotential', { potential_V });
  mustBePositive('flatEffectivePotential', { temperature_K });
  mustBeNeutral('flatEffectivePotential', ions);
  const unit_V = thermalVoltage(temperature_K);
  const height = Math.abs(potential_V) / unit_V;
  if (height === 0) return { effectivePotential_V: 0, saturation: 0 };
  const sign = Math.sign(potential_V);
  const [own, highest] = logFarPotentials(gathered(ions, sign), height);
  return {
    effectivePotential_V: sign * unit_V * Math.exp(own),
    saturation: Math.exp(own - highest),
  };
}

/**
 * Far-field potential Ψ of one sphere in any mixture of ions [V], from ψ(r) → Ψ (a/r) e^(−κ(r−a)).
 *
 * The flat surface's, times the curvature factor of the symmetric salt: see {@link curvatureFactor}.
 *
 * Source, Throws as {@link flatEffectivePotential}.
 * Valid   exact for large κa; for the deviations at small κa see {@link curvatureFactor}.
 */
export function sphereEffectivePotential({
  kappaRadius,
  ...surface
}: Surface & { readonly kappaRadius: number }): number {
  mustBePositive('sphereEffectivePotential', { kappaRadius });
  const { effectivePotential_V, saturation } = flatEffectivePotential(surface);
  return effectivePotential_V * curvatureFactor(kappaRadius, saturation);
}
