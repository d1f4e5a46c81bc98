import sharp from 'sharp';
import { PHOTO_MAX_PIXELS, type PhotoSize } from '@rivetside/shared';
import { TooLarge, WrongType } from '../../common/errors/app-error.js';

/** What may come in, judged by its first bytes and never by its name. */
const TAKEN = new Set(['jpeg', 'png', 'webp', 'heif']);
const WIDEST: Readonly<Record<PhotoSize, number>> = { thumb: 320, screen: 1_600, full: 6_000 };
const QUALITY: Readonly<Record<PhotoSize, number>> = { thumb: 72, screen: 80, full: 88 };

// Two pictures at a time leave the process able to answer.
sharp.concurrency(1);
sharp.cache(false);

export interface Developed {
  readonly width: number;
  readonly height: number;
  readonly files: Readonly<Record<PhotoSize, Buffer>>;
}

/**
 * Re-encodes a picture in three sizes. Turned upright first, then all metadata is dropped: place, device and time
 * among it.
 */
export async function develop(bytes: Buffer): Promise<Developed> {
  const options = { limitInputPixels: PHOTO_MAX_PIXELS, failOn: 'error' as const, sequentialRead: true };
  const { width = 0, height = 0 } = await readHead(bytes);
  if (width * height > PHOTO_MAX_PIXELS) throw new TooLarge('A photo has at most 50 megapixels.');
  try {
    const make = (size: PhotoSize) =>
      sharp(bytes, options)
        .rotate()
        .resize({ width: WIDEST[size], height: WIDEST[size], fit: 'inside', withoutEnlargement: true })
        .flatten({ background: '#ffffff' })
        .jpeg({ quality: QUALITY[size], mozjpeg: size !== 'full' })
        .toBuffer({ resolveWithObject: true });
    const full = await make('full');
    const screen = await make('screen');
    const thumb = await make('thumb');
    const files = { thumb: thumb.data, screen: screen.data, full: full.data };
    return { width: full.info.width, height: full.info.height, files };
  } catch {
    throw new WrongType('This picture is damaged or broken off: take it again or choose another.');
  }
}

async function readHead(bytes: Buffer): Promise<{ format?: string; width?: number; height?: number }> {
  const head = await headOf(bytes).catch(() => null);
  if (!head?.format || !TAKEN.has(head.format))
    throw new WrongType('Photos are JPEG, PNG, WebP, or HEIC where it can be read here.');
  return head;
}

/** SVG is text that draws, with reach beyond itself: only its head is looked at, no renderer. Empty bytes throw at once. */
async function headOf(bytes: Buffer) {
  return sharp(bytes, { limitInputPixels: false }).metadata();
}
