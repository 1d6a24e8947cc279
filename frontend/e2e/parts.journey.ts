import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';
import { DEMO_PASSWORD } from './roles';

test.describe('a librarian', () => {
  test.use({ role: 'librarian' });

  test('adds a gear with its geometry in sight, corrects it, and finds it again', async ({ page }) => {
    await page.goto('/parts');
    await page.getByRole('link', { name: 'Add part' }).click();
    await page.getByLabel('Description').fill('Spur gear, journey, 23 teeth');
    await page.getByLabel('Teeth').fill('23');
    await page.getByLabel('Module').fill('1,5');
    await page.getByLabel('Face width').fill('12');
    await page.getByLabel('Bore').fill('10');
    // d_a = m (z + 2) = 1.5 · 25 mm.
    await expect(page.getByRole('row', { name: /Tip diameter/ })).toContainText('37.500');
    await page.getByRole('button', { name: 'Add the part' }).click();
    await expect(page).toHaveURL(/\/parts\/KW-\d{5}$/);
    await expect(page.getByRole('heading', { level: 1 })).toContainText('Spur gear, journey, 23 teeth');
    const number = /KW-\d{5}/.exec(page.url())?.[0] ?? '';

    await page.getByRole('button', { name: 'Edit' }).click();
    await page.getByLabel('Face width').fill('14');
    await page.getByRole('button', { name: 'Save changes' }).click();
    await expect(page.getByRole('row', { name: /Face width/ })).toContainText('14');
    await expect(page.getByText(/Face width, mm:/)).toBeVisible();

    await page.getByRole('button', { name: 'Clear for use' }).click();
    await expect(page.getByText(`${number} cleared for use.`)).toBeVisible();

    await page.keyboard.press('/');
    await page.keyboard.type(number);
    await page.getByRole('option', { name: new RegExp(number) }).click();
    await expect(page).toHaveURL(new RegExp(`/parts/${number}$`));
  });

  test('is told at the field what the server refuses, and loses nothing', async ({ page }) => {
    await page.goto('/add-part');
    await page.getByLabel('Number', { exact: true }).fill('KW-00001');
    await page.getByLabel('Description').fill('A number that is taken');
    await page.getByLabel('Teeth').fill('20');
    await page.getByLabel('Module').fill('2');
    await page.getByLabel('Face width').fill('20');
    await page.getByLabel('Bore').fill('10');
    await page.getByRole('button', { name: 'Add the part' }).click();
    await expect(page.getByText(/KW-00001/).first()).toBeVisible();
    await expect(page).toHaveURL(/\/add-part$/);
    await expect(page.getByLabel('Description')).toHaveValue('A number that is taken');
    await expect(page.getByLabel('Number', { exact: true })).toHaveValue('KW-00001');
  });

  test('filters, sorts and pages; a link shows the same list', async ({ page }) => {
    await page.goto('/parts');
    await page.getByLabel('Teeth, least').fill('100');
    await page.getByRole('columnheader', { name: 'Teeth' }).click();
    await expect(page).toHaveURL(/teethMin=100/);
    await expect(page).toHaveURL(/sort=teeth/);
    const first = page.getByRole('row').nth(1);
    await expect(first).toContainText('100');
    const said = await page.getByRole('status').filter({ hasText: 'parts' }).textContent();
    await page.getByRole('button', { name: 'Go to next page' }).click();
    await expect(page).toHaveURL(/page=2/);
    await page.reload();
    await expect(page.getByLabel('Teeth, least')).toHaveValue('100');
    await expect(page.getByRole('status').filter({ hasText: 'parts' })).toHaveText(said ?? '');
    await expect(page.getByText(/26–50 of/)).toBeVisible();
  });

  for (const [address, rows] of [
    ['/parts?page=2', '26–50'],
    ['/parts?page=30&sort=teeth,-module', '726–750'],
  ] as const) {
    test(`a link to ${address} opens that page`, async ({ page }) => {
      await page.goto(address, { waitUntil: 'networkidle' });
      await expect(page.getByText(new RegExp(`${rows} of`))).toBeVisible();
      expect(page.url()).toContain(address);
    });
  }

  test('is asked to sign in again when the session ends before saving, and loses nothing', async ({
    page,
  }) => {
    await page.goto('/add-part');
    await page.getByLabel('Description').fill('Typed before the session ended');
    await page.getByLabel('Teeth').fill('20');
    await page.getByLabel('Module').fill('2');
    await page.getByLabel('Face width').fill('20');
    await page.getByLabel('Bore').fill('10');
    await page.context().clearCookies();
    await page.getByRole('button', { name: 'Add the part' }).click();
    await expect(page.getByRole('dialog', { name: 'Your session ended' })).toBeVisible();
    await expectAccessible(page);
    await page.getByLabel('Password').fill(DEMO_PASSWORD);
    await page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await expect(page.getByRole('dialog')).toHaveCount(0);
    await expect(page.getByLabel('Description')).toHaveValue('Typed before the session ended');
    await page.getByRole('button', { name: 'Add the part' }).click();
    await expect(page).toHaveURL(/\/parts\/KW-\d{5}$/);
  });

  test('without a network the refusal stands beside the button, and nothing is lost', async ({ page }) => {
    await page.goto('/add-part?kind=bearing');
    await page.getByLabel('Description').fill('Typed without a network');
    for (const label of ['Bore', 'Outer diameter', 'Width']) await page.getByLabel(label).fill('10');
    await page.getByLabel('Type').fill('deep groove ball');
    await page.context().setOffline(true);
    await page.getByRole('button', { name: 'Add the part' }).click();
    await expect(page.getByText(/did not answer/)).toBeInViewport();
    await expect(page.getByLabel('Description')).toHaveValue('Typed without a network');
  });

  test('sees at least fifteen parts on a laptop', async ({ page }) => {
    await page.goto('/parts');
    await expect(page.getByRole('row').nth(1)).toBeVisible();
    const whole = await page.getByRole('row').evaluateAll((rows) => {
      const foot = document.querySelector('.MuiDataGrid-footerContainer')?.getBoundingClientRect().top ?? 0;
      return rows.slice(1).filter((row) => row.getBoundingClientRect().bottom <= Math.min(foot, innerHeight))
        .length;
    });
    expect(whole).toBeGreaterThanOrEqual(15);
  });
});

