import type { HamakerReport } from '../evaluation';
import type { Material } from '../materials/material';
import { done, type Result, refused } from '../problem';
import type { HamakerRoute } from '../scenario/scenario';
import type { Caveat } from '../validity';
import { blendBodies } from './blendBodies';
import {
  bodyOf,
  type DielectricBody,
  type ResponseLevel,
  responseAt,
  staticPermittivityOfSolid,
} from './dielectricBody';
import { responseOf } from './dielectricResponse';
import { hamakerRouteValues, type RouteAnswer } from './hamakerRouteValues';
import { hamakerUncertainty } from './hamakerUncertainty';
import { isBeyondTwoPoint, isNearIndexMatch } from './indexContrast';
import { matchLevels } from './matchLevels';
import { retardationWavelength } from './retardationWavelength';

export interface HamakerQuestion {
  readonly first: Material;
  readonly second: Material;
  readonly medium: {
    readonly components: readonly { readonly material: Material; readonly volumeFraction: number }[];
    readonly staticPermittivity: number;
  };
  readonly temperature_K: number;
  readonly route: HamakerRoute;
  readonly entered_J: number | null;
}

export interface HamakerAnswer {
  readonly report: HamakerReport;
  readonly caveats: readonly Caveat[];
}

/**
 * The Hamaker constant of particle 1 across the medium against particle 2 by every route, with the chosen one in front.
 * Refused when the chosen route lacks a datum; the problem's place is left empty for the caller to fill.
 */
export function hamakerReport(question: HamakerQuestion): Result<HamakerAnswer> {
  const { first, second, medium, temperature_K, route, entered_J } = question;
  const components = medium.components.filter(({ volumeFraction }) => volumeFraction > 0);
  const { level, caveats: levelCaveats } = matchLevels([first, second, ...components.map(({ material }) => material)]);
  const caveats: Caveat[] = [...levelCaveats];

  const bodies = {
    first: solidBody(first, level, caveats),
    second: first === second ? null : solidBody(second, level, caveats),
    medium: blendBodies(
      components.map(({ material, volumeFraction }) => ({
        body: bodyOf(material, medium.staticPermittivity, level),
        volumeFraction,
      })),
      medium.staticPermittivity,
    ),
    temperature_K,
  };
  const three = { ...bodies, second: bodies.second ?? bodies.first };
  const answers = hamakerRouteValues({ bodies: three, first, second, components, entered_J });
  const chosen = answers.find((answer) => answer.route === route);
  if (chosen === undefined || chosen.parts === null) return refusal(route, chosen?.note ?? '');

  if (isNearIndexMatch(three.first, three.second, three.medium)) {
    caveats.push({
      code: 'hamaker-index-match',
      message:
        'Particle and liquid have nearly the same refractive index: the Hamaker constant is a small difference ' +
        'of large numbers, known to no better than 3 zJ.',
    });
  }
  if (route === 'two-point' && isBeyondTwoPoint(three.first, three.second)) {
    caveats.push({
      code: 'two-point-range',
      message:
        'The two-point route is made for a refractive index below 1.9; above, it may give two to four times too much.',
    });
  }
  const relativeUncertainty = hamakerUncertainty(route, chosen.parts.hamakerConstant_J, three);
  caveats.push(...disagreement(answers, chosen.parts.hamakerConstant_J, relativeUncertainty));
  if (chosen.parts.hamakerConstant_J < 0) {
    caveats.push({
      code: 'hamaker-repulsive',
      message: 'The liquid lies optically between the two solids, so the van der Waals force repels here.',
    });
  }
  return done({
    report: {
      route,
      ...chosen.parts,
      relativeUncertainty,
      retardationWavelength_m: retardationWavelength(three.first, three.second),
      reason: `${reasons[route]} ${chosen.note}`,
      routes: answers.map(({ route: name, parts, note }) => ({
        route: name,
        hamakerConstant_J: parts?.hamakerConstant_J ?? null,
        note,
      })),
    },
    caveats,
  });
}

const zJ_from_J = (energy_J: number): string => `${(energy_J * 1e21).toPrecision(2)} zJ`;

/** A doubt when the full theory lies outside the interval of the chosen route. */
function disagreement(answers: readonly RouteAnswer[], chosen_J: number, relativeUncertainty: number): Caveat[] {
  const full_J = answers.find(({ route }) => route === 'lifshitz')?.parts?.hamakerConstant_J;
  if (full_J === undefined || Math.abs(full_J - chosen_J) <= relativeUncertainty * Math.abs(chosen_J)) return [];
  return [
    {
      code: 'hamaker-routes-disagree',
      message: `The chosen Hamaker constant is ${zJ_from_J(chosen_J)}; full Lifshitz theory gives ${zJ_from_J(full_J)}.`,
    },
  ];
}

const reasons: Readonly<Record<HamakerRoute, string>> = {
  lifshitz: 'Full Lifshitz theory, the most complete route.',
  'two-point': 'Two-point approximation, as chosen.',
  molecular: 'Pairwise molecular sum, as chosen.',
  combining: 'Combining rule, as chosen.',
  entered: 'Entered by hand.',
};

/** Far below every vibration: there the response has reached its own static value. */
const nearlyStatic_rad_s = 1;

function solidBody(material: Material, level: ResponseLevel | null, caveats: Caveat[]): DielectricBody {
  const known = staticPermittivityOfSolid(material);
  if (known !== null) return bodyOf(material, known, level);
  caveats.push({
    code: 'static-permittivity-missing',
    message:
      `The static permittivity of ${material.name} is not known; the value from its optical data is used. ` +
      'This touches only the part of the Hamaker constant that salt screens.',
  });
  return bodyOf(material, responseOf(responseAt(material, level))(nearlyStatic_rad_s), level);
}

function refusal(route: HamakerRoute, note: string): Result<never> {
  if (route === 'entered') {
    return refused({
      code: 'hamaker-not-entered',
      at: '',
      message: `The Hamaker constant is to be the entered one. ${note}`,
      remedy: 'Enter a value in zJ, or choose another route.',
    });
  }
  return refused({
    code: 'hamaker-route-unusable',
    at: '',
    message: `The chosen route to the Hamaker constant cannot be used for these materials. ${note}`,
    remedy: 'Choose the Lifshitz route, which works for every material in the catalogue, or enter a value.',
  });
}
