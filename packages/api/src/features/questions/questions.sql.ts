/** What one may see: one's chapters', what is shared with a kit one's chapters build, everything for the keepers. */
export const VISIBLE = `(q."chapterId" IN (SELECT value FROM json_each(:chapters))
    OR (q."audience" = 'kit' AND q."kitId" IN (SELECT value FROM json_each(:kits))))`;

const ROW_COLUMNS = `q."id", q."number", q."title", q."state", q."mishap", q."discipline", q."audience", q."headline", q."waitsFor", q."waitsSince",
    q."kitId", q."sectionId", s."code" AS "sectionCode", s."name" AS "sectionName", s."critical", s."regions", p."number" AS "partNumber",
    h."code" AS "holeLineCode", b."serial", q."chapterId", c."name" AS "chapterName", q."askedById", u."name" AS "askedByName", q."askedAt",
    q."lastActivityAt", q."lastSeq", coalesce(v."seq", q."lastSeq") AS "seenSeq"`;
const ROW_JOINS = `LEFT JOIN "sections" s ON s."id" = q."sectionId" LEFT JOIN "parts" p ON p."id" = q."partId"
  LEFT JOIN "hole_lines" h ON h."id" = q."holeLineId" LEFT JOIN "builds" b ON b."id" = q."buildId"
  JOIN "chapters" c ON c."id" = q."chapterId" JOIN "users" u ON u."id" = q."askedById"
  LEFT JOIN "question_seen" v ON v."userId" = :userId AND v."questionId" = q."id"`;

/** Each filter is a constant text; which of them are used is the only thing that differs between two lists. */
export const FILTERS = {
  kitId: 'q."kitId" = :kitId',
  sectionId: 'q."sectionId" = :sectionId',
  partId: 'q."partId" = :partId',
  holeLineId: 'q."holeLineId" = :holeLineId',
  state: 'q."state" = :state',
  discipline: 'q."discipline" = :discipline',
  chapterId: 'q."chapterId" = :chapterId',
  mine: `(q."askedById" = :userId OR q."buildId" IN (SELECT "id" FROM "builds" WHERE "ownerId" = :userId)
    OR q."buildId" IN (SELECT "buildId" FROM "build_crew" WHERE "userId" = :userId))`,
  found: 'q."id" IN (SELECT value FROM json_each(:found))',
} as const;
export type FilterName = keyof typeof FILTERS;

export const SORTS = {
  activity: { column: '"lastActivityAt"', direction: 'DESC', compare: '<' },
  newest: { column: '"askedAt"', direction: 'DESC', compare: '<' },
  waiting: { column: '"waitsSince"', direction: 'ASC', compare: '>' },
} as const;
export type SortName = keyof typeof SORTS;

/** The text of a list: built from the constants above only, so that it can be prepared once per kind of list. */
export function listSql(
  filters: readonly FilterName[],
  sort: SortName,
  after: boolean,
  everything: boolean,
): string {
  const { column, direction, compare } = SORTS[sort];
  const conditions = [
    ...(everything ? [] : [VISIBLE]),
    ...filters.map((name) => FILTERS[name]),
    ...(after ? [`(q.${column}, q."id") ${compare} (:afterKey, :afterId)`] : []),
  ];
  const where = conditions.length > 0 ? `WHERE ${conditions.join(' AND ')}` : '';
  return `SELECT ${ROW_COLUMNS}, q.${column} AS "sortKey" FROM "questions" q ${ROW_JOINS} ${where}
    ORDER BY q.${column} ${direction}, q."id" ${direction} LIMIT :limit`;
}

export const ROWS_BY_IDS = `SELECT ${ROW_COLUMNS} FROM json_each(:ids) j JOIN "questions" q ON q."id" = j.value ${ROW_JOINS} ORDER BY j.key`;

/** Chapters that build the kit, and owner and crew of the build, each as a JSON list: one look-up instead of three. */
const STANDING_LISTS = `(SELECT json_group_array(kc."chapterId") FROM "kit_chapters" kc WHERE kc."kitId" = q."kitId") AS "kitChapterIds",
    (SELECT json_group_array(w."id") FROM (SELECT "ownerId" AS "id" FROM "builds" WHERE "id" = q."buildId"
      UNION SELECT "userId" FROM "build_crew" WHERE "buildId" = q."buildId" UNION SELECT q."askedById") w) AS "builderIds"`;

export const SHEET = `SELECT ${ROW_COLUMNS}, q."body", q."holes", q."buildId", q."holeCard", q."fitCheck", q."withdrawnAt", q."withdrawnReason", ${STANDING_LISTS},
    k."name" AS "kitName", t."id" AS "stepId", t."code" AS "stepCode", t."title" AS "stepTitle", p."id" AS "partId", p."name" AS "partName",
    h."id" AS "holeLineId", h."title" AS "holeLineTitle", h."callOut", h."count", h."repeats", h."revision"
  FROM "questions" q ${ROW_JOINS} JOIN "kits" k ON k."id" = q."kitId" LEFT JOIN "steps" t ON t."id" = q."stepId" WHERE q."id" = :id`;

export const FIXES = `SELECT f.*, u."name" AS "byName" FROM "fixes" f JOIN "users" u ON u."id" = f."byId" WHERE f."questionId" = ? ORDER BY f."number"`;
export const STAMPS = `SELECT e.*, u."name" AS "byName" FROM "endorsements" e JOIN "users" u ON u."id" = e."byId"
  WHERE e."fixId" IN (SELECT "id" FROM "fixes" WHERE "questionId" = ?) ORDER BY e."givenAt", e."id"`;
