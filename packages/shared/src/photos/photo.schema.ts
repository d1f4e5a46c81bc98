import { z } from 'zod';

/** Upload limits: bytes of the file as sent, pixels before decoding. */
export const PHOTO_MAX_BYTES = 12 * 1024 * 1024;
export const PHOTO_MAX_PIXELS = 50_000_000;
export const PHOTOS_PER_ENTRY = 12;
export const PHOTO_SIZES = ['thumb', 'screen', 'full'] as const;
export type PhotoSize = (typeof PHOTO_SIZES)[number];

/** A label at a place in the picture; x and y run from 0 to 1 from the upper left corner. */
export const photoMarkSchema = z.strictObject({
  x: z.number().min(0).max(1),
  y: z.number().min(0).max(1),
  label: z.string().max(120),
});
export type PhotoMark = z.infer<typeof photoMarkSchema>;

export const photoSchema = z
  .strictObject({
    id: z.string(),
    width: z.number().int(),
    height: z.number().int(),
    bytes: z.number().int(),
    contentType: z.string(),
    caption: z.string().nullable(),
    marks: z.array(photoMarkSchema),
    /** Signed and short-lived, so that an `<img>` works without a header. */
    urls: z.strictObject({ thumb: z.string(), screen: z.string(), full: z.string() }),
  })
  .meta({ id: 'Photo' });
export type Photo = z.infer<typeof photoSchema>;

export const describePhotoSchema = z
  .strictObject({ caption: z.string().trim().max(300).nullable() })
  .meta({ id: 'DescribePhoto' });
export type DescribePhoto = z.infer<typeof describePhotoSchema>;

/** Photos named in a write: the sender's own, each once. */
export const photoIdsSchema = z
  .array(z.uuid())
  .max(PHOTOS_PER_ENTRY, `At most ${PHOTOS_PER_ENTRY} photos at a time.`)
  .refine((ids) => new Set(ids).size === ids.length, 'The same photo is named twice.');
