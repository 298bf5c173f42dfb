import { describe, expect, it } from 'vitest';
import { materials } from '../../../core/materials/catalogue';
import { hamakerRoutes } from '../../../core/scenario/scenario';
import { type HamakerAnswer, type HamakerQuestion, hamakerReport } from '../../../core/vanDerWaals/hamakerReport';
import { materialFrom, recipeOf, sourced } from './bodies';
import { fullSum_zJ, material } from './catalogueBodies';

const liquid = (id: string, staticPermittivity: number) => ({
  components: [{ material: material(id), volumeFraction: 1 }],
  staticPermittivity,
});
const water = liquid('water', 78.3553);

const question = (first: string, second: string, change: Partial<HamakerQuestion> = {}): HamakerQuestion => ({
  first: material(first),
  second: material(second),
  medium: water,
  temperature_K: 298.15,
  route: 'lifshitz',
  entered_J: null,
  ...change,
});

function answer(asked: HamakerQuestion): HamakerAnswer {
  const result = hamakerReport(asked);
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join());
  return result.value;
}
const codes = ({ caveats }: HamakerAnswer) => caveats.map(({ code }) => code);

function noteOf({ report }: HamakerAnswer, route: string) {
  const found = report.routes.find((one) => one.route === route);
  if (found === undefined) throw new Error(`no ${route}`);
  return found;
}

