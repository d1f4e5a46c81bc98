import { createHash } from 'node:crypto';
import type { PhotoSize } from '@rivetside/shared';
import { newId } from '../common/ids.js';
import { develop } from '../features/photos/develop.js';
import { PhotoUseEntity } from '../features/photos/photo-use.entity.js';
import type { PhotoStore } from '../features/photos/photo-store.js';
import { PhotoEntity } from '../features/photos/photo.entity.js';
import type { Loading } from './load-kit.js';
import { openDarkroom } from './photos/darkroom.js';
import type { SeedPhoto, SeedQuestion } from './seed.schema.js';
import type { SeedWorld } from './seed-world.js';

/** As many as there are threads to develop them. */
const AT_ONCE = 4;

export interface StoredPhoto {
  readonly id: string;
  readonly seed: SeedPhoto;
  readonly width: number;
  readonly height: number;
  readonly bytes: number;
  readonly sha256: string;
}

/** Drawn, developed and stored before any row is written; files that no row names are nobody's. */
export async function storePhotos(world: SeedWorld, store: PhotoStore): Promise<Map<string, StoredPhoto>> {
  const draw = await openDarkroom();
  const shots = world.questions.flatMap(({ photos, holeCard: card }) =>
    photos.map((photo) => ({ photo, card })),
  );
  const stored = new Map<string, StoredPhoto>();
  const next = async (): Promise<void> => {
    for (let shot = shots.pop(); shot; shot = shots.pop()) {
      const { width, height, files } = await develop(await draw(shot));
      const id = newId();
      for (const [size, bytes] of Object.entries(files)) await store.put(id, size as PhotoSize, bytes);
      const sha256 = createHash('sha256').update(files.full).digest('hex');
      stored.set(shot.photo.key, { id, seed: shot.photo, width, height, bytes: files.full.length, sha256 });
    }
  };
  await Promise.all(Array.from({ length: AT_ONCE }, next));
  return stored;
}

interface Hanging {
  readonly photos: ReadonlyMap<string, StoredPhoto>;
  readonly question: SeedQuestion;
  readonly ownerId: string;
  readonly at: string;
  /** `question`, or the id of the completion. */
  readonly usedIn: string;
}

/** Those of the question as it was asked, or those of its completion. */
export async function hangPhotos({ tx, keys }: Loading, hanging: Hanging): Promise<void> {
  const { photos, question, ownerId, at, usedIn } = hanging;
  const wanted = usedIn === 'question' ? 'question' : 'completion';
  const questionId = keys.of('question', question.key);
  const hung = question.photos.filter((photo) => photo.usedIn === wanted);
  for (const [position, { key, caption, marks }] of hung.entries()) {
    const { id, seed: _seed, ...facts } = photos.get(key)!;
    await tx.manager.insert(PhotoEntity, {
      id,
      ownerId,
      contentType: 'image/jpeg',
      ...facts,
      caption,
      marks,
      storedAt: at,
    });
    await tx.manager.insert(PhotoUseEntity, { photoId: id, questionId, usedIn, position });
  }
}
