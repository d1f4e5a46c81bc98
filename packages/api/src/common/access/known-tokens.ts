import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { claimsOf, type TokenClaims } from './access-tokens.js';

const BEARER = /^Bearer ([\w-]+\.[\w-]+\.[\w-]+)$/i;
/** Fifteen minutes of people at once; when more come the oldest is verified again. */
const KNOWN_MAX = 20_000;

interface Known {
  readonly claims: TokenClaims;
  readonly endsAtMs: number;
}

/**
 * Tokens whose signature was verified once and need not be again until they end: it costs more than the rest of a
 * request. Whether the session behind a token still lives is asked every time, elsewhere.
 */
@Injectable()
export class KnownTokens {
  private readonly known = new Map<string, Known>();

  constructor(private readonly jwt: JwtService) {}

  /** Null for a token that was not verified here, or has ended. */
  claims(authorization: string | undefined): TokenClaims | null {
    const token = tokenIn(authorization);
    const found = token === null ? undefined : this.known.get(token);
    if (!found) return null;
    if (found.endsAtMs > Date.now()) return found.claims;
    this.known.delete(token!);
    return null;
  }

  /** Only for a token that has just been verified: it is read here, not judged. */
  remember(authorization: string | undefined): void {
    const token = tokenIn(authorization);
    const payload = token === null ? null : this.jwt.decode<{ exp?: unknown } | null>(token);
    const claims = claimsOf(payload);
    if (token === null || !claims || typeof payload?.exp !== 'number') return;
    if (this.known.size >= KNOWN_MAX) this.known.delete(this.known.keys().next().value!);
    this.known.set(token, { claims, endsAtMs: payload.exp * 1_000 });
  }
}

function tokenIn(authorization: string | undefined): string | null {
  return BEARER.exec(authorization ?? '')?.[1] ?? null;
}
