import { mkdir, readFile, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { DeleteObjectCommand, GetObjectCommand, PutObjectCommand, S3Client } from '@aws-sdk/client-s3';
import { Injectable } from '@nestjs/common';
import type { PhotoSize } from '@rivetside/shared';
import { Settings } from '../../common/config/settings.js';

/** Where the pictures lie. Names are ours: an id and a size. */
export abstract class PhotoStore {
  abstract put(photoId: string, size: PhotoSize, bytes: Buffer): Promise<void>;
  abstract get(photoId: string, size: PhotoSize): Promise<Buffer | null>;
  abstract remove(photoId: string): Promise<void>;
}

const SIZES: readonly PhotoSize[] = ['thumb', 'screen', 'full'];

/** Files under DATA_DIR, outside whatever is served. Spread over folders by the end of the id, which is random. */
@Injectable()
export class FilePhotoStore extends PhotoStore {
  constructor(private readonly settings: Settings) {
    super();
  }

  async put(photoId: string, size: PhotoSize, bytes: Buffer): Promise<void> {
    await mkdir(this.folder(photoId), { recursive: true });
    await writeFile(this.file(photoId, size), bytes, { flush: true });
  }

  async get(photoId: string, size: PhotoSize): Promise<Buffer | null> {
    return readFile(this.file(photoId, size)).catch(() => null);
  }

  async remove(photoId: string): Promise<void> {
    for (const size of SIZES) await rm(this.file(photoId, size), { force: true });
  }

  private folder(photoId: string): string {
    return join(this.settings.dataDir, 'photos', photoId.slice(-2));
  }

  private file(photoId: string, size: PhotoSize): string {
    return join(this.folder(photoId), `${photoId}-${size}.jpg`);
  }
}

/** A bucket, where S3_BUCKET is set. */
@Injectable()
export class BucketPhotoStore extends PhotoStore {
  private readonly client: S3Client;
  private readonly bucket: string;

  constructor({ env }: Settings) {
    super();
    this.bucket = env.S3_BUCKET!;
    this.client = new S3Client({
      region: env.S3_REGION,
      ...(env.S3_ENDPOINT ? { endpoint: env.S3_ENDPOINT, forcePathStyle: true } : {}),
      credentials: { accessKeyId: env.S3_ACCESS_KEY_ID!, secretAccessKey: env.S3_SECRET_ACCESS_KEY! },
    });
  }

  async put(photoId: string, size: PhotoSize, bytes: Buffer): Promise<void> {
    await this.client.send(
      new PutObjectCommand({
        Bucket: this.bucket,
        Key: key(photoId, size),
        Body: bytes,
        ContentType: 'image/jpeg',
      }),
    );
  }

  async get(photoId: string, size: PhotoSize): Promise<Buffer | null> {
    try {
      const { Body } = await this.client.send(
        new GetObjectCommand({ Bucket: this.bucket, Key: key(photoId, size) }),
      );
      return Body ? Buffer.from(await Body.transformToByteArray()) : null;
    } catch {
      return null;
    }
  }

  async remove(photoId: string): Promise<void> {
    for (const size of SIZES)
      await this.client.send(new DeleteObjectCommand({ Bucket: this.bucket, Key: key(photoId, size) }));
  }
}

const key = (photoId: string, size: PhotoSize) => `photos/${photoId}/${size}.jpg`;
