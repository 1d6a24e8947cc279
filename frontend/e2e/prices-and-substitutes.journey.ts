import { readFileSync } from 'node:fs';
import { request, type Page } from '@playwright/test';
import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';
import { stateFile } from './roles';

const BILL = '/trains/T-0001?tab=bom';
const bill = (page: Page) => page.getByRole('table', { name: 'Bill of materials' });

interface Line {
  findNumber: number;
  key: string;
  partNumber: string | null;
}

/** The lines of the train's bill as the server tells them to a designer. */
async function linesOf(code: string): Promise<Line[]> {
  const baseURL = process.env.STAGEYARD_JOURNEY_URL;
  const designer = await request.newContext({ baseURL, storageState: stateFile('designer') });
  const { lines } = (await (await designer.get(`/api/trains/${code}/bom`)).json()) as { lines: Line[] };
  await designer.dispose();
  return lines;
}

async function openBill(page: Page): Promise<void> {
  await page.goto(BILL);
  await expect(bill(page).getByText(/EUR/).first()).toBeVisible();
}

async function act(page: Page, findNumber: number, item: RegExp): Promise<void> {
  await page.getByRole('button', { name: `What to do with line ${findNumber}`, exact: true }).click();
  await page.getByRole('menuitem', { name: item }).click();
}

