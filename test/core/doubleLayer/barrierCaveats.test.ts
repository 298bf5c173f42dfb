import { describe, expect, it } from 'vitest';
import { barrierCaveats } from '../../../core/doubleLayer/barrierCaveats';

const barrier = {
  model: 'superposition',
  separation_m: 5e-9,
  slipPlane1_m: 0.5e-9,
  slipPlane2_m: 0.5e-9,
  debyeLength_m: 3e-9,
} as const;
const codes = (change: Partial<Parameters<typeof barrierCaveats>[0]>) =>
  barrierCaveats({ ...barrier, ...change }).map(({ code }) => code);

describe('barrierCaveats', () => {
  it('are none where the layers overlap weakly', () => {
    expect(codes({})).toEqual([]);
  });

  it('speak of overlap below one Debye length between the slip planes, with the number', () => {
    expect(codes({ separation_m: 2.5e-9 })).toEqual(['double-layer-overlap']);
    expect(barrierCaveats({ ...barrier, separation_m: 2.5e-9 })[0].message).toMatch(/0\.50 Debye lengths/);
    expect(codes({ separation_m: 2.5e-9, model: 'constant-potential' })).toEqual([]);
  });

  it('speak of a barrier inside the slip planes, where the energy was held', () => {
    expect(codes({ separation_m: 0.8e-9 })).toEqual(['inside-slip-planes', 'double-layer-overlap']);
    expect(barrierCaveats({ ...barrier, separation_m: 0.8e-9 })[0].message).toMatch(/0\.80 nm.*1\.00 nm/);
    expect(codes({ separation_m: 0.8e-9, model: 'constant-potential' })).toEqual(['inside-slip-planes']);
    // Held up to the closest approach of bare surfaces, 0.165 nm, outside the slip planes; no farther.
    expect(codes({ separation_m: 1.16e-9, model: 'constant-potential' })).toEqual(['inside-slip-planes']);
    expect(codes({ separation_m: 1.17e-9, model: 'constant-potential' })).toEqual([]);
  });

  it('do not speak of slip planes that lie on the bare surfaces', () => {
    expect(codes({ separation_m: 0.165e-9, slipPlane1_m: 0, slipPlane2_m: 0 })).toEqual(['double-layer-overlap']);
  });
});
