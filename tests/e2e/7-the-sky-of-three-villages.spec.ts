import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';

/*
 * The same screens in the tropics, high in the hills and beyond the arctic circle: everywhere an answer, on a phone of
 * 320 pixels, with nothing that a screen reader stumbles over.
 */
test.use({ viewport: { width: 320, height: 640 } });

/** Sirius serves in all three villages, Capella never sets in the north, the Pleiades hide behind its hills. */
const SCREENS = [
  '/',
  '/stars?year=2027',
  '/stars/hr2491?year=2027',
  '/stars/hr1708?year=2027',
  '/stars/hr2491/air?year=2027',
  '/stars/pleiades/drift?year=2027',
  '/stars/moons?year=2027',
  '/finder?year=2027',
  '/look?marker=hr2491',
  '/look?marker=pleiades',
  '/village/figures',
  '/village/places',
];
/** The same wherever the village lies. */
const ANYWHERE = ['/figures/new', '/places/new', '/account'];

for (const { mailbox, village, screens } of [
  { mailbox: 'officer', village: 'Upper Tazimel', screens: [...SCREENS, ...ANYWHERE] },
  { mailbox: 'officer2', village: 'Vardesca Terraces', screens: SCREENS },
  { mailbox: 'officer3', village: 'Tholmere Landing', screens: SCREENS },
]) {
  test(`${village}: every screen of the sky fits a phone and can be read aloud`, async ({ page }) => {
    test.setTimeout(180_000);
    await signIn(page, mailbox);
    for (const address of screens) {
      await test.step(address, async () => {
        await page.goto(address);
        await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
        await expect(page.locator('.skeleton')).toHaveCount(0);
        await expect(page.getByText('This did not come through')).toHaveCount(0);
        await expectNoSidewaysScroll(page);
        await expectAccessible(page);
      });
    }
  });
}
