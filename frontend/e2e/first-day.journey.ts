import type { Browser, Page } from '@playwright/test';
import { expect, expectAccessible, expectNoSidewaysScroll, test } from './fixtures';
import { startOwnServer, type OwnServer } from './own-server';

// One server of one's own, empty; the steps follow each other.
test.describe.configure({ mode: 'serial' });

let server: OwnServer;
let origin: string;
test.beforeAll(async () => {
  server = await startOwnServer();
  origin = new URL(server.link).origin;
});
test.afterAll(() => server.close());

const ADMIN = { email: 'mara@kiln.example', password: 'three herons on a fence' };
const PERSON = { name: 'Otis Fell', email: 'otis@kiln.example' };
let firstPassword = '';

async function signIn(page: Page, { email, password }: { email: string; password: string }) {
  await page.goto(`${origin}/sign-in`);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
}

async function otherPage(browser: Browser): Promise<Page> {
  return (await browser.newContext({ locale: 'en-GB' })).newPage();
}

for (const scheme of ['light', 'dark'] as const) {
  test.describe(scheme, () => {
    test.use({ scheme });
    test('the page behind the link is accessible, whole or not', async ({ page }) => {
      await page.goto(server.link);
      await expect(page.getByRole('heading', { name: 'Set up your team' })).toBeVisible();
      await expectAccessible(page);
      await page.goto(`${origin}/accept-invite`);
      await expect(page.getByRole('heading', { name: 'The link is not whole' })).toBeVisible();
      await expectAccessible(page);
    });
  });
}

test('no demo account stands on the sign-in page', async ({ page }) => {
  await page.goto(`${origin}/sign-in`);
  await expect(page.getByText(/An administrator of your team can help/)).toBeVisible();
  await expect(page.getByText(/demo account/)).toHaveCount(0);
});

test('the link makes the first administrator, once', async ({ page, browser }) => {
  await page.goto(server.link);
  await page.getByLabel('Your name').fill('Mara Kiln');
  await page.getByLabel('E-mail address').fill(ADMIN.email);
  await page.getByLabel('Password').fill('short');
  await page.getByRole('button', { name: 'Create the account' }).click();
  await expect(page.getByText(/At least 10 characters; this has 5/)).toBeVisible();
  await expect(page.getByLabel('Your name')).toHaveValue('Mara Kiln');
  await page.getByLabel('Password').fill(ADMIN.password);
  await page.getByRole('button', { name: 'Create the account' }).click();
  await expect(page.getByRole('heading', { level: 1, name: 'Today, Mara' })).toBeVisible();
  await expect(page.getByRole('link', { name: 'Add the people of your team' })).toBeVisible();
  await expectAccessible(page);

  const late = await otherPage(browser);
  await late.goto(server.link);
  await late.getByLabel('Your name').fill('Somebody Else');
  await late.getByLabel('E-mail address').fill('else@kiln.example');
  await late.getByLabel('Password').fill('another long sentence');
  await late.getByRole('button', { name: 'Create the account' }).click();
  await expect(late.getByRole('alert')).toBeVisible();
  await expect(late.getByLabel('E-mail address')).toHaveValue('else@kiln.example');
  await late.context().close();
});

test('the administrator adds a person, who signs in with the first password', async ({ page, browser }) => {
  await signIn(page, ADMIN);
  await page.getByRole('link', { name: 'Add the people of your team' }).click();
  await page.getByRole('button', { name: 'Add a person' }).click();
  const dialog = page.getByRole('dialog', { name: 'Add a person' });
  await dialog.getByLabel('Name').fill(PERSON.name);
  await dialog.getByLabel('E-mail address').fill(PERSON.email);
  await dialog.getByRole('button', { name: 'Add', exact: true }).click();
  await expect(dialog.getByText('Choose at least one role.')).toBeVisible();
  await dialog.getByLabel(/^Librarian/).check();
  await dialog.getByRole('button', { name: 'Suggest one' }).click();
  firstPassword = await dialog.getByLabel('First password').inputValue();
  expect(firstPassword.length).toBeGreaterThanOrEqual(10);
  await expectAccessible(page);

  // Without a network nothing is lost, and it is said.
  await page.context().setOffline(true);
  await dialog.getByRole('button', { name: 'Add', exact: true }).click();
  await expect(dialog.getByText(/did not answer/)).toBeVisible();
  await expect(dialog.getByLabel('Name')).toHaveValue(PERSON.name);
  await page.context().setOffline(false);
  await dialog.getByRole('button', { name: 'Add', exact: true }).click();
  await expect(page.getByText(`${PERSON.name} can now sign in at ${origin}`)).toBeVisible();

  const theirs = await otherPage(browser);
  await signIn(theirs, { email: PERSON.email, password: firstPassword });
  await expect(theirs.getByRole('heading', { level: 1, name: 'Today, Otis' })).toBeVisible();
  await theirs.goto(`${origin}/parts`);
  await expect(theirs.getByText('The library is empty')).toBeVisible();
  await theirs.context().close();
});

test('roles change, and a person who is switched off is out', async ({ page, browser }) => {
  const theirs = await otherPage(browser);
  await signIn(theirs, { email: PERSON.email, password: firstPassword });
  await expect(theirs.getByRole('heading', { level: 1, name: 'Today, Otis' })).toBeVisible();

  await signIn(page, ADMIN);
  await page.getByRole('link', { name: 'People', exact: true }).first().click();
  await page.getByRole('button', { name: `Edit ${PERSON.name}` }).click();
  await page.getByLabel(/^Purchaser/).check();
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  const row = page.getByRole('row', { name: new RegExp(PERSON.name) });
  await expect(row).toContainText('Librarian, Purchaser');

  await page.getByRole('button', { name: `Switch off ${PERSON.name}` }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Switch off' }).click();
  await expect(row).toContainText('switched off');
  await theirs.goto(`${origin}/parts`);
  await expect(theirs.getByRole('heading', { name: 'Sign in' })).toBeVisible();
  await theirs.context().close();

  await page.setViewportSize({ width: 390, height: 844 });
  await expect(page.getByRole('button', { name: `Switch on ${PERSON.name}` })).toBeInViewport();
  await expectNoSidewaysScroll(page);
});
