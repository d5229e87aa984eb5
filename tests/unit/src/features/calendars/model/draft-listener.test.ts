import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { DraftGlance } from '#shared/contracts/draft-changes.js';
import { glanceIn, listenToDraft } from '#src/features/calendars/model/draft-listener.js';

const glance = (publishedNumber: number | null): DraftGlance => ({
  entries: [],
  locked: false,
  publishedNumber,
});
const asSent = (told: DraftGlance) => `retry: 3000\n\nevent: glance\ndata: ${JSON.stringify(told)}\n\n`;

/** A stream whose other end is the test. */
class Stream extends EventTarget {
  isClosed = false;
  close() {
    this.isClosed = true;
  }
  tells(told: DraftGlance) {
    this.dispatchEvent(new MessageEvent('glance', { data: JSON.stringify(told) }));
  }
  breaks() {
    this.dispatchEvent(new Event('error'));
  }
}

let streams: Stream[];
let heard: DraftGlance[];
const ask = vi.fn(() => Promise.resolve(asSent(glance(7))));
const last = () => {
  const stream = streams.at(-1);
  if (!stream) throw new Error('no stream was opened');
  return stream;
};
const listen = () =>
  listenToDraft(
    {
      open: () => {
        streams.push(new Stream());
        return last();
      },
      ask,
    },
    (told) => heard.push(told),
  );

beforeEach(() => {
  vi.useFakeTimers();
  streams = [];
  heard = [];
  ask.mockClear();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('whoever listens to a draft', () => {
  it('hears what the stream tells, and comes back soon after one break', async () => {
    listen();
    last().tells(glance(1));
    last().breaks();
    await vi.advanceTimersByTimeAsync(3_000);
    expect(streams.map(({ isClosed }) => isClosed)).toEqual([true, false]);
    last().tells(glance(2));
    expect(heard).toEqual([glance(1), glance(2)]);
    expect(ask).not.toHaveBeenCalled();
  });

  it('asks every ten seconds after two breaks in a row, until a stream tells again', async () => {
    listen();
    last().breaks();
    await vi.advanceTimersByTimeAsync(3_000);
    last().breaks();
    await vi.advanceTimersByTimeAsync(20_000);
    expect(heard).toEqual([glance(7), glance(7)]);
    await vi.advanceTimersByTimeAsync(40_000);
    expect(streams).toHaveLength(3);
    ask.mockClear();
    last().tells(glance(8));
    await vi.advanceTimersByTimeAsync(30_000);
    expect(ask).not.toHaveBeenCalled();
  });

  it('asks from the beginning where there are no streams, and bears a missing network', async () => {
    ask.mockRejectedValueOnce(new Error('offline'));
    listenToDraft({ open: () => null, ask }, (told) => heard.push(told));
    await vi.advanceTimersByTimeAsync(20_000);
    expect(heard).toEqual([glance(7)]);
  });

  it('hears nothing more once it stopped', async () => {
    const stop = listen();
    const stream = last();
    stop();
    stream.tells(glance(1));
    await vi.advanceTimersByTimeAsync(120_000);
    expect([heard, stream.isClosed, streams.length]).toEqual([[], true, 1]);
  });
});

it('a glance that cannot be read is none', () => {
  expect(glanceIn(asSent(glance(3)))).toEqual(glance(3));
  expect(glanceIn('event: glance\ndata: {"entries":3}\n\n')).toBeNull();
  expect(glanceIn('event: glance\ndata: <html>\n\n')).toBeNull();
  expect(glanceIn(':\n\n')).toBeNull();
});
