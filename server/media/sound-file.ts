import { fileTypeFromFile } from 'file-type';
import { withByteReader } from './byte-reader.js';
import { isMp4OfSound } from './mp4-shape.js';
import { isOggOfSound } from './ogg-shape.js';
import { isWebmOfSound } from './webm-shape.js';

/** The closed list: what a browser records. A file is served with the type that stands here, never with the sender's. */
const SOUND = {
  webm: { contentType: 'audio/webm', isOfSound: isWebmOfSound },
  mp4: { contentType: 'audio/mp4', isOfSound: isMp4OfSound },
  m4a: { contentType: 'audio/mp4', isOfSound: isMp4OfSound },
  opus: { contentType: 'audio/ogg', isOfSound: isOggOfSound },
  ogg: { contentType: 'audio/ogg', isOfSound: isOggOfSound },
} as const;

export type SoundType = (typeof SOUND)[keyof typeof SOUND]['contentType'];

/**
 * The type of a sound file by its content, whatever its name says; null for anything else, and for a file that holds
 * more than sound: pictures, other tracks, something hung on behind its end.
 */
export async function soundTypeOf(filePath: string): Promise<SoundType | null> {
  const found = await fileTypeFromFile(filePath);
  const kind = Object.entries(SOUND).find(([ext]) => ext === found?.ext)?.[1];
  if (kind === undefined) return null;
  return (await withByteReader(filePath, kind.isOfSound)) ? kind.contentType : null;
}
