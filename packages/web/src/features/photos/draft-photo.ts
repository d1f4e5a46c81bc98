import { PHOTO_MAX_BYTES, type Photo } from '@rivetside/shared';

/** A photo as the draft keeps it: the picture itself, so that it outlives a closed tab and a lost network. */
export interface DraftPhoto {
  /** Ours, on this device alone. */
  readonly key: string;
  readonly name: string;
  readonly file: Blob;
  readonly caption: string;
  /** The photo as the server keeps it, once it was sent. */
  readonly sent: Photo | null;
}

const MEGABYTE = 1024 * 1024;
const PICTURE = /^image\//;
const PICTURE_NAME = /\.(jpe?g|png|webp|heic|heif)$/i;

/** Why a file cannot be a photo, before anything is sent; null where it may be one. */
export function refusedFile(file: {
  readonly name: string;
  readonly type: string;
  readonly size: number;
}): string | null {
  if (!PICTURE.test(file.type) && !PICTURE_NAME.test(file.name)) {
    return `${file.name} is no picture: JPEG, PNG, WebP or HEIC.`;
  }
  if (/svg/i.test(file.type)) return `${file.name} is a drawing, not a photo: JPEG, PNG, WebP or HEIC.`;
  if (file.size === 0) return `${file.name} is empty.`;
  if (file.size <= PHOTO_MAX_BYTES) return null;
  const [has, most] = [file.size, PHOTO_MAX_BYTES].map((bytes) => (bytes / MEGABYTE).toFixed(0));
  return `${file.name} has ${has} MB, at most ${most} MB can be sent: take it smaller.`;
}

/** Moves one photo a place on; at either end it stays. */
export function movedPhoto(photos: readonly DraftPhoto[], index: number, by: 1 | -1): DraftPhoto[] {
  const to = index + by;
  if (to < 0 || to >= photos.length) return [...photos];
  const next = [...photos];
  [next[index], next[to]] = [next[to]!, next[index]!];
  return next;
}
