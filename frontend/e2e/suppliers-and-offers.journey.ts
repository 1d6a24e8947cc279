import type { Locator, Page } from '@playwright/test';
import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';
import { stateFile } from './roles';

/** Adds a supplier and ends on its page. */
async function addSupplier(page: Page, name: string): Promise<string> {
  await page.goto('/suppliers');
  await page.getByRole('link', { name: 'Add supplier' }).first().click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Add a supplier');
  await page.getByRole('textbox', { name: 'Name', exact: true }).first().fill(name);
  await page.getByLabel('Usual lead time').fill('12');
  await page.getByLabel('Least order value').fill('50,00');
  const contact = page.getByRole('group', { name: 'Contact 1' });
  await contact.getByLabel('Name').fill('Enquiries');
  await contact.getByLabel('E-mail').fill('enquiries@journey.example');
  await contact.getByLabel('Telephone').fill('+44 (0)1326 555 0140');
  await page.getByRole('button', { name: 'Add the supplier' }).click();
  await expect(page).toHaveURL(/\/suppliers\/S-\d{4}$/);
  return /S-\d{4}/.exec(page.url())?.[0] ?? '';
}

/** The row of a supplier in the offers of a part. */
const offerOf = (page: Page, supplier: string): Locator =>
  page.getByRole('table', { name: 'Offers' }).getByRole('row', { name: new RegExp(supplier) });

for (const role of ['purchaser', 'librarian'] as const) {
  test.describe(`a ${role}`, () => {
    test.use({ role });
    const supplier = `Journey Gears for the ${role}`;
    const part = role === 'purchaser' ? 'KW-00200' : 'KW-00201';

    test('adds a supplier and an offer with three price breaks; the part page prices 1, 30 and 250', async ({
      page,
    }) => {
      await addSupplier(page, supplier);
      await expect(page.getByRole('link', { name: 'enquiries@journey.example' })).toHaveAttribute(
        'href',
        'mailto:enquiries@journey.example',
      );
      await expect(page.getByRole('link', { name: /555 0140/ })).toHaveAttribute(
        'href',
        'tel:+4413265550140',
      );
      await expect(page.getByRole('row', { name: /Least order value/ })).toContainText('50.00 EUR');

      await page.getByRole('link', { name: 'Add offer' }).click();
      await page.getByRole('combobox', { name: 'Part', exact: true }).fill(part);
      await page.getByRole('option', { name: new RegExp(part) }).click();
      // The breaks by the keyboard alone.
      await page.getByLabel('Price, row 1').fill('12.40');
      await page.getByLabel('Price, row 1').press('Enter');
      await page.keyboard.type('10');
      await page.keyboard.press('Enter');
      await page.keyboard.type('11,10');
      await page.keyboard.press('Enter');
      await page.keyboard.type('100');
      await page.keyboard.press('Enter');
      await page.keyboard.type('9.85');
      await page.getByLabel('Try a quantity, pcs').fill('90');
      // 90 × 11.10 = 999.00; 100 × 9.85 = 985.00, which is 14.00 less.
      await expect(page.getByText('999.00 EUR')).toBeVisible();
      await expect(
        page.getByText(/Ordering 100 pcs costs less: 985\.00 EUR, 14\.00 EUR saved/),
      ).toBeVisible();
      await page.getByRole('button', { name: 'Add the offer' }).click();
      await expect(page).toHaveURL(/\/offers\/\d+$/);

      await page.goto(`/parts/${part}`);
      const quantity = page.getByRole('region', { name: 'Offers' }).getByLabel('At quantity, pcs');
      // 12.40; 30 × 11.10; 250 × 9.85.
      for (const [needed, total] of [
        ['1', '12.40'],
        ['30', '333.00'],
        ['250', '2,462.50'],
      ] as const) {
        await quantity.fill(needed);
        await expect(offerOf(page, supplier)).toContainText(total);
      }
      await expect(offerOf(page, supplier)).toContainText('1: 12.40 · 10: 11.10 · 100: 9.85 EUR');
      await expect(page.getByRole('table', { name: 'Offers' }).getByText('taken by the rule')).toHaveCount(1);
    });

    test('pastes 20 rows of which 2 are wrong, books the others, and still has the wrong ones to mend', async ({
      page,
    }) => {
      const code = await addSupplier(page, `Pasted by the ${role}`);
      const rows = Array.from({ length: 20 }, (_, index) => {
        const number = index === 4 ? 'KW-99999' : `KW-00${String(300 + index)}`;
        return [number, `J-${index + 1}`, index === 11 ? '-3.00' : '7.25', '6.90', '12'].join('\t');
      });
      const heads = [
        'Part number',
        'Supplier part number',
        'Price from 1',
        'Price from 50',
        'Lead time days',
      ];
      await page.getByRole('link', { name: 'Paste offers' }).click();
      const dialog = page.getByRole('dialog', { name: 'Paste offers of a supplier' });
      await dialog.getByLabel('Rows from the spreadsheet').fill([heads.join('\t'), ...rows].join('\n'));
      await dialog.getByRole('button', { name: 'Check the rows' }).click();
      await expect(dialog.getByRole('button', { name: '20 in all' })).toBeVisible();
      await expect(dialog.getByText(/KW-99999/).first()).toBeVisible();
      await expect(dialog.getByText(/-3\.00/).first()).toBeVisible();
      await expectAccessible(page);
      await dialog.getByRole('button', { name: 'Book 18 rows, leave out 2 wrong' }).click();
      await expect(dialog.getByText(/18 offers added, 2 rows left out/)).toBeVisible();
      const left = await dialog.getByLabel('Rows from the spreadsheet').inputValue();
      expect(left.split('\n').map((line) => line.split('\t')[1])).toEqual([heads[1], 'J-5', 'J-12']);
      await dialog.getByRole('button', { name: 'Cancel' }).click();
      await page.getByRole('button', { name: 'Leave and lose the rows' }).click();
      await page.goto(`/suppliers/${code}`);
      await expect(page.getByText('18 offers', { exact: true })).toBeVisible();
    });
  });
}