test.describe('prices and substitutes', () => {
  test.describe('as purchaser', () => {
    test.use({ role: 'purchaser' });

    test('prices a train for 25, takes another offer and goes back to the rule', async ({ page }) => {
      await openBill(page);
      await page.getByLabel('Build quantity').fill('25');
      await page.getByRole('button', { name: 'Set', exact: true }).click();
      await expect(page.getByText(/^For 25:/).first()).toBeVisible();
      await expect(page.getByText('25 to build', { exact: false }).first()).toBeVisible();
      await expect(page.getByText(/^without \d+ lines? of unknown price$/).first()).toBeVisible();
      const open = page.getByRole('region', { name: /lines? without a price$/ });
      await expect(open.getByRole('link', { name: 'Add an offer' }).first()).toBeVisible();
      await expect(open).toContainText(/is offered by nobody here/);
      await expectAccessible(page);

      // A line that has other offers.
      await page
        .getByRole('row', { name: /^401 / })
        .getByRole('button', { name: 'What to do with line 401' })
        .click();
      await page.getByRole('menuitem', { name: /^Choose the offer \(\d+ others?\)/ }).click();
      const dialog = page.getByRole('dialog', { name: /^Offers for / });
      await expect(dialog.getByRole('radio', { name: /^The rule chooses/ })).toBeChecked();
      await expectAccessible(page);
      const other = dialog.getByRole('radio', { name: /(?<!the rule takes this one.*)\d EUR/ }).last();
      await other.check();
      await dialog.getByRole('button', { name: 'Choose this offer' }).click();
      await expect(dialog).toHaveCount(0);
      await expect(bill(page).getByRole('img', { name: 'chosen by hand' }).first()).toBeVisible();

      await act(page, 401, /^Choose the offer/);
      await dialog.getByRole('radio', { name: /^The rule chooses/ }).check();
      await dialog.getByRole('button', { name: 'Let the rule choose' }).click();
      await expect(dialog).toHaveCount(0);
      await expect(bill(page).getByRole('img', { name: 'chosen by hand' })).toHaveCount(0);
    });

    test('copies rows and downloads the workbook', async ({ page, context }) => {
      await context.grantPermissions(['clipboard-read', 'clipboard-write']);
      await openBill(page);
      await bill(page).getByRole('row').nth(1).focus();
      await page.keyboard.press('Shift+ArrowDown');
      await page.keyboard.press('Control+c');
      await expect(page.getByText(/rows copied; paste into a spreadsheet/)).toBeVisible();
      const copied = await page.evaluate(() => navigator.clipboard.readText());
      const [heads, ...rows] = copied.split('\n').map((row) => row.split('\t'));
      expect(rows).toHaveLength(2);
      const total = rows[0]?.[heads?.indexOf('Line total') ?? -1];
      expect(total).toMatch(/^\d+\.\d\d$/);

      const waiting = page.waitForEvent('download');
      await page.getByRole('link', { name: 'Download BOM (.xlsx)' }).click();
      const file = readFileSync(await (await waiting).path());
      // A workbook is a zip archive.
      expect(file.subarray(0, 2).toString()).toBe('PK');
    });

    test('copies rows of the list of trains', async ({ page, context }) => {
      await context.grantPermissions(['clipboard-read', 'clipboard-write']);
      await page.goto('/trains');
      await page.getByRole('checkbox', { name: 'Select row' }).first().check();
      await page.getByRole('button', { name: 'Copy', exact: true }).click();
      await expect(page.getByText('One row copied; paste into a spreadsheet.')).toBeVisible();
      const copied = await page.evaluate(() => navigator.clipboard.readText());
      expect(copied).toMatch(/^Train\tTitle\t.*\nT-000\d\t/);
    });
  });

  test.describe('as designer', () => {
    test.use({ role: 'designer' });

    test('sees what a swap changes, swaps, and takes it back', async ({ page }) => {
      const before = (await linesOf('T-0001')).find(({ findNumber }) => findNumber === 101);
      await openBill(page);
      await act(page, 101, /^Substitutes and swap/);
      const dialog = page.getByRole('dialog', { name: /^Substitutes for / });
      const first = dialog.getByRole('radio').first();
      await first.check();
      const changes = dialog.getByRole('table', { name: 'What changes' });
      await expect(changes.getByRole('row', { name: /^Part / })).toBeVisible();
      await expect(changes.getByRole('row', { name: /^Price of / })).toBeVisible();
      await expectAccessible(page);
      const taken = (await first.getAttribute('value')) ?? '';
      await dialog.getByRole('button', { name: `Take ${taken}` }).click();
      await expect(dialog).toHaveCount(0);
      await expect(bill(page).getByRole('link', { name: taken })).toBeVisible();
      await page.getByRole('button', { name: 'Undo' }).click();
      await expect(bill(page).getByRole('link', { name: taken })).toHaveCount(0);
      await expect(bill(page).getByRole('link', { name: before?.partNumber ?? '' })).toBeVisible();
    });

    test('pastes three rows, one of them wrong, and books the other two', async ({ page }) => {
      await openBill(page);
      await page.getByRole('button', { name: 'Paste rows' }).click();
      const dialog = page.getByRole('dialog', { name: 'Paste rows into the bill of T-0001' });
      const rows = [
        ['Find number', 'Part number', 'Quantity', 'Unit', 'Description', 'Note'],
        ['', '', '2', 'pcs', 'Lifting eye M8', 'for the crane'],
        ['', '', '-1', 'pcs', 'Name plate', ''],
        ['', '', '1', 'pcs', 'Warning label', ''],
      ];
      await dialog.getByLabel('Rows from the spreadsheet').fill(rows.map((row) => row.join('\t')).join('\n'));
      await dialog.getByRole('button', { name: 'Check the rows' }).click();
      await expect(dialog.getByText('Lifting eye M8').last()).toBeVisible();
      await expectAccessible(page);
      await dialog.getByRole('button', { name: /^Book 2 .*leave out 1/i }).click();
      // The wrong row stays in the box to be mended.
      await expect(dialog.getByLabel('Rows from the spreadsheet')).toHaveValue(/Name plate/);
      await dialog.getByRole('button', { name: 'Cancel' }).click();
      await page.getByRole('button', { name: 'Leave and lose the rows' }).click();
      await expect(bill(page)).toContainText('Lifting eye M8');
      await expect(bill(page)).toContainText('Warning label');
      await expect(bill(page)).not.toContainText('Name plate');
    });

    test('adds a line by hand, and takes it away and back', async ({ page }) => {
      await openBill(page);
      await page.getByRole('button', { name: 'Add a line' }).click();
      const dialog = page.getByRole('dialog', { name: 'Add a line' });
      await dialog.getByRole('button', { name: 'Add the line' }).click();
      await expect(dialog.getByText('Say what it is, or name a part.')).toBeVisible();
      await dialog.getByLabel('Description').fill('Spare shear pin');
      await dialog.getByLabel(/^Quantity in each/).fill('3');
      await expectAccessible(page);
      await dialog.getByRole('button', { name: 'Add the line' }).click();
      const row = bill(page).getByRole('row', { name: /Spare shear pin/ });
      await expect(row).toBeVisible();
      await row.getByRole('button', { name: /^What to do with line/ }).click();
      await page.getByRole('menuitem', { name: 'Take this line away' }).click();
      await expect(row).toHaveCount(0);
      await page.getByRole('button', { name: 'Undo' }).click();
      await expect(row).toBeVisible();
    });

    test('a brief with a build quantity shows cost and stock of its options', async ({ page }) => {
      test.slow();
      await page.goto('/briefs/3?edit=1');
      await page.getByLabel('Build quantity').fill('25');
      await page.getByRole('button', { name: /^Save/ }).first().click();
      await expect(page).toHaveURL(/\/briefs\/3(\?(?!edit).*)?$/);
      await page.getByRole('button', { name: /^Search( again)?$/ }).click();
      const options = page.getByRole('grid', { name: 'Options' });
      await expect(options.getByRole('columnheader', { name: 'Cost for 25' })).toBeVisible();
      await expect(options.getByText(/of \d on the shelf|all \d on the shelf/).first()).toBeVisible();
      await expect(options.getByText(/\d [A-Z]{3}$/).first()).toBeVisible();
      await page.getByRole('button', { name: 'Cost for 25' }).click();
      await expect(page).toHaveURL(/sort=cost/);
      await expectAccessible(page);
    });

    test('the page of a part lists what drops in for it', async ({ page }) => {
      const gear = (await linesOf('T-0001')).find(({ findNumber }) => findNumber === 101);
      await page.goto(`/parts/${gear?.partNumber}`);
      const table = page.getByRole('table', { name: 'Substitutes' });
      await expect(table.getByRole('link').first()).toBeVisible();
      await expectAccessible(page);
    });
  });

  test.describe('as viewer', () => {
    test.use({ role: 'viewer' });

    test('sees no price anywhere, and asks for none', async ({ page }) => {
      const refused: string[] = [];
      page.on('response', (response) => {
        if (response.status() >= 400) refused.push(`${response.status()} ${response.url()}`);
      });
      await page.goto(BILL);
      await expect(bill(page)).toBeVisible();
      await expect(page.getByText(/\bEUR\b/)).toHaveCount(0);
      await expect(page.getByLabel('Build quantity')).toHaveCount(0);
      await page.goto('/briefs/3');
      await expect(page.getByRole('grid', { name: 'Options' })).toBeVisible();
      await expect(page.getByRole('columnheader', { name: /^Cost/ })).toHaveCount(0);
      const gear = (await linesOf('T-0001')).find(({ findNumber }) => findNumber === 101);
      await page.goto(`/parts/${gear?.partNumber}`);
      await expect(page.getByRole('table', { name: 'Substitutes' })).toBeVisible();
      await expect(page.getByText(/\bEUR\b/)).toHaveCount(0);
      expect(refused).toEqual([]);
    });
  });
});

test.describe('on a laptop', () => {
  test.use({ role: 'purchaser', viewport: { width: 1280, height: 800 } });

  test('fifteen lines of the bill stand on the first screen', async ({ page }) => {
    await openBill(page);
    await expect(page.getByText(/^For \d+:/).first()).toBeVisible();
    const ends = await bill(page)
      .getByRole('row')
      .evaluateAll((rows) => rows.slice(1).map((row) => row.getBoundingClientRect().bottom));
    expect(ends.filter((end) => end <= 800).length).toBeGreaterThanOrEqual(15);
  });
});

for (const scheme of ['light', 'dark'] as const) {
  test.describe(`on a phone, ${scheme}`, () => {
    test.use({ role: 'purchaser', scheme, viewport: { width: 390, height: 844 } });

    test('the bill with prices fits and is accessible', async ({ page }) => {
      await openBill(page);
      await expectNoSidewaysScroll(page);
      await expectAccessible(page);
    });
  });
}
