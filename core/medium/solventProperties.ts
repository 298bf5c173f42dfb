import type { Material } from '../materials/material';
import { degC_from_K } from '../quantities/convert';
import { type Caveat, isWithin, mustBePositive, type Span } from '../validity';
import { andrade } from './andrade';
import { expandedDensity } from './expandedDensity';
import { lewisSquires, slopeAtReference } from './lewisSquires';
import { polynomialPermittivity } from './polynomialPermittivity';
import { waterDensity, waterDensityValidity_K } from './waterDensity';
import { waterPermittivity, waterPermittivityValidity_K } from './waterPermittivity';
import { waterViscosity, waterViscosityValidity_K } from './waterViscosity';

/** A property of one component of the medium, with what is doubtful about it. */
export interface Property {
  readonly value: number;
  readonly caveats: readonly Caveat[];
}

const WATER = 'water';
/** Handbook values without a stated temperature hold at room temperature. */
const ROOM_K = 298.15;
/** A polynomial in T continued this far is off by less than the table's own uncertainty of 1 %. */
const POLYNOMIAL_SLACK_K = 6;
/** The permittivity of a liquid changes by less than half a per cent per kelvin. */
const SAME_PERMITTIVITY_K = 2;

const degrees = (temperature_K: number): string => `${Math.round(degC_from_K(temperature_K) * 10) / 10} °C`;

/** Nearer than this the laws below change nothing worth a remark. */
const isSame = (temperature_K: number, reference_K: number): boolean => Math.abs(temperature_K - reference_K) <= 0.5;

const certain = (value: number): Property => ({ value, caveats: [] });

function outsideWater(property: string, validity_K: Span, temperature_K: number): readonly Caveat[] {
  if (isWithin(validity_K, temperature_K)) return [];
  return [
    {
      code: `water-${property}-range`,
      message: `The ${property} of water is continued to ${degrees(temperature_K)}; the law holds from 0 to 100 °C.`,
    },
  ];
}

function outsideSpan({ id, name }: Material, valid_K: Span, temperature_K: number): readonly Caveat[] {
  if (isWithin(valid_K, temperature_K)) return [];
  const end_K = temperature_K < valid_K.from ? valid_K.from : valid_K.to;
  const distance_K = Math.abs(temperature_K - end_K);
  if (distance_K <= POLYNOMIAL_SLACK_K) return [];
  return [
    {
      code: `permittivity-temperature-${id}`,
      message: `The measured permittivity of ${name} ends at ${degrees(end_K)} and is continued to ${degrees(temperature_K)}: expect ±${(0.1 * distance_K).toFixed(0)} %.`,
    },
  ];
}

/**
 * Static relative permittivity of a component of the medium at temperature [-]: the law for water, the handbook
 * polynomial (with a caveat outside its span), else the one handbook value with a caveat. Unknown (some resins): n²,
 * with a caveat.
 * Throws RangeError for a conductor, or when neither permittivity nor index is known.
 */
export function componentPermittivity(material: Material, temperature_K: number): Property {
  mustBePositive('componentPermittivity', { temperature_K });
  if (material.id === WATER) {
    return {
      value: waterPermittivity(temperature_K),
      caveats: outsideWater('permittivity', waterPermittivityValidity_K, temperature_K),
    };
  }
  const known = material.staticPermittivity;
  if (known === null) {
    if (material.conductor || material.refractiveIndex === null) {
      throw new RangeError(`componentPermittivity: ${material.name} has no permittivity and cannot be a medium`);
    }
    return {
      value: material.refractiveIndex.value ** 2,
      caveats: [
        {
          code: `permittivity-from-index-${material.id}`,
          message: `No static permittivity is known for ${material.name}; the square of its refractive index is used, which is a lower limit. Enter a measured value for the medium.`,
        },
      ],
    };
  }
  if (known.temperaturePolynomial !== null) {
    return {
      value: polynomialPermittivity(known.temperaturePolynomial, temperature_K),
      caveats: outsideSpan(material, known.temperaturePolynomial.valid_K, temperature_K),
    };
  }
  const reference_K = known.temperature_K ?? ROOM_K;
  if (Math.abs(temperature_K - reference_K) <= SAME_PERMITTIVITY_K) return certain(known.value);
  return {
    value: known.value,
    caveats: [
      {
        code: `permittivity-temperature-${material.id}`,
        message: `The permittivity of ${material.name} is the value at ${degrees(reference_K)}; no law for ${degrees(temperature_K)} is at hand. Polar liquids lose 0.3–0.6 % per kelvin, non-polar ones about 0.1 %.`,
      },
    ],
  };
}

/**
 * Viscosity of a component of the medium at temperature [Pa s]: the law for water, else the value at 25 °C moved by
 * {@link lewisSquires} upwards and {@link andrade} downwards, with a caveat. null when none is known (resins).
 */
export function componentViscosity(material: Material, temperature_K: number): Property | null {
  mustBePositive('componentViscosity', { temperature_K });
  if (material.id === WATER) {
    return {
      value: waterViscosity(temperature_K),
      caveats: outsideWater('viscosity', waterViscosityValidity_K, temperature_K),
    };
  }
  const known = material.viscosity_Pa_s;
  if (known === null) return null;
  const reference_K = known.temperature_K ?? ROOM_K;
  const point = { viscosity_Pa_s: known.value, reference_K };
  const value =
    temperature_K > reference_K
      ? lewisSquires({ ...point, temperature_K })
      : andrade({ ...point, slope_K: slopeAtReference(point), temperature_K });
  if (isSame(temperature_K, reference_K)) return certain(value);
  return {
    value,
    caveats: [
      {
        code: `viscosity-temperature-${material.id}`,
        message: `The viscosity of ${material.name} is moved from ${degrees(reference_K)} to ${degrees(temperature_K)} by a general curve: expect ±15 %, for glycols, oils and cold storage up to ±45 %.`,
      },
    ],
  };
}

/**
 * Density of a component of the medium at temperature [kg/m³]: the law for water, else the value at 25 °C moved by a
 * typical thermal expansion, with a caveat.
 */
export function componentDensity(material: Material, temperature_K: number): Property {
  mustBePositive('componentDensity', { temperature_K });
  if (material.id === WATER) {
    return {
      value: waterDensity(temperature_K),
      caveats: outsideWater('density', waterDensityValidity_K, temperature_K),
    };
  }
  const known = material.density_kg_m3;
  const reference_K = known.temperature_K ?? ROOM_K;
  const value = expandedDensity({ density_kg_m3: known.value, reference_K, temperature_K });
  if (isSame(temperature_K, reference_K)) return certain(value);
  const distance_K = Math.abs(temperature_K - reference_K);
  return {
    value,
    caveats: [
      {
        code: `density-temperature-${material.id}`,
        message: `The density of ${material.name} is moved from ${degrees(reference_K)} to ${degrees(temperature_K)} with a typical expansion of 0.1 % per kelvin: expect ±${(0.06 * distance_K).toFixed(1)} %.`,
      },
    ],
  };
}
