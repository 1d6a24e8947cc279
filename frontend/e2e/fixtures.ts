import AxeBuilder from '@axe-core/playwright';
import { expect, test as base, type Page } from '@playwright/test';
import { stateFile, type Role } from './roles';

interface JourneyOptions {
  /** Who is signed in when the journey starts; null: nobody. */
  role: Role | null;
  /** Light or dark, as the person menu sets it. */
  scheme: 'light' | 'dark';
}

interface JourneyChecks {
  /** Fails the journey on any error in the page's console. */
  quietConsole: undefined;
}

export const test = base.extend<JourneyOptions & JourneyChecks>({
  role: [null, { option: true }],
  scheme: ['light', { option: true }],
  // eslint-disable-next-line no-empty-pattern -- the runner reads the names of a fixture's needs from this pattern
  baseURL: ({}, use) => use(process.env.STAGEYARD_JOURNEY_URL),
  storageState: ({ role }, use) => use(role === null ? undefined : stateFile(role)),
  colorScheme: ({ scheme }, use) => use(scheme),
  quietConsole: [
    async ({ page }, use) => {
      const said: string[] = [];
      page.on('pageerror', (error) => said.push(error.message));
      page.on('console', (message) => {
        // A refused request is written by the browser itself; whether it was meant is for the journey to say.
        if (message.type() === 'error' && !message.text().startsWith('Failed to load resource')) {
          said.push(message.text());
        }
      });
      await use(undefined);
      expect(said, 'errors in the console').toEqual([]);
    },
    { auto: true },
  ],
});

/** No accessibility fault on the page as it stands (WCAG 2.1 A and AA, contrast included). */
export async function expectAccessible(page: Page): Promise<void> {
  // Text that is still fading in would be measured half transparent.
  await page.evaluate(() =>
    Promise.all(document.getAnimations().map((each) => each.finished.catch(() => null))),
  );
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa'])
    .analyze();
  const told = violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`,
  );
  expect(told).toEqual([]);
}

/** Nothing sticks out to the side. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const { wide, seen } = await page.evaluate(() => ({
    wide: document.documentElement.scrollWidth,
    seen: document.documentElement.clientWidth,
  }));
  expect(wide).toBeLessThanOrEqual(seen);
}

export { expect };