describe('hamakerReport', () => {
  it('gives the full sum for rutile in water, with a value for every route that works', () => {
    const { report, caveats } = answer(question('tio2-rutile', 'tio2-rutile'));
    expect(1e21 * report.hamakerConstant_J).toBeCloseTo(
      fullSum_zJ({ first: 'tio2-rutile', medium: 'water', second: 'tio2-rutile' }),
      9,
    );
    expect(report.zeroFrequency_J + report.dispersion_J).toBe(report.hamakerConstant_J);
    expect(report.routes.map(({ route }) => route)).toEqual([...hamakerRoutes]);
    expect(report.relativeUncertainty).toBe(material('tio2-rutile').hamakerUncertainty.acrossLiquid);
    expect(report.retardationWavelength_m * 1e9).toBeCloseTo(243.4, 0);
    expect(caveats).toEqual([]);
  });

  it('warns of the two-point route for rutile', () => {
    const chosen = answer(question('tio2-rutile', 'tio2-rutile', { route: 'two-point' }));
    expect(noteOf(chosen, 'two-point').note).toMatch(/above 1.9/);
    expect(codes(chosen)).toContain('two-point-range');
    expect(chosen.report.relativeUncertainty).toBeGreaterThan(0.6);
    expect(codes(answer(question('polystyrene', 'polystyrene', { route: 'two-point' })))).not.toContain(
      'two-point-range',
    );
  });

  it('shows what the full theory says when the chosen value lies far from it', () => {
    const far = answer(question('tio2-rutile', 'tio2-rutile', { route: 'entered', entered_J: 2e-20 }));
    expect(codes(far)).toEqual(['hamaker-routes-disagree']);
    expect(far.caveats[0]?.message).toContain('20 zJ; full Lifshitz theory gives 68 zJ');
    const near = answer(question('tio2-rutile', 'tio2-rutile', { route: 'entered', entered_J: 6e-20 }));
    expect(codes(near)).toEqual([]);
  });

  it('lets water take its full spectrum for carbon black, which reflects wholly at frequency zero', () => {
    const chosen = answer(question('carbon-black', 'carbon-black'));
    expect(codes(chosen)).toEqual([]);
    expect(chosen.report.zeroFrequency_J * 1e21).toBeCloseTo(3.711, 3);
    expect(chosen.report.retardationWavelength_m).toBe(100e-9);
    expect(noteOf(chosen, 'two-point').hamakerConstant_J).toBeNull();
    expect(noteOf(chosen, 'molecular').note).toMatch(/conductor/);
  });

  it('warns when levels cannot match', () => {
    expect(codes(answer(question('tio2-rutile', 'carbon-black')))).toContain('response-levels-differ');
  });

  it('does not change when the particles change places', () => {
    const one = answer(question('tio2-rutile', 'acrylic-resin')).report;
    const two = answer(question('acrylic-resin', 'tio2-rutile')).report;
    expect(one.hamakerConstant_J).toBe(two.hamakerConstant_J);
    expect(one.relativeUncertainty).toBe(two.relativeUncertainty);
    expect(one.retardationWavelength_m).toBeCloseTo(two.retardationWavelength_m, 20);
  });

  it('keeps 3 zJ of doubt near an index match', () => {
    const chosen = answer(question('silica-amorphous', 'silica-amorphous', { medium: liquid('toluene', 2.3741) }));
    expect(codes(chosen)).toContain('hamaker-index-match');
    expect(chosen.report.relativeUncertainty * chosen.report.hamakerConstant_J).toBeGreaterThanOrEqual(
      3e-21 * (1 - 1e-12),
    );
  });

  it('says so when the force repels', () => {
    const chosen = answer(question('ptfe', 'alumina-alpha', { medium: liquid('cyclohexane', 2.0165) }));
    expect(chosen.report.hamakerConstant_J).toBeLessThan(0);
    expect(codes(chosen)).toContain('hamaker-repulsive');
  });

  it('moves from water to glycol as the recipe does', () => {
    const mix = (glycol: number) =>
      answer(
        question('polystyrene', 'polystyrene', {
          medium: {
            components: [
              { material: material('water'), volumeFraction: 1 - glycol },
              { material: material('propylene-glycol'), volumeFraction: glycol },
            ],
            staticPermittivity: 78 - 50 * glycol,
          },
        }),
      ).report.dispersion_J;
    expect(mix(0.2)).toBeLessThan(mix(0));
    expect(mix(0.5)).toBeLessThan(mix(0.2));
    expect(mix(1)).toBeLessThan(mix(0.5));
  });

  it('treats an entered value wholly as dispersion, of either sign', () => {
    for (const entered_J of [2e-20, -1e-21, 0]) {
      const { report } = answer(question('tio2-rutile', 'tio2-rutile', { route: 'entered', entered_J }));
      expect(report.dispersion_J).toBe(entered_J);
      expect(report.zeroFrequency_J).toBe(0);
      expect(report.reason).toMatch(/not screened by salt/);
      expect(Number.isFinite(report.relativeUncertainty)).toBe(true);
    }
  });

  it('refuses an entered route without a value, leaving the place to the caller', () => {
    for (const entered_J of [null, Number.NaN, Number.POSITIVE_INFINITY]) {
      const result = hamakerReport(question('tio2-rutile', 'tio2-rutile', { route: 'entered', entered_J }));
      expect(result.ok).toBe(false);
      if (!result.ok) expect(result.problems.map(({ code, at }) => [code, at])).toEqual([['hamaker-not-entered', '']]);
    }
  });

  it('refuses the molecular route and names the missing datum', () => {
    const medium = liquid('propylene-glycol', 28);
    const result = hamakerReport(question('tio2-rutile', 'tio2-rutile', { medium, route: 'molecular' }));
    expect(result.ok).toBe(false);
    if (!result.ok) {
      expect(result.problems[0]?.code).toBe('hamaker-route-unusable');
      expect(result.problems[0]?.message).toMatch(/ionization energy of Propylene glycol/);
    }
  });

  it('uses the optical value, with a caveat, where no static permittivity is known', () => {
    const first = materialFrom('unknown', recipeOf('ptfe'), {
      staticPermittivity: null,
      refractiveIndex: sourced(1.36),
    });
    const chosen = answer({ ...question('ptfe', 'ptfe'), first, second: first });
    expect(codes(chosen)).toContain('static-permittivity-missing');
    expect(codes(chosen).filter((code) => code === 'static-permittivity-missing')).toHaveLength(1);
    expect(chosen.report.zeroFrequency_J).toBeGreaterThan(0);
  });

  it('is finite for every particle of the catalogue in every liquid, by every route that works', () => {
    const liquids = materials.filter(({ kind }) => kind === 'solvent');
    const particles = materials.filter(({ kind }) => kind !== 'solvent');
    expect(liquids.length * particles.length).toBeGreaterThan(1000);
    for (const { id, staticPermittivity } of liquids) {
      const medium = liquid(id, staticPermittivity?.value ?? 2);
      for (const particle of particles) {
        const { report } = answer(question(particle.id, particle.id, { medium }));
        const numbers = [
          report.hamakerConstant_J,
          report.zeroFrequency_J,
          report.dispersion_J,
          report.relativeUncertainty,
        ];
        for (const { hamakerConstant_J } of report.routes) {
          if (hamakerConstant_J !== null) numbers.push(hamakerConstant_J);
        }
        expect(numbers.every(Number.isFinite), `${particle.id} in ${id}`).toBe(true);
        expect(report.hamakerConstant_J, `${particle.id} in ${id}`).toBeGreaterThan(0);
      }
    }
  });
});