test.describe('two people', () => {
  test.use({ role: 'purchaser' });

  test('editing the same offer: what was typed stays, and the second sees what the first changed', async ({
    page,
    browser,
    baseURL,
  }) => {
    await page.goto('/offers?text=KW-00210&state=valid');
    await page.getByRole('row').nth(1).click();
    await expect(page).toHaveURL(/\/offers\/\d+$/);
    const address = page.url();
    await page.getByRole('button', { name: 'Edit' }).click();
    await page.getByLabel('Source').fill('Typed by the purchaser');

    const other = await browser.newContext({ baseURL, storageState: stateFile('librarian') });
    const second = await other.newPage();
    await second.goto(`${address}?edit=1`);
    await second.getByLabel('Lead time').fill('77');
    await second.getByRole('button', { name: 'Save changes' }).click();
    await expect(second).toHaveURL(address);
    await other.close();

    await page.getByRole('button', { name: 'Save changes' }).click();
    const notice = page.getByRole('alert').filter({ hasText: 'changed this offer' });
    await expect(notice).toContainText('77 days');
    await expectAccessible(page);
    await expect(page.getByLabel('Source')).toHaveValue('Typed by the purchaser');
    await notice.getByRole('button', { name: 'Save mine over it' }).click();
    await expect(page).toHaveURL(address);
    await expect(page.getByRole('row', { name: /^Source/ })).toContainText('Typed by the purchaser');
  });
});

test.describe('a purchaser on a laptop', () => {
  test.use({ role: 'purchaser' });

  test('sees at least fifteen offers, and finds a supplier from the head of any page', async ({ page }) => {
    await page.goto('/offers');
    await expect(page.getByRole('row').nth(1)).toBeVisible();
    const whole = await page.getByRole('row').evaluateAll((rows) => {
      const foot = document.querySelector('.MuiDataGrid-footerContainer')?.getBoundingClientRect().top ?? 0;
      return rows.slice(1).filter((row) => row.getBoundingClientRect().bottom <= Math.min(foot, innerHeight))
        .length;
    });
    expect(whole).toBeGreaterThanOrEqual(15);
    await page.keyboard.press('/');
    await page.keyboard.type('S-0001');
    await page.getByRole('option', { name: /S-0001/ }).click();
    await expect(page).toHaveURL(/\/suppliers\/S-0001$/);
  });

  test('is told on the first page which prices to ask for again', async ({ page }) => {
    await page.goto('/');
    const section = page.getByRole('region', { name: 'Prices too old or ending soon' });
    await expect(section.getByText(/too old/).first()).toBeVisible();
    await section.getByRole('link', { name: /\d too old/ }).click();
    await expect(page).toHaveURL(/\/offers\?tooOld=true/);
    await expect(page.getByRole('row').nth(1)).toContainText('too old');
  });
});

test.describe('a viewer', () => {
  test.use({ role: 'viewer' });

  test('sees neither suppliers nor offers nor a price', async ({ page }) => {
    await page.goto('/parts/KW-00200');
    await expect(page.getByRole('heading', { level: 1 })).toContainText('KW-00200');
    await expect(page.getByRole('heading', { name: 'Offers' })).toHaveCount(0);
    await expect(page.getByRole('link', { name: 'Suppliers' })).toHaveCount(0);
    await expect(page.getByRole('link', { name: 'Offers' })).toHaveCount(0);
    for (const address of [
      '/suppliers',
      '/suppliers/S-0001',
      '/offers',
      '/offers/1',
      '/add-offer',
      '/add-supplier',
    ]) {
      await page.goto(address);
      await expect(page.getByText('Your role does not include this')).toBeVisible();
    }
  });
});

test.describe('on a telephone', () => {
  test.use({ role: 'purchaser', viewport: { width: 390, height: 844 } });

  test('nothing sticks out to the side', async ({ page }) => {
    for (const address of [
      '/suppliers',
      '/suppliers/S-0001',
      '/offers',
      '/offers/1',
      '/offers/1?edit=1',
      '/add-supplier',
    ]) {
      await page.goto(address, { waitUntil: 'networkidle' });
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      await expectNoSidewaysScroll(page);
    }
  });
});

for (const scheme of ['light', 'dark'] as const) {
  test.describe(`${scheme} pages`, () => {
    test.use({ role: 'purchaser', scheme });
    for (const address of [
      '/suppliers',
      '/suppliers/S-0001',
      '/suppliers/S-0001?edit=1',
      '/suppliers/S-9999',
      '/add-supplier',
      '/offers',
      '/offers?paste=S-0001',
      '/offers/1',
      '/offers/1?edit=1',
      '/add-offer',
      '/parts/KW-00200',
    ]) {
      test(`${address} is accessible`, async ({ page }) => {
        await page.goto(address, { waitUntil: 'networkidle' });
        await expect(page.getByRole('heading', { level: 1, includeHidden: true })).toBeVisible();
        await expectAccessible(page);
      });
    }
  });
}
