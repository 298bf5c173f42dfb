import { CONTACT_SEPARATION_m } from '../constants';
import { barrierCaveats } from '../doubleLayer/barrierCaveats';
import { insideValidity } from '../doubleLayer/doubleLayerChoice';
import type { DoubleLayerReport, PairEvaluation } from '../evaluation';
import { findFeatures } from '../pairEnergy/curveFeatures';
import { pairCurve } from '../pairEnergy/pairCurve';
import { totalEnergy } from '../pairEnergy/pairForces';
import { doubleLayerModels, type Formulation } from '../scenario/scenario';
import { layerNeeded } from '../stericLayer/layerNeeded';
import type { Caveat } from '../validity';
import type { PairDoubt } from './doubt';
import { pairModel } from './pairModel';
import { pairRates } from './pairRates';
import type { SolvedFormulation, SolvedPair } from './solve';

/** Attraction that heat shakes apart at once: the harmless depth of an outer well (common practice). */
const TOLERATED_DEPTH_kT = 2;

/** Why no double layer acts, in words; empty when one does. */
function noDoubleLayer(solved: SolvedFormulation, pair: SolvedPair): string {
  if (solved.model.medium.debyeLength_m === null) return 'The medium holds no ions, and no charge is counted.';
  const bare = [pair.model.first, pair.model.second].find(({ charge }) => charge === null);
  return `No charge is counted on ${bare?.name ?? 'one of the particles'}.`;
}

function doubleLayerReport(formulation: Formulation, solved: SolvedFormulation, pair: SolvedPair): DoubleLayerReport {
  const { first, second, doubleLayer, forces } = pair.model;
  const { debyeLength_m, temperature_K } = solved.model.medium;
  if (doubleLayer === null || debyeLength_m === null || first.charge === null || second.charge === null) {
    return { model: null, reason: noDoubleLayer(solved, pair), alternatives: [] };
  }
  const slipPlanes_m = first.charge.slipPlane_m + second.charge.slipPlane_m;
  const alternatives = doubleLayerModels.map((model) => {
    const rival = pairModel(solved.model, first, second, {
      hamaker: formulation.hamaker,
      doubleLayerModel: model,
      hamakerScale: 1,
    });
    const features = rival.ok ? findFeatures(totalEnergy(rival.value.forces), pair.separation_m) : pair.features;
    const place_m = features.barrier?.separation_m ?? forces.contact_m;
    const { inside, note } = insideValidity(model, {
      potential1_V: first.charge?.zeta_V ?? 0,
      potential2_V: second.charge?.zeta_V ?? 0,
      kappaRadiusSmaller: Math.min(first.radius_m, second.radius_m) / debyeLength_m,
      kappaGap: Math.max(0, place_m - slipPlanes_m) / debyeLength_m,
      temperature_K,
    });
    return { model, barrier_kT: features.barrier?.energy_kT ?? 0, insideValidity: inside, note };
  });
  return { model: doubleLayer.model, reason: doubleLayer.reason, alternatives };
}

function caveatsAtBarrier(report: DoubleLayerReport, solved: SolvedFormulation, pair: SolvedPair): Caveat[] {
  const { barrier } = pair.features;
  const { first, second, doubleLayer } = pair.model;
  const { debyeLength_m } = solved.model.medium;
  if (barrier === null || doubleLayer === null || debyeLength_m === null) return [];
  const rivals_kT = report.alternatives.map(({ barrier_kT }) => barrier_kT);
  const spread = `The models put the barrier between ${Math.min(...rivals_kT).toFixed(0)} and ${Math.max(...rivals_kT).toFixed(0)} kT.`;
  return barrierCaveats({
    model: doubleLayer.model,
    separation_m: barrier.separation_m,
    slipPlane1_m: first.charge?.slipPlane_m ?? 0,
    slipPlane2_m: second.charge?.slipPlane_m ?? 0,
    debyeLength_m,
  }).map((caveat) => ({ ...caveat, message: `${caveat.message} ${spread}` }));
}

/** Everything about one pair that is shown: curve, features, rates, rival models, doubt. */
export function pairEvaluation(
  formulation: Formulation,
  solved: SolvedFormulation,
  pairIndex: number,
  doubt: PairDoubt,
  requirement: { readonly shelfLife_s: number; readonly acceptedLoss: number },
): { readonly evaluation: PairEvaluation; readonly caveats: readonly Caveat[] } {
  const pair = solved.pairs[pairIndex];
  const doubleLayer = doubleLayerReport(formulation, solved, pair);
  return {
    evaluation: {
      first: pair.first,
      second: pair.second,
      hamaker: pair.model.hamaker,
      doubleLayer,
      curve: pairCurve(pair.model.forces, pair.separation_m),
      features: pair.features,
      rates: pairRates({ solved, pair, requirement }),
      barrierDoubt: doubt.barrier,
      layerNeeded_m: layerNeeded({
        attraction_J: pair.model.forces.vanDerWaals_J,
        thermalEnergy_J: solved.model.thermalEnergy_J,
        toleratedDepth_kT: TOLERATED_DEPTH_kT,
        contact_m: CONTACT_SEPARATION_m,
      }),
    },
    caveats: [...pair.model.caveats, ...caveatsAtBarrier(doubleLayer, solved, pair)],
  };
}
