import { describe, expect, it } from 'vitest';
import { differencesFromBase } from '../../../renderer/state/differences';
import { newFormulation, newLayer } from '../../../renderer/state/templates';

const base = newFormulation([]);

describe('differencesFromBase', () => {
  it('finds none in a copy, whatever its name', () => {
    expect(differencesFromBase({ ...base, id: 'x', name: 'y', copiedFrom: base.id }, base)).toEqual([]);
  });

  it('names the place and what it was', () => {
    const salts = [{ salt: 'sodium-chloride', concentration_mM: 40 }];
    expect(differencesFromBase({ ...base, salts, temperature_degC: 50 }, base)).toEqual([
      { path: '/temperature_degC', was: 25 },
      { path: '/salts/0/concentration_mM', was: 10 },
    ]);
  });

  it('counts a whole group that came or went once', () => {
    const [particle] = base.particles;
    const layered = { ...base, particles: [{ ...particle, layer: newLayer }] };
    expect(differencesFromBase(layered, base)).toEqual([{ path: '/particles/0/layer', was: null }]);
    expect(differencesFromBase({ ...base, salts: [] }, base)).toHaveLength(1);
  });
});
