import { readFileSync } from 'node:fs';
import type { Page } from '@playwright/test';
import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';

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

test.describe.serial('from the winch brief to its spreadsheet', () => {
  test.describe('as designer', () => {
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
      const masses = await rows.locator('td:nth-child(8)').allTextContents();
      const numbers = masses.map(Number);
      expect(numbers.length).toBeGreaterThan(2);
      expect(numbers).toEqual([...numbers].sort((a, b) => a - b));

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
      await page.getByRole('switch', { name: 'Differences only' }).check();
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
      await expect(page.getByRole('table', { name: 'Bill of materials' }).getByRole('row')).not.toHaveCount(
        1,
      );
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
      const output = page.getByLabel('Diameter of Output, mm');
      await output.fill('900');
      await page.getByRole('button', { name: 'Save diameters' }).click();
      await expect(page.getByText(/from 2 to 500 mm/).first()).toBeVisible();
      await expect(output).toHaveValue('900');
      await output.fill('35');
      await page.getByRole('button', { name: 'Save diameters' }).click();
      await expect(page.getByText('chosen', { exact: true })).toBeVisible();
    });
  });

  test.describe('as viewer', () => {
    test.use({ role: 'viewer' });

    test('can look and nothing else', async ({ page }) => {
      await openWinch(page);
      await expect(page.getByRole('grid', { name: 'Options' })).toBeVisible();
      await expect(page.getByRole('checkbox')).toHaveCount(0);
      for (const name of [/^Search/, 'Edit brief', 'Adopt as train', 'New brief']) {
        await expect(page.getByRole('button', { name })).toHaveCount(0);
      }
      await page.getByRole('button', { name: 'Brief in full' }).click();
      await expect(page.getByRole('region', { name: 'Brief in full' })).toContainText('Pressure angle');
      await page.goto('/briefs/new');
      await expect(page.getByText('Your role does not include this')).toBeVisible();
      await page.goto('/trains/T-0001?tab=bom');
      await expect(page.getByRole('table', { name: 'Bill of materials' })).toBeVisible();
      await expect(page.getByRole('link', { name: /Download/ })).toHaveCount(0);
      await expect(page.getByText(/workbook is for designers/)).toBeVisible();
      await page.goto('/trains/T-0001?tab=record');
      await expect(page.getByRole('textbox', { name: 'Title' })).toHaveCount(0);
      const status = await page.evaluate(async () => (await fetch('/api/trains/T-0001/bom.xlsx')).status);
      expect(status).toBe(403);
    });
  });

  test.describe('as purchaser', () => {
    test.use({ role: 'purchaser' });

    test('downloads the bill of materials', async ({ page }) => {
      await page.goto('/trains/T-0002?tab=bom');
      const waiting = page.waitForEvent('download');
      await page.getByRole('link', { name: 'Download BOM (.xlsx)' }).click();
      const download = await waiting;
      expect(download.suggestedFilename()).toMatch(/T-0002.*\.xlsx$/);
      expect(readFileSync(await download.path()).length).toBeGreaterThan(5000);
      await page.goto('/trains/T-0002');
      await expect(page.getByRole('button', { name: 'Change diameters' })).toHaveCount(0);
    });
  });

  const pages = [
    ['/briefs', 'Briefs'],
    ['/briefs/1', 'winch'],
    ['/briefs/1?edit=1', 'winch'],
    ['/briefs/new', 'New brief'],
    ['/briefs/1/compare', 'winch'],
    ['/trains', 'Trains'],
    ['/trains/T-0001', 'T-0001'],
    ['/trains/T-0001?tab=stages', 'T-0001'],
    ['/trains/T-0001?tab=bom', 'T-0001'],
    ['/trains/T-0001?tab=record', 'T-0001'],
  ] as const;
  for (const scheme of ['light', 'dark'] as const) {
    test.describe(`every page, ${scheme}`, () => {
      test.use({ role: 'designer', scheme });
      for (const [path, heading] of pages) {
        test(`${path} is accessible`, async ({ page }) => {
          await page.goto(path);
          await expect(page.getByRole('heading', { level: 1 })).toContainText(heading);
          await expect(page.getByRole('status', { name: /^Loading/ })).toHaveCount(0);
          await expectAccessible(page);
        });
      }
    });
  }

  test.describe('on a phone', () => {
    test.use({ role: 'viewer', viewport: { width: 390, height: 844 } });
    for (const [path, heading] of pages.filter(([each]) => !/new|edit/.test(each))) {
      test(`${path} fits`, async ({ page }) => {
        await page.goto(path);
        await expect(page.getByRole('heading', { level: 1 })).toContainText(heading);
        await expectNoSidewaysScroll(page);
      });
    }
  });
});
