import { photoSchema } from '@rivetside/shared';
import { api } from '../../lib/api';
import { Problem, sentenceOf } from '../../lib/problem';
import { uploadPhoto } from '../../lib/upload';
import type { PhotoWire } from './send-photos';

/** A photo's own key goes with it, so that one sent twice is kept once. */
export const photoWire: PhotoWire = {
  send: ({ file, key }, { onProgress, signal }) => uploadPhoto(file, { key, onProgress, signal }),
  describe: (id, caption) => api.patch(`/photos/${id}`, { body: { caption }, answer: photoSchema }),
};

/** Null where only the network is away: the photo waits and nothing went wrong. */
export function reasonOfPhoto(error: unknown): string | null {
  return error instanceof Problem && error.isOffline ? null : sentenceOf(error);
}
