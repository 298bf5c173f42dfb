import type { DoubleLayerModel, DoubleLayerModelChoice } from '../scenario/scenario';
import { type Caveat, isWithin, mustBeFinite, mustBePositive } from '../validity';
import {
  type DoubleLayerPlace,
  doubleLayerValidity,
  inMillivolts,
  modelNames,
  outsideParticleRange,
  overlapSentence,
} from './doubleLayerValidity';
import { flatEffectivePotential } from './effectivePotential';
import type { Ion } from './reducedField';
import { thermalVoltage } from './thermalVoltage';

export interface ChargedPair {
  readonly choice: DoubleLayerModelChoice;
  readonly potential1_V: number;
  readonly potential2_V: number;
  /** Radius of the smaller particle over the Debye length. */
  readonly kappaRadiusSmaller: number;
  readonly temperature_K: number;
  /** All ions of the medium, neutral together. */
  readonly ions: readonly Ion[];
}

export interface DoubleLayerChoice {
  readonly model: DoubleLayerModel;
  /** A sentence for the user: which model, and on what ground. */
  readonly reason: string;
  readonly caveats: readonly Caveat[];
}

/** Below this κa the flat-surface geometry of the linear models is out of the question: Bell, Levine & McCartney 1970. */
const CURVED_BELOW = 5;
/** Far-field potential and zeta may differ by this share in the linear theory; 2 % in a 1:1 salt at its upper end. */
const LINEAR_WITHIN = 0.05;

/** Multivalent ions bend the double layer at lower potentials than the limit of one-valued ones. */
function isLinear({ ions, temperature_K, potential1_V, potential2_V }: ChargedPair): boolean {
  return [potential1_V, potential2_V].every((potential_V) => {
    if (potential_V === 0) return true;
    const { effectivePotential_V } = flatEffectivePotential({ ions, potential_V, temperature_K });
    return Math.abs(effectivePotential_V / potential_V - 1) <= LINEAR_WITHIN;
  });
}

function byValidity(pair: ChargedPair) {
  const { potential1_V, potential2_V, kappaRadiusSmaller, temperature_K } = pair;
  const linear = doubleLayerValidity['constant-potential'];
  const limit_V = linear.reducedPotential.to * thermalVoltage(temperature_K);
  const highest_V = Math.max(Math.abs(potential1_V), Math.abs(potential2_V));
  const size = `the smaller particle has a radius of ${kappaRadiusSmaller.toPrecision(2)} Debye lengths`;
  if (kappaRadiusSmaller < CURVED_BELOW) {
    return {
      model: 'superposition',
      reason: `Superposition with the curvature of the particles counted, because ${size}, below ${CURVED_BELOW}.`,
    } as const;
  }
  if (highest_V > limit_V) {
    return {
      model: 'superposition',
      reason: `Superposition, because a zeta potential of ${inMillivolts(highest_V)} is above ${inMillivolts(limit_V)}, where the linear theory ends.`,
    } as const;
  }
  if (!isWithin(linear.kappaRadius, kappaRadiusSmaller)) {
    return {
      model: 'superposition',
      reason: `Superposition, because ${size}, below the ${linear.kappaRadius.from} that the linear models need.`,
    } as const;
  }
  if (!isLinear(pair)) {
    return {
      model: 'superposition',
      reason: `Superposition, because the ions of higher charge make the double layer non-linear already at ${inMillivolts(highest_V)}.`,
    } as const;
  }
  return {
    model: 'constant-potential',
    reason: `Constant potential, because both zeta potentials are within ${inMillivolts(limit_V)} and ${size}.`,
  } as const;
}

function caveatsOf(model: DoubleLayerModel, pair: ChargedPair): Caveat[] {
  const caveats: Caveat[] = outsideParticleRange(model, pair).map((message) => ({
    code: 'double-layer-model-range',
    message: `${message} It was chosen by hand and is used as asked.`,
  }));
  if (model === 'superposition' && pair.kappaRadiusSmaller < CURVED_BELOW) {
    caveats.push({
      code: 'double-layer-curvature',
      message: `The smaller particle has a radius of only ${pair.kappaRadiusSmaller.toPrecision(2)} Debye lengths. The curvature of its double layer is counted with a formula for salts like NaCl, good to a few per cent; where calcium, sulphate or other ions of several charges make up most of the salt, the repulsion may be off by up to a third.`,
    });
  }
  return caveats;
}

/**
 * Which formula for the double-layer energy covers a case.
 *
 * `by-validity`: κa below 5, superposition with curvature; both |ψ| up to kT/e (25.7 mV at 25 °C), κa of at least 10 and
 * far-field potentials within 5 % of zeta, constant potential; superposition otherwise. A model chosen by hand is obeyed, with a caveat where it is out of range.
 *
 * Source  ranges as in {@link doubleLayerValidity}; the order of preference is ours.
 * Throws  RangeError for a non-finite potential, or another input that is not positive.
 */
export function chooseDoubleLayerModel(pair: ChargedPair): DoubleLayerChoice {
  const { choice, potential1_V, potential2_V, kappaRadiusSmaller, temperature_K } = pair;
  mustBeFinite('chooseDoubleLayerModel', { potential1_V, potential2_V });
  mustBePositive('chooseDoubleLayerModel', { kappaRadiusSmaller, temperature_K });
  const { model, reason } =
    choice === 'by-validity' ? byValidity(pair) : { model: choice, reason: `${modelNames[choice]}, chosen by hand.` };
  return { model, reason, caveats: caveatsOf(model, pair) };
}

/** Is a model inside its range at the barrier? The note says why, or why not, with numbers. */
export function insideValidity(
  model: DoubleLayerModel,
  place: DoubleLayerPlace,
): { readonly inside: boolean; readonly note: string } {
  const sentences = outsideParticleRange(model, place);
  const overlap = overlapSentence(model, place.kappaGap);
  if (overlap !== null) sentences.push(overlap);
  if (sentences.length > 0) return { inside: false, note: sentences.join(' ') };
  const highest_V = Math.max(Math.abs(place.potential1_V), Math.abs(place.potential2_V));
  return {
    inside: true,
    note: `Inside its range: potentials up to ${inMillivolts(highest_V)}, radius of ${place.kappaRadiusSmaller.toPrecision(2)} Debye lengths, gap at the barrier of ${place.kappaGap.toFixed(2)} Debye lengths.`,
  };
}
