import type { ByteReader } from './byte-reader.js';

/** Element ids as RFC 9559 gives them. */
const EBML = 0x1a45dfa3;
const SEGMENT = 0x18538067;
const CLUSTER = 0x1f43b675;
const TRACKS = 0x1654ae6b;
const TRACK_ENTRY = 0xae;
const TRACK_TYPE = 0x83;
const AUDIO_TRACK = 2;
/** What else a recording of sound is made of: seek head, info, cues, tags, void, CRC, timestamp, blocks, sizes. */
const PLAIN = new Set([
  0x114d9b74, 0x1549a966, 0x1c53bb6b, 0x1254c367, 0xec, 0xbf, 0xe7, 0xa3, 0xa0, 0xa7, 0xab,
]);
const TRACKS_MAX_BYTES = 65_536;
/** An id of four bytes and a size of eight. */
const HEAD_BYTES = 12;

interface Element {
  id: number;
  /** Where its content begins. */
  from: number;
  /** Null where the writer did not know it: a live recording. */
  bytes: number | null;
}

/**
 * Whether a file is a WebM of sound and nothing else, from its first byte to its last: only elements that such a
 * recording has, every track of sound, nothing behind the end. The last element may be cut short anywhere, as
 * when a recorder was closed in the middle: browsers hand out slices that end within an element's head.
 */
export async function isWebmOfSound(reader: ByteReader): Promise<boolean> {
  let soundTracks = 0;
  for (let position = 0; position < reader.size;) {
    const head = await reader.at(position, HEAD_BYTES);
    const element = elementAt(head, position);
    if (element === null) return soundTracks > 0 && isCutHead(head);
    if ((position === 0) !== (element.id === EBML)) return false;
    const { id, from, bytes } = element;
    if (id === SEGMENT || id === CLUSTER) {
      position = from;
      continue;
    }
    if (bytes === null) return false;
    if (id === TRACKS) {
      if (bytes > TRACKS_MAX_BYTES) return false;
      const types = trackTypes(await reader.at(from, bytes));
      if (types.length === 0 || types.some((type) => type !== AUDIO_TRACK)) return false;
      soundTracks += types.length;
    } else if (id !== EBML && !PLAIN.has(id)) return false;
    position = from + bytes;
  }
  return soundTracks > 0;
}

/** The first bytes of an element that such a recording has, and then the end of the file. */
function isCutHead(head: Buffer): boolean {
  const idLength = vintLength(head[0]);
  if (head.length === HEAD_BYTES || idLength === 0) return false;
  const given = Math.min(idLength, head.length);
  return [CLUSTER, ...PLAIN].some((id) => {
    const whole = id.toString(16).padStart(2, '0');
    return whole.length === idLength * 2 && whole.startsWith(head.toString('hex', 0, given));
  });
}

/** The type of each track; an entry that says none counts as 0. */
function trackTypes(tracks: Buffer): number[] {
  return children(tracks)
    .filter(({ id }) => id === TRACK_ENTRY)
    .map(({ from, bytes }) => {
      const entry = tracks.subarray(from, from + (bytes ?? 0));
      const type = children(entry).find(({ id }) => id === TRACK_TYPE);
      return type === undefined ? 0 : (entry[type.from] ?? 0);
    });
}

function children(content: Buffer): Element[] {
  const found: Element[] = [];
  for (let position = 0; position < content.length;) {
    const element = elementAt(content.subarray(position, position + HEAD_BYTES), position);
    if (element === null) break;
    found.push(element);
    // One of unknown size reaches to the end.
    position = element.from + (element.bytes ?? content.length);
  }
  return found;
}

/** Id and size in front of an element; null where there is none. */
function elementAt(head: Buffer, position: number): Element | null {
  const idLength = vintLength(head[0]);
  if (idLength === 0 || idLength > 4 || head.length <= idLength) return null;
  const id = head.readUIntBE(0, idLength);
  const sizeLength = vintLength(head[idLength]);
  if (sizeLength === 0 || head.length < idLength + sizeLength) return null;
  const from = position + idLength + sizeLength;
  return { id, from, bytes: vintValue(head.subarray(idLength, idLength + sizeLength)) };
}

/** How many bytes a number of variable length takes: one more than the zeros before its first set bit. */
function vintLength(first: number | undefined): number {
  return first === undefined || first === 0 ? 0 : Math.clz32(first) - 23;
}

/** The number behind the length mark; null where all bits are set, which means "not known". */
function vintValue(bytes: Buffer): number | null {
  const mark = 0x80 >> (bytes.length - 1);
  let value = (bytes[0] ?? 0) & (mark - 1);
  let isUnknown = value === mark - 1;
  for (const byte of bytes.subarray(1)) {
    value = value * 256 + byte;
    isUnknown &&= byte === 0xff;
  }
  return isUnknown ? null : value;
}
