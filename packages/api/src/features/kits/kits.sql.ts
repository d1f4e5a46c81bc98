export const KITS = 'SELECT "id", "name", "maker", "kind" FROM "kits" ORDER BY "name"';

/** What one may see of questions: one's chapters', and those shared with a kit that one's chapters build. */
export const VISIBLE = `(q."chapterId" IN (SELECT value FROM json_each(:chapters)) OR :keeper = 1
  OR (q."audience" = 'kit' AND q."kitId" IN (SELECT "kitId" FROM "kit_chapters" WHERE "chapterId" IN (SELECT value FROM json_each(:chapters)))))`;

export const SECTIONS_OF_KIT = `SELECT s."id", s."kitId", s."code", s."name", s."position", s."critical", s."regions",
    (SELECT count(*) FROM "steps" t WHERE t."sectionId" = s."id") AS "stepCount", k."name" AS "kitName", u."name" AS "steward"
  FROM "sections" s JOIN "kits" k ON k."id" = s."kitId" LEFT JOIN "users" u ON u."id" = s."stewardId"
  WHERE s."kitId" = :kitId ORDER BY s."position"`;
export const SECTION_BY_ID = SECTIONS_OF_KIT.replace(
  's."kitId" = :kitId ORDER BY s."position"',
  's."id" = :sectionId',
);

export const TALLY = `SELECT q."sectionId", count(*) AS "total",
    sum(q."state" IN ('open', 'advised', 'endorsed', 'referred')) AS "waiting", sum(q."state" = 'underReview') AS "underReview"
  FROM "questions" q WHERE q."kitId" = :kitId AND ${VISIBLE} GROUP BY q."sectionId"`;

/** The reader's own aircraft of that kit: the one they own, else one they help on. */
export const OWN_BUILD = `SELECT b."id" FROM "builds" b LEFT JOIN "build_crew" c ON c."buildId" = b."id" AND c."userId" = :userId
  WHERE b."kitId" = :kitId AND (b."ownerId" = :userId OR c."userId" IS NOT NULL) ORDER BY b."ownerId" = :userId DESC LIMIT 1`;
export const PROGRESS = `SELECT t."sectionId", coalesce(p."state", 'todo') AS "state" FROM "steps" t JOIN "sections" s ON s."id" = t."sectionId"
  LEFT JOIN "step_progress" p ON p."stepId" = t."id" AND p."buildId" = :buildId WHERE s."kitId" = :kitId ORDER BY t."sectionId", t."number"`;

export const STEPS = `SELECT "id", "sectionId", "code", "number", "title", "work", "estimateHours", "twoPerson", "closesStructure", "hazard"
  FROM "steps" WHERE "sectionId" = :sectionId ORDER BY "number"`;
const PART_COLUMNS = `p."id", p."sectionId", p."number", p."name", p."alloy", p."thickness", p."quantity", p."hands",
    (SELECT count(*) FROM "questions" q WHERE q."partId" = p."id" AND ${VISIBLE}) AS "questionCount"`;
export const PARTS = `SELECT ${PART_COLUMNS} FROM "parts" p WHERE p."sectionId" = :sectionId ORDER BY p."number"`;
export const FIND_PARTS = `SELECT ${PART_COLUMNS} FROM "parts" p WHERE p."kitId" = :kitId
  AND (p."number" LIKE :like ESCAPE '\\' OR p."name" LIKE :like ESCAPE '\\') ORDER BY p."number" LIMIT 20`;
const HOLE_LINE_COLUMNS = `h.*, (SELECT count(*) FROM "questions" q WHERE q."holeLineId" = h."id" AND ${VISIBLE}) AS "questionCount"`;
export const HOLE_LINES = `SELECT ${HOLE_LINE_COLUMNS} FROM "hole_lines" h WHERE h."sectionId" = :sectionId ORDER BY h."code"`;
export const HOLE_LINE = `SELECT ${HOLE_LINE_COLUMNS} FROM "hole_lines" h WHERE h."id" = :holeLineId`;
export const PART_OF_STACK =
  'SELECT "id" AS "partId", "number", "name", "alloy", "thickness" FROM "parts" WHERE "id" = ?';

export const MET_HERE = `SELECT q."id" AS "questionId", q."number", q."title", q."state", h."code" AS "holeLineCode", p."number" AS "partNumber",
    (SELECT f."summary" FROM "fixes" f JOIN "endorsements" e ON e."fixId" = f."id" WHERE f."questionId" = q."id" ORDER BY e."givenAt" DESC LIMIT 1) AS "fixSummary",
    c."at" AS "carriedOutAt"
  FROM "questions" q LEFT JOIN "completions" c ON c."questionId" = q."id" LEFT JOIN "hole_lines" h ON h."id" = q."holeLineId"
  LEFT JOIN "parts" p ON p."id" = q."partId"
  WHERE q."sectionId" = :sectionId AND q."state" IN ('carriedOut', 'endorsed', 'underReview') AND ${VISIBLE}
  ORDER BY q."lastActivityAt" DESC LIMIT 20`;

export const NOTICES = `SELECT * FROM "notices" WHERE "kitId" = :kitId ORDER BY "issuedOn" DESC, "number" DESC`;
export const NOTICE = 'SELECT * FROM "notices" WHERE "id" = :noticeId';
export const SECTION_KIT = 'SELECT "kitId", "code" FROM "sections" WHERE "id" = :sectionId';
