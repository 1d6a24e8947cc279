import { expect, test } from './fixtures';

// Not the designer: one person runs one search at a time, and the winch journey runs beside this one.
test.use({ role: 'admin' });

test('a new brief is warned about, saved, searched and stopped', async ({ page }) => {
  test.slow();
  await page.goto('/briefs/new');
  await page.getByLabel('Title').fill('Long search');
  await page.getByRole('textbox', { name: 'Ratio', exact: true }).fill('37,5');
  await page.getByLabel('Pinion from').fill('50');
  await expect(page.getByRole('heading', { name: 'Cannot be met' })).toBeVisible();
  await page.getByLabel('Pinion from').fill('12');
  await expect(page.getByText(/undercut below 18/).first()).toBeVisible();

  // Leaving asks once; staying keeps everything.
  await page.getByRole('link', { name: /^Trains/ }).click();
  await page.getByRole('button', { name: 'Stay here' }).click();
  await expect(page.getByRole('textbox', { name: 'Ratio', exact: true })).toHaveValue('37,5');

  // A space big enough that the search is still running when Stop is pressed.
  const figures = {
    Ratio: '79736.51',
    Tolerance: '10',
    'Pinion from': '10',
    'Pinion to': '500',
    'Wheel from': '20',
    'Wheel to': '1000',
    Length: '900',
    'Width along shafts': '60',
    Height: '700',
    Wall: '5',
  };
  for (const [label, figure] of Object.entries(figures)) {
    await page.getByRole('textbox', { name: label, exact: true }).fill(figure);
  }
  await page.getByRole('button', { name: 'Save brief' }).click();
  await expect(page.getByRole('heading', { level: 1, name: /B-\d{4} Long search/ })).toBeVisible();
  await page.getByRole('button', { name: 'Search', exact: true }).click();
  await page.getByRole('button', { name: 'Stop' }).click();
  // Stopped while it looked for trains, or while it worked out why there is none.
  await expect(
    page.getByText(/Nothing found before it stopped|was stopped before the reasons/),
  ).toBeVisible();
  await expect(page.getByRole('button', { name: 'Search again' })).toBeVisible();
});

test('a search goes on while its page is left', async ({ page }) => {
  test.slow();
  await page.goto('/briefs/4');
  await page.getByRole('button', { name: /^Search/ }).click();
  await page.goto('/trains');
  await page.goto('/briefs/4');
  await expect(page.getByText(/Every combination settled/)).toBeVisible({ timeout: 40_000 });
});

test('two people edit one brief: the second is told what changed and loses nothing', async ({ page }) => {
  await page.goto('/briefs/2?edit=1');
  await page.getByLabel('Note').fill('My note.');
  const status = await page.evaluate(async () => {
    const brief = (await (await fetch('/api/briefs/2')).json()) as { version: number };
    const body = JSON.stringify({ version: brief.version, title: '60 : 1 vent drive, north' });
    const headers = { 'content-type': 'application/json' };
    return (await fetch('/api/briefs/2', { method: 'PATCH', headers, body })).status;
  });
  expect(status).toBe(200);
  await page.getByRole('button', { name: 'Save brief' }).click();
  await expect(page.getByText(/saved by somebody else/)).toBeVisible();
  await expect(page.getByRole('row', { name: /^Title/ })).toContainText('vent drive, north');
  await expect(page.getByLabel('Note')).toHaveValue('My note.');
  await page.getByRole('button', { name: /Take their changes/ }).click();
  await page.getByRole('button', { name: 'Save brief' }).click();
  await expect(page.getByRole('heading', { level: 1, name: /vent drive, north/ })).toBeVisible();
});
