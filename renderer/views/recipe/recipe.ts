import { createContext } from 'preact';
import { useContext } from 'preact/hooks';
import type { FormulationOutcome } from '../../../core/evaluation';
import type { DecimalSign } from '../../../core/quantities/writeQuantity';
import type { Formulation, Particle } from '../../../core/scenario/scenario';
import { editedNumber } from '../../format/numbers';
import { differencesFromBase } from '../../state/differences';
import type { FormulationChange, Workbench } from '../../state/workbench';

/** The selected formulation as its fields need it. Paths are JSON pointers within the formulation. */
export interface Recipe {
  readonly formulation: Formulation;
  readonly outcome: FormulationOutcome | undefined;
  /** Value in the formulation this one was copied from, in words, where it differs. */
  wasAt(path: string): string | null;
  /** Problem that the evaluation found at this entry. */
  problemAt(path: string): string | null;
  change(label: string, path: string, change: FormulationChange): void;
  changeParticle(label: string, index: number, path: string, change: (particle: Particle) => Particle): void;
}

const inWords = (value: unknown, decimalSign: DecimalSign): string => {
  if (value === null || value === undefined) return 'none';
  if (typeof value === 'number') return editedNumber(value, decimalSign);
  return typeof value === 'string' ? value : 'another';
};

export function recipeOf(workbench: Workbench, decimalSign: DecimalSign): Recipe {
  const formulation = workbench.selected.value;
  const outcome = workbench.outcomeOf(formulation.id);
  const base = workbench.scenario.value.formulations.find(({ id }) => id === formulation.copiedFrom);
  const differences = new Map(
    base === undefined ? [] : differencesFromBase(formulation, base).map(({ path, was }) => [path, was]),
  );
  const problems = outcome?.kind === 'refused' ? outcome.problems : [];
  const change: Recipe['change'] = (label, path, apply) =>
    workbench.editFormulation(label, formulation.id, apply, path);
  return {
    formulation,
    outcome,
    wasAt: (path) => (differences.has(path) ? inWords(differences.get(path), decimalSign) : null),
    problemAt: (path) => {
      const found = problems.find(({ at }) => at.replace(/^\/formulations\/\d+/, '') === path);
      return found === undefined ? null : `${found.message} ${found.remedy}`;
    },
    change,
    changeParticle: (label, index, path, apply) =>
      change(label, path, (now) => ({
        ...now,
        particles: now.particles.map((particle, at) => (at === index ? apply(particle) : particle)),
      })),
  };
}

const RecipeContext = createContext<Recipe | null>(null);

export const RecipeProvider = RecipeContext.Provider;

export function useRecipe(): Recipe {
  const recipe = useContext(RecipeContext);
  if (recipe === null) throw new Error('useRecipe: no RecipeProvider above');
  return recipe;
}
