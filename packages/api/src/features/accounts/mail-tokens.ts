import { type EntityManager, In, Not } from 'typeorm';
import { BadInput } from '../../common/errors/app-error.js';
import { MailTokenEntity } from './mail-token.entity.js';
import { hashToken, makeToken } from './tokens.js';

type Purpose = MailTokenEntity['purpose'];

const HOURS: Readonly<Record<Purpose, number>> = {
  confirmEmail: 48,
  resetPassword: 1,
  changeEmail: 48,
};

export interface TokenFor {
  readonly userId: string;
  readonly purpose: Purpose;
  readonly email?: string;
  readonly now: Date;
}

/**
 * Makes the secret of a link. Earlier links for the same purpose go on working until one of them is used: otherwise
 * whoever asks in a stranger's name would take the owner's link away. Only of a changed address the last one counts.
 */
export async function issueMailToken(
  manager: EntityManager,
  { userId, purpose, email, now }: TokenFor,
): Promise<string> {
  const { token, hash } = makeToken();
  const expiresAt = new Date(now.getTime() + HOURS[purpose] * 3_600_000).toISOString();
  if (purpose === 'changeEmail') await manager.delete(MailTokenEntity, { userId, purpose });
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

/** The live token of a link; used, expired and strange ones are refused alike. */
export async function requireMailToken(
  manager: EntityManager,
  token: string,
  purposes: readonly Purpose[],
  now: string,
): Promise<MailTokenEntity> {
  const known = await manager.findOneBy(MailTokenEntity, { hash: hashToken(token), purpose: In(purposes) });
  if (!known || known.usedAt || known.expiresAt <= now) throw deadLink();
  return known;
}

/** Takes a link's secret once. Every other link that was mailed to its owner stops working. */
export async function takeMailToken(
  manager: EntityManager,
  token: string,
  purposes: readonly Purpose[],
  now: string,
): Promise<MailTokenEntity> {
  const known = await requireMailToken(manager, token, purposes, now);
  await manager.update(MailTokenEntity, { hash: known.hash }, { usedAt: now });
  await manager.delete(MailTokenEntity, { userId: known.userId, hash: Not(known.hash) });
  return known;
}

export function deadLink(): BadInput {
  return new BadInput([
    { path: 'token', message: 'This link has been used or has run out. Ask for a new one.' },
  ]);
}
