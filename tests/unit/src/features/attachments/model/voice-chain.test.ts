import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { PART_SECONDS, PARTS_MAX } from '#shared/contracts/attachments.js';
import { recordingType, VoiceChain, type Slice } from '#src/features/attachments/model/voice-chain.js';

/** A recorder that writes down what is done to it and hands out what the test says. */
class FakeRecorder extends EventTarget {
  static made: FakeRecorder[] = [];
  static log: string[] = [];
  static types = new Set(['audio/webm;codecs=opus']);
  static isTypeSupported = (type: string) => FakeRecorder.types.has(type);
  state: 'inactive' | 'recording' = 'inactive';
  readonly number = FakeRecorder.made.push(this);

  start(): void {
    this.state = 'recording';
    FakeRecorder.log.push(`begin ${this.number}`);
  }

  stop(): void {
    this.state = 'inactive';
    FakeRecorder.log.push(`end ${this.number}`);
    this.hand(`last of ${this.number}`);
    this.dispatchEvent(new Event('stop'));
  }

  hand(text: string): void {
    this.dispatchEvent(Object.assign(new Event('dataavailable'), { data: new Blob([text]) }));
  }
}

const track = Object.assign(new EventTarget(), { stop: vi.fn() });
const stream = { getTracks: () => [track] } as unknown as MediaStream;
let slices: Slice[];
let nowMs: number;
const onEnd = vi.fn();

function chain(firstPart = 1): VoiceChain {
  return new VoiceChain({
    stream,
    mimeType: 'audio/webm;codecs=opus',
    firstPart,
    now: () => nowMs,
    onEnd,
    onSlice: async (slice) => {
      await Promise.resolve();
      slices.push(slice);
    },
  });
}

beforeEach(() => {
  vi.useFakeTimers();
  vi.stubGlobal('MediaRecorder', FakeRecorder);
  FakeRecorder.made = [];
  FakeRecorder.log = [];
  slices = [];
  nowMs = 0;
  onEnd.mockClear();
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('what a browser records', () => {
  it('is WebM with Opus before MP4, and nothing where it can do neither', () => {
    expect(recordingType()).toBe('audio/webm;codecs=opus');
    FakeRecorder.types = new Set(['audio/mp4']);
    expect(recordingType()).toBe('audio/mp4');
    FakeRecorder.types = new Set();
    expect(recordingType()).toBeNull();
    FakeRecorder.types = new Set(['audio/webm;codecs=opus']);
    vi.stubGlobal('MediaRecorder', undefined);
    expect(recordingType()).toBeNull();
  });
});

describe('a recording in parts', () => {
  it('begins the next part before it ends the one before, so nothing of the speech falls between', async () => {
    const voice = chain();
    voice.start();
    vi.advanceTimersByTime(PART_SECONDS * 1000);
    expect(FakeRecorder.log).toEqual(['begin 1', 'begin 2', 'end 1']);
    await voice.stop();
    expect(FakeRecorder.log).toEqual(['begin 1', 'begin 2', 'end 1', 'end 2']);
  });

  it('numbers slices within their part, and says how long the part is so far', async () => {
    const voice = chain(3);
    voice.start();
    nowMs = 2000;
    FakeRecorder.made[0]?.hand('a');
    nowMs = 4000;
    FakeRecorder.made[0]?.hand('b');
    vi.advanceTimersByTime(PART_SECONDS * 1000);
    nowMs = 5500;
    await voice.stop();
    expect(slices.map(({ part, index, seconds }) => [part, index, seconds])).toEqual([
      [3, 0, 2],
      [3, 1, 4],
      [3, 2, 4],
      [4, 0, 1.5],
    ]);
  });

  it('has stopped only when every slice is kept, and hands nothing out afterwards', async () => {
    const voice = chain();
    voice.start();
    await voice.stop();
    expect(slices).toHaveLength(1);
    vi.advanceTimersByTime(PART_SECONDS * 5000);
    expect(FakeRecorder.made).toHaveLength(1);
  });

  it('leaves empty slices out', async () => {
    const voice = chain();
    voice.start();
    FakeRecorder.made[0]?.hand('');
    await voice.stop();
    expect(slices.map(({ index }) => index)).toEqual([0]);
  });

  it('ends by itself after the last part that may be, and when the microphone goes away', () => {
    chain(PARTS_MAX).start();
    vi.advanceTimersByTime(PART_SECONDS * 1000 - 1);
    expect(onEnd).not.toHaveBeenCalled();
    vi.advanceTimersByTime(1);
    expect(onEnd).toHaveBeenCalledTimes(1);
    track.dispatchEvent(new Event('ended'));
    expect(onEnd).toHaveBeenCalledTimes(2);
  });
});
