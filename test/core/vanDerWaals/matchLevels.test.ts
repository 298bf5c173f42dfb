import { describe, expect, it } from 'vitest';
import { matchLevels } from '../../../core/vanDerWaals/matchLevels';
import { materialFrom, recipeOf, responseFrom } from './bodies';
import { material } from './catalogueBodies';

const recipe = recipeOf('rutile');
const single = materialFrom('Single', recipe);
const full = materialFrom('Full', recipe, { dielectricResponses: [responseFrom(recipe, 'full-spectrum')] });
const both = materialFrom('Both', recipe, {
  dielectricResponses: [responseFrom(recipe), responseFrom(recipe, 'full-spectrum')],
});

describe('matchLevels', () => {
  it('prefers single ultraviolet bands', () => {
    expect(matchLevels([both, both, single])).toEqual({ level: 'single-uv', caveats: [] });
    expect(matchLevels([both, both])).toEqual({ level: 'single-uv', caveats: [] });
  });

  it('takes full spectra when one has nothing else', () => {
    expect(matchLevels([full, both])).toEqual({ level: 'full-spectrum', caveats: [] });
  });

  it('says who differs when nothing matches', () => {
    const { level, caveats } = matchLevels([full, single, both]);
    expect(level).toBeNull();
    expect(caveats.map(({ code }) => code)).toEqual(['response-levels-differ']);
    expect(caveats[0]?.message).toContain('Full cover the full spectrum, those of Single only');
  });

  it('lets water take its full spectrum for carbon black', () => {
    expect(matchLevels([material('carbon-black'), material('water')]).level).toBe('full-spectrum');
    expect(matchLevels([material('tio2-rutile'), material('water')]).level).toBe('single-uv');
    expect(matchLevels([material('carbon-black'), material('mineral-oil')]).level).toBeNull();
  });
});
