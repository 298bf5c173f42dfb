import { describe, expect, it } from 'vitest';
import { lifshitzNonRetarded } from '../../../core/vanDerWaals/lifshitzNonRetarded';
import { zeroFrequencyScreening } from '../../../core/vanDerWaals/zeroFrequencyScreening';
import * as ackler from '../../published/ackler1996';
import * as bergstrom from '../../published/bergstrom1997';
import * as cellulose from '../../published/bergstrom1999';
import { ranges } from '../../published/conductorRanges';
import * as faure from '../../published/faure2011';
import * as houghWhite from '../../published/houghWhite1980';
import { lifshitzValues } from '../../published/israelachvili2011';
import * as larson from '../../published/larson1993';
import { table12_2 } from '../../published/walstra2003';
import * as kaolinite from '../../published/weberKaufhold2021';
import * as zhao from '../../published/zhao2010';
import reference from '../../reference/vanDerWaals/catalogueSystems.json';
import { bodyNamed, fullSum_zJ, type System } from './catalogueBodies';

interface Row extends System {
  readonly hamakerConstant_zJ: number;
}

/**
 * The bounds below were written with the deviations in view: they hold the agreement found and its explanation, and
 * fail when a change worsens it. They are no proof of accuracy, the less so where source and catalogue share data.
 */

/** How far a source may lie from ours, as a fraction of its value, and the rows known to lie further, each with why. */
interface Tolerance {
  readonly usual: number;
  readonly outliers?: Readonly<Record<string, number>>;
  /** Bound on the mean of the magnitudes of all deviations, outliers included. */
  readonly meanMagnitude?: number;
}

const deviation = (row: Row) => fullSum_zJ(row) / row.hamakerConstant_zJ - 1;
const nameOf = ({ first, medium, second }: System) => `${first} | ${medium} | ${second}`;

function check(source: string, rows: readonly Row[], { usual, outliers = {}, meanMagnitude }: Tolerance) {
  describe(source, () => {
    it.each(rows.map((row) => ({ ...row, name: nameOf(row) })))('$name: $hamakerConstant_zJ zJ', (row) => {
      const bound = Object.entries(outliers).find(([id]) => id === row.first)?.[1] ?? usual;
      expect(Math.abs(deviation(row))).toBeLessThan(bound);
    });
    if (meanMagnitude !== undefined) {
      it(`lies within ${100 * meanMagnitude} % on average`, () => {
        const mean = rows.reduce((sum, row) => sum + Math.abs(deviation(row)), 0) / rows.length;
        expect(mean).toBeLessThan(meanMagnitude);
      });
    }
  });
}

describe('a separate Python program over the same responses, good to 1e-6', () => {
  it.each(reference.systems)('$first | $medium | $second', (row) => {
    const ours = lifshitzNonRetarded({
      first: bodyNamed(row.first),
      second: bodyNamed(row.second),
      medium: bodyNamed(row.medium),
      temperature_K: reference.temperature_K,
    });
    // Frequency zero is one term, so exact; the rest stops early there and falls short by up to 1.0e-6 (carbon black).
    expect(Math.abs(ours.zeroFrequency_J / row.zeroFrequency_J - 1)).toBeLessThan(1e-12);
    expect(Math.abs(ours.dispersion_J / row.dispersion_J - 1)).toBeLessThan(1.5e-6);
    expect(Math.abs(ours.hamakerConstant_J / row.hamakerConstant_J - 1)).toBeLessThan(1e-6);
  });

  it.each(reference.screened)('$first | $medium | $second with salt, kappa h $kappaH', (row) => {
    const { zeroFrequency_J, dispersion_J } = lifshitzNonRetarded({
      first: bodyNamed(row.first),
      second: bodyNamed(row.second),
      medium: bodyNamed(row.medium),
      temperature_K: reference.temperature_K,
    });
    const ours = zeroFrequency_J * zeroFrequencyScreening(1, row.kappaH) + dispersion_J;
    expect(Math.abs(ours / row.hamakerConstant_J - 1)).toBeLessThan(1e-6);
  });
});

