import type { ByteReader } from './byte-reader.js';

/** Head of an Ogg page without its table of segments (RFC 3533). */
const HEAD_BYTES = 27;
const SEGMENT_COUNT_AT = 26;
/** How a stream of sound names itself in its first page. */
const SOUND = ['OpusHead', '\u0001vorbis'];
const NAME_BYTES = 8;

/** Whether a file is an Ogg of sound and nothing else: pages to its last byte, each stream's first one of sound. */
export async function isOggOfSound(reader: ByteReader): Promise<boolean> {
  let position = 0;
  let streams = 0;
  while (position < reader.size) {
    const head = await reader.at(position, HEAD_BYTES);
    if (head.length < HEAD_BYTES || head.toString('latin1', 0, 4) !== 'OggS') return false;
    const segments = await reader.at(position + HEAD_BYTES, head[SEGMENT_COUNT_AT] ?? 0);
    const content = position + HEAD_BYTES + segments.length;
    if (((head[5] ?? 0) & 2) !== 0) {
      const name = (await reader.at(content, NAME_BYTES)).toString('latin1');
      if (!SOUND.some((start) => name.startsWith(start))) return false;
      streams += 1;
    }
    position = content + segments.reduce((sum, bytes) => sum + bytes, 0);
  }
  return streams > 0;
}
