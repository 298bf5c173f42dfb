// `npm test`: every check of the project, one line a stage, the sum on the last line.
import { spawn } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { browserArguments, ensureBrowser, findInPath, installedByApt } from './app/browser.mjs';

const root = fileURLToPath(new URL('../', import.meta.url));
const results = join(root, 'test-results');
const tool = (...path) => join(root, 'node_modules', ...path);

const tally = { passed: 0, failed: 0 };
/** Process groups that are running now: ended with this process, however it ends. */
const running = new Set();

function endGroup(child, signal) {
  if (child.pid === undefined) return;
  try {
    if (process.platform === 'win32') child.kill(signal);
    else process.kill(-child.pid, signal);
  } catch {
    // Nothing of the group is left.
  }
}

process.on('exit', () => {
  for (const child of running) endGroup(child, 'SIGKILL');
});
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => process.exit(130));

function start(command, commandArguments, env) {
  const child = spawn(command, commandArguments, {
    cwd: root,
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: process.platform !== 'win32',
    env: { ...process.env, NO_COLOR: '1', FORCE_COLOR: undefined, ...env },
  });
  running.add(child);
  return child;
}

/** Runs one Node script; what it started is gone when this returns. */
function run(script, scriptArguments, { timeout_s, env = {} }) {
  return new Promise((resolve) => {
    const child = start(process.execPath, [script, ...scriptArguments], env);
    let output = '';
    let late = false;
    const collect = (piece) => {
      output += piece;
    };
    child.stdout.setEncoding('utf8').on('data', collect);
    child.stderr.setEncoding('utf8').on('data', collect);
    const timer = setTimeout(() => {
      late = true;
      output += `\nStopped after ${timeout_s} s.\n`;
      endGroup(child, 'SIGKILL');
    }, timeout_s * 1000);
    // 'exit' before 'close': a grandchild may hold the pipes open until its group is ended.
    child.on('exit', () => endGroup(child, 'SIGKILL'));
    child.on('error', (error) => collect(`${error.message}\n`));
    child.on('close', (code) => {
      clearTimeout(timer);
      running.delete(child);
      resolve({ well: code === 0 && !late, output });
    });
  });
}

/** Long output is cut in the middle: the first faults and the sum at the end are what counts. */
const MAX_OUTPUT = 12_000;
const cut = (text) =>
  text.length <= MAX_OUTPUT ? text : `${text.slice(0, MAX_OUTPUT / 2)}\n…\n${text.slice(-MAX_OUTPUT / 2)}`;

const say = (line) => process.stdout.write(`${line}\n`);

/** A stage gives how much passed and failed, what to print when something failed, and what was left out. */
async function stage(name, work) {
  const begun_ms = performance.now();
  const {
    passed,
    failed,
    output = '',
    left = [],
    note = '',
  } = await work().catch((error) => ({
    passed: 0,
    failed: 1,
    output: error instanceof Error ? error.message : String(error),
  }));
  tally.passed += passed;
  tally.failed += failed;
  const seconds = ((performance.now() - begun_ms) / 1000).toFixed(1);
  const counts = passed + failed > 0 ? `${passed} passed, ${failed} failed` : note;
  say(`${failed === 0 ? 'ok    ' : 'FAILED'} ${name.padEnd(8)} ${`${seconds} s`.padStart(8)}  ${counts}`);
  for (const line of left) say(`         not run: ${line}`);
  if (failed > 0) say(cut(output.trimEnd()));
  return failed === 0;
}

/** The same fault shows in every room that uses the file: each line once. */
const inTurn = (outputs) => [...new Set(outputs.flatMap((output) => output.trim().split('\n')))].join('\n');

async function types() {
  const waiting = ['core', 'main', 'renderer', 'test'];
  const ended = [];
  const worker = async () => {
    for (let room = waiting.shift(); room !== undefined; room = waiting.shift()) {
      ended.push(await run(tool('typescript', 'bin', 'tsc'), ['-p', room, '--pretty', 'false'], { timeout_s: 180 }));
    }
  };
  await Promise.all([worker(), worker()]);
  const bad = ended.filter(({ well }) => !well);
  return { passed: ended.length - bad.length, failed: bad.length, output: inTurn(bad.map(({ output }) => output)) };
}

async function style() {
  const biome = ['check', '--error-on-warnings', '--max-diagnostics=15', '.'];
  const { well, output } = await run(tool('@biomejs', 'biome', 'bin', 'biome'), biome, { timeout_s: 120 });
  return { passed: well ? 1 : 0, failed: well ? 0 : 1, output };
}

function reportIn(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return null;
  }
}

const firstLines = (text) =>
  text
    .split('\n')
    .slice(0, 12)
    .map((line) => `    ${line.slice(0, 300)}`)
    .join('\n');

/** A runner that ended badly without naming a failed test has failed all the same. */
const atLeastOne = (failed, well) => (well ? failed : Math.max(failed, 1));

