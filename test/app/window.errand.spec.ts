import { copyFileSync, mkdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { bench, comparisonRow, field } from './bench';
import { type DeskUnderTest, expect, test } from './fixture';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

interface Finding {
  readonly id: string;
  readonly nodes: readonly { readonly html: string }[];
}

/** Faults against WCAG 2.2 AA, as axe-core sees them. */
async function accessibilityFaults({ page }: DeskUnderTest): Promise<readonly string[]> {
  // Put in by evaluate: the content policy stops a script tag.
  await page.evaluate(axeSource);
  const violations = await page.evaluate<readonly Finding[]>(`axe.run({
    runOnly: ['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa']
  }).then((result) => result.violations.map(({ id, nodes }) => ({ id, nodes: nodes.map(({ html }) => ({ html })) })))`);
  return violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html.slice(0, 160)}`));
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`no accessibility faults in the window, its tabs and dialogs, ${colorScheme}`, async ({ desk }) => {
    await desk.page.emulateMedia({ colorScheme });
    await bench(desk);
    expect(await accessibilityFaults(desk)).toEqual([]);
    for (const tab of ['Key points', 'Hamaker constant', 'Double layer', 'Recipe converted']) {
      await desk.page.getByRole('tab', { name: tab }).click();
      expect(await accessibilityFaults(desk), tab).toEqual([]);
    }
    for (const dialog of ['About', 'Keys']) {
      await desk.page.getByRole('button', { name: dialog, exact: true }).click();
      expect(await accessibilityFaults(desk), dialog).toEqual([]);
      await desk.page.keyboard.press('Escape');
      await expect(desk.page.getByRole('dialog')).toHaveCount(0);
    }
  });
}

test('the keyboard alone reaches the salt, changes it and reads the curve off', async ({ desk }) => {
  const { page } = desk;
  await bench(desk);
  const before = await comparisonRow(desk, 'Water, polyacrylate');
  const concentration = field(desk, 'Concentration');
  for (let step = 0; step < 150; step += 1) {
    await page.keyboard.press('Tab');
    if (await concentration.evaluate((element) => element === document.activeElement)) break;
  }
  await expect(concentration).toBeFocused();
  await page.keyboard.press('Control+a');
  await page.keyboard.type('40');
  await page.keyboard.press('Enter');
  await expect.poll(() => comparisonRow(desk, 'Water, polyacrylate')).not.toEqual(before);
  const cursor = page.getByRole('slider', { name: 'Read-out: gap between the surfaces' });
  for (let step = 0; step < 150; step += 1) {
    await page.keyboard.press('Tab');
    if (await cursor.evaluate((element) => element === document.activeElement)) break;
  }
  await expect(cursor).toBeFocused();
  await page.keyboard.press('PageUp');
  await expect(page.locator('.read-out')).toContainText('kT');
  await expect(page.locator('.read-out')).toContainText('J');
});

test('everything is reachable at 200 % on a small screen', async ({ desk }) => {
  await bench(desk);
  await desk.page.setViewportSize({ width: 640, height: 400 });
  // The chart takes its new width in the frame after.
  await expect
    .poll(() => desk.page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth))
    .toBeLessThanOrEqual(0);
  for (const name of ['Add candidate', 'Copy table', 'Add salt']) {
    await desk.page.getByRole('button', { name }).scrollIntoViewIfNeeded();
    await expect(desk.page.getByRole('button', { name })).toBeInViewport();
  }
});

test('pictures of the window, for README and for the eye', { tag: '@loopback' }, async ({ desk }, info) => {
  const { page } = desk;
  await bench(desk);
  await page.setViewportSize({ width: 1280, height: 800 });
  const light = info.outputPath('light.png');
  await page.screenshot({ path: light });
  await page.emulateMedia({ colorScheme: 'dark' });
  await page.screenshot({ path: info.outputPath('dark.png') });
  await page.emulateMedia({ colorScheme: 'light' });
  await page.setViewportSize({ width: 1920, height: 1080 });
  await page.screenshot({ path: info.outputPath('wide.png') });
  await page.setViewportSize({ width: 640, height: 400 });
  await page.screenshot({ path: info.outputPath('narrow.png'), fullPage: true });
  if (process.env.SUNDER_UPDATE_PICTURES === '1') {
    mkdirSync('assets/readme', { recursive: true });
    copyFileSync(light, 'assets/readme/window.png');
  }
  await expect(page.locator('.verdict-line')).toHaveCount(3);
});
