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

/** Reads who somebody is at every request: an ended session or a lost role counts at once, not at expiry. */
@Injectable()
export class ActorReader {
  constructor(private readonly reader: PreparedReader) {}

  /** Null when the session has ended or is another's. */
  ofClaims({ sid, sub }: TokenClaims): Actor | null {
    const actor = this.ofSession(sid);
    return actor?.id === sub ? actor : null;
  }

  /** Null when the session has ended or the account is disabled. */
  ofSession(sessionId: string): Actor | null {
    const user = this.reader.get<{ id: string; name: string; siteRole: SiteRole }>(LIVE_SESSION, [sessionId]);
    return user ? { ...user, sessionId, memberships: this.membershipsOf(user.id) } : null;
  }

  membershipsOf(userId: string): Membership[] {
    return this.reader.all<MembershipRow>(MEMBERSHIPS, [userId]).map((row) => ({
      ...row,
      roles: JSON.parse(row.roles) as ChapterRole[],
      disciplines: JSON.parse(row.disciplines) as Discipline[],
    }));
  }
}
