import { CONTACT_SEPARATION_m } from '../constants';
import { chooseDoubleLayerModel } from '../doubleLayer/doubleLayerChoice';
import { prepareDoubleLayer } from '../doubleLayer/doubleLayerEnergy';
import type { HamakerReport } from '../evaluation';
import type { PairForces } from '../pairEnergy/pairForces';
import { done, type Result, refused } from '../problem';
import { J_from_zJ } from '../quantities/convert';
import type { DoubleLayerModel, DoubleLayerModelChoice, Formulation } from '../scenario/scenario';
import { prepareStericLayer } from '../stericLayer/stericEnergy';
import type { Caveat } from '../validity';
import { prepareVanDerWaals } from '../vanDerWaals/vanDerWaalsEnergy';
import type { FormulationModel, ParticleModel } from './formulationModel';
import { rememberedHamakerReport } from './hamakerMemory';

/** The forces between two kinds of particle, ready to be evaluated at any gap. */
export interface PairModel {
  readonly first: ParticleModel;
  readonly second: ParticleModel;
  readonly hamaker: HamakerReport;
  /** null when no double layer acts. */
  readonly doubleLayer: { readonly model: DoubleLayerModel; readonly reason: string } | null;
  readonly forces: PairForces;
  readonly caveats: readonly Caveat[];
}

export interface PairChoices {
  readonly hamaker: Formulation['hamaker'];
  readonly doubleLayerModel: DoubleLayerModelChoice;
  /** Factor on the Hamaker constant, for asking what its doubt does; 1 otherwise. */
  readonly hamakerScale: number;
}

const none = (): number => 0;

function doubleLayerOf(model: FormulationModel, first: ParticleModel, second: ParticleModel, choices: PairChoices) {
  const { debyeLength_m, relativePermittivity, ions } = model.medium;
  if (first.charge === null || second.charge === null || debyeLength_m === null) return null;
  const chosen = chooseDoubleLayerModel({
    choice: choices.doubleLayerModel,
    potential1_V: first.charge.zeta_V,
    potential2_V: second.charge.zeta_V,
    kappaRadiusSmaller: Math.min(first.radius_m, second.radius_m) / debyeLength_m,
    temperature_K: model.temperature_K,
    ions,
  });
  const energy = prepareDoubleLayer({
    model: chosen.model,
    ions,
    relativePermittivity,
    temperature_K: model.temperature_K,
    radius1_m: first.radius_m,
    radius2_m: second.radius_m,
    zeta1_V: first.charge.zeta_V,
    zeta2_V: second.charge.zeta_V,
    slipPlane1_m: first.charge.slipPlane_m,
    slipPlane2_m: second.charge.slipPlane_m,
  });
  return { ...chosen, energy };
}

/** Builds the forces of one pair. Refused when the chosen route to the Hamaker constant cannot be taken. */
export function pairModel(
  model: FormulationModel,
  first: ParticleModel,
  second: ParticleModel,
  choices: PairChoices,
): Result<PairModel> {
  const { thermalEnergy_J, temperature_K, medium } = model;
  const answer = rememberedHamakerReport({
    first: first.material,
    second: second.material,
    medium: { components: model.components, staticPermittivity: medium.relativePermittivity },
    temperature_K,
    route: choices.hamaker.route,
    entered_J: choices.hamaker.entered_zJ === null ? null : J_from_zJ(choices.hamaker.entered_zJ),
  });
  if (!answer.ok) return refused(...answer.problems.map((problem) => ({ ...problem, at: `/hamaker${problem.at}` })));
  const { report } = answer.value;
  const inverseDebyeLength_per_m = medium.debyeLength_m === null ? 0 : 1 / medium.debyeLength_m;
  const attraction = {
    zeroFrequency_J: report.zeroFrequency_J * choices.hamakerScale,
    dispersion_J: report.dispersion_J * choices.hamakerScale,
    retardationWavelength_m: report.retardationWavelength_m,
    radius1_m: first.radius_m,
    radius2_m: second.radius_m,
    inverseDebyeLength_per_m,
  };
  const doubleLayer = doubleLayerOf(model, first, second, choices);
  const steric = prepareStericLayer({
    radius1_m: first.radius_m,
    radius2_m: second.radius_m,
    layer1: first.layer,
    layer2: second.layer,
    solventMolecule_m3: model.solventMolecule_m3,
    temperature_K,
  });
  return done({
    first,
    second,
    hamaker: report,
    doubleLayer: doubleLayer === null ? null : { model: doubleLayer.model, reason: doubleLayer.reason },
    forces: {
      thermalEnergy_J,
      contact_m: Math.max(CONTACT_SEPARATION_m, steric?.contact_m ?? 0),
      edges_m: steric?.edges_m ?? [],
      ranges_m: [
        report.retardationWavelength_m,
        ...(medium.debyeLength_m === null || doubleLayer === null ? [] : [medium.debyeLength_m]),
      ],
      vanDerWaals_J: prepareVanDerWaals(attraction),
      doubleLayer_J: doubleLayer?.energy ?? none,
      stericLayer_J: steric?.energy_J ?? none,
    },
    caveats: [...answer.value.caveats, ...(doubleLayer?.caveats ?? []), ...(steric?.caveats ?? [])],
  });
}
