import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { PartsPlayer } from '#src/features/attachments/model/parts-player.js';

/** A sound that the test lets go on, end or fail. */
class FakeAudio extends EventTarget {
  static made: FakeAudio[] = [];
  src = '';
  preload = '';
  playbackRate = 1;
  currentTime = 0;
  isPlaying = false;
  failure: Error | null = null;

  constructor() {
    super();
    FakeAudio.made.push(this);
  }
  play(): Promise<void> {
    if (FakeAudio.nextFails !== null) return Promise.reject(FakeAudio.nextFails);
    this.isPlaying = true;
    return Promise.resolve();
  }
  pause(): void {
    this.isPlaying = false;
  }
  static nextFails: Error | null = null;
}
const last = () => FakeAudio.made.at(-1);
const heard = () => FakeAudio.made.filter(({ isPlaying }) => isPlaying).map(({ src }) => src);

const PARTS = [
  { source: '/one', seconds: 300 },
  { source: '/two', seconds: 12 },
];
let player: PartsPlayer;
let leave: () => void;
beforeEach(() => {
  FakeAudio.made = [];
  FakeAudio.nextFails = null;
  vi.stubGlobal('Audio', FakeAudio);
  player = new PartsPlayer(PARTS);
  leave = player.subscribe(() => undefined);
});
afterEach(() => {
  vi.unstubAllGlobals();
});

describe('listening', () => {
  it('never begins by itself, and fetches nothing before', () => {
    expect([FakeAudio.made.length, player.read().isPlaying]).toEqual([0, false]);
    player.play();
    expect([heard(), last()?.preload]).toEqual([['/one'], 'none']);
  });

  it('goes from part to part as one recording, with its speed', () => {
    player.play();
    player.setSpeed(0.8);
    expect(last()?.playbackRate).toBe(0.8);
    last()?.dispatchEvent(new Event('ended'));
    expect([heard(), last()?.playbackRate, player.read().at]).toEqual([['/two'], 0.8, 300]);
    Object.assign(last() ?? {}, { currentTime: 5 });
    last()?.dispatchEvent(new Event('timeupdate'));
    expect(player.read().at).toBe(305);
  });

  it('stands at the beginning again after the last part, and does not begin anew', () => {
    player.play();
    last()?.dispatchEvent(new Event('ended'));
    last()?.dispatchEvent(new Event('ended'));
    expect([FakeAudio.made.length, heard(), player.read()]).toEqual([
      2,
      [],
      { at: 0, isMissing: false, isPlaying: false, speed: 1 },
    ]);
  });

  it('pauses and goes on where it was; "from the beginning" goes to the first part', () => {
    player.play();
    last()?.dispatchEvent(new Event('ended'));
    player.pause();
    expect(heard()).toEqual([]);
    player.play();
    expect(last()?.src).toBe('/two');
    player.replay();
    expect([last()?.src, player.read().at]).toEqual(['/one', 0]);
  });

  it('says when the sound did not come through, and can be tried again', async () => {
    FakeAudio.nextFails = new Error('404');
    player.play();
    await vi.waitFor(() => {
      expect(player.read().isMissing).toBe(true);
    });
    FakeAudio.nextFails = null;
    player.play();
    expect(player.read()).toMatchObject({ isMissing: false, isPlaying: true });
  });

  it('is silent when its screen is gone', () => {
    player.play();
    leave();
    expect(heard()).toEqual([]);
  });

  it('gives the memory of what is on this device back', () => {
    const revoke = vi.fn();
    vi.stubGlobal(
      'URL',
      Object.assign(class extends URL {}, { createObjectURL: () => 'blob:one', revokeObjectURL: revoke }),
    );
    const local = new PartsPlayer([{ source: new Blob(['a voice']), seconds: 2 }]);
    local.play();
    expect(last()?.src).toBe('blob:one');
    last()?.dispatchEvent(new Event('ended'));
    expect(revoke).toHaveBeenCalledWith('blob:one');
  });
});
