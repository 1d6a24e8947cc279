import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';
import type { Page } from '@playwright/test';

/** A part of its own with nothing on the shelf, so that journeys beside each other never meet. */
async function newPart(page: Page, description: string): Promise<string> {
  const attributes = { teeth: 31, module: 2, faceWidth: 20, bore: 12 };
  const data = { kind: 'gear', description, standing: 'cleared', attributes };
  const response = await page.request.post('/api/parts', { data });
  return ((await response.json()) as { number: string }).number;
}

async function receive(page: Page, number: string, quantity: number, place: string): Promise<void> {
  const data = { number, kind: 'received', quantity, place };
  expect((await page.request.post('/api/stock/movements', { data })).status()).toBe(201);
}

/** A scanner types the number and presses Enter; then the figure, and Enter. */
async function count(page: Page, number: string, figure: string): Promise<void> {
  await expect(page.getByLabel('Part number')).toBeFocused();
  await page.keyboard.type(number);
  await page.keyboard.press('Enter');
  await expect(page.getByLabel('What is there')).toBeFocused();
  await page.keyboard.type(figure);
  await page.keyboard.press('Enter');
}

test.describe('a librarian with a phone', () => {
  test.use({ role: 'librarian', viewport: { width: 390, height: 844 } });

  test('counts part after part, and is asked about a surprising figure', async ({ page }) => {
    const [gear, pinion] = [await newPart(page, 'Counted gear'), await newPart(page, 'Counted pinion')];
    await receive(page, gear, 20, 'Journey rack 1');
    await page.goto('/stock/count');
    await page.getByLabel('Place').fill('journey RACK 1');
    // The places of the books are offered once they are read.
    await expect(page.getByRole('button', { name: 'Journey rack 1' })).toBeVisible();
    await page.keyboard.press('Enter');
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Count Journey rack 1');

    await page.getByLabel('Part number').fill(gear.toLowerCase());
    await page.keyboard.press('Enter');
    await expect(page.getByText('Counted gear')).toBeVisible();
    await expect(page.getByText(/\b20 pcs/)).toHaveCount(0);
    await expect(page.getByLabel('What is there')).toHaveAttribute('inputmode', 'numeric');
    await expectAccessible(page);
    await expectNoSidewaysScroll(page);
    await page.keyboard.type('9');
    await page.keyboard.press('Enter');
    // 9 of 20 is more than a fifth off.
    await expect(page.getByText(/the books say 20 pcs/)).toBeVisible();
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Count again' }).click();
    await page.keyboard.type('19');
    await page.keyboard.press('Enter');
    const list = page.getByRole('list', { name: 'Counted in this round' });
    await expect(list.getByText('−1 pcs to the books · booked')).toBeVisible();

    await count(page, pinion, '4');
    await expect(list.getByText('+4 pcs to the books · booked')).toBeVisible();
    for (const target of await page.getByRole('main').getByRole('button').all()) {
      expect((await target.boundingBox())?.height ?? 0).toBeGreaterThanOrEqual(30);
    }
    await expectNoSidewaysScroll(page);

    // The place is remembered.
    await page.reload();
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Count Journey rack 1');
    await page.goto(`/parts/${gear}`);
    await expect(page.getByText(/19 pcs on the shelf/)).toBeVisible();
    await expectNoSidewaysScroll(page);
  });

  test('goes on counting without a network; the counts are sent when it is back', async ({ page }) => {
    const [gear, pinion] = [await newPart(page, 'Offline gear'), await newPart(page, 'Offline pinion')];
    await receive(page, gear, 10, 'Journey rack 2');
    await page.goto('/stock/count');
    await page.getByLabel('Place').fill('Journey rack 2');
    await page.keyboard.press('Enter');
    await count(page, gear, '10');
    const list = page.getByRole('list', { name: 'Counted in this round' });
    await expect(list.getByText('as in the books · booked')).toBeVisible();

    await page.context().setOffline(true);
    await count(page, gear, '9');
    await count(page, pinion, '3');
    await expect(page.getByText('2 counts wait for the network. Go on counting.')).toBeVisible();
    await expectAccessible(page);
    await page.getByRole('link', { name: 'What lies on the shelf' }).click();
    await expect(page.getByRole('dialog', { name: '2 counts are not booked yet' })).toBeVisible();
    await expectAccessible(page);
    await page.getByRole('button', { name: 'Stay here' }).click();

    await page.context().setOffline(false);
    await expect(list.getByText(/· booked/)).toHaveCount(3);
    const stock = await page.request.get(`/api/stock/items/${gear}`);
    expect(await stock.json()).toMatchObject({ quantity: 9 });
  });

  test('is told what was booked meanwhile, and decides', async ({ page }) => {
    const gear = await newPart(page, 'Contested gear');
    await receive(page, gear, 10, 'Journey rack 3');
    await page.goto('/stock/count');
    await page.getByLabel('Place').fill('Journey rack 3');
    await page.keyboard.press('Enter');
    await page.getByLabel('Part number').fill(gear);
    await page.keyboard.press('Enter');
    await expect(page.getByLabel('What is there')).toBeFocused();
    // Somebody takes one while this person counts.
    const data = { number: gear, kind: 'issued', quantity: 1, place: 'Journey rack 3' };
    await page.request.post('/api/stock/movements', { data });
    await page.keyboard.type('10');
    await page.keyboard.press('Enter');
    await expect(page.getByText(/issued 1 pcs. Now the books say 9 pcs/)).toBeVisible();
    await expectAccessible(page);
    await expectNoSidewaysScroll(page);
    await page.getByRole('button', { name: '10 pcs is right: send it' }).click();
    await expect(page.getByText('+1 pcs to the books · booked')).toBeVisible();
  });
});

