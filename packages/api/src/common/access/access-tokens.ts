import { createSecretKey, type KeyObject } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { Settings } from '../config/settings.js';

export const ACCESS_TOKEN_SECONDS = 15 * 60;
export const TOKEN_ISSUER = 'rivetside';
export const TOKEN_AUDIENCE = 'rivetside-api';
export const TOKEN_ALGORITHM = 'HS256';

/** As a KeyObject: a text secret is tried as a PEM key first, at every request. */
export function tokenKey(settings: Settings): KeyObject {
  return createSecretKey(settings.jwtSecret, 'utf8');
}

export interface TokenClaims {
  /** The user. */
  readonly sub: string;
  /** The session. */
  readonly sid: string;
}

@Injectable()
export class AccessTokens {
  constructor(private readonly jwt: JwtService) {}

  issue(userId: string, sessionId: string): string {
    return this.jwt.sign({ sub: userId, sid: sessionId });
  }

  /** Throws on anything but a live token of ours. */
  verify(token: string): TokenClaims {
    return this.jwt.verify<TokenClaims & object>(token);
  }
}
