import { Injectable } from '@nestjs/common';
import { type Actor, type Page, PAGE_MAX, type PageAsked, type Session } from '@rivetside/shared';
import { IsNull } from 'typeorm';
import { writeAudit } from '../../common/audit/audit.js';
import { decodeCursor, pageOfRows } from '../../common/database/cursor.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { NotFound, NotSignedIn } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { SessionEnded } from './accounts.events.js';
import { deviceOf } from './device-of.js';
import { RefreshTokenEntity } from './refresh-token.entity.js';
import { SessionEntity } from './session.entity.js';
import { hashToken, makeToken } from './tokens.js';
import { UserEntity } from './user.entity.js';

const DAY_MS = 86_400_000;
/** A device that is not used for so long signs in again. */
export const REFRESH_DAYS = 30;
/** However much it is used. */
export const SESSION_DAYS = 90;
const OPEN_OF_USER = `SELECT "id", "createdAt", "lastUsedAt", "device" FROM "sessions"
  WHERE "userId" = ? AND "endedAt" IS NULL AND "lastUsedAt" > ? AND "createdAt" > ?
    AND ("lastUsedAt", "id") < (?, ?) ORDER BY "lastUsedAt" DESC, "id" DESC LIMIT ?`;
/** Sorts after every instant. */
const NEWEST = ['9999', ''];

type SessionRow = Omit<Session, 'current'>;

export interface OpenedSession {
  readonly userId: string;
  readonly sessionId: string;
  readonly refreshToken: string;
}

export interface SessionFrom {
  readonly userAgent: string | undefined;
  /** The refresh token that the browser still holds: a session of the same account gives way to the new one. */
  readonly earlier: string | null;
}

@Injectable()
export class SessionsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly clock: Clock,
  ) {}

  async open(tx: Tx, userId: string, { userAgent, earlier }: SessionFrom): Promise<OpenedSession> {
    const before = earlier === null ? null : await this.sessionOf(tx, earlier);
    if (before?.userId === userId) await this.endIn(tx, before, 'signed in anew');
    const at = this.clock.instant();
    const sessionId = newId();
    await tx.manager.insert(SessionEntity, {
      id: sessionId,
      userId,
      device: deviceOf(userAgent),
      createdAt: at,
      lastUsedAt: at,
      endedAt: null,
      endedReason: null,
    });
    return { userId, sessionId, refreshToken: await this.issue(tx, sessionId, at) };
  }

  /**
   * Each refresh token is used once. One that comes a second time was copied: its whole session ends, whoever holds
   * the newer one. There is no grace for tabs that refresh at once, since a copy would have it too: the page lets
   * its tabs take turns.
   */
  async refresh(token: string): Promise<OpenedSession> {
    const outcome = await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const known = await tx.manager.findOneBy(RefreshTokenEntity, { hash: hashToken(token) });
      const session = await this.sessionOf(tx, token);
      if (!known || !session) return null;
      const reason = await this.reasonToEnd(tx, known, session);
      if (reason !== null) {
        await this.endIn(tx, session, reason);
        return null;
      }
      await tx.manager.update(RefreshTokenEntity, { hash: known.hash }, { usedAt: at });
      await tx.manager.update(SessionEntity, { id: session.id }, { lastUsedAt: at });
      const refreshToken = await this.issue(tx, session.id, session.createdAt);
      return { userId: session.userId, sessionId: session.id, refreshToken };
    });
    // Thrown outside: inside, the refusal would roll the end of the session back.
    if (!outcome) throw new NotSignedIn('This session has ended. Sign in again.');
    return outcome;
  }

  /** Ends whatever session the token belongs to; nothing when it is none of ours. */
  async endByToken(token: string, reason: string): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const session = await this.sessionOf(tx, token);
      if (session) await this.endIn(tx, session, reason);
    });
  }

  async endById(id: string, reason: string): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const session = await tx.manager.findOneBy(SessionEntity, { id, endedAt: IsNull() });
      if (session) await this.endIn(tx, session, reason);
    });
  }

  /** The last used first. */
  list(actor: Actor, { limit = PAGE_MAX, cursor }: PageAsked): Page<Session> {
    const [lastUsedAt, id] = cursor === undefined ? NEWEST : decodeCursor(cursor);
    const since = [this.daysAgo(REFRESH_DAYS), this.daysAgo(SESSION_DAYS)];
    const after = [String(lastUsedAt), String(id ?? '')];
    const rows = this.reader.all<SessionRow>(OPEN_OF_USER, [actor.id, ...since, ...after, limit + 1]);
    return pageOfRows(
      rows,
      limit,
      (row) => ({ ...row, current: row.id === actor.sessionId }),
      (row) => [row.lastUsedAt, row.id],
    );
  }

  async end(actor: Actor, id: string): Promise<void> {
    await this.unitOfWork.run(async (tx) => {
      const session = await tx.manager.findOneBy(SessionEntity, { id, userId: actor.id, endedAt: IsNull() });
      if (!session) throw new NotFound('session');
      await this.endIn(tx, session, 'signed out from another device');
    });
  }

  /** Every other device; the one at hand goes on. */
  async endOthers(actor: Actor): Promise<void> {
    await this.unitOfWork.run((tx) =>
      this.endAll(tx, actor.id, 'signed out from another device', actor.sessionId),
    );
  }

  /** Ends every open session of somebody but, where given, the one at hand. */
  async endAll(tx: Tx, userId: string, reason: string, except?: string): Promise<void> {
    const open = await tx.manager.findBy(SessionEntity, { userId, endedAt: IsNull() });
    for (const session of open) if (session.id !== except) await this.endIn(tx, session, reason);
  }

  private async reasonToEnd(
    tx: Tx,
    token: RefreshTokenEntity,
    { userId, createdAt }: SessionEntity,
  ): Promise<string | null> {
    if (token.usedAt) return 'a refresh token was used twice';
    if (token.expiresAt <= this.clock.instant()) return 'not used for long';
    if (createdAt <= this.daysAgo(SESSION_DAYS)) return 'signed in long ago';
    const user = await tx.manager.findOneBy(UserEntity, { id: userId });
    return user && !user.disabledAt ? null : 'the account is closed';
  }

  /** The open session that a refresh token, used or not, belongs to. */
  private async sessionOf(tx: Tx, token: string): Promise<SessionEntity | null> {
    const known = await tx.manager.findOneBy(RefreshTokenEntity, { hash: hashToken(token) });
    return known && tx.manager.findOneBy(SessionEntity, { id: known.sessionId, endedAt: IsNull() });
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

  private async issue(tx: Tx, sessionId: string, openedAt: string): Promise<string> {
    const { token, hash } = makeToken();
    const now = this.clock.now().getTime();
    const end = Math.min(now + REFRESH_DAYS * DAY_MS, Date.parse(openedAt) + SESSION_DAYS * DAY_MS);
    const facts = { issuedAt: new Date(now).toISOString(), expiresAt: new Date(end).toISOString() };
    await tx.manager.insert(RefreshTokenEntity, { hash, sessionId, ...facts, usedAt: null });
    return token;
  }

  private daysAgo(days: number): string {
    return new Date(this.clock.now().getTime() - days * DAY_MS).toISOString();
  }
}
