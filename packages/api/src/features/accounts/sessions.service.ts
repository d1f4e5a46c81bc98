import { Injectable } from '@nestjs/common';
import type { Actor, Session } from '@rivetside/shared';
import Bowser from 'bowser';
import { writeAudit } from '../../common/audit/audit.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { NotFound, NotSignedIn } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { SessionEnded } from './accounts.events.js';
import { RefreshTokenEntity } from './refresh-token.entity.js';
import { SessionEntity } from './session.entity.js';
import { hashToken, makeToken } from './tokens.js';

export const REFRESH_DAYS = 30;
const OPEN_OF_USER = `SELECT "id", "createdAt", "lastUsedAt", "device" FROM "sessions"
  WHERE "userId" = ? AND "endedAt" IS NULL ORDER BY "lastUsedAt" DESC`;

/** `Chromium on Linux`, so that a person recognises their own. */
export function deviceOf(userAgent: string | undefined): string {
  if (!userAgent) return 'unknown device';
  const { browser, os } = Bowser.parse(userAgent.slice(0, 500));
  const parts = [browser.name, os.name].filter((part) => part !== undefined && part !== '');
  return parts.length === 0 ? 'unknown device' : parts.join(' on ');
}

export interface OpenedSession {
  readonly userId: string;
  readonly sessionId: string;
  readonly refreshToken: string;
}

@Injectable()
export class SessionsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly clock: Clock,
  ) {}

  async open(tx: Tx, userId: string, userAgent: string | undefined): Promise<OpenedSession> {
    const at = this.clock.instant();
    const sessionId = newId();
    const device = deviceOf(userAgent);
    await tx.manager.insert(SessionEntity, {
      id: sessionId,
      userId,
      device,
      createdAt: at,
      lastUsedAt: at,
      endedAt: null,
      endedReason: null,
    });
    return { userId, sessionId, refreshToken: await this.issue(tx, sessionId) };
  }

  /**
   * Each refresh token is used once. One that comes a second time was copied: its whole session ends, whoever holds
   * the newer one.
   */
  async refresh(token: string): Promise<OpenedSession> {
    const outcome = await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const known = await tx.manager.findOneBy(RefreshTokenEntity, { hash: hashToken(token) });
      const session = known && (await tx.manager.findOneBy(SessionEntity, { id: known.sessionId }));
      if (!known || !session || session.endedAt) return null;
      if (known.usedAt) {
        await this.endIn(tx, session, 'a refresh token was used twice');
        return null;
      }
      if (known.expiresAt <= at) return null;
      await tx.manager.update(RefreshTokenEntity, { hash: known.hash }, { usedAt: at });
      await tx.manager.update(SessionEntity, { id: session.id }, { lastUsedAt: at });
      return {
        userId: session.userId,
        sessionId: session.id,
        refreshToken: await this.issue(tx, session.id),
      };
    });
    // Thrown outside: inside, the refusal would roll the end of the session back.
    if (!outcome) throw new NotSignedIn('This session has ended. Sign in again.');
    return outcome;
  }

  /** Ends whatever session the token belongs to; nothing when it is none of ours. */
  async endByToken(token: string, reason: string): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const known = await tx.manager.findOneBy(RefreshTokenEntity, { hash: hashToken(token) });
      const session = known && (await tx.manager.findOneBy(SessionEntity, { id: known.sessionId }));
      if (session && !session.endedAt) await this.endIn(tx, session, reason);
    });
  }

  list(actor: Actor): Session[] {
    return this.reader
      .all<Omit<Session, 'current'>>(OPEN_OF_USER, [actor.id])
      .map((row) => ({ ...row, current: row.id === actor.sessionId }));
  }

  async end(actor: Actor, id: string): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const session = await tx.manager.findOneBy(SessionEntity, { id, userId: actor.id });
      if (!session || session.endedAt) throw new NotFound('session');
      await this.endIn(tx, session, 'signed out from another device');
    });
  }

  /** Ends every open session of somebody but, where given, the one at hand. */
  async endAll(tx: Tx, userId: string, reason: string, except?: string): Promise<void> {
    const open = await tx.manager.findBy(SessionEntity, { userId });
    for (const session of open)
      if (!session.endedAt && session.id !== except) await this.endIn(tx, session, reason);
  }

  private async endIn(tx: Tx, session: SessionEntity, reason: string): Promise<void> {
    const at = this.clock.instant();
    await tx.manager.update(SessionEntity, { id: session.id }, { endedAt: at, endedReason: reason });
    await writeAudit(tx.manager, {
      at,
      byId: session.userId,
      what: 'session.ended',
      subject: ['session', session.id],
      detail: { reason },
    });
    tx.record(new SessionEnded(session.id, reason));
  }

  private async issue(tx: Tx, sessionId: string): Promise<string> {
    const { token, hash } = makeToken();
    const issuedAt = this.clock.instant();
    const expiresAt = new Date(this.clock.now().getTime() + REFRESH_DAYS * 86_400_000).toISOString();
    await tx.manager.insert(RefreshTokenEntity, { hash, sessionId, issuedAt, expiresAt, usedAt: null });
    return token;
  }
}
