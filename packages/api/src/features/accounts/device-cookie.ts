import { createHmac, hkdfSync, randomBytes, timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { Settings } from '../../common/config/settings.js';
import { SecretCookie } from './cookies.js';

const DAYS = 180;

/**
 * Says that this browser has signed in to an account before. It opens nothing: it only counts wrong passwords apart
 * from those of strangers. It holds no address, so that whoever finds it learns none.
 */
@Injectable()
export class DeviceCookie {
  private readonly cookie: SecretCookie;
  private readonly key: Buffer;

  constructor(settings: Settings) {
    this.cookie = new SecretCookie('rivetside-device', '/api/auth/sign-in', settings.https);
    this.key = Buffer.from(hkdfSync('sha256', settings.jwtSecret, '', 'rivetside device', 32));
  }

  /** The device, where the cookie is one of ours for that address. */
  read(request: FastifyRequest, email: string): string | null {
    const [device = '', seal = ''] = this.cookie.read(request)?.split('.') ?? [];
    const given = Buffer.from(seal, 'base64url');
    const ours = this.seal(device, email);
    return given.length === ours.length && timingSafeEqual(given, ours) ? device : null;
  }

  write(reply: FastifyReply, email: string, known: string | null): void {
    const device = known ?? randomBytes(16).toString('base64url');
    this.cookie.write(reply, `${device}.${this.seal(device, email).toString('base64url')}`, DAYS);
  }

  private seal(device: string, email: string): Buffer {
    return createHmac('sha256', this.key).update(`${device}\n${email}`).digest();
  }
}
