import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sharesOf } from '../../../core/formulation/loading';

const WATER_kg_m3 = 997;
const PIGMENT_kg_m3 = 4100;

describe('sharesOf', () => {
  it('turns 70 % by mass of a titania base in water into 36 % by volume', () => {
    // (0.7/4100) / (0.7/4100 + 0.3/997) = 0.3620, by hand
    const [share] = sharesOf([{ basis: 'mass', fraction: 0.7, density_kg_m3: PIGMENT_kg_m3 }], WATER_kg_m3) ?? [];
    expect(share?.volumeFraction).toBeCloseTo(0.36204, 4);
  });

  it('gives back the shares it was given, whichever way they are written', () => {
    const share = fc.double({ min: 0.001, max: 0.3, noNaN: true });
    const density_kg_m3 = fc.double({ min: 800, max: 8000, noNaN: true });
    fc.assert(
      fc.property(share, share, density_kg_m3, density_kg_m3, density_kg_m3, (first, second, a, b, medium) => {
        const byVolume = sharesOf(
          [
            { basis: 'volume', fraction: first, density_kg_m3: a },
            { basis: 'volume', fraction: second, density_kg_m3: b },
          ],
          medium,
        );
        const mixed = sharesOf(
          [
            { basis: 'volume', fraction: first, density_kg_m3: a },
            { basis: 'mass', fraction: byVolume?.[1]?.massFraction ?? Number.NaN, density_kg_m3: b },
          ],
          medium,
        );
        expect(mixed?.[1]?.volumeFraction).toBeCloseTo(second, 12);
        expect(mixed?.[0]?.massFraction).toBeCloseTo(byVolume?.[0]?.massFraction ?? Number.NaN, 12);
      }),
    );
  });

  it('refuses shares that leave no room for the medium', () => {
    expect(sharesOf([{ basis: 'volume', fraction: 1, density_kg_m3: 1000 }], WATER_kg_m3)).toBeNull();
    expect(sharesOf([{ basis: 'mass', fraction: 1, density_kg_m3: 1000 }], WATER_kg_m3)).toBeNull();
  });
});