export const OBJECTIONS = `SELECT o.*, u."name" AS "byName", a."name" AS "answeredByName" FROM "objections" o JOIN "users" u ON u."id" = o."byId"
  LEFT JOIN "users" a ON a."id" = o."answeredById" WHERE o."fixId" IN (SELECT "id" FROM "fixes" WHERE "questionId" = ?) ORDER BY o."at", o."id"`;
export const REFERRAL = `SELECT r.*, u."name" AS "byName", a."name" AS "answeredByName" FROM "referrals" r JOIN "users" u ON u."id" = r."byId"
  LEFT JOIN "users" a ON a."id" = r."answeredById" WHERE r."questionId" = ? ORDER BY r."at" DESC LIMIT 1`;
export const COMPLETION = `SELECT c.*, u."name" AS "byName" FROM "completions" c JOIN "users" u ON u."id" = c."byId" WHERE c."questionId" = ?`;

const EVENT_COLUMNS = `e."questionId", e."seq", e."type", e."at", e."byId", u."name" AS "byName", e."data"`;
const EVENT_FROM = `FROM "question_events" e JOIN "users" u ON u."id" = e."byId"`;
export const EVENTS_AFTER = `SELECT ${EVENT_COLUMNS} ${EVENT_FROM} WHERE e."questionId" = ? AND e."seq" > ? ORDER BY e."seq" LIMIT ?`;
export const EVENTS_BEFORE = `SELECT ${EVENT_COLUMNS} ${EVENT_FROM} WHERE e."questionId" = ? AND e."seq" < ? ORDER BY e."seq" DESC LIMIT ?`;
export const REVIEWER_NAME = 'SELECT "name" FROM "users" WHERE "id" = ?';

/** What a policy needs to know of a question, and no more. */
export const STANDING = `SELECT q."id", q."number", q."kitId", q."sectionId", q."buildId", q."chapterId", q."audience", q."discipline", q."askedById", q."state",
    q."lastSeq", coalesce(s."critical", 0) AS "critical", q."holeCard", q."holeLineId", ${STANDING_LISTS}
  FROM "questions" q LEFT JOIN "sections" s ON s."id" = q."sectionId" WHERE q."id" = ?`;
export const KITS_OF_CHAPTERS =
  'SELECT DISTINCT "kitId" FROM "kit_chapters" WHERE "chapterId" IN (SELECT value FROM json_each(?))';

export const NEXT_SEQ = `UPDATE "questions" SET "lastSeq" = "lastSeq" + 1, "lastActivityAt" = ? WHERE "id" = ? RETURNING "lastSeq"`;
export const ADD_EVENT = `INSERT INTO "question_events" ("questionId", "seq", "id", "type", "at", "byId", "data") VALUES (?, ?, ?, ?, ?, ?, ?)`;
export const SEEN = `INSERT INTO "question_seen" ("userId", "questionId", "seq") VALUES (?, ?, ?)
  ON CONFLICT ("userId", "questionId") DO UPDATE SET "seq" = max("seq", excluded."seq")`;

/** A mentor's desk: what waits in their disciplines where they may advise. */
const DESK_FROM = `SELECT ${ROW_COLUMNS} FROM "questions" q ${ROW_JOINS}
  WHERE q."discipline" IN (SELECT value FROM json_each(:disciplines)) AND ${VISIBLE}
    AND q."askedById" <> :userId`;
export const DESK_FIRST_FIX = `${DESK_FROM} AND q."waitsFor" = 'firstFix' ORDER BY q."waitsSince" LIMIT 50`;
export const DESK_STAMP = `${DESK_FROM} AND q."waitsFor" IN ('stamp', 'secondStamp')
    AND EXISTS (SELECT 1 FROM "fixes" f WHERE f."questionId" = q."id" AND f."withdrawnAt" IS NULL AND f."byId" <> :userId
      AND NOT EXISTS (SELECT 1 FROM "endorsements" e WHERE e."fixId" = f."id" AND e."byId" = :userId AND e."withdrawnAt" IS NULL))
  ORDER BY q."waitsSince" LIMIT 50`;
export const DESK_REVIEW = `${DESK_FROM} AND q."waitsFor" = 'review'
  ORDER BY (SELECT count(*) FROM "endorsements" e WHERE e."questionId" = q."id" AND e."byId" = :userId AND e."heldAt" IS NOT NULL AND e."withdrawnAt" IS NULL) DESC, q."waitsSince" LIMIT 50`;

/** Met before: the same hole line, part or section, the nearest place first. */
const samePlace = (
  sight: string,
) => `SELECT q."id", q."mishap", q."holeLineId", q."partId", q."sectionId", q."holeCard" FROM "questions" q
  WHERE q."sectionId" = :sectionId ${sight} AND q."state" <> 'withdrawn'
  ORDER BY (q."partId" IS :partId) DESC, q."lastActivityAt" DESC LIMIT 40`;
export const SAME_PLACE = samePlace(`AND ${VISIBLE}`);
export const SAME_PLACE_ANYWHERE = samePlace('');
export const SIMILAR_FACTS = `SELECT q."id", q."title", q."mishap", q."holeLineId", q."partId", q."sectionId", q."holeCard" FROM "questions" q WHERE q."id" = ?`;
