import { Injectable } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { Settings } from '../../common/config/settings.js';
import { SecretCookie } from './cookies.js';
import { REFRESH_DAYS } from './sessions.service.js';

/** The refresh token never touches a script: it travels in this cookie and only to /api/auth. */
@Injectable()
export class RefreshCookie {
  private readonly cookie: SecretCookie;

  constructor(settings: Settings) {
    this.cookie = new SecretCookie('rivetside-refresh', '/api/auth', settings.https);
  }

  read(request: FastifyRequest): string | null {
    return this.cookie.read(request);
  }

  write(reply: FastifyReply, token: string): void {
    this.cookie.write(reply, token, REFRESH_DAYS);
  }

  clear(reply: FastifyReply): void {
    this.cookie.clear(reply);
  }
}
