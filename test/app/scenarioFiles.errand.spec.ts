import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { bench, comparisonRow, field } from './bench';
import { type DeskUnderTest, expect, test } from './fixture';

/** Saves under a name, in whichever way this host asks for one. */
async function saveAs(desk: DeskUnderTest, name: string): Promise<string> {
  const path = join(desk.documentsFolder, name);
  if (desk.project !== 'loopback') await desk.answerDialog(path);
  await desk.page.getByRole('button', { name: 'Save as…' }).click();
  if (desk.project === 'loopback') {
    const dialog = desk.page.getByRole('dialog');
    await dialog.getByRole('textbox').fill(name);
    await dialog.getByRole('button', { name: 'Save', exact: true }).click();
  }
  await expect(desk.page.locator('.file-name')).toContainText(name.replace('.sunder.json', ''));
  await expect(desk.page.getByText('not saved')).toHaveCount(0);
  return path;
}

async function open(desk: DeskUnderTest, name: string, { dropping = false } = {}): Promise<void> {
  if (desk.project !== 'loopback') await desk.answerDialog(join(desk.documentsFolder, name));
  await desk.page.getByRole('button', { name: 'Open…' }).click();
  if (dropping) await desk.page.getByRole('button', { name: 'Don’t save' }).click();
  if (desk.project === 'loopback')
    await desk.page.getByRole('dialog').getByText(name.replace('.sunder.json', '')).click();
}

test('a scenario saved and opened after a new start gives the same numbers', async ({ desk }) => {
  await bench(desk);
  await field(desk, 'Zeta potential').fill('-51.25');
  await field(desk, 'Zeta potential').blur();
  await expect(desk.page.getByText('not saved')).toBeVisible();
  const path = await saveAs(desk, 'Mine.sunder.json');
  const numbers = await comparisonRow(desk, 'Water, polyacrylate');
  expect(JSON.parse(readFileSync(path, 'utf8')).formulations[0].particles[0].charge.zeta_mV).toBe(-51.25);

  await desk.reopen();
  await bench(desk);
  expect(await comparisonRow(desk, 'Water, polyacrylate')).not.toEqual(numbers);
  await open(desk, 'Mine.sunder.json');
  await expect(field(desk, 'Zeta potential')).toHaveValue('−51.25');
  await expect.poll(() => comparisonRow(desk, 'Water, polyacrylate')).toEqual(numbers);
});

test('saving again writes the same file, and the title shows what is not saved', async ({ desk }) => {
  await bench(desk);
  const path = await saveAs(desk, 'Again.sunder.json');
  await field(desk, 'Temperature').fill('31');
  await expect.poll(() => desk.page.title()).toMatch(/^\*/);
  await desk.page.keyboard.press('Control+s');
  await expect.poll(() => JSON.parse(readFileSync(path, 'utf8')).formulations[0].temperature_degC).toBe(31);
  await expect.poll(() => desk.page.title()).not.toMatch(/^\*/);
  expect(readdirSync(desk.documentsFolder)).toEqual(['Again.sunder.json']);
});

test('a bad file is refused with its place, and the work stays', async ({ desk }) => {
  await bench(desk);
  await saveAs(desk, 'Good.sunder.json');
  const good = readFileSync(join(desk.documentsFolder, 'Good.sunder.json'), 'utf8');
  writeFileSync(
    join(desk.documentsFolder, 'Bad.sunder.json'),
    good.replace('"diameter_nm": 300', '"diameter_nm": -300'),
  );
  await field(desk, 'Temperature').fill('33');
  // The work is not saved, so the window asks first.
  await open(desk, 'Bad.sunder.json', { dropping: true });
  const trouble = desk.page.getByRole('alert').filter({ hasText: 'could not be opened' });
  await expect(trouble).toContainText('/formulations/0/particles/0/diameter_nm');
  await expect(field(desk, 'Temperature')).toHaveValue('33');
});

test('unsaved work is asked about before it is replaced; Escape cancels', async ({ desk }) => {
  await bench(desk);
  await field(desk, 'Temperature').fill('44');
  await desk.page.getByRole('button', { name: 'New', exact: true }).click();
  const question = desk.page.getByRole('dialog', { name: 'Save your changes?' });
  await expect(question).toBeVisible();
  await desk.page.keyboard.press('Escape');
  await expect(question).toHaveCount(0);
  await expect(field(desk, 'Temperature')).toHaveValue('44');
  await desk.page.getByRole('button', { name: 'New', exact: true }).click();
  await desk.page.getByRole('button', { name: 'Don’t save' }).click();
  await expect(desk.page.getByRole('textbox', { name: 'Title of the scenario' })).toHaveValue('New scenario');
  expect(existsSync(join(desk.documentsFolder, 'New scenario.sunder.json'))).toBe(false);
});

test('a file dropped on the window opens; a picture is refused in words', async ({ desk }) => {
  await bench(desk);
  const drop = (name: string, text: string) =>
    desk.page.evaluate(
      ([file, content]) => {
        const data = new DataTransfer();
        data.items.add(new File([content], file));
        document.querySelector('.window')?.dispatchEvent(new DragEvent('drop', { dataTransfer: data, bubbles: true }));
      },
      [name, text] as const,
    );
  await drop('holiday.png', '\u0089PNG');
  await expect(desk.page.getByRole('alert').filter({ hasText: 'could not be opened' })).toBeVisible();
  await expect(field(desk, 'Zeta potential')).toHaveValue('−45');
});
