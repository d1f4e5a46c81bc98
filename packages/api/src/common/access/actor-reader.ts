import { Injectable } from '@nestjs/common';
import type { Actor, ChapterRole, Discipline, Membership, SiteRole } from '@rivetside/shared';
import { PreparedReader } from '../database/prepared-reader.js';
import type { TokenClaims } from './access-tokens.js';

const LIVE_SESSION = `SELECT u."id", u."name", u."siteRole" FROM "sessions" s JOIN "users" u ON u."id" = s."userId"
  WHERE s."id" = ? AND s."endedAt" IS NULL AND u."disabledAt" IS NULL`;
const MEMBERSHIPS = `SELECT m."chapterId", c."name" AS "chapterName", m."roles", m."disciplines", m."status"
  FROM "memberships" m JOIN "chapters" c ON c."id" = m."chapterId" WHERE m."userId" = ? ORDER BY m."joinedAt"`;

interface MembershipRow {
  chapterId: string;
  chapterName: string;
  roles: string;
  disciplines: string;
  status: Membership['status'];
}

const NEWEST_CHANGE = 'SELECT coalesce(max("seq"), 0) AS "seq" FROM "standing_changes"';
const KNOWN_MAX = 20_000;

/**
 * Says who somebody is, asked at every request: an ended session or a lost role counts at once, not at expiry. The
 * database numbers every change of standing, so what was read stays good for as long as that number does.
 */
@Injectable()
export class ActorReader {
  private readonly known = new Map<string, Actor>();
  private asOf = -1;

  constructor(private readonly reader: PreparedReader) {}

  /** Null when the session has ended or is another's. */
  ofClaims({ sid, sub }: TokenClaims): Actor | null {
    const actor = this.ofSession(sid);
    return actor?.id === sub ? actor : null;
  }

  /** Null when the session has ended or the account is disabled. */
  ofSession(sessionId: string): Actor | null {
    this.forgetWhatChanged();
    const known = this.known.get(sessionId);
    if (known) return known;
    const user = this.reader.get<{ id: string; name: string; siteRole: SiteRole }>(LIVE_SESSION, [sessionId]);
    if (!user) return null;
    const actor = { ...user, sessionId, memberships: this.membershipsOf(user.id) };
    if (this.known.size >= KNOWN_MAX) this.known.clear();
    this.known.set(sessionId, actor);
    return actor;
  }

  private forgetWhatChanged(): void {
    const { seq } = this.reader.get<{ seq: number }>(NEWEST_CHANGE)!;
    if (seq === this.asOf) return;
    this.known.clear();
    this.asOf = seq;
  }

  membershipsOf(userId: string): Membership[] {
    return this.reader.all<MembershipRow>(MEMBERSHIPS, [userId]).map((row) => ({
      ...row,
      roles: JSON.parse(row.roles) as ChapterRole[],
      disciplines: JSON.parse(row.disciplines) as Discipline[],
    }));
  }
}
