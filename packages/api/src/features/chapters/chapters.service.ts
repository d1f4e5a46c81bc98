import { Injectable } from '@nestjs/common';
import {
  type Actor,
  canSeeMembers,
  type Chapter,
  type ChapterMember,
  type ChapterRole,
  type Discipline,
  isMember,
  type Page,
  PAGE_MAX,
  type PageAsked,
} from '@rivetside/shared';
import { decodeCursor, pageOfRows } from '../../common/database/cursor.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { NotFound } from '../../common/errors/app-error.js';

const CHAPTER = 'SELECT "id", "name", "zone", "currency", "meets", "place" FROM "chapters"';
const CHAPTERS = `${CHAPTER} WHERE ("name", "id") > (?, ?) ORDER BY "name", "id" LIMIT ?`;
const ONE = `${CHAPTER} WHERE "id" = ?`;
const MEMBERS = `SELECT m."userId", u."name", m."roles", m."disciplines", m."stampNumber" FROM "memberships" m
  JOIN "users" u ON u."id" = m."userId"
  WHERE m."chapterId" = ? AND m."status" = 'active' AND (u."name", u."id") > (?, ?)
  ORDER BY u."name", u."id" LIMIT ?`;

type ChapterRow = Omit<Chapter, 'member'>;
interface MemberRow extends Omit<ChapterMember, 'roles' | 'disciplines'> {
  roles: string;
  disciplines: string;
}

@Injectable()
export class ChaptersService {
  constructor(private readonly reader: PreparedReader) {}

  /** Name, place and meeting day are public among those signed in, so that one can find a chapter to join. */
  list(actor: Actor, { limit = PAGE_MAX, cursor }: PageAsked): Page<Chapter> {
    const rows = this.reader.all<ChapterRow>(CHAPTERS, [...afterOf(cursor), limit + 1]);
    return pageOfRows(
      rows,
      limit,
      (row) => present(actor, row),
      (row) => [row.name, row.id],
    );
  }

  requireById(actor: Actor, id: string): Chapter {
    const found = this.reader.get<ChapterRow>(ONE, [id]);
    if (!found) throw new NotFound('chapter');
    return present(actor, found);
  }

  /** To whoever may not see them it is as if there were no such chapter. */
  members(actor: Actor, id: string, { limit = PAGE_MAX, cursor }: PageAsked): Page<ChapterMember> {
    if (!canSeeMembers(actor, id)) throw new NotFound('chapter');
    this.requireById(actor, id);
    const rows = this.reader.all<MemberRow>(MEMBERS, [id, ...afterOf(cursor), limit + 1]);
    return pageOfRows(rows, limit, presentMember, (row) => [row.name, row.userId]);
  }
}

function afterOf(cursor: string | undefined): [name: string, id: string] {
  const [name, id] = cursor === undefined ? [] : decodeCursor(cursor);
  return [String(name ?? ''), String(id ?? '')];
}

function present(actor: Actor, { id, name, zone, currency, meets, place }: ChapterRow): Chapter {
  return { id, name, zone, currency, meets, place, member: isMember(actor, id) };
}

function presentMember({ userId, name, roles, disciplines, stampNumber }: MemberRow): ChapterMember {
  return {
    userId,
    name,
    roles: JSON.parse(roles) as ChapterRole[],
    disciplines: JSON.parse(disciplines) as Discipline[],
    stampNumber,
  };
}
