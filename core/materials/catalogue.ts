import { alcohols } from './alcohols';
import { alkanes } from './alkanes';
import { aromaticHydrocarbons } from './aromaticHydrocarbons';
import { binderResins } from './binderResins';
import { carbonsAndMetals } from './carbonsAndMetals';
import { ceramics } from './ceramics';
import { chlorinatedAndAprotic } from './chlorinatedAndAprotic';
import { colouredPigments } from './colouredPigments';
import { glycolsAndEthers } from './glycolsAndEthers';
import { ketonesAndEsters } from './ketonesAndEsters';
import type { Material } from './material';
import { mineralFillers } from './mineralFillers';
import { monomersAndOils } from './monomersAndOils';
import { otherPolymers } from './otherPolymers';
import { oxideFillers } from './oxideFillers';
import { technicalHydrocarbons } from './technicalHydrocarbons';
import { vinylPolymers } from './vinylPolymers';
import { water } from './water';
import { whitePigments } from './whitePigments';

/** Every material, in the order a picker shows them: liquids, pigments, fillers, polymers. */
export const materials: readonly Material[] = [
  ...water,
  ...alcohols,
  ...glycolsAndEthers,
  ...ketonesAndEsters,
  ...alkanes,
  ...technicalHydrocarbons,
  ...aromaticHydrocarbons,
  ...chlorinatedAndAprotic,
  ...monomersAndOils,
  ...whitePigments,
  ...colouredPigments,
  ...carbonsAndMetals,
  ...oxideFillers,
  ...ceramics,
  ...mineralFillers,
  ...vinylPolymers,
  ...otherPolymers,
  ...binderResins,
];

const byId: ReadonlyMap<string, Material> = new Map(materials.map((material) => [material.id, material]));

/** The material stored under an id in a scenario, or undefined when there is none. */
export const findMaterial = (id: string): Material | undefined => byId.get(id);
