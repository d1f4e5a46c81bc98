import { createHash, randomBytes } from 'node:crypto';

/** A secret that leaves only once, and the hash that stays. */
export function makeToken(): { token: string; hash: string } {
  const token = randomBytes(32).toString('base64url');
  return { token, hash: hashToken(token) };
}

/** The tokens are 256 random bits: a plain hash is enough, nothing can be guessed. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('base64url');
}
