import { readFileSync } from 'node:fs';
import { request } from '@playwright/test';
import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';
import { stateFile } from './roles';

/** The packing turntable: searched and pinned below, so that there is something to look at. */
const TURNTABLE = '/briefs/3';

interface Found {
  outcome: { options: { key: string }[] } | null;
}

test.beforeAll(async () => {
  const baseURL = process.env.STAGEYARD_JOURNEY_URL;
  const admin = await request.newContext({ baseURL, storageState: stateFile('admin') });
  const started = await admin.post('/api/briefs/3/searches');
  const { id } = (await started.json()) as { id: string };
  let outcome: Found['outcome'] = null;
  for (let asked = 0; outcome === null && asked < 100; asked += 1) {
    await new Promise((done) => setTimeout(done, 200));
    ({ outcome } = (await (await admin.get(`/api/searches/${id}`)).json()) as Found);
  }
  for (const { key } of outcome?.options.slice(0, 2) ?? []) {
    await admin.put(`/api/briefs/3/pins/${encodeURIComponent(key)}`, { data: { searchId: id } });
  }
  await admin.dispose();
});

test.describe('as viewer', () => {
  test.use({ role: 'viewer' });

  test('can look and nothing else', async ({ page }) => {
    await page.goto(TURNTABLE);
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

test.describe('as designer', () => {
  test.use({ role: 'designer' });

  test('chooses what a helical gear is: made to order, then the stock part again', async ({ page }) => {
    await page.goto('/trains/T-0002?tab=stages');
    const choose = page.getByRole('button', { name: 'Choose the part of the pinion' });
    const gears = page.getByRole('table', { name: 'Gears of stage 1' });
    await choose.click();
    const dialog = page.getByRole('dialog', { name: 'Part for the pinion of stage 1' });
    await expect(dialog.getByText(/helix 15° right/)).toBeVisible();
    const stock = dialog.getByRole('radio', { name: /^KW-/ }).first();
    await expect(stock).toBeChecked();
    const number = (await stock.getAttribute('value')) ?? '';
    await expectAccessible(page);
    await dialog.getByRole('radio', { name: 'Made to order' }).check();
    await dialog.getByRole('button', { name: 'Choose' }).click();
    await expect(dialog).toHaveCount(0);
    await expect(gears.getByRole('link', { name: number })).toHaveCount(0);
    await choose.click();
    await dialog.getByRole('radio', { name: new RegExp(number) }).check();
    await dialog.getByRole('button', { name: 'Choose' }).click();
    await expect(gears.getByRole('link', { name: number })).toBeVisible();
    await page.getByRole('tab', { name: 'Bill of materials' }).click();
    await expect(page.getByRole('table', { name: 'Bill of materials' })).toContainText(number);
  });

  test('is told on the page when the workbook cannot be had', async ({ page }) => {
    await page.route('**/bom.xlsx', (route) =>
      route.fulfill({ status: 503, json: { statusCode: 503, code: 'busy', message: 'Try again shortly.' } }),
    );
    await page.goto('/trains/T-0001?tab=bom');
    await page.getByRole('link', { name: 'Download BOM (.xlsx)' }).click();
    await expect(page.getByText('The workbook could not be downloaded. Try again shortly.')).toBeVisible();
    await expect(page.getByRole('table', { name: 'Bill of materials' })).toBeVisible();
  });

  test('prints pages without the frame round them, whole in width', async ({ page }) => {
    // An upright A4 sheet between its margins.
    await page.setViewportSize({ width: 718, height: 1020 });
    for (const [path, table] of [
      ['/trains/T-0002?tab=bom', 'Bill of materials'],
      ['/briefs/3/compare', 'Options side by side'],
    ] as const) {
      await page.goto(path);
      const shown = page.getByRole('table', { name: table });
      await expect(shown).toBeVisible();
      await page.emulateMedia({ media: 'print' });
      await expect(page.getByRole('banner')).toBeHidden();
      await expect(page.getByRole('link', { name: 'Skip to the page' })).toBeHidden();
      const { right } = await shown.evaluate((each) => each.getBoundingClientRect());
      expect(right).toBeLessThanOrEqual(718);
      await page.emulateMedia({ media: 'screen' });
    }
  });
});

test.describe('on a laptop', () => {
  test.use({ role: 'viewer', viewport: { width: 1280, height: 800 } });

  test('fifteen options stand above what is pinned', async ({ page }) => {
    await page.goto(TURNTABLE);
    await expect(page.getByRole('grid', { name: 'Options' })).toBeVisible();
    const foot = await page
      .getByRole('region', { name: 'Pinned options' })
      .evaluate((bar) => bar.getBoundingClientRect().top);
    const ends = await page
      .getByRole('grid', { name: 'Options' })
      .getByRole('row')
      .evaluateAll((rows) => rows.slice(1).map((row) => row.getBoundingClientRect().bottom));
    expect(ends.filter((end) => end <= foot).length).toBeGreaterThanOrEqual(15);
  });
});

const pages = [
  ['/briefs', 'Briefs'],
  ['/briefs/3', 'turntable'],
  ['/briefs/3?edit=1', 'turntable'],
  ['/briefs/new', 'New brief'],
  ['/briefs/3/compare', 'turntable'],
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
