import { CONTACT_SEPARATION_m } from '../constants';
import { nm_from_m } from '../quantities/convert';
import type { DoubleLayerModel } from '../scenario/scenario';
import type { Caveat } from '../validity';
import { overlapSentence } from './doubleLayerValidity';

/**
 * What is doubtful about the double-layer energy at the place of the barrier.
 *
 * `inside-slip-planes`: the energy there is not known and was held constant. `double-layer-overlap`: κ·gap below the range
 * of the model.
 */
export function barrierCaveats(barrier: {
  readonly model: DoubleLayerModel;
  /** Between the bare surfaces. */
  readonly separation_m: number;
  readonly slipPlane1_m: number;
  readonly slipPlane2_m: number;
  readonly debyeLength_m: number;
}): readonly Caveat[] {
  const { model, separation_m, slipPlane1_m, slipPlane2_m, debyeLength_m } = barrier;
  const gap_m = separation_m - slipPlane1_m - slipPlane2_m;
  const caveats: Caveat[] = [];
  if (gap_m < CONTACT_SEPARATION_m && slipPlane1_m + slipPlane2_m > 0) {
    const nm = (length_m: number): string => nm_from_m(length_m).toFixed(2);
    caveats.push({
      code: 'inside-slip-planes',
      message: `The barrier lies at ${nm(separation_m)} nm, inside the slip planes (${nm(slipPlane1_m + slipPlane2_m)} nm together), where zeta says nothing about the repulsion. It was taken as constant there; check the slip-plane distance.`,
    });
  }
  const overlap = overlapSentence(model, Math.max(gap_m, CONTACT_SEPARATION_m) / debyeLength_m);
  if (overlap !== null) caveats.push({ code: 'double-layer-overlap', message: overlap });
  return caveats;
}
