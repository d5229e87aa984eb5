import { AxeBuilder } from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';
import { DEMO_DOMAIN, DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';

/** Signs in through the door as a person of the demo. */
export async function signIn(page: Page, mailbox: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(`${mailbox}@${DEMO_DOMAIN}`);
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).not.toHaveURL(/sign-in/u);
}

/** Opens a new entry in the editor and waits for its empty form: what is typed sooner would go into the one before. */
export async function beginEntry(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Add an entry' }).click();
  await expect(page.getByLabel(/^Name of the work or rite/u)).toHaveValue('');
}

/** No serious or critical accessibility violation on the screen as it stands (axe-core, WCAG 2.2 A and AA). */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    // All within the page: no screen has frames of strangers, and a second page for the result takes longer than the rules.
    .setLegacyMode()
    // What is fine is not written out: that takes most of the time on a long page.
    .options({ resultTypes: ['violations'] })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    // React Aria's announcer is empty until it speaks; axe takes its role for an image without a name.
    .exclude('[data-live-announcer]')
    .analyze();
  const serious = violations.filter(({ impact }) => impact === 'serious' || impact === 'critical');
  expect(
    serious.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`),
    'serious accessibility violations',
  ).toEqual([]);
}

/** Nothing reaches over the side of the screen: a phone never scrolls sideways, once pictures know their width. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const overflow = () =>
    page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  await expect.poll(overflow, { message: 'pixels beyond the side of the screen' }).toBeLessThanOrEqual(0);
}
