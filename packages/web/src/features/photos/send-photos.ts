import type { Photo } from '@rivetside/shared';
import type { DraftPhoto } from './draft-photo';

/** The wire, as far as photos need it. */
export interface PhotoWire {
  readonly send: (
    photo: DraftPhoto,
    options: { readonly onProgress: (part: number) => void; readonly signal: AbortSignal },
  ) => Promise<Photo>;
  readonly describe: (id: string, caption: string | null) => Promise<Photo>;
}

function captionOf({ caption }: DraftPhoto): string | null {
  return caption.trim() || null;
}

/** Brings one photo to the server as the draft has it: sent once, its caption written where it is another. */
export async function sendPhoto(
  wire: PhotoWire,
  photo: DraftPhoto,
  options: { readonly onProgress: (part: number) => void; readonly signal: AbortSignal },
): Promise<DraftPhoto> {
  const sent = photo.sent ?? (await wire.send(photo, options));
  const caption = captionOf(photo);
  if (sent.caption === caption) return { ...photo, sent };
  return { ...photo, sent: await wire.describe(sent.id, caption) };
}

/**
 * Sends whatever was not sent, one after the other, and hands each over as soon as it is there: what a lost network
 * cuts off is not sent twice.
 */
export async function sendPhotos(
  wire: PhotoWire,
  photos: readonly DraftPhoto[],
  onSent: (photo: DraftPhoto) => void,
): Promise<DraftPhoto[]> {
  const done: DraftPhoto[] = [];
  for (const photo of photos) {
    const sent = await sendPhoto(wire, photo, {
      onProgress: () => undefined,
      signal: new AbortController().signal,
    });
    onSent(sent);
    done.push(sent);
  }
  return done;
}
