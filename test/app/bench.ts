import type { Locator } from '@playwright/test';
import { type DeskUnderTest, expect } from './fixture';

/** The regions of the window, once the first verdict is there. */
export async function bench({ page }: DeskUnderTest) {
  const verdict = page.getByRole('region', { name: /^Verdict on/ });
  await expect(verdict.getByRole('listitem').first()).toBeVisible({ timeout: 20_000 });
  return {
    verdict,
    verdictLines: page.locator('.verdict-line'),
    candidates: page.getByRole('region', { name: 'Candidates' }),
    recipe: page.getByRole('region', { name: /^Recipe of/ }),
  };
}

/** A field by its label. */
export const field = ({ page }: DeskUnderTest, label: string): Locator =>
  page.getByRole('textbox', { name: label, exact: true });

/** The cells of one candidate in the comparison, as shown. */
export async function comparisonRow({ page }: DeskUnderTest, name: string): Promise<readonly string[]> {
  const row = page
    .getByRole('table', { name: 'Comparison of all candidates' })
    .getByRole('row')
    .filter({
      has: page.getByRole('button', { name, exact: true }),
    });
  return row.getByRole('cell').allTextContents();
}

const BARRIER_CELL = 4;

/** The barrier in the comparison; a candidate without one counts as zero. */
export async function barrierOf(desk: DeskUnderTest, name: string): Promise<number> {
  const cells = await comparisonRow(desk, name);
  const value = Number((cells[BARRIER_CELL] ?? '').replace('−', '-'));
  return Number.isFinite(value) ? value : 0;
}
