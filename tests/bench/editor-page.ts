import type { BrowserContext, CDPSession, Page } from '@playwright/test';

const SLOWER = 4;
/** Of February: whatever comes after it in the year is laid out anew. */
const EARLY_BAR = 'Move the days of Work 38';
/** Work that a person's hand set off is over by then. */
const SETTLED_MS = 1_200;

/**
 * From opening an address of a calendar until the entry of that number stands there; code and texts are in the cache. Long
 * lists are drawn in parts: the first entry can be read before the first part is whole. The page itself looks at each of its
 * frames: asked from outside, now and then, it would seem up to half a second slower.
 */
export async function firstRowsMs(context: BrowserContext, address: string, entry: number): Promise<number> {
  const page = await context.newPage();
  const times: number[] = [];
  for (let time = 0; time < 6; time += 1) {
    await page.goto(address);
    const seen = await page.waitForFunction(
      (name) => {
        const said = document.querySelector('main')?.textContent ?? '';
        return new RegExp(`${name}(?!\\d)`).test(said) && performance.now();
      },
      `Work ${entry}`,
      { polling: 'raf' },
    );
    times.push(Number(await seen.jsonValue()));
  }
  await page.close();
  return middle(times.slice(1));
}

export interface StripTimes {
  /** The longest single piece of work while a window is dragged on the strip. */
  dragLongestTaskMs: number;
  /** The longest one after it was let go. */
  releaseMs: number;
}

/** Drags a window on the strip of a wide screen, on a processor four times slower. */
export async function stripTimes(context: BrowserContext, address: string): Promise<StripTimes> {
  const page = await context.newPage();
  await page.setViewportSize({ width: 1280, height: 900 });
  await page.goto(address);
  const bar = page.getByRole('slider', { name: EARLY_BAR, exact: true });
  await bar.waitFor();
  const slow = await context.newCDPSession(page);
  await slow.send('Emulation.setCPUThrottlingRate', { rate: SLOWER });
  const drags: number[] = [];
  const releases: number[] = [];
  for (let time = 0; time < 3; time += 1) {
    await page.waitForTimeout(SETTLED_MS);
    const box = await bar.boundingBox();
    if (box === null) throw new Error('the bar is not there');
    const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
    await page.mouse.move(x, y);
    await page.mouse.down();
    await page.waitForTimeout(SETTLED_MS);
    drags.push(await longestTaskMs(slow, () => dragAlong(page, x, y)));
    releases.push(
      await longestTaskMs(slow, async () => {
        await page.mouse.up();
        await page.waitForTimeout(SETTLED_MS);
      }),
    );
  }
  await page.close();
  return { dragLongestTaskMs: middle(drags), releaseMs: middle(releases) };
}

async function dragAlong(page: Page, x: number, y: number): Promise<void> {
  for (let step = 1; step <= 20; step += 1) {
    await page.mouse.move(x + step * 4, y);
    await page.waitForTimeout(30);
  }
}

function middle(times: readonly number[]): number {
  return Math.round(times.toSorted((a, b) => a - b)[Math.floor(times.length / 2)] ?? Number.NaN);
}

interface TraceEvent {
  name: string;
  dur?: number;
}

/** The longest task of the page's own thread while something is done, as the browser's trace has it, milliseconds. */
async function longestTaskMs(session: CDPSession, work: () => Promise<void>): Promise<number> {
  const tasks: number[] = [];
  const collect = ({ value }: { value: object[] }) => {
    for (const { name, dur } of value as TraceEvent[]) {
      if (name === 'RunTask') tasks.push((dur ?? 0) / 1000);
    }
  };
  session.on('Tracing.dataCollected', collect);
  await session.send('Tracing.start', {
    transferMode: 'ReportEvents',
    traceConfig: { includedCategories: ['disabled-by-default-devtools.timeline', 'toplevel'] },
  });
  await work();
  const complete = new Promise<void>((resolve) => {
    session.once('Tracing.tracingComplete', () => resolve());
  });
  await session.send('Tracing.end');
  await complete;
  session.off('Tracing.dataCollected', collect);
  return Math.max(0, ...tasks);
}
