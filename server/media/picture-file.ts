import { fileTypeFromFile } from 'file-type';
import sharp from 'sharp';
import { PICTURE_SIDE_MAX_PX, THUMBNAIL_SIDE_MAX_PX } from '#shared/contracts/attachments.js';

const TAKEN = new Set(['jpg', 'png', 'webp']);
/** A picture of more is a bomb or a poster; both would take the memory of everybody else. */
const PIXELS_MAX = 64_000_000;
const QUALITY = 82;
const THUMBNAIL_QUALITY = 70;
const PAPER = '#ffffff';

export interface DrawnPicture {
  /** JPEG without anything about place, device or time. */
  picture: Buffer;
  thumbnail: Buffer;
  widthPx: number;
  heightPx: number;
}

/**
 * Draws a photo anew, so that nothing of the file that was sent is kept but its picture: turned upright, at most
 * 2048 px, as JPEG. Null for anything that is no JPEG, PNG or WebP by its content, or that cannot be drawn.
 */
export async function drawAnew(filePath: string): Promise<DrawnPicture | null> {
  const found = await fileTypeFromFile(filePath);
  if (found === undefined || !TAKEN.has(found.ext)) return null;
  try {
    const { data, info } = await sharp(filePath, { limitInputPixels: PIXELS_MAX, failOn: 'error' })
      .autoOrient()
      .flatten({ background: PAPER })
      .resize({
        width: PICTURE_SIDE_MAX_PX,
        height: PICTURE_SIDE_MAX_PX,
        fit: 'inside',
        withoutEnlargement: true,
      })
      .jpeg({ quality: QUALITY })
      .toBuffer({ resolveWithObject: true });
    const thumbnail = await sharp(data)
      .resize({
        width: THUMBNAIL_SIDE_MAX_PX,
        height: THUMBNAIL_SIDE_MAX_PX,
        fit: 'inside',
        withoutEnlargement: true,
      })
      .jpeg({ quality: THUMBNAIL_QUALITY })
      .toBuffer();
    return { picture: data, thumbnail, widthPx: info.width, heightPx: info.height };
  } catch {
    // Whatever the drawing trips over (a broken file, too many pixels) is a picture that cannot be taken.
    return null;
  }
}
