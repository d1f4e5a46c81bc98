import { createHmac, timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Photo, PhotoMark, PhotoSize } from '@rivetside/shared';
import { Settings } from '../../common/config/settings.js';
import { Clock } from '../../common/time/clock.js';

const LASTS_SECONDS = 3_600;
/** Addresses made within the same quarter of an hour are the same, so that the browser's cache works. */
const STEP_SECONDS = 900;

export interface PhotoRow {
  id: string;
  width: number;
  height: number;
  bytes: number;
  contentType: string;
  caption: string | null;
  marks: string;
}

/** Signed, short-lived addresses: an `<img>` sends no token, and who holds an old address holds nothing. */
@Injectable()
export class PhotoUrlsService {
  private readonly key: Buffer;

  constructor(
    settings: Settings,
    private readonly clock: Clock,
  ) {
    this.key = createHmac('sha256', settings.jwtSecret).update('photo addresses').digest();
  }

  present(row: PhotoRow): Photo {
    const { id, width, height, bytes, contentType, caption } = row;
    const urls = { thumb: this.url(id, 'thumb'), screen: this.url(id, 'screen'), full: this.url(id, 'full') };
    return {
      id,
      width,
      height,
      bytes,
      contentType,
      caption,
      marks: JSON.parse(row.marks) as PhotoMark[],
      urls,
    };
  }

  isGood(photoId: string, size: string, until: string, signature: string): boolean {
    const given = Buffer.from(signature, 'base64url');
    const right = this.signature(photoId, size, until);
    return given.length === right.length && timingSafeEqual(given, right) && Number(until) >= this.seconds();
  }

  private url(photoId: string, size: PhotoSize): string {
    const until = String((Math.floor(this.seconds() / STEP_SECONDS) + 1) * STEP_SECONDS + LASTS_SECONDS);
    return `/api/photos/${photoId}/${size}?until=${until}&signature=${this.signature(photoId, size, until).toString('base64url')}`;
  }

  private signature(photoId: string, size: string, until: string): Buffer {
    return createHmac('sha256', this.key).update(`${photoId}\n${size}\n${until}`).digest().subarray(0, 16);
  }

  private seconds(): number {
    return Math.floor(this.clock.now().getTime() / 1_000);
  }
}
