import { devices, type Page } from '@playwright/test';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { expect, test } from '#tests/support/journey.js';
import { expectAccessible, expectNoSidewaysScroll, signIn } from '#tests/support/journey-steps.js';
import { ask, giveCard, JOURNEY_PIN, openReview } from '#tests/support/open-review.js';

/* An elder who does not read finishes twelve entries by ear: four buttons, two voices, and nothing typed but the PIN. */
test.use({
  viewport: { width: 360, height: 740 },
  isMobile: true,
  hasTouch: true,
  userAgent: devices['Pixel 7'].userAgent,
});

const TWELVE = 12;

/** Stands in the place of the device's voices and writes down what it was asked to say. */
function hearingStub(): void {
  const said: { text: string; lang: string; voice: string; rate: number }[] = [];
  const voices = [
    { name: 'Far away', lang: 'en-GB', localService: false },
    { name: 'On this phone', lang: 'en-GB', localService: true },
  ];
  class Utterance {
    voice: { name: string } | null = null;
    lang = '';
    rate = 1;
    constructor(readonly text: string) {}
  }
  const engine = {
    getVoices: () => voices,
    speak: ({ text, lang, voice, rate }: Utterance) =>
      said.push({ text, lang, voice: voice?.name ?? '', rate }),
    cancel: () => said.push({ text: '(stopped)', lang: '', voice: '', rate: 0 }),
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  };
  Object.defineProperty(window, 'speechSynthesis', { value: engine });
  Object.defineProperty(window, 'SpeechSynthesisUtterance', { value: Utterance });
  Object.defineProperty(window, 'said', { value: said });
}

interface Said {
  text: string;
  lang: string;
  voice: string;
}
const heard = (page: Page) => page.evaluate(() => (window as unknown as { said: Said[] }).said);

async function changeByVoice(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Change this' }).click();
  await page.getByRole('button', { name: 'Say it by voice' }).click();
  await page.getByRole('button', { name: 'On to the spoken agreement' }).click();
  await page.getByRole('button', { name: 'Record the agreement' }).click();
  await expect(page.getByRole('timer')).not.toHaveText('0:00');
  await page.getByRole('button', { name: 'Stop', exact: true }).click();
  await page.getByRole('button', { name: 'Yes, on to the recording' }).click();
  await page.getByRole('button', { name: 'Record', exact: true }).click();
  await expect(page.getByRole('timer')).not.toHaveText('0:00');
  await page.getByRole('button', { name: 'Stop', exact: true }).click();
  await page.getByRole('button', { name: 'Keep it' }).click();
  await expect(page.getByText('Change this: kept.').last()).toBeVisible();
}

test('twelve entries are heard and answered with four buttons, two of them by voice', async ({
  page,
  browser,
}) => {
  test.setTimeout(120_000);
  const office = await browser.newPage();
  await signIn(office, 'officer');
  const path = await openReview(office, TWELVE);
  await office.close();
  const steward = await browser.newPage();
  await signIn(steward, 'steward');
  const code = await giveCard(steward, 'Elder A-2');
  await steward.close();

  await page.addInitScript(hearingStub);
  await page.goto('/sign-in');
  await ask(page, 'post', '/session/card/pin', { code, pin: JOURNEY_PIN });
  const version = (await (await page.request.get(`/api${path}`)).json()) as Version;
  const answers = async () =>
    ((await (await page.request.get(`/api${path}/answers`)).json()) as { items: Answer[] }).items.filter(
      ({ elderName }) => elderName === 'Elder A-2',
    );
  const before = await answers();
  const open = version.entries.filter(({ entryId }) => !before.some((each) => each.entryId === entryId));
  expect(open.length).toBeGreaterThanOrEqual(TWELVE);
  await page.goto(`${path}/review`);
  const four = page.getByRole('group', { name: 'Your answer' });
  const words = ['Agree', 'Change this', 'Not for the board', 'Not mine to say'];
  for (let done = 0; done < TWELVE; done += 1) {
    const total = version.entries.length;
    const progress = new RegExp(`^${before.length + done} of ${total} entries answered`, 'u');
    await expect(page.getByRole('img', { name: progress })).toBeVisible();
    for (const name of words) await expect(four.getByRole('button', { name, exact: true })).toBeInViewport();
    const address = page.url();
    const title = await page.locator('#entry-title').innerText();
    if (done === 0) {
      await page.getByRole('button', { name: 'Read it aloud' }).click();
      const spoken = (await heard(page)).filter(({ lang }) => lang !== '');
      expect(spoken.length).toBeGreaterThan(2);
      expect(title).toContain(spoken[0]?.text ?? '?');
      expect(new Set(spoken.map(({ lang, voice }) => `${lang} ${voice}`))).toEqual(
        new Set(['en-GB On this phone']),
      );
      await expectAccessible(page);
      await expectNoSidewaysScroll(page);
    }
    if (done === 3 || done === 7) await changeByVoice(page);
    else await four.getByRole('button', { name: 'Agree', exact: true }).click();
    await expect.poll(async () => (await answers()).length).toBe(before.length + done + 1);
    // The next answer belongs to the next entry: it has to be on screen.
    await expect(page).not.toHaveURL(address);
    // Whatever was being read stops with the entry.
    if (done === 0) await expect.poll(async () => (await heard(page)).at(-1)?.text).toBe('(stopped)');
    if (done + 1 < TWELVE) await expect(page.locator('#entry-title')).toBeVisible();
  }
  const given = (await answers()).slice(before.length);
  expect(given).toHaveLength(TWELVE);
  const voiced = given.filter(({ spoken }) => spoken !== null);
  expect(voiced.map(({ answer, note, spoken }) => [answer, note, spoken?.state])).toEqual([
    ['change-this', '', 'kept'],
    ['change-this', '', 'kept'],
  ]);
  // What was said can be heard where it was said.
  await page.goto(`${path}/review?entry=${voiced[0]?.entryId ?? ''}`);
  await expect(page.getByText('It was said by voice.')).toBeVisible();
  await page.getByRole('button', { name: 'What Elder A-2 said' }).click();
});
