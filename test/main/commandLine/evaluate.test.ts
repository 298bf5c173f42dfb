import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

const DEMO = 'assets/demo/white-base.sunder.json';
let folder = '';

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'sunder-cli-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** The command as a user runs it, without npm in front. */
const evaluate = (...words: string[]) =>
  spawnSync(process.execPath, ['main/commandLine/evaluate.mjs', ...words], { encoding: 'utf8', timeout: 60_000 });

const damaged = (name: string, change: (text: string) => string): string => {
  const path = join(folder, name);
  writeFileSync(path, change(readFileSync(DEMO, 'utf8')));
  return path;
};

describe('evaluate without a window', () => {
  it('prints every result as JSON with units in the keys, the same digits each time', () => {
    const first = evaluate(DEMO, '--format', 'json');
    expect([first.status, first.stderr]).toEqual([0, '']);
    const output = JSON.parse(first.stdout);
    expect(output.formulations).toHaveLength(6);
    const [{ result }] = output.formulations;
    expect(result.medium.debyeLength_m).toBeGreaterThan(0);
    expect(result.pairs[0].features.barrier.energy_kT).toBeGreaterThan(0);
    expect(result.pairs[0].curve).toBeUndefined();
    expect(output.caution).toContain('safety data sheets');
    expect(evaluate(DEMO, '--format', 'json').stdout).toBe(first.stdout);
  });

  it('adds the curves on request, parts adding up to the total', () => {
    const output = JSON.parse(evaluate(DEMO, '--format', 'json', '--curves', '--formulation', 'base').stdout);
    expect(output.formulations).toHaveLength(1);
    const { curve } = output.formulations[0].result.pairs[0];
    curve.total_kT.forEach((total: number, index: number) => {
      const parts = curve.vanDerWaals_kT[index] + curve.doubleLayer_kT[index] + curve.stericLayer_kT[index];
      expect(total).toBe(parts);
    });
  });

  it('prints a table to read and a CSV to calculate with', () => {
    expect(evaluate(DEMO).stdout).toContain('Water, polyacrylate');
    const [header, ...rows] = evaluate(DEMO, '--format', 'csv').stdout.split('\r\n');
    expect(header?.split(',')).toContain('barrier_kT');
    expect(rows.filter((row) => row !== '' && !row.startsWith('#') && !row.startsWith('"#'))).toHaveLength(6);
  });

  it.each([
    [
      'a negative size',
      (text: string) => text.replace('"diameter_nm": 300', '"diameter_nm": -1'),
      '/formulations/0/particles/0/diameter_nm',
    ],
    [
      'a number beyond numbers',
      (text: string) => text.replace('"diameter_nm": 300', '"diameter_nm": 1e400'),
      '/formulations/0/particles/0/diameter_nm',
    ],
    ['a newer file', (text: string) => text.replace('"schema": 1', '"schema": 99'), '/schema'],
    ['a misspelt entry', (text: string) => text.replace('"pH"', '"ph"'), '/formulations/0/pH'],
    ['a truncated file', (text: string) => text.slice(0, 900), 'file: '],
  ])('%s ends with 2 and one message that names the place', (name, change, place) => {
    const { status, stdout, stderr } = evaluate(damaged(`${name}.json`, change));
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr).toContain(place);
    expect(stderr).not.toMatch(/\bat .*\.js:/);
  });

  it('names the formulations when the one asked for is not there, and the use when words are missing', () => {
    expect(evaluate(DEMO, '--formulation', 'nobody')).toMatchObject({ status: 2 });
    expect(evaluate().stderr).toContain('--format json|table|csv');
    expect(evaluate(join(folder, 'nothing.json')).stderr).toContain('cannot be read');
  });
});
