import { describe, expect, it } from 'vitest';
import { breachesOfLayers } from './layers';
import { projectSources } from './sources';

const planted = (...files: readonly (readonly [path: string, text: string])[]): readonly string[] =>
  breachesOfLayers(new Map(files));

describe('who may import whom', () => {
  it('is kept by every file of the house', () => {
    const sources = projectSources();
    expect([...sources.keys()].filter((path) => path.startsWith('core/')).length).toBeGreaterThan(10);
    expect(breachesOfLayers(sources)).toEqual([]);
  });

  it.each([
    ['core/evaluate.ts', "import { readFileSync } from 'node:fs';"],
    ['core/evaluate.ts', "import { app } from 'electron';"],
    ['core/evaluate.ts', "import { signal } from '@preact/signals';"],
    ['core/evaluate.ts', "import { App } from '../renderer/views/App';"],
    ['core/evaluate.ts', "import type { Desk } from '../main/bridge/contract';"],
    ['core/evaluate.ts', "import { parse } from 'mathjs/number';"],
    ['core/evaluate.ts', "import { readQuantity } from './quantities/readQuantity';"],
    ['core/evaluate.ts', "import { debyeLength } from './doubleLayer/debyeLength.ts';"],
    ['core/evaluate.ts', 'export const later = (name: string) => import(name);'],
    ['core/evaluate.ts', "export type Later = import('./problem').Problem;"],
    ['core/evaluate.ts', "export * from '../main/files/write';"],
    ['core/evaluate.ts', "const fs = await import('node:fs');"],
    ['core/evaluate.ts', 'import {'],
    ['core/quantities/units.ts', "import { parse } from 'mathjs';"],
    ['core/quantities/convert.ts', "import { amountFrom } from './arithmetic';"],
    ['core/quantities/arithmetic.ts', "import { all } from 'mathjs';"],
    ['core/quantities/convert.ts', "import { water } from '../materials/water';"],
    ['core/vanDerWaals/hamakerSpheres.ts', "import { debyeLength } from '../doubleLayer/debyeLength';"],
    ['core/doubleLayer/debyeLength.ts', "import type { Layer } from '../stericLayer/overlap';"],
    ['core/stericLayer/overlap.ts', "import { hamakerSpheres } from '../vanDerWaals/hamakerSpheres';"],
    ['core/stericLayer/overlap.ts', "import { pairCurve } from '../pairEnergy/pairCurve';"],
    ['core/numerics/roots.ts', "import { BOLTZMANN_J_K } from '../materials/water';"],
    ['core/constants.ts', "import { findMaterial } from './materials/catalogue';"],
    ['main/files/write.ts', "import { render } from 'preact';"],
    ['main/files/write.ts', "import type { View } from '../../renderer/views/App';"],
    ['main/loopback/serve.ts', "import { app } from 'electron';"],
    ['main/commandLine/build.mjs', "import { evaluate } from '../../core/evaluate';"],
    ['main/commandLine/evaluate.ts', "import { build } from 'vite';"],
    ['renderer/views/App.tsx', "import { Chart } from 'chart.js';"],
    ['renderer/views/App.tsx', "import { handlers } from '../../main/bridge/handlers';"],
    ['renderer/views/App.tsx', "import { CHANNELS } from '../../main/bridge/contract';"],
    ['renderer/views/App.tsx', "import type { Handlers } from '../../main/bridge/handlers';"],
    ['renderer/views/App.tsx', "import { readFile } from 'node:fs/promises';"],
    ['renderer/views/App.tsx', "import fc from 'fast-check';"],
    ['renderer/state/workbench.ts', "import { evaluate } from '../../core/evaluate';"],
  ])('a planted breach in %s is found: %s', (path, text) => {
    expect(planted([path, text]).join()).toContain(path);
  });

  it.each([
    ['core/evaluate.ts', "import { debyeLength } from './doubleLayer/debyeLength';"],
    ['core/quantities/arithmetic.ts', "import { create } from 'mathjs/number';"],
    ['core/quantities/readQuantity.ts', "import { amountFrom } from './arithmetic';"],
    ['main/electron/main.ts', "import { app } from 'electron';\nimport { join } from 'node:path';"],
    [
      'main/commandLine/build.mjs',
      "import { build } from 'vite';\nawait import(new URL('../x.js', import.meta.url).href);",
    ],
    ['renderer/worker/evaluate.worker.ts', "import { evaluate } from '../../core/evaluate';"],
    ['renderer/charts/lineChart.ts', "import { Chart } from 'chart.js';"],
    ['renderer/views/App.tsx', "import type { Desk } from '../../main/bridge/contract';\nimport './app.css';"],
    ['renderer/worker/pool.ts', "import worker from './evaluate.worker?worker&url';"],
  ])('what is allowed in %s passes: %s', (path, text) => {
    expect(planted([path, text])).toEqual([]);
  });

  it('finds a cycle, and names its way round', () => {
    expect(
      planted(
        ['core/evaluate.ts', "import { a } from './medium/a';"],
        ['core/medium/a.ts', "import { b } from './b';"],
        ['core/medium/b.ts', "import type { A } from './a';"],
      ),
    ).toEqual(['import cycle: core/medium/a → core/medium/b → core/medium/a']);
  });
});
