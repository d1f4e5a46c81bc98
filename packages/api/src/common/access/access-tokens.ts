import { createSecretKey, type KeyObject } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { Settings } from '../config/settings.js';

export const ACCESS_TOKEN_SECONDS = 15 * 60;
export const TOKEN_ISSUER = 'rivetside';
export const TOKEN_AUDIENCE = 'rivetside-api';
export const TOKEN_ALGORITHM = 'HS256';
/** Whatever else may once be signed with the same key is no access token. */
const TOKEN_TYPE = 'access';

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

/** Of a token whose signature, issuer and audience were checked: null unless it is ours, of that kind, and ends. */
export function claimsOf(payload: unknown): TokenClaims | null {
  const { sub, sid, typ, exp, iat } = (payload ?? {}) as Readonly<Record<string, unknown>>;
  if (typ !== TOKEN_TYPE || typeof sub !== 'string' || typeof sid !== 'string') return null;
  if (typeof exp !== 'number' || typeof iat !== 'number') return null;
  return exp - iat <= ACCESS_TOKEN_SECONDS ? { sub, sid } : null;
}

@Injectable()
export class AccessTokens {
  constructor(private readonly jwt: JwtService) {}

  issue(userId: string, sessionId: string): string {
    return this.jwt.sign({ sub: userId, sid: sessionId, typ: TOKEN_TYPE });
  }

  /** Null for anything but a live token of ours. */
  verify(token: string): TokenClaims | null {
    try {
      return claimsOf(this.jwt.verify<object>(token));
    } catch {
      return null;
    }
  }
}
