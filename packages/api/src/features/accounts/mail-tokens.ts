import type { EntityManager } from 'typeorm';
import { BadInput } from '../../common/errors/app-error.js';
import { MailTokenEntity } from './mail-token.entity.js';
import { hashToken, makeToken } from './tokens.js';

const HOURS: Readonly<Record<MailTokenEntity['purpose'], number>> = {
  confirmEmail: 48,
  resetPassword: 1,
  changeEmail: 48,
};

export interface TokenFor {
  readonly userId: string;
  readonly purpose: MailTokenEntity['purpose'];
  readonly email?: string;
  readonly now: Date;
}

/** Makes the secret of a link. An older one for the same purpose stops working. */
export async function issueMailToken(
  manager: EntityManager,
  { userId, purpose, email, now }: TokenFor,
): Promise<string> {
  const { token, hash } = makeToken();
  const expiresAt = new Date(now.getTime() + HOURS[purpose] * 3_600_000).toISOString();
  await manager.delete(MailTokenEntity, { userId, purpose });
  await manager.insert(MailTokenEntity, {
    hash,
    userId,
    purpose,
    email: email ?? null,
    expiresAt,
    usedAt: null,
  });
  return token;
}

/** Takes a link's secret once; used, expired or strange ones are refused alike. */
export async function takeMailToken(
  manager: EntityManager,
  token: string,
  purposes: readonly MailTokenEntity['purpose'][],
  now: string,
): Promise<MailTokenEntity> {
  const known = await manager.findOneBy(MailTokenEntity, { hash: hashToken(token) });
  if (!known || known.usedAt || known.expiresAt <= now || !purposes.includes(known.purpose))
    throw new BadInput([
      { path: 'token', message: 'This link has been used or has run out. Ask for a new one.' },
    ]);
  await manager.update(MailTokenEntity, { hash: known.hash }, { usedAt: now });
  return known;
}
