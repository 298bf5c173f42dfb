import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseScenario } from '../../../core/scenario/parse';
import type { Scenario } from '../../../core/scenario/scenario';
import { writeScenario } from '../../../core/scenario/write';

const demoText = readFileSync(new URL('../../../assets/demo/white-base.sunder.json', import.meta.url), 'utf8');
const demo = (): Scenario => {
  const parsed = parseScenario(demoText);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return parsed.value;
};

/** The demo with one place changed, as text. */
function changed(pointer: string, value: unknown): string {
  const document = JSON.parse(demoText);
  const keys = pointer.split('/').slice(1);
  const last = keys.pop() ?? '';
  const parent = keys.reduce((place, key) => place[key], document);
  if (value === undefined) delete parent[last];
  else parent[last] = value;
  return JSON.stringify(document);
}

const problemsOf = (text: string) => {
  const parsed = parseScenario(text);
  return parsed.ok ? [] : parsed.problems;
};

describe('parseScenario reads what it wrote', () => {
  it('gives the same bytes after a round trip of the demo', () => {
    expect(writeScenario(demo())).toBe(demoText);
  });

  it('keeps every finite number in the permitted range to the last digit', () => {
    fc.assert(
      fc.property(fc.double({ min: -300, max: 300, noNaN: true }), (zeta_mV) => {
        const scenario = demo();
        const [formulation] = scenario.formulations;
        const [particle] = formulation.particles;
        const charge = { zeta_mV, zetaUncertainty_mV: 5, slipPlane_nm: 0.5 };
        const edited = { ...scenario, formulations: [{ ...formulation, particles: [{ ...particle, charge }] }] };
        const again = parseScenario(writeScenario(edited));
        expect(again.ok && again.value.formulations[0].particles[0].charge?.zeta_mV).toBe(zeta_mV === 0 ? 0 : zeta_mV);
      }),
    );
  });

  it('accepts a byte order mark at the start', () => {
    expect(parseScenario(`\uFEFF${demoText}`).ok).toBe(true);
  });
});

describe('parseScenario names the place and the code of a slip', () => {
  const first = '/formulations/0';
  const particle = `${first}/particles/0`;
  it.each([
    [`${particle}/diameter_nm`, -300, 'out-of-range'],
    [`${particle}/diameter_nm`, '300', 'not-a-number'],
    [`${particle}/diameter_nm`, null, 'not-a-number'],
    [`${first}/pH`, 15, 'out-of-range'],
    [`${first}/temperature_degC`, 1e9, 'out-of-range'],
    [`${first}/salts`, {}, 'not-a-list'],
    [`${first}/salts/0/salt`, 'unobtainium', 'unknown-name'],
    [`${first}/medium/components/0/material`, 'tio2-rutile', 'unknown-name'],
    [`${particle}/material`, 'water', 'unknown-name'],
    [`${first}/doubleLayerModel`, 'guess', 'not-a-choice'],
    [`${particle}/diametre_nm`, 300, 'unknown-entry'],
    [`${particle}/name`, undefined, 'missing'],
    [`${first}/copiedFrom`, 'nobody', 'unknown-formulation'],
    [`${first}/copiedFrom`, 'base', 'unknown-formulation'],
    ['/formulations/1/id', 'base', 'double-id'],
    ['/formulations', [], 'wrong-count'],
    ['/schema', 2, 'newer-schema'],
    ['/schema', 'one', 'unknown-schema'],
    ['/format', 'something-else', 'not-a-scenario'],
    ['/title', 'x'.repeat(201), 'wrong-length'],
    ['/title', 'white\u202Ebase', 'control-character'],
  ])('%s = %j is %s', (pointer, value, code) => {
    const problems = problemsOf(changed(pointer, value));
    expect(problems.map((problem) => [problem.at, problem.code])).toContainEqual([pointer, code]);
    for (const problem of problems) {
      expect(problem.message).not.toBe('');
      expect(problem.remedy).not.toBe('');
    }
  });

  it('a number beyond the number range is refused, not turned into infinity', () => {
    const text = demoText.replace('"diameter_nm": 300', '"diameter_nm": 1e400');
    expect(problemsOf(text).map(({ at, code }) => [at, code])).toEqual([
      ['/formulations/0/particles/0/diameter_nm', 'not-a-number'],
    ]);
  });

  it('a route that needs a value says that it is missing', () => {
    expect(problemsOf(changed(`${first}/hamaker/route`, 'entered')).map(({ at }) => at)).toEqual([
      `${first}/hamaker/entered_zJ`,
    ]);
  });

  it('more salts than any recipe holds are refused', () => {
    const salts = Array.from({ length: 1000 }, () => ({ salt: 'sodium-chloride', concentration_mM: 1 }));
    expect(problemsOf(changed(`${first}/salts`, salts)).map(({ code }) => code)).toEqual(['wrong-count']);
  });

  it('a truncated file tells where it ends', () => {
    const [problem] = problemsOf(demoText.slice(0, 500));
    expect(problem.message).toMatch(/line \d+, character \d+/);
  });
});

describe('parseScenario survives hostile files', () => {
  it('deep nesting is refused without exhausting the stack', () => {
    expect(problemsOf(`${'['.repeat(100_000)}${']'.repeat(100_000)}`)).toHaveLength(1);
    const nested = `${'{"a":'.repeat(50_000)}1${'}'.repeat(50_000)}`;
    expect(problemsOf(changed('/notes', '').replace('"notes":""', `"notes":${nested}`))).not.toHaveLength(0);
  });

  it.each(['__proto__', 'constructor', 'prototype', 'toString'])('the key %s pollutes nothing', (key) => {
    const text = demoText.replace('"title":', `"${key}": {"polluted": true}, "title":`);
    expect(problemsOf(text).map(({ at }) => at)).toEqual([`/${key}`]);
    expect(Object.keys(Object.prototype)).toEqual([]);
    expect(({} as { polluted?: boolean }).polluted).toBeUndefined();
  });

  it('any mutation of the demo gives a scenario or problems with places, never an exception', () => {
    fc.assert(
      fc.property(
        fc.nat(demoText.length - 1),
        fc.constantFrom('', '"', '{', '}', ',', '1e999', '-', 'null', '[]', '\\', '\u0000', '9'),
        fc.nat(20),
        (place, inserted, removed) => {
          const parsed = parseScenario(demoText.slice(0, place) + inserted + demoText.slice(place + removed));
          if (!parsed.ok) expect(parsed.problems.length).toBeGreaterThan(0);
        },
      ),
      { numRuns: 2000 },
    );
  });
});
