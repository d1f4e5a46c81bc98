import { Injectable } from '@nestjs/common';
import {
  type Actor,
  type Chapter,
  type ChapterMember,
  type ChapterRole,
  type Discipline,
  isMember,
} from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { NotFound } from '../../common/errors/app-error.js';

const CHAPTERS = 'SELECT "id", "name", "zone", "currency", "meets", "place" FROM "chapters" ORDER BY "name"';
const MEMBERS = `SELECT m."userId", u."name", m."roles", m."disciplines", m."stampNumber" FROM "memberships" m
  JOIN "users" u ON u."id" = m."userId" WHERE m."chapterId" = ? AND m."status" = 'active' ORDER BY u."name"`;

interface MemberRow extends Omit<ChapterMember, 'roles' | 'disciplines'> {
  roles: string;
  disciplines: string;
}

@Injectable()
export class ChaptersService {
  constructor(private readonly reader: PreparedReader) {}

  /** Name, place and meeting day are public among those signed in, so that one can find a chapter to join. */
  list(actor: Actor): Chapter[] {
    return this.reader
      .all<Omit<Chapter, 'member'>>(CHAPTERS)
      .map((row) => ({ ...row, member: isMember(actor, row.id) }));
  }

  requireById(actor: Actor, id: string): Chapter {
    const found = this.list(actor).find((chapter) => chapter.id === id);
    if (!found) throw new NotFound('chapter');
    return found;
  }

  /** For members of the chapter and the site admin; to others it is as if there were none. */
  members(actor: Actor, id: string): ChapterMember[] {
    if (!isMember(actor, id) && actor.siteRole !== 'siteAdmin') throw new NotFound('chapter');
    return this.reader.all<MemberRow>(MEMBERS, [id]).map((row) => ({
      ...row,
      roles: JSON.parse(row.roles) as ChapterRole[],
      disciplines: JSON.parse(row.disciplines) as Discipline[],
    }));
  }
}
