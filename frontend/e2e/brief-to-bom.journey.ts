import { readFileSync } from 'node:fs';
import type { Page } from '@playwright/test';
import { expect, test } from './fixtures';

/** The demo brief every newcomer opens first. */
const WINCH = /37\.5 : 1 kelp-line winch/;

async function openWinch(page: Page): Promise<void> {
  await page.goto('/briefs?text=kelp-line');
  await page.getByRole('gridcell', { name: WINCH }).click();
  await expect(page.getByRole('heading', { level: 1, name: WINCH })).toBeVisible();
}

async function searchWinch(page: Page): Promise<void> {
  await openWinch(page);
  const found = page.getByRole('grid', { name: 'Options' });
  await page.getByRole('button', { name: /^Search( again)?$/ }).click();
  await expect(page.getByText(/Every combination settled/)).toBeVisible({ timeout: 40_000 });
  await expect(found).toBeVisible();
}

const isRising = (figures: number[]): boolean =>
  figures.every((figure, at) => at === 0 || figure >= (figures[at - 1] ?? 0));

test.describe.serial('from the winch brief to its spreadsheet', () => {
  test.use({ role: 'designer' });

  test('searches, compares, adopts and downloads', async ({ page }) => {
    test.slow();
    await searchWinch(page);
    const rows = page.getByRole('grid', { name: 'Options' }).getByRole('row');

    // Two and three stages are drawn; one stage is out and the page says why.
    await expect(page.getByRole('img', { name: /^Two stages/ }).first()).toBeVisible();
    await expect(page.getByRole('img', { name: /^Three stages/ }).first()).toBeVisible();
    const whyNot = page.getByRole('heading', { name: 'Why not one stage' });
    await expect(whyNot).toBeVisible();
    await expect(whyNot.locator('xpath=following-sibling::p')).toContainText(/\d/);

    // Only two stages, the lightest first; the address holds both.
    await page.getByRole('button', { name: '2 stages' }).click();
    await page.getByRole('button', { name: 'Mass kg' }).click();
    await expect(page).toHaveURL(/stages=2/);
    await expect(page).toHaveURL(/sort=mass/);
    await expect(page.getByRole('img', { name: /^Three stages/ })).toHaveCount(0);
    const masses = async () => (await rows.locator('td:nth-child(8)').allTextContents()).map(Number);
    expect((await masses()).length).toBeGreaterThan(2);
    await expect.poll(async () => isRising(await masses())).toBe(true);

    // One of each count, side by side.
    await page.getByRole('checkbox', { name: /^Pin/ }).first().check();
    await page.goto(page.url().replace(/\?.*/, '?stages=3'));
    await page.getByRole('checkbox', { name: /^Pin/ }).first().check();
    await expect(page.getByText('2 pinned')).toBeVisible();
    await page.getByRole('link', { name: 'Compare side by side' }).click();
    const table = page.getByRole('table', { name: 'Options side by side' });
    await expect(table.getByText('better').first()).toBeVisible();
    await expect(page.getByText(/^Three stages \(.*instead of two stages/)).toBeVisible();
    const before = await table.getByRole('row').count();
    await page.getByRole('switch', { name: 'Differences only' }).click();
    await expect.poll(() => table.getByRole('row').count()).toBeLessThan(before);

    await page.getByRole('button', { name: 'Adopt as train' }).first().click();
    await page.getByLabel('Title of the train').fill('Winch for the journey');
    await page.getByRole('button', { name: 'Adopt', exact: true }).click();
    await expect(page).toHaveURL(/\/trains\/T-\d{4}/);
    await expect(page.getByRole('heading', { level: 1, name: /Winch for the journey/ })).toBeVisible();
    const code = /T-\d{4}/.exec(page.url())?.[0] ?? '';

    await page.getByRole('tab', { name: 'Stages' }).click();
    await expect(page.getByRole('img', { name: /contact runs from A to E/ })).toBeVisible();
    await page.getByRole('tab', { name: 'Bill of materials' }).click();
    await expect(page.getByRole('table', { name: 'Bill of materials' }).getByRole('row')).not.toHaveCount(1);
    const waiting = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Download BOM (.xlsx)' }).click();
    const download = await waiting;
    expect(download.suggestedFilename()).toMatch(new RegExp(`${code}.*\\.xlsx$`));
    const file = readFileSync(await download.path());
    // A workbook is a zip archive.
    expect(file.subarray(0, 2).toString()).toBe('PK');
    expect(file.length).toBeGreaterThan(5000);
  });

  test('changes a title and a shaft, and the record tells', async ({ page }) => {
    await page.goto('/trains?text=Winch for the journey');
    await page.getByRole('gridcell', { name: 'Winch for the journey' }).click();
    await page.getByRole('tab', { name: 'Record' }).click();
    await page.getByLabel('Title').fill('Winch, port side');
    await page.getByRole('button', { name: 'Save' }).click();
    await expect(page.getByRole('heading', { level: 1, name: /Winch, port side/ })).toBeVisible();
    await expect(page.getByRole('table', { name: 'Changes' }).getByRole('row')).toHaveCount(3);
    await page.getByRole('tab', { name: 'Drawing' }).click();
    await page.getByRole('button', { name: 'Change diameters' }).click();
    const output = page.getByLabel(/^Shaft \d, output: diameter, mm$/);
    await output.fill('900');
    await page.getByRole('button', { name: 'Save diameters' }).click();
    await expect(page.getByText(/from 2 to 500 mm/).first()).toBeVisible();
    await expect(output).toHaveValue('900');
    await output.fill('35');
    await page.getByRole('button', { name: 'Save diameters' }).click();
    await expect(page.getByText('chosen', { exact: true })).toBeVisible();
  });
});
