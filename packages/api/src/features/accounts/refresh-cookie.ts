import { Injectable } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { Settings } from '../../common/config/settings.js';
import { REFRESH_DAYS } from './sessions.service.js';

type WithCookies = FastifyRequest & { cookies: Record<string, string | undefined> };
type SetsCookies = FastifyReply & {
  setCookie(name: string, value: string, options: object): FastifyReply;
  clearCookie(name: string, options: object): FastifyReply;
};

/** The refresh token never touches a script: it travels in this cookie and only to /api/auth. */
@Injectable()
export class RefreshCookie {
  constructor(private readonly settings: Settings) {}

  private get name(): string {
    return this.settings.https ? '__Secure-rivetside-refresh' : 'rivetside-refresh';
  }

  private get options() {
    return { path: '/api/auth', httpOnly: true, sameSite: 'strict' as const, secure: this.settings.https };
  }

  read(request: FastifyRequest): string | null {
    return (request as WithCookies).cookies[this.name] ?? null;
  }

  write(reply: FastifyReply, token: string): void {
    (reply as SetsCookies).setCookie(this.name, token, { ...this.options, maxAge: REFRESH_DAYS * 86_400 });
  }

  clear(reply: FastifyReply): void {
    (reply as SetsCookies).clearCookie(this.name, this.options);
  }
}
