import { barrierOf, bench, field } from './bench';
import { expect, test } from './fixture';

test('the demo opens with a verdict on every candidate', async ({ desk }) => {
  const { page } = desk;
  const { candidates, verdictLines } = await bench(desk);
  await expect(candidates.getByRole('listitem')).toHaveCount(6);
  await expect(verdictLines).toHaveCount(3);
  await expect(candidates.getByText('Calculating…')).toHaveCount(0);
  for (const words of ['Should hold', 'Borderline', 'Expect failure']) {
    await expect(candidates.getByText(words).first()).toBeVisible();
  }
  expect(await page.title()).toContain('Sunder');
  expect(desk.violations).toEqual([]);
});

test('salt typed with its unit lowers the barrier at once', async ({ desk }) => {
  await bench(desk);
  const before = await barrierOf(desk, 'Water, polyacrylate');
  await field(desk, 'Concentration').fill('0,02 mol/L');
  await expect.poll(() => barrierOf(desk, 'Water, polyacrylate')).toBeLessThan(before);
  await expect(desk.page.getByText('= 20 mM', { exact: false })).toBeVisible();
  await field(desk, 'Concentration').blur();
  await expect(field(desk, 'Concentration')).toHaveValue('20');
});

test('a slip of the pen is explained at its field and leaves the last result standing', async ({ desk }) => {
  await bench(desk);
  const before = await barrierOf(desk, 'Water, polyacrylate');
  const diameter = field(desk, 'Diameter');
  for (const text of ['-5 nm', '5 mV', '1e400', 'abc', 'NaN']) {
    await diameter.fill(text);
    await expect(diameter).toHaveAttribute('aria-invalid', 'true');
    await expect(desk.page.locator('.field-error').first()).toBeVisible();
  }
  expect(await barrierOf(desk, 'Water, polyacrylate')).toBe(before);
  await expect(diameter).toHaveValue('NaN');
  await diameter.press('Escape');
  await expect(diameter).toHaveValue('300');
});

test('a charged particle without ions is refused in words, the others go on', async ({ desk }) => {
  const { candidates, verdict } = await bench(desk);
  await desk.page.getByRole('button', { name: 'Remove salt 1' }).click();
  await desk.page.getByLabel('The medium has a pH').uncheck();
  await expect(verdict.getByText('A charged particle needs ions around it', { exact: false })).toBeVisible();
  await expect(candidates.getByText('Needs mending')).toHaveCount(1);
  await expect(candidates.getByText('Should hold').first()).toBeVisible();
});

test('a duplicate shows what differs from its base', async ({ desk }) => {
  const { candidates } = await bench(desk);
  await desk.page.getByRole('button', { name: 'Duplicate', exact: true }).click();
  await expect(candidates.getByRole('listitem')).toHaveCount(7);
  await expect(candidates.getByText('from “Water, polyacrylate”, 0 differences')).toBeVisible();
  await field(desk, 'Temperature').fill('40');
  await expect(candidates.getByText('from “Water, polyacrylate”, 1 difference')).toBeVisible();
  await expect(desk.page.getByText('was 25')).toBeVisible();
});

test('every step can be undone and done again', async ({ desk }) => {
  const { candidates } = await bench(desk);
  const before = await barrierOf(desk, 'Water, polyacrylate');
  await field(desk, 'Zeta potential').fill('-60');
  await field(desk, 'Zeta potential').blur();
  await expect.poll(() => barrierOf(desk, 'Water, polyacrylate')).toBeGreaterThan(before);
  await desk.page.getByRole('button', { name: 'Add candidate' }).click();
  await expect(candidates.getByRole('listitem')).toHaveCount(7);
  await desk.page.keyboard.press('Control+z');
  await expect(candidates.getByRole('listitem')).toHaveCount(6);
  await desk.page.keyboard.press('Control+z');
  await expect.poll(() => barrierOf(desk, 'Water, polyacrylate')).toBe(before);
  await expect(desk.page.getByRole('button', { name: 'Undo' })).toBeDisabled();
  await desk.page.keyboard.press('Control+Shift+z');
  await expect.poll(() => barrierOf(desk, 'Water, polyacrylate')).toBeGreaterThan(before);
});

test('in a field Ctrl+Z undoes typing first, then the last step', async ({ desk }) => {
  await bench(desk);
  const temperature = field(desk, 'Temperature');
  await temperature.fill('31');
  await temperature.press('Enter');
  await temperature.press('End');
  await temperature.pressSequentially('5');
  await expect(temperature).toHaveValue('315');
  await temperature.press('Control+z');
  await expect(temperature).not.toHaveValue('315');
  await temperature.press('Escape');
  await temperature.press('Control+z');
  await expect(temperature).toHaveValue('25');
});

test('another material is found by a part of its name', async ({ desk }) => {
  await bench(desk);
  const material = desk.page.getByRole('combobox', { name: 'Material' });
  await material.click();
  await material.fill('zinc ox');
  await material.press('Enter');
  await expect(material).toHaveValue(/Zinc oxide/);
  await expect(desk.page.getByText('Undo')).toBeEnabled();
});
