import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';

test('a demo account is one click away, and the way in leads where the link pointed', async ({ page }) => {
  await page.goto('/parts?kind=gear');
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  await page.getByRole('button', { name: /Designer/ }).click();
  await expect(page).toHaveURL(/\/parts\?kind=gear$/);
  await expect(page.getByRole('heading', { name: 'Parts', level: 1 })).toBeVisible();
});

test('a wrong password is told in words and what was typed stays', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill('librarian@brackenbay.example');
  await page.getByLabel('Password').fill('not the password');
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page.getByRole('alert')).toBeVisible();
  await expect(page.getByLabel('E-mail address')).toHaveValue('librarian@brackenbay.example');
  await expect(page.getByLabel('Password')).toHaveValue('not the password');
});

test('signing out ends the session', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: /Viewer/ }).click();
  await page.getByRole('button', { name: /account and appearance/ }).click();
  await page.getByRole('menuitem', { name: 'Sign out' }).click();
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  await page.goto('/parts');
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
});

test('the sign-in page brings neither the data grid nor charts', async ({ page }) => {
  let script = 0;
  page.on('response', (response) => {
    if (!response.url().endsWith('.js')) return;
    script += Number(response.headers()['content-length'] ?? 0);
  });
  await page.goto('/sign-in', { waitUntil: 'networkidle' });
  const names = await page.evaluate(() => performance.getEntriesByType('resource').map(({ name }) => name));
  expect(names.filter((name) => /grid|chart|PartsPage|BriefPage|SignedInShell/i.test(name))).toEqual([]);
  // The grid alone is over 400 kB: the page's whole script, unpacked, stays under a megabyte.
  expect(script).toBeLessThan(1_000_000);
});

test.describe('on a telephone', () => {
  test.use({ viewport: { width: 390, height: 844 } });
  test('one signs in, and nothing sticks out to the side', async ({ page }) => {
    await page.goto('/sign-in');
    await expect(page.getByRole('button', { name: /Purchaser/ })).toBeInViewport();
    await expectNoSidewaysScroll(page);
    await page.getByRole('button', { name: /Purchaser/ }).click();
    // A purchaser's day: trains, each leading to its bill of materials.
    await expect(page.getByRole('link', { name: 'T-0001' })).toBeVisible();
    await expectNoSidewaysScroll(page);
  });
});

for (const scheme of ['light', 'dark'] as const) {
  test.describe(scheme, () => {
    test.use({ scheme });
    test('the sign-in page is accessible', async ({ page }) => {
      await page.goto('/sign-in');
      await expect(page.getByRole('button', { name: /Designer/ })).toBeVisible();
      await expectAccessible(page);
    });
  });
}
