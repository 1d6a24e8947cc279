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