test.describe('a viewer', () => {
  test.use({ role: 'viewer' });

  test('looks parts up and can change nothing', async ({ page }) => {
    await page.goto('/parts');
    await expect(page.getByRole('row').nth(1)).toBeVisible();
    await expect(page.getByRole('link', { name: 'Add part' })).toHaveCount(0);
    await page.goto('/add-part');
    await expect(page.getByText('Your role does not include this')).toBeVisible();
    await page.goto('/people');
    await expect(page.getByText('Your role does not include this')).toBeVisible();
    await expect(page.getByRole('link', { name: 'People' })).toHaveCount(0);
  });
});

test.describe('on a telephone', () => {
  test.use({ role: 'viewer', viewport: { width: 390, height: 844 } });

  test('nothing sticks out to the side, and the navigation is a drawer', async ({ page }) => {
    for (const address of ['/', '/parts', '/parts/KW-00100']) {
      await page.goto(address);
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      await expectNoSidewaysScroll(page);
    }
    await page.getByRole('button', { name: 'Open the navigation' }).click();
    await page.getByRole('link', { name: /Trains/ }).click();
    await expect(page).toHaveURL(/\/trains$/);
  });
});

for (const scheme of ['light', 'dark'] as const) {
  test.describe(`${scheme} pages`, () => {
    test.use({ role: 'admin', scheme });
    for (const address of [
      '/',
      '/parts',
      '/parts/KW-00100',
      '/parts/KW-00100?edit=1',
      '/add-part',
      '/people',
      '/nowhere',
    ]) {
      test(`${address} is accessible`, async ({ page }) => {
        await page.goto(address, { waitUntil: 'networkidle' });
        await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
        await expectAccessible(page);
      });
    }
  });
}
