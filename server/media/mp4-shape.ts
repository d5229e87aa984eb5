import type { ByteReader } from './byte-reader.js';

/** Boxes that stand at the top of an MP4 of sound, whole or in fragments (ISO/IEC 14496-12). */
const TOP = new Set(['ftyp', 'styp', 'moov', 'moof', 'mdat', 'mfra', 'sidx', 'free', 'skip', 'wide']);
const HEAD_BYTES = 16;
const MOOV_MAX_BYTES = 4_194_304;
const HANDLER_TYPE_AT = 8;

interface Box {
  type: string;
  from: number;
  end: number;
}

/**
 * Whether a file is an MP4 of sound and nothing else: it begins with its type, is boxes to its last byte, and every
 * track is of sound. The last media box may be cut short, as when a recorder was closed in the middle.
 */
export async function isMp4OfSound(reader: ByteReader): Promise<boolean> {
  let handlers: string[] = [];
  for (let position = 0; position < reader.size;) {
    const box = boxAt(await reader.at(position, HEAD_BYTES), position, reader.size);
    if (box === null || !TOP.has(box.type) || (position === 0 && box.type !== 'ftyp')) return false;
    if (box.end > reader.size && box.type !== 'mdat') return false;
    if (box.type === 'moov') {
      if (box.end - box.from > MOOV_MAX_BYTES) return false;
      handlers = [...handlers, ...handlerTypes(await reader.at(box.from, box.end - box.from))];
    }
    position = box.end;
  }
  return handlers.length > 0 && handlers.every((type) => type === 'soun');
}

/** moov > trak > mdia > hdlr: what each track holds. */
function handlerTypes(moov: Buffer): string[] {
  return inside(moov, 'trak').flatMap((track) =>
    inside(track, 'mdia').flatMap((media) =>
      inside(media, 'hdlr').map((handler) =>
        handler.toString('latin1', HANDLER_TYPE_AT, HANDLER_TYPE_AT + 4),
      ),
    ),
  );
}

/** Contents of the boxes of a type. */
function inside(content: Buffer, type: string): Buffer[] {
  const found: Buffer[] = [];
  for (let position = 0; position < content.length;) {
    const box = boxAt(content.subarray(position, position + HEAD_BYTES), position, content.length);
    if (box === null) break;
    if (box.type === type) found.push(content.subarray(box.from, box.end));
    position = box.end;
  }
  return found;
}

/** A size of 1 means that the real one follows in eight bytes; 0 means "to the end". */
function boxAt(head: Buffer, position: number, end: number): Box | null {
  if (head.length < 8) return null;
  const short = head.readUInt32BE(0);
  const headBytes = short === 1 ? 16 : 8;
  if (head.length < headBytes) return null;
  const bytes = short === 1 ? Number(head.readBigUInt64BE(8)) : short === 0 ? end - position : short;
  if (bytes < headBytes) return null;
  return { type: head.toString('latin1', 4, 8), from: position + headBytes, end: position + bytes };
}
