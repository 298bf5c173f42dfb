import { pageHeaders } from '../../main/bridge/contentPolicy';
import { expect, test } from './fixture';

const FOREIGN = 'https://foreign.example/collect';

test('the policy comes with the page and loads nothing from elsewhere', async ({ sharedDesk: desk }) => {
  const headers = await desk.page.evaluate(async () => Object.fromEntries((await fetch('./index.html')).headers));
  for (const [name, value] of Object.entries(pageHeaders)) expect(headers[name.toLowerCase()]).toBe(value);
  const policy = headers['content-security-policy'];
  expect(policy).toContain("default-src 'none'");
  expect(policy).toContain("script-src 'self'");
  expect(policy).not.toMatch(/unsafe|https?:|\*/);
});

test('an inline script does not run', async ({ sharedDesk: desk }) => {
  const ran = await desk.page.evaluate(() => {
    const script = document.createElement('script');
    script.append('window.planted = true;');
    document.body.append(script);
    return 'planted' in window;
  });
  expect(ran).toBe(false);
  // Refused for being inline, or even before that as text that nobody vouched for.
  await expect.poll(() => desk.violations.join()).toMatch(/^(script-src|require-trusted-types-for)/);
});

test('text is not run as code', async ({ sharedDesk: desk }) => {
  // From a timer: a call made by the test itself would be excused from the policy.
  const outcome = await desk.page.evaluate(
    () =>
      new Promise<unknown>((resolve) => {
        setTimeout(() => {
          try {
            resolve(Reflect.get(globalThis, 'eval')('1 + 1'));
          } catch (error) {
            resolve(error instanceof Error ? error.name : 'thrown');
          }
        });
      }),
  );
  expect(outcome).toBe('EvalError');
});

test('nothing is fetched from elsewhere', async ({ sharedDesk: desk }) => {
  const outcomes = await desk.page.evaluate(async (address) => {
    const image = new Image();
    const shown = new Promise((resolve) => {
      image.onload = () => resolve('loaded');
      image.onerror = () => resolve('refused');
    });
    image.src = `${address}.png`;
    const fetched = await fetch(address).then(
      () => 'fetched',
      () => 'refused',
    );
    return [fetched, await shown];
  }, FOREIGN);
  expect(outcomes).toEqual(['refused', 'refused']);
  await expect.poll(() => desk.violations.filter((text) => text.includes('foreign.example')).length).toBe(2);
});

test('no address leads out of the folder of the page', async ({ sharedDesk: desk }) => {
  const statuses = await desk.page.evaluate(
    (paths) =>
      Promise.all(
        paths.map((path) =>
          fetch(path)
            .then((answer) => answer.status)
            .catch(() => 0),
        ),
      ),
    [
      '/index.html',
      '/..%2fmain/main.js',
      '/%2e%2e/%2e%2e/package.json',
      '/..%5c..%5cpackage.json',
      '/assets/..%00.js',
      '/assets/..%2f..%2fmain%2fpreload.cjs',
      '/%252e%252e/package.json',
      '/index.html::$DATA',
      '/%E0%A4%A',
      '/assets/',
      '//etc/passwd',
    ],
  );
  expect(statuses[0]).toBe(200);
  expect(statuses.slice(1).filter((status) => status !== 404 && status !== 0)).toEqual([]);
});

test('a start asks for nothing outside the app', async ({ sharedDesk: desk }) => {
  const own = new URL(desk.page.url()).origin;
  await desk.page.reload();
  await expect.poll(() => desk.page.evaluate(() => 'desk' in window)).toBe(true);
  expect(desk.requests.length).toBeGreaterThan(0);
  const foreign = desk.requests.filter(
    (url) => !url.startsWith('app://bundle/') && !url.startsWith(`${own}/`) && !/^(data|blob):/.test(url),
  );
  expect(foreign).toEqual([]);
});