test.describe('a purchaser', () => {
  test.use({ role: 'purchaser' });

  test('receives, issues and is told what is there', async ({ page }) => {
    // Parts are a librarian's to add; the demo has plenty.
    const { items } = (await (await page.request.get('/api/parts?onShelf=true&text=ISO%204017')).json()) as {
      items: { number: string }[];
    };
    const number = items[0]?.number ?? '';
    const place = `Journey rack ${Date.now()}`;
    await page.goto('/stock');
    await page.getByRole('button', { name: 'Book a movement' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('Part number').fill(number);
    await dialog.getByLabel('Place').fill(place);
    await dialog.getByLabel('Quantity').fill('5');
    await expect(dialog.getByText(`None of it at ${place} so far; 5 pcs afterwards.`)).toBeVisible();
    await expectAccessible(page);
    await dialog.getByLabel('Why').fill('Delivery note 4711');
    await dialog.getByRole('button', { name: 'Receive' }).last().click();
    await expect(page.getByText(`${number}: 5 pcs received at ${place}; 5 pcs there now.`)).toBeVisible();

    await page.goto(`/parts/${number}`);
    await page.getByRole('button', { name: 'Issue', exact: true }).click();
    await dialog.getByLabel('Place').fill(place.toLowerCase());
    await dialog.getByLabel('Quantity').fill('6');
    await dialog.getByRole('button', { name: 'Issue', exact: true }).last().click();
    await expect(dialog.getByRole('alert')).toContainText(`Only 5 pcs of ${number} lie at ${place}`);
    await expect(dialog.getByLabel('Quantity')).toHaveValue('6');
    await dialog.getByLabel('Quantity').fill('2');
    await dialog.getByRole('button', { name: 'Issue', exact: true }).last().click();
    await expect(page.getByRole('row', { name: `${place} 3` })).toBeVisible();

    await page.getByRole('button', { name: 'Least stock' }).click();
    await page.getByLabel('Low below').fill('100000');
    await page.getByRole('button', { name: 'Save' }).click();
    await expect(page.getByText(/low, short by/)).toBeVisible();
    await expectAccessible(page);
    await page.goto('/stock?low=true');
    await expect(page.getByRole('row').nth(1)).toContainText(number);
  });

  test('finds a movement again: filters and page stand in the address', async ({ page }) => {
    await page.goto('/stock?tab=movements&kind=received');
    await expect(page.getByRole('row').nth(1)).toContainText('received');
    await page.getByRole('button', { name: 'Go to next page' }).click();
    await expect(page).toHaveURL(/page=2/);
    await page.reload();
    await expect(page.getByText(/26–50 of/)).toBeVisible();
    await page.getByRole('tab', { name: 'On the shelf' }).click();
    await expect(page).toHaveURL(/\/stock$/);
  });
});

test.describe('a viewer', () => {
  test.use({ role: 'viewer' });

  test('looks, and books nothing', async ({ page }) => {
    await page.goto('/stock');
    await expect(page.getByRole('row').nth(1)).toBeVisible();
    await expect(page.getByRole('button', { name: 'Book a movement' })).toHaveCount(0);
    await page.goto('/stock/count');
    await expect(page.getByText('Your role does not include this')).toBeVisible();
    await page.goto('/');
    await expect(page.getByRole('heading', { name: 'Low stock' })).toHaveCount(0);
  });
});

for (const scheme of ['light', 'dark'] as const) {
  test.describe(`in ${scheme}`, () => {
    test.use({ role: 'librarian', scheme });

    for (const width of [1280, 390]) {
      for (const address of ['/stock', '/stock?tab=movements', '/stock/count']) {
        test(`${address} fits ${width} px`, async ({ page }) => {
          await page.setViewportSize({ width, height: 800 });
          await page.goto(address, { waitUntil: 'networkidle' });
          const shown = address === '/stock/count' ? page.getByLabel('Place') : page.getByRole('row').nth(2);
          await expect(shown).toBeVisible();
          await expectNoSidewaysScroll(page);
          await expectAccessible(page);
        });
      }
    }
  });
}
