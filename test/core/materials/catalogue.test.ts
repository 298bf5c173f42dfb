import { describe, expect, it } from 'vitest';
import { findMaterial, materials } from '../../../core/materials/catalogue';

describe('findMaterial', () => {
  it('finds every material under its id', () => {
    for (const material of materials) expect(findMaterial(material.id)).toBe(material);
  });

  it.each(['', 'Water', 'unobtainium', 'constructor', '__proto__'])('finds nothing under "%s"', (id) => {
    expect(findMaterial(id)).toBeUndefined();
  });
});

describe('materials', () => {
  it('show names a formulator can tell apart', () => {
    const names = materials.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
  });

  it('start with the liquids and keep each kind together', () => {
    const runs = materials.map(({ kind }) => kind).filter((kind, index, kinds) => kind !== kinds[index - 1]);
    expect(runs[0]).toBe('solvent');
    expect(runs.filter((kind) => kind === 'solvent' || kind === 'polymer')).toEqual(['solvent', 'polymer']);
  });

  it('water carries both levels of response, the recommended one first', () => {
    const water = findMaterial('water');
    expect(water?.dielectricResponses[0].id).toBe('cauchy-fit-plus-ir');
    expect(new Set(water?.dielectricResponses.map(({ level }) => level))).toEqual(
      new Set(['single-uv', 'full-spectrum']),
    );
  });

  it('conductors have tabulated spectra and no optical limit', () => {
    const conductors = materials.filter(({ conductor }) => conductor);
    expect(conductors.map(({ id }) => id)).toEqual(['carbon-black', 'graphite', 'gold', 'silver']);
    for (const { dielectricResponses, refractiveIndexIsOpticalLimit } of conductors) {
      expect(dielectricResponses[0].level).toBe('full-spectrum');
      expect(refractiveIndexIsOpticalLimit).toBe(false);
    }
  });
});
