/** What a watch card says, all words ready: the card is one page of A5, read in the hand. */
export interface WatchCardModel {
  readonly title: string;
  /** Which morning or evening, and where. */
  readonly when: string;
  /** The time to stop or to begin, in the largest type. */
  readonly limit: string;
  /** Null where there is nothing to look at. */
  readonly picture: WatchPicture | null;
  /** Sentences, the most needed first: what does not fit is left out whole, from the end. */
  readonly sentences: readonly string[];
  /** Always printed. */
  readonly cautions: readonly string[];
  readonly foot: string;
}

export interface PictureDirection {
  readonly azimuthDeg: number;
  readonly altitudeDeg: number;
}

export interface WatchPicture {
  /** Skyline of the place; empty for level ground. */
  readonly skyline: readonly PictureDirection[];
  /** In order of time. */
  readonly path: readonly (PictureDirection & { readonly isSeen: boolean; readonly isUp: boolean })[];
  readonly star: PictureDirection;
  /** Where the path ends because the Sun comes. */
  readonly stop: PictureDirection | null;
  readonly labels: readonly (PictureDirection & { readonly words: string })[];
  readonly compass: readonly { readonly azimuthDeg: number; readonly words: string }[];
  readonly handWords: string;
}
