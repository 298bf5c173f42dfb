import { describe, expect, it } from 'vitest';
import { longFiles, strangersAtTheTop, unfinishedWork, unsafePage, vagueFiles } from './files';
import { projectSources, topLevelNames } from './sources';

const sources = projectSources();
const planted = (path: string, text: string) => new Map([[path, text]]);

describe('files stay short', () => {
  it('everywhere in the house', () => {
    expect(longFiles(sources)).toEqual([]);
  });

  it('and a long one is found, tables of materials excepted', () => {
    expect(longFiles(planted('core/evaluate.ts', '\n'.repeat(401)))).toEqual(['core/evaluate.ts: 401 lines']);
    expect(longFiles(planted('core/evaluate.ts', '\n'.repeat(400)))).toEqual([]);
    expect(longFiles(planted('core/materials/sources.ts', '\n'.repeat(900)))).toEqual([]);
  });
});

describe('the top of the project', () => {
  it('holds the agreed names and no others', () => {
    expect(strangersAtTheTop(topLevelNames())).toEqual([]);
  });

  it('and a stranger is found', () => {
    expect(strangersAtTheTop(['core', 'scratch.mjs', '.env'])).toEqual(['scratch.mjs', '.env']);
  });
});

describe('nothing is left half done', () => {
  it('in any file', () => {
    expect(unfinishedWork(sources)).toEqual([]);
  });

  it.each([
    `// ${'TO'}DO later`,
    `/* ${'FIX'}ME */`,
    `from the ${'lec'}ture`,
    `the ${'Tran'}scripts say`,
    `const a = b as ${'any'};`,
    `// @ts-${'ignore'}`,
    `// @ts-${'expect'}-error`,
    `it.${'skip'}('works', () => {});`,
    `test.${'only'}('works', () => {});`,
    `describe.${'skip'}(\`all\`, () => {});`,
    `it.${'skip'}.each([1])('a', () => {});`,
    `test.${'fixme'}('works', () => {});`,
  ])('a planted %s is found', (line) => {
    expect(unfinishedWork(planted('test/core/a.test.ts', `fine\n${line}`))).toHaveLength(1);
  });

  it.each(["read: 'transcription',", 'has as anything', 'base.skip(binary === undefined, reason);'])(
    '%s passes',
    (line) => {
      expect(unfinishedWork(planted('core/a.ts', line))).toEqual([]);
    },
  );
});

describe('the page is safe by its text', () => {
  it('in every file of the renderer', () => {
    expect(unsafePage(sources)).toEqual([]);
  });

  it.each([
    '<input type="number" />',
    "<input type={'number'} />",
    '<p dangerouslySetInnerHTML={{ __html: text }} />',
    'node.innerHTML = text;',
    "node.insertAdjacentHTML('beforeend', text);",
    'eval(text);',
    "const help = 'https://example.org';",
    "const socket = 'ws://127.0.0.1';",
    "fetch('//example.org');",
  ])('a planted %s is found', (line) => {
    expect(unsafePage(planted('renderer/views/App.tsx', line))).toHaveLength(1);
  });

  it.each([
    '<input type="text" inputmode="decimal" />',
    "document.createElementNS('http://www.w3.org/2000/svg', 'path');",
  ])('%s passes', (line) => {
    expect(unsafePage(planted('renderer/views/App.tsx', line))).toEqual([]);
  });
});

describe('names say what a file holds', () => {
  it('everywhere in the house', () => {
    expect(vagueFiles(sources)).toEqual([]);
  });

  it.each([
    ['core/utils.ts', ''],
    ['renderer/views/index.tsx', ''],
    ['core/medium/all.ts', "export * from './water';"],
  ])('a planted %s is found', (path, text) => {
    expect(vagueFiles(planted(path, text))).toHaveLength(1);
  });
});
