import { findMaterial } from '../materials/catalogue';
import { findSalt } from '../medium/salts';
import { done, type Problem, type Result, refused } from '../problem';
import { limitsOf, type QuantityKind } from '../quantities/quantityKinds';
import { group, keyOf, list, number, oneOf, orNull, pointerTo, type Reader, type Reading, text } from './reader';
import {
  type AdsorbedLayer,
  doubleLayerModels,
  type Formulation,
  hamakerRoutes,
  type MediumComponent,
  type MediumRecipe,
  type Particle,
  type ParticleCharge,
  type Requirement,
  type SaltDose,
  SCENARIO_FORMAT,
  SCENARIO_SCHEMA,
  type Scenario,
} from './scenario';

/** Most formulations one scenario may hold. */
export const MAX_FORMULATIONS = 200;
export const MAX_COMPONENTS = 20;
export const MAX_SALTS = 20;
export const MAX_PARTICLE_KINDS = 2;

const quantity = (kind: QuantityKind): Reader<number> => {
  const { min, max, fileUnit } = limitsOf(kind);
  return number({ min, max, unit: fileUnit });
};

const liquidOrBinder = (key: string): boolean => {
  const material = findMaterial(key);
  return material?.kind === 'solvent' || material?.kind === 'polymer';
};
const solid = (key: string): boolean => {
  const material = findMaterial(key);
  return material !== undefined && material.kind !== 'solvent';
};

const requirement = group<Requirement>('the requirement', {
  shelfLife_days: quantity('shelfLife_days'),
  acceptedLoss_percent: quantity('acceptedLoss_percent'),
  fillHeight_mm: quantity('fillHeight_mm'),
  acceptedClearLayer_percent: quantity('acceptedClearLayer_percent'),
});

const mediumComponent = group<MediumComponent>('a component of the medium', {
  material: keyOf('a liquid or binder', liquidOrBinder),
  volumeParts: quantity('volumeParts'),
});

const medium = group<MediumRecipe>('the medium', {
  components: list('components', mediumComponent, { min: 1, max: MAX_COMPONENTS }),
  measuredRelativePermittivity: orNull(quantity('relativePermittivity')),
  measuredViscosity_mPa_s: orNull(quantity('viscosity_mPa_s')),
  measuredDensity_kg_m3: orNull(quantity('mediumDensity_kg_m3')),
});

const saltDose = group<SaltDose>('a salt', {
  salt: keyOf('a salt', (key) => findSalt(key) !== undefined),
  concentration_mM: quantity('concentration_mM'),
});

const charge = group<ParticleCharge>('the charge', {
  zeta_mV: quantity('zeta_mV'),
  zetaUncertainty_mV: quantity('zetaUncertainty_mV'),
  slipPlane_nm: quantity('slipPlane_nm'),
});

const layer = group<AdsorbedLayer>('the polymer layer', {
  thickness_nm: quantity('layerThickness_nm'),
  adsorbedAmount_mg_m2: quantity('adsorbedAmount_mg_m2'),
  chainMolarMass_g_mol: quantity('chainMolarMass_g_mol'),
  polymerDensity_kg_m3: quantity('polymerDensity_kg_m3'),
  floryChi: quantity('floryChi'),
});

const particle = group<Particle>('a particle', {
  name: text(80, 1),
  material: keyOf('a pigment, filler or polymer', solid),
  diameter_nm: quantity('diameter_nm'),
  loadingBasis: oneOf(['volume', 'mass'] as const),
  loading_percent: quantity('loading_percent'),
  density_kg_m3: orNull(quantity('density_kg_m3')),
  charge: orNull(charge),
  layer: orNull(layer),
});

const formulation = group<Formulation>('a formulation', {
  id: text(40, 1),
  name: text(120, 1),
  copiedFrom: orNull(text(40, 1)),
  temperature_degC: quantity('temperature_degC'),
  medium,
  salts: list('salts', saltDose, { min: 0, max: MAX_SALTS }),
  hardness_dH: quantity('hardness_dH'),
  pH: orNull(quantity('pH')),
  particles: list('kinds of particle', particle, { min: 1, max: MAX_PARTICLE_KINDS }),
  hamaker: group('the Hamaker constant', {
    route: oneOf(hamakerRoutes),
    entered_zJ: orNull(quantity('entered_zJ')),
  }),
  doubleLayerModel: oneOf(['by-validity', ...doubleLayerModels] as const),
});

