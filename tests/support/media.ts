import sharp from 'sharp';

/** Small files made in code: just enough of each form to be one. */

/** An EBML element: id, size, content. */
function element(id: number, ...content: (Buffer | number[])[]): Buffer {
  const body = Buffer.concat(content.map((part) => Buffer.from(part)));
  const size = Buffer.alloc(4);
  size.writeUInt32BE(0x10000000 + body.length);
  return Buffer.concat([idBytes(id), size, body]);
}

function idBytes(id: number): Buffer {
  const hex = id.toString(16);
  return Buffer.from(hex.padStart(hex.length + (hex.length % 2), '0'), 'hex');
}

const UNKNOWN_SIZE = Buffer.from('01ffffffffffffff', 'hex');
const SOUND_TRACK = 2;
const MOVING_PICTURE_TRACK = 1;

/** A live WebM as a browser records it: segment and cluster of unknown size. */
export function webm({ note = 'voice', trackType = SOUND_TRACK } = {}): Buffer {
  const track = element(
    0xae,
    element(0xd7, [1]),
    element(0x83, [trackType]),
    element(0x86, Buffer.from('A_OPUS')),
  );
  return Buffer.concat([
    element(0x1a45dfa3, element(0x4282, Buffer.from('webm'))),
    idBytes(0x18538067),
    UNKNOWN_SIZE,
    element(0x1654ae6b, track),
    idBytes(0x1f43b675),
    UNKNOWN_SIZE,
    element(0xe7, [0]),
    element(0xa3, [0x81, 0, 0, 0x80], Buffer.from(note)),
  ]);
}

export const movie = (): Buffer => webm({ trackType: MOVING_PICTURE_TRACK });

function box(type: string, ...content: Buffer[]): Buffer {
  const body = Buffer.concat(content);
  const head = Buffer.alloc(8);
  head.writeUInt32BE(body.length + 8);
  head.write(type, 4, 'latin1');
  return Buffer.concat([head, body]);
}

/** An MP4 with one track: of sound, unless another handler is named. */
export function mp4({ handler = 'soun' } = {}): Buffer {
  const hdlr = box('hdlr', Buffer.alloc(8), Buffer.from(handler, 'latin1'), Buffer.alloc(13));
  return Buffer.concat([
    box('ftyp', Buffer.from('isom\0\0\0\0isomiso6', 'latin1')),
    box('moov', box('trak', box('mdia', hdlr))),
    box('mdat', Buffer.from('voice')),
  ]);
}

/** An Ogg with one page. */
export function ogg({ name = 'OpusHead' } = {}): Buffer {
  const content = Buffer.from(`${name}\u0001\u0001`, 'latin1');
  const head = Buffer.alloc(28);
  head.write('OggS', 0, 'latin1');
  head[5] = 2;
  head[26] = 1;
  head[27] = content.length;
  return Buffer.concat([head, content]);
}

/** A photo as a phone takes it: it says where and with what, and lies on its side. */
export function photoWithPlace(): Promise<Buffer> {
  return sharp({ create: { width: 60, height: 40, channels: 3, background: '#a3522f' } })
    .withExif({
      IFD0: { Make: 'Telltale', Model: 'Phone 9', Orientation: '6' },
      IFD3: {
        GPSLatitudeRef: 'N',
        GPSLatitude: '12/1 30/1 0/1',
        GPSLongitudeRef: 'E',
        GPSLongitude: '39/1 0/1 0/1',
      },
    })
    .withMetadata({ orientation: 6 })
    .jpeg()
    .toBuffer();
}

export function plainPicture(format: 'jpeg' | 'png' | 'webp' = 'png', side = 40): Promise<Buffer> {
  return sharp({ create: { width: side, height: side, channels: 3, background: '#345' } })
    .toFormat(format)
    .toBuffer();
}