// The same theory with nearly the same oscillators: a twentieth for digits lost in recall and refitted UV bands.
// PVC has no infrared term and another UV band in the catalogue.
check('Hough & White 1980 across vacuum (from memory)', houghWhite.acrossVacuum.rows, {
  usual: 0.05,
  outliers: { pvc: 0.1 },
  meanMagnitude: 0.03,
});
// Across water A is a difference, which multiplies a change of one oscillator by two to five. Calcite's infrared term
// and polyisoprene's oscillators are guesses; PVC as above.
check('Hough & White 1980 across water (from memory)', houghWhite.acrossWater.rows, {
  usual: 0.07,
  outliers: { calcite: 0.2, polyisoprene: 0.2, pvc: 0.2 },
  meanMagnitude: 0.06,
});
check('Hough & White 1980, quartz under a water film (from memory)', houghWhite.quartzWaterFilm.rows, { usual: 0.02 });
// Two parts of opposite sign; pentane comes out at 1.14 of parts of 3 zJ each, and its digits are unsure.
check('Hough & White 1980, oil on water (from memory, digits unsure)', houghWhite.oilWaterFilms.rows, {
  usual: 0.1,
  outliers: { pentane: 0.3 },
});
// Read in the source, two digits: half a digit is 1 to 6 %.
check('Walstra 2003, table 12.2', table12_2.rows, { usual: 0.06, meanMagnitude: 0.02 });
// Independent spectra. Barium titanate absorbs near the visible, where one band does not stand for it.
check('Bergström 1997 across vacuum (from memory)', bergstrom.acrossVacuum.rows, {
  usual: 0.12,
  outliers: { batio3: 0.25 },
  meanMagnitude: 0.06,
});
// All but barium titanate lie above his. Part of it is his water (Roth & Lenhoff), which the catalogue lacks; the rest is
// not explained. Quartz, the smallest, suffers most. The wide bounds are the honest doubt of A across water.
check('Bergström 1997 across water (from memory)', bergstrom.acrossWater.rows, {
  usual: 0.5,
  outliers: { quartz: 0.8 },
  meanMagnitude: 0.4,
});
// Recalled with low confidence; mica differs between published tables by as much.
check('Ackler, French & Chiang 1996 across vacuum (from memory)', ackler.acrossVacuum.rows, {
  usual: 0.15,
  outliers: { mica: 0.45 },
  meanMagnitude: 0.15,
});
check('Ackler, French & Chiang 1996 across water (from memory)', ackler.acrossWater.rows, {
  usual: 0.25,
  outliers: { 'alumina-alpha': 0.9 },
});
// Printed as 7 ± 1.
check('Larson et al. 1993, rutile in water, calculated', larson.calculated.rows, { usual: 1 / 7 });
// Fitted to these, so only the sum is tested: half of the second digit, and the fit's own 2 %.
check('Faure et al. 2011, iron oxides in water (fitted)', faure.acrossWater.rows, { usual: 0.025 });
check('Zhao et al. 2010, copper phthalocyanine (fitted)', zhao.acrossVacuum.rows, { usual: 0.005 });
// Second-hand values; the clay's response is a class guess. Across water ours is more than twice theirs.
check('Weber & Kaufhold 2021 across vacuum (second-hand)', kaolinite.acrossVacuum.rows, { usual: 0.25 });
check('Weber & Kaufhold 2021 across water (second-hand)', kaolinite.acrossWater.rows, { usual: 1.5 });
// The catalogue's cellulose was fitted with another water.
check('Bergström et al. 1999, cellulose in water', cellulose.acrossWater.rows, { usual: 0.25 });
// The liquids' values are of the two-point form, 4 to 8 % above the full sum; silica under octane is that form's too,
// and a difference of opposite parts.
check('Israelachvili 2011, tables 13.2 and 13.3 (from memory)', lifshitzValues.rows, {
  usual: 0.1,
  outliers: { 'silica-amorphous': 0.4 },
});

describe('published ranges', () => {
  const rows = [...larson.measured.rows, ...faure.acrossToluene.rows, ...ranges.rows].filter(
    ({ first }) => first !== 'gold',
  );
  it.each(rows.map((row) => ({ ...row, name: nameOf(row) })))('$name lies within $low_zJ to $high_zJ zJ', (row) => {
    expect(fullSum_zJ(row)).toBeGreaterThan(row.low_zJ);
    expect(fullSum_zJ(row)).toBeLessThan(row.high_zJ);
  });

  it('gold across water lies up to 10 % above its range: interband spectrum and water of another source', () => {
    const gold = ranges.rows.filter(({ first }) => first === 'gold');
    expect(gold).toHaveLength(1);
    for (const row of gold) {
      expect(fullSum_zJ(row)).toBeGreaterThan(row.low_zJ);
      expect(fullSum_zJ(row)).toBeLessThan(1.1 * row.high_zJ);
    }
  });
});
