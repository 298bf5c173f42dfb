import type { Material } from '../materials/material';
import type { HamakerRoute } from '../scenario/scenario';
import { combiningRule } from './combiningRule';
import { type DielectricBody, vacuum } from './dielectricBody';
import { isBeyondTwoPoint, isNearIndexMatch } from './indexContrast';
import { type HamakerParts, lifshitzNonRetarded, type ThreeBodies } from './lifshitzNonRetarded';
import { molecularHamaker } from './molecularHamaker';
import { type MolecularMatter, molecularMatter } from './molecularMatter';
import { type TwoPointBody, twoPoint } from './twoPoint';

/** One route's answer; `parts` is null when the route cannot be used, and the note says why. */
export interface RouteAnswer {
  readonly route: HamakerRoute;
  readonly parts: HamakerParts | null;
  readonly note: string;
}

export interface RouteInput {
  readonly bodies: ThreeBodies;
  readonly first: Material;
  readonly second: Material;
  readonly components: readonly { readonly material: Material; readonly volumeFraction: number }[];
  readonly entered_J: number | null;
}

/** A value that cannot be split is treated as dispersion: salt does not screen it, distance retards all of it. */
const allDispersion = (hamakerConstant_J: number): HamakerParts => ({
  hamakerConstant_J,
  zeroFrequency_J: 0,
  dispersion_J: hamakerConstant_J,
});
const asDispersion = 'Taken wholly as dispersion: not screened by salt.';

export function hamakerRouteValues(input: RouteInput): readonly RouteAnswer[] {
  return [
    lifshitzRoute(input),
    twoPointRoute(input),
    molecularRoute(input),
    combiningRoute(input),
    enteredRoute(input),
  ];
}

function lifshitzRoute({ bodies }: RouteInput): RouteAnswer {
  return {
    route: 'lifshitz',
    parts: lifshitzNonRetarded(bodies),
    note: 'Sum over all frequencies of the dielectric responses of particles and medium.',
  };
}

function twoPointRoute({ bodies }: RouteInput): RouteAnswer {
  const { first, second, medium, temperature_K } = bodies;
  const without = [first, second, medium].find(({ opticalLimit }) => opticalLimit === null);
  const [one, two, three] = [first, second, medium].map(twoPointBody);
  if (without !== undefined || one === null || two === null || three === null) {
    return {
      route: 'two-point',
      parts: null,
      note: `Needs one ultraviolet band for each substance; ${without?.name ?? 'one of them'} has no single one.`,
    };
  }
  const doubts: string[] = [];
  if (isBeyondTwoPoint(first, second)) {
    doubts.push('an index above 1.9 is outside its range, and the result may be two to four times too high');
  }
  if (isNearIndexMatch(first, second, medium)) {
    doubts.push('the indices nearly match, so the result is a small difference');
  }
  const note = 'From the static permittivities and one ultraviolet band each.';
  return {
    route: 'two-point',
    parts: twoPoint({ first: one, second: two, medium: three, temperature_K }),
    note: doubts.length === 0 ? note : `${note} Doubtful here: ${doubts.join('; ')}.`,
  };
}

const twoPointBody = ({ opticalLimit, staticPermittivity }: DielectricBody): TwoPointBody | null =>
  opticalLimit === null ? null : { ...opticalLimit, staticPermittivity };

function molecularRoute({ first, second, components }: RouteInput): RouteAnswer {
  const replaced = new Set<string>();
  const missing = new Set<string>();
  const matterOf = (material: Material): MolecularMatter | null => {
    const matter = molecularMatter(material);
    if (typeof matter === 'string') {
      missing.add(matter);
      return null;
    }
    for (const one of matter.replaced) replaced.add(one);
    return matter;
  };
  const one = matterOf(first);
  const two = matterOf(second);
  const medium: { matter: MolecularMatter; volumeFraction: number }[] = [];
  for (const { material, volumeFraction } of components) {
    const matter = volumeFraction > 0 ? matterOf(material) : null;
    if (matter !== null) medium.push({ matter, volumeFraction });
  }
  if (one === null || two === null || missing.size > 0) {
    return { route: 'molecular', parts: null, note: `Cannot be used: ${[...missing].join('; ')}.` };
  }
  const stands = replaced.size === 0 ? '' : ` Stand-ins: ${[...replaced].join('; ')}.`;
  return {
    route: 'molecular',
    parts: allDispersion(molecularHamaker({ first: one, second: two, medium })),
    note:
      "London's attraction summed over molecules. The terms of Keesom and Debye are left out, since in a liquid the " +
      `dipoles hold one another and a sum over pairs fails.${stands}`,
  };
}

function combiningRoute({ bodies: { first, second, medium, temperature_K } }: RouteInput): RouteAnswer {
  const acrossVacuum = (body: DielectricBody) =>
    lifshitzNonRetarded({ first: body, second: body, medium: vacuum, temperature_K }).hamakerConstant_J;
  const hamakerConstant_J = combiningRule({
    first_J: acrossVacuum(first),
    second_J: acrossVacuum(second),
    medium_J: acrossVacuum(medium),
  });
  return {
    route: 'combining',
    parts: allDispersion(hamakerConstant_J),
    note: `From the constants of the three substances across vacuum; low by 20 to 80 %, most often by a third. ${asDispersion}`,
  };
}

function enteredRoute({ entered_J }: RouteInput): RouteAnswer {
  if (entered_J === null) return { route: 'entered', parts: null, note: 'No value has been entered.' };
  if (!Number.isFinite(entered_J)) {
    return { route: 'entered', parts: null, note: 'The entered value is not a finite number.' };
  }
  return { route: 'entered', parts: allDispersion(entered_J), note: `Your own value. ${asDispersion}` };
}
