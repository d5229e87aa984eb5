import { draftGlance, type DraftGlance } from '#shared/contracts/draft-changes.js';

/** As much of an EventSource as is used. */
interface DraftStream {
  addEventListener: (type: string, hear: (event: Event) => void) => void;
  close: () => void;
}

/** The way to the server, so that a test can stand in for it. */
export interface ListenerWays {
  /** Opens a stream; null where the browser has none. */
  open: () => DraftStream | null;
  /** Asks once, without a stream. */
  ask: () => Promise<string>;
}

const AGAIN_MS = 3_000;
const STREAM_AGAIN_MS = 60_000;
const ASK_EVERY_MS = 10_000;
/** After so many failures in a row the draft is asked for instead. */
const FAILURES_MAX = 2;

const GLANCE = /^event: glance\ndata: (.*)$/mu;

/** The glance in what a stream sent; null where there is none that can be read. */
export function glanceIn(text: string): DraftGlance | null {
  const found = GLANCE.exec(text)?.[1];
  return found === undefined ? null : readGlance(found);
}

export function readGlance(json: string): DraftGlance | null {
  try {
    const parsed = draftGlance.safeParse(JSON.parse(json));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

/**
 * Hears of a draft by a stream. Where none comes to be, or it breaks twice in a row, the draft is asked for every ten seconds
 * and a stream is tried again every minute.
 * @returns stops listening
 */
export function listenToDraft(ways: ListenerWays, onGlance: (glance: DraftGlance) => void): () => void {
  let stream: DraftStream | null = null;
  let failures = 0;
  let isOver = false;
  let again: ReturnType<typeof setTimeout> | undefined;
  let asking: ReturnType<typeof setInterval> | undefined;

  const hear = (glance: DraftGlance | null) => {
    if (glance !== null && !isOver) onGlance(glance);
  };
  const ask = () => {
    // Without a network there is nothing to hear; the next time will tell.
    void ways.ask().then(
      (text) => {
        hear(glanceIn(text));
      },
      () => undefined,
    );
  };
  const fail = () => {
    stream?.close();
    stream = null;
    failures += 1;
    const asksNow = failures >= FAILURES_MAX;
    if (asksNow) asking ??= setInterval(ask, ASK_EVERY_MS);
    again = setTimeout(connect, asksNow ? STREAM_AGAIN_MS : AGAIN_MS);
  };
  const connect = () => {
    stream = ways.open();
    if (stream === null) {
      asking ??= setInterval(ask, ASK_EVERY_MS);
      return;
    }
    stream.addEventListener('glance', (event) => {
      failures = 0;
      clearInterval(asking);
      asking = undefined;
      hear(readGlance(String((event as MessageEvent<unknown>).data)));
    });
    stream.addEventListener('error', fail);
  };

  connect();
  return () => {
    isOver = true;
    stream?.close();
    clearTimeout(again);
    clearInterval(asking);
  };
}
