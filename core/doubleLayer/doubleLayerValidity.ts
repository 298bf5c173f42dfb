import { mV_from_V } from '../quantities/convert';
import type { DoubleLayerModel } from '../scenario/scenario';
import { isWithin, type Span } from '../validity';
import { thermalVoltage } from './thermalVoltage';

export interface ModelValidity {
  /** The higher |eψ/kT| of the two surfaces. */
  readonly reducedPotential: Span;
  /** κa of the smaller particle. */
  readonly kappaRadius: Span;
  /** κh at the place that is asked about. */
  readonly kappaGap: Span;
}

/**
 * Where each model of the double-layer energy is trusted.
 *
 * The two of constant potential and constant charge are linear in the potential: |ψ| up to kT/e, which is 25.7 mV at 25 °C
 * (Hogg, Healy & Fuerstenau 1966 give 25 mV strictly, 50 to 60 mV in practice; from memory), and flat on the scale of the
 * Debye length, κa of 10. Under constant charge the potential rises on approach and leaves the linear theory below κh of 1.
 * Superposition takes the far ends of the layers, κh above 1 (Gregory 1975, from memory), at any potential and curvature.
 *
 * What these limits are worth, against the full Poisson–Boltzmann equation of like plates in a 1:1 salt: constant potential
 * within 5 %; constant charge 31 % too high at its corner (kT/e, κh = 1), 13 % at κh = 2; superposition up to 37 % above the
 * plates of constant potential at κh = 1, and 35 % below those of constant charge; within 11 % of both at κh = 3. Ions of unlike
 * valence narrow the linear range: at 25 mV and with divalent counter-ions alone the linear energy is 1.5 times too high.
 */
export const doubleLayerValidity: Readonly<Record<DoubleLayerModel, ModelValidity>> = {
  'constant-potential': {
    reducedPotential: { from: 0, to: 1 },
    kappaRadius: { from: 10, to: Infinity },
    kappaGap: { from: 0, to: Infinity },
  },
  'constant-charge': {
    reducedPotential: { from: 0, to: 1 },
    kappaRadius: { from: 10, to: Infinity },
    kappaGap: { from: 1, to: Infinity },
  },
  superposition: {
    reducedPotential: { from: 0, to: Infinity },
    kappaRadius: { from: 0, to: Infinity },
    kappaGap: { from: 1, to: Infinity },
  },
};

export interface DoubleLayerPlace {
  readonly potential1_V: number;
  readonly potential2_V: number;
  readonly kappaRadiusSmaller: number;
  /** Gap between the slip planes at the barrier over the Debye length. */
  readonly kappaGap: number;
  readonly temperature_K: number;
}

/** Three digits: `25.7 mV`, `45 mV`. */
export const inMillivolts = (potential_V: number): string => `${Number(mV_from_V(potential_V).toPrecision(3))} mV`;

export const modelNames: Readonly<Record<DoubleLayerModel, string>> = {
  'constant-potential': 'Constant potential',
  'constant-charge': 'Constant charge',
  superposition: 'Superposition',
};

/** What about potential and size lies outside the range of a model, one sentence each; none when it fits. */
export function outsideParticleRange(model: DoubleLayerModel, place: Omit<DoubleLayerPlace, 'kappaGap'>): string[] {
  const { reducedPotential, kappaRadius } = doubleLayerValidity[model];
  const unit_V = thermalVoltage(place.temperature_K);
  const highest_V = Math.max(Math.abs(place.potential1_V), Math.abs(place.potential2_V));
  const sentences: string[] = [];
  if (!isWithin(reducedPotential, highest_V / unit_V)) {
    sentences.push(
      `${modelNames[model]} is meant for zeta potentials up to ${inMillivolts(reducedPotential.to * unit_V)}; here one reaches ${inMillivolts(highest_V)}, and it overstates the repulsion.`,
    );
  }
  if (!isWithin(kappaRadius, place.kappaRadiusSmaller)) {
    sentences.push(
      `${modelNames[model]} is meant for particles of at least ${kappaRadius.from} Debye lengths in radius; the smaller one has ${place.kappaRadiusSmaller.toPrecision(2)}.`,
    );
  }
  return sentences;
}

/** What about the gap lies outside the range of a model: one sentence, or none. */
export function overlapSentence(model: DoubleLayerModel, kappaGap: number): string | null {
  const { from } = doubleLayerValidity[model].kappaGap;
  if (kappaGap >= from) return null;
  const place = `The two layers overlap strongly at the barrier (gap of ${kappaGap.toFixed(2)} Debye lengths, below ${from})`;
  return model === 'superposition'
    ? `${place}: superposition gives a value between constant potential and constant charge, and the true one may lie anywhere between these.`
    : `${place}: the potentials rise there beyond what the constant-charge formula allows, and it overstates the repulsion.`;
}