async function units() {
  const file = join(results, 'units.json');
  const vitest = ['run', '--reporter=json', `--outputFile.json=${file}`];
  const { well, output } = await run(tool('vitest', 'vitest.mjs'), vitest, { timeout_s: 1200 });
  const report = reportIn(file);
  if (report === null) return { passed: 0, failed: 1, output };
  const assertions = report.testResults.flatMap(({ assertionResults, name }) =>
    assertionResults.map((one) => ({ ...one, file: relative(root, name) })),
  );
  const bad = assertions.filter(({ status }) => status === 'failed');
  const unread = report.testResults.filter((one) => one.status === 'failed' && one.assertionResults.length === 0);
  const faults = [
    ...bad.map((one) => `${one.file}: ${one.fullName}\n${firstLines(one.failureMessages.join('\n'))}`),
    ...unread.map((one) => `${relative(root, one.name)} cannot be run\n${firstLines(one.message)}`),
  ];
  return {
    passed: report.numPassedTests,
    failed: atLeastOne(faults.length, well),
    output: faults.length > 0 ? faults.join('\n\n') : output,
    left: assertions.filter(({ status }) => status !== 'passed' && status !== 'failed').map((one) => one.fullName),
  };
}

/** Every test of a Playwright report with the reason for which it was left out, if it was. */
function* testsIn(suites) {
  for (const suite of suites) {
    for (const spec of suite.specs ?? []) yield* spec.tests;
    yield* testsIn(suite.suites ?? []);
  }
}

async function app(env) {
  const file = join(results, 'app.json');
  const { well, output } = await run(
    tool('@playwright', 'test', 'cli.js'),
    ['test', '--config', join(root, 'test', 'app', 'playwright.config.ts'), '--reporter=list,json'],
    { timeout_s: 1800, env: { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: file } },
  );
  const report = reportIn(file);
  if (report === null) return { passed: 0, failed: 1, output };
  const reasons = new Map();
  for (const { status, projectName, annotations } of testsIn(report.suites)) {
    if (status !== 'skipped') continue;
    const why = annotations.find(({ type }) => type === 'skip')?.description ?? 'no reason given';
    const key = `${projectName}: ${why}`;
    reasons.set(key, (reasons.get(key) ?? 0) + 1);
  }
  return {
    passed: report.stats.expected,
    failed: atLeastOne(report.stats.unexpected + report.stats.flaky, well),
    output: `${output}\n${report.errors.map(({ message }) => message).join('\n')}`,
    left: [...reasons].map(([why, count]) => `${count} × ${why}`),
  };
}

const needsDisplay = process.platform === 'linux' && !process.env.DISPLAY && !process.env.WAYLAND_DISPLAY;

/** A display in memory for real windows. Resolves to its name, or null where there is none: the specs then say so. */
async function displayInMemory() {
  if (findInPath('Xvfb') === null && !((await installedByApt('xvfb')) && findInPath('Xvfb') !== null)) return null;
  const child = start('Xvfb', ['-displayfd', '1', '-screen', '0', '1440x960x24', '-nolisten', 'tcp'], {});
  return new Promise((resolve) => {
    const timer = setTimeout(() => resolve(null), 20_000);
    const settle = (name) => {
      clearTimeout(timer);
      resolve(name);
    };
    let text = '';
    child.stdout.setEncoding('utf8').on('data', (piece) => {
      text += piece;
      if (text.includes('\n')) settle(`:${text.trim()}`);
    });
    child.stderr.resume();
    child.on('error', () => settle(null));
    child.on('exit', () => {
      running.delete(child);
      settle(null);
    });
  });
}

async function builtApp() {
  const env = {};
  const hasBrowser = await stage('browser', async () => {
    env.SUNDER_BROWSER = await ensureBrowser();
    env.SUNDER_BROWSER_ARGUMENTS = browserArguments().join(' ');
    if (!needsDisplay) return { passed: 0, failed: 0, note: env.SUNDER_BROWSER };
    const display = await displayInMemory();
    if (display !== null) env.DISPLAY = display;
    return {
      passed: 0,
      failed: 0,
      note: env.SUNDER_BROWSER,
      left: display === null ? ['tests in a real window, for want of a display. Run: apt-get install -y xvfb'] : [],
    };
  });
  const isBuilt = await stage('build', async () => {
    const { well, output } = await run(join(root, 'main', 'commandLine', 'build.mjs'), [], { timeout_s: 300 });
    return { passed: 0, failed: well ? 0 : 1, output, note: 'built' };
  });
  if (hasBrowser && isBuilt) await stage('app', () => app(env));
  else say('         not run: the tests of the built app, for the reason above');
}

rmSync(results, { recursive: true, force: true });
mkdirSync(results, { recursive: true });
await stage('types', types);
await stage('style', style);
await stage('units', units);
await builtApp();
for (const child of running) endGroup(child, 'SIGKILL');
say(`${tally.passed} passed, ${tally.failed} failed`);
process.exit(tally.failed > 0 || tally.passed === 0 ? 1 : 0);