const scenario = group<Scenario>('the scenario', {
  format: oneOf([SCENARIO_FORMAT] as const),
  schema: (value) => (value === SCENARIO_SCHEMA ? SCENARIO_SCHEMA : undefined),
  title: text(200),
  notes: text(20_000),
  requirement,
  formulations: list('formulations', formulation, { min: 1, max: MAX_FORMULATIONS }),
});

/** Slips that no single entry shows: doubled identities, a base that is not there, a route without its value. */
function problemsBetweenEntries(read: Scenario): Problem[] {
  const problems: Problem[] = [];
  const ids = new Set<string>();
  read.formulations.forEach((one, index) => {
    const at = pointerTo('/formulations', index);
    if (ids.has(one.id)) {
      problems.push({
        code: 'double-id',
        at: `${at}/id`,
        message: `Two formulations carry the id "${one.id}".`,
        remedy: 'Give each formulation an id of its own.',
      });
    }
    ids.add(one.id);
    if (!one.medium.components.some((component) => component.volumeParts > 0)) {
      problems.push({
        code: 'empty-medium',
        at: `${at}/medium/components`,
        message: 'The medium holds no liquid: every volume part is zero.',
        remedy: 'Give at least one component a volume part above zero.',
      });
    }
    if (one.hamaker.route === 'entered' && one.hamaker.entered_zJ === null) {
      problems.push({
        code: 'missing',
        at: `${at}/hamaker/entered_zJ`,
        message: 'The Hamaker constant is to be entered, but no value is given.',
        remedy: 'Enter a value in zJ (1e-21 J), or choose another route.',
      });
    }
  });
  read.formulations.forEach((one, index) => {
    if (one.copiedFrom !== null && (!ids.has(one.copiedFrom) || one.copiedFrom === one.id)) {
      problems.push({
        code: 'unknown-formulation',
        at: `${pointerTo('/formulations', index)}/copiedFrom`,
        message: `There is no other formulation with the id "${one.copiedFrom}" to compare with.`,
        remedy: 'Name an existing formulation, or write null.',
      });
    }
  });
  return problems;
}

/** Which program wrote it, and for which version: looked at first, since all else depends on it. */
function problemOfVersion(value: unknown): Problem | undefined {
  const head = typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {};
  if (head.format !== SCENARIO_FORMAT) {
    return {
      code: 'not-a-scenario',
      at: '/format',
      message: `This is not a Sunder scenario: "format" should be "${SCENARIO_FORMAT}".`,
      remedy: 'Open a file that was saved by Sunder.',
    };
  }
  if (typeof head.schema !== 'number' || !Number.isInteger(head.schema) || head.schema < 1) {
    return {
      code: 'unknown-schema',
      at: '/schema',
      message: `The schema version should be a whole number from 1 to ${SCENARIO_SCHEMA}.`,
      remedy: 'Open a file that was saved by Sunder.',
    };
  }
  if (head.schema > SCENARIO_SCHEMA) {
    return {
      code: 'newer-schema',
      at: '/schema',
      message: `This file was written by a newer Sunder (schema ${head.schema}); this one reads up to schema ${SCENARIO_SCHEMA}.`,
      remedy: 'Open it with the newer version. The file has not been touched.',
    };
  }
  return undefined;
}

/** Checks an untrusted value and builds a scenario anew from it, keys in the order in which files are written. */
export function checkScenario(value: unknown): Result<Scenario> {
  const versionProblem = problemOfVersion(value);
  if (versionProblem !== undefined) return refused(versionProblem);
  const reading: Reading = { problems: [] };
  const read = scenario(value, '', reading);
  if (read === undefined) return refused(...reading.problems);
  const problems = problemsBetweenEntries(read);
  return problems.length > 0 ? refused(...problems) : done(read);
}

function placeOf(error: unknown, source: string): string {
  const position = /position (\d+)/.exec(String(error))?.[1];
  const offset = position === undefined ? source.length : Number(position);
  const before = source.slice(0, offset);
  const line = before.split('\n').length;
  return `line ${line}, character ${offset - before.lastIndexOf('\n')}`;
}

/** Reads the text of a scenario file. Every problem carries its place; nothing is guessed or repaired silently. */
export function parseScenario(source: string): Result<Scenario> {
  let value: unknown;
  try {
    value = JSON.parse(source.startsWith('\uFEFF') ? source.slice(1) : source);
  } catch (error) {
    return refused({
      code: 'not-json',
      at: '',
      message: `The file is not complete JSON: reading stopped at ${placeOf(error, source)}.`,
      remedy: 'The file is cut off or damaged there. Open an earlier copy, or mend that place in a text editor.',
    });
  }
  return checkScenario(value);
}
