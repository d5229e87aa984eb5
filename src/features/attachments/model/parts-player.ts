export const SPEEDS = [0.8, 0.9, 1] as const;
export type Speed = (typeof SPEEDS)[number];

export interface PlayerPart {
  /** An address, or what is on this device. */
  source: string | Blob;
  seconds: number;
}

export interface PlayerState {
  isPlaying: boolean;
  /** Seconds from the beginning of the first part. */
  at: number;
  speed: Speed;
  /** True where the sound did not come through. */
  isMissing: boolean;
}

/** Plays parts one after the other as one recording. It never begins by itself, and fetches nothing before. */
export class PartsPlayer {
  private state: PlayerState = { isPlaying: false, at: 0, speed: 1, isMissing: false };
  private sound: HTMLAudioElement | null = null;
  private index = 0;
  private readonly listeners = new Set<() => void>();

  constructor(private readonly parts: readonly PlayerPart[]) {}

  readonly read = (): PlayerState => this.state;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => {
      this.listeners.delete(listener);
      // Nobody looks any more: a screen that is gone does not go on speaking.
      if (this.listeners.size === 0) this.pause();
    };
  };

  play(): void {
    if (this.sound === null) this.open(this.index);
    else this.begin(this.sound);
  }

  pause(): void {
    this.sound?.pause();
    this.tell({ isPlaying: false });
  }

  replay(): void {
    this.open(0);
  }

  setSpeed(speed: Speed): void {
    if (this.sound !== null) this.sound.playbackRate = speed;
    this.tell({ speed });
  }

  private open(index: number): void {
    const part = this.parts[index];
    if (part === undefined) return;
    this.close();
    this.index = index;
    const sound = new Audio();
    sound.preload = 'none';
    sound.src = typeof part.source === 'string' ? part.source : URL.createObjectURL(part.source);
    sound.playbackRate = this.state.speed;
    const before = this.parts.slice(0, index).reduce((sum, { seconds }) => sum + seconds, 0);
    sound.addEventListener('timeupdate', () => {
      if (this.sound === sound) this.tell({ at: before + sound.currentTime });
    });
    sound.addEventListener('ended', () => {
      if (this.sound === sound) this.afterPart();
    });
    this.sound = sound;
    this.tell({ at: before });
    this.begin(sound);
  }

  private afterPart(): void {
    if (this.index + 1 < this.parts.length) {
      this.open(this.index + 1);
      return;
    }
    this.close();
    this.index = 0;
    this.tell({ isPlaying: false, at: 0 });
  }

  private begin(sound: HTMLAudioElement): void {
    this.tell({ isPlaying: true, isMissing: false });
    sound.play().catch((cause: unknown) => {
      // Pressed "pause" before the sound had come: that is no trouble.
      const wasPaused = cause instanceof DOMException && cause.name === 'AbortError';
      if (wasPaused || this.sound !== sound) return;
      this.close();
      this.tell({ isPlaying: false, isMissing: true });
    });
  }

  /** An address of what is on this device holds it in memory until it is given back. */
  private close(): void {
    const { sound } = this;
    this.sound = null;
    sound?.pause();
    if (sound?.src.startsWith('blob:') === true) URL.revokeObjectURL(sound.src);
  }

  private tell(changes: Partial<PlayerState>): void {
    this.state = { ...this.state, ...changes };
    for (const listener of this.listeners) listener();
  }
}
