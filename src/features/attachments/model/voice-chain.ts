import { PART_SECONDS, PARTS_MAX } from '#shared/contracts/attachments.js';

/** In the order in which they are asked for: what every browser that can record offers one of. */
const TYPES = ['audio/webm;codecs=opus', 'audio/webm', 'audio/mp4', 'audio/ogg;codecs=opus'] as const;
/** Enough for a voice: about a quarter of a megabyte a minute. */
const BITS_PER_SECOND = 32_000;
/** What is lost at most when the page is closed in the middle. */
const SLICE_MS = 2_000;

/** What this browser records; null where it cannot. */
export function recordingType(): string | null {
  if (typeof MediaRecorder === 'undefined') return null;
  return TYPES.find((type) => MediaRecorder.isTypeSupported(type)) ?? null;
}

export interface Slice {
  part: number;
  /** Place of the slice within its part, from 0. */
  index: number;
  content: Blob;
  /** How long the part is so far. */
  seconds: number;
}

interface ChainOptions {
  stream: MediaStream;
  mimeType: string;
  firstPart: number;
  /** Called for every slice, in order; the chain waits for it before it says that it has stopped. */
  onSlice: (slice: Slice) => Promise<void>;
  /** The last part that may be is full, or the microphone went away. */
  onEnd: () => void;
  /** Monotonic milliseconds. */
  now?: () => number;
}

/**
 * Records one stream in parts. The next part begins before the one before it is stopped, so nothing of the speech falls
 * between two parts, and nobody has to stop speaking.
 */
export class VoiceChain {
  private current: MediaRecorder | null = null;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private readonly ended: Promise<void>[] = [];
  private queue: Promise<void> = Promise.resolve();
  private isStopping = false;
  private part: number;
  private readonly now: () => number;

  constructor(private readonly options: ChainOptions) {
    this.part = options.firstPart - 1;
    this.now = options.now ?? (() => performance.now());
  }

  start(): void {
    for (const track of this.options.stream.getTracks()) track.addEventListener('ended', this.options.onEnd);
    this.next();
  }

  /** Resolves when every slice has been taken in. */
  async stop(): Promise<void> {
    this.isStopping = true;
    clearTimeout(this.timer);
    for (const track of this.options.stream.getTracks()) {
      track.removeEventListener('ended', this.options.onEnd);
    }
    this.stopCurrent();
    await Promise.all(this.ended);
    await this.queue;
  }

  private next(): void {
    const before = this.current;
    this.part += 1;
    this.current = this.begin(this.part);
    if (before !== null && before.state !== 'inactive') before.stop();
    this.timer = setTimeout(() => {
      if (this.isStopping) return;
      if (this.part < PARTS_MAX) this.next();
      else this.options.onEnd();
    }, PART_SECONDS * 1000);
  }

  private stopCurrent(): void {
    if (this.current !== null && this.current.state !== 'inactive') this.current.stop();
  }

  private begin(part: number): MediaRecorder {
    const { stream, mimeType, onSlice } = this.options;
    const recorder = new MediaRecorder(stream, { mimeType, audioBitsPerSecond: BITS_PER_SECOND });
    const from = this.now();
    let index = 0;
    recorder.addEventListener('dataavailable', ({ data }) => {
      if (data.size === 0) return;
      const slice = { part, index, content: data, seconds: (this.now() - from) / 1000 };
      index += 1;
      this.queue = this.queue.then(() => onSlice(slice));
    });
    this.ended.push(
      new Promise((resolve) => {
        recorder.addEventListener('stop', () => {
          resolve();
        });
      }),
    );
    recorder.start(SLICE_MS);
    return recorder;
  }
}
