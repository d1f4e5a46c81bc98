const COLUMNS = `b."id", b."kitId", k."name" AS "kitName", b."serial", b."chapterId", b."ownerId", o."name" AS "ownerName", b."mentorId", m."name" AS "mentorName", b."startedOn"`;
const FROM = `FROM "builds" b JOIN "kits" k ON k."id" = b."kitId" JOIN "users" o ON o."id" = b."ownerId" LEFT JOIN "users" m ON m."id" = b."mentorId"`;

export const OWN_BUILDS = `SELECT ${COLUMNS} ${FROM} WHERE b."ownerId" = :userId
  OR b."id" IN (SELECT "buildId" FROM "build_crew" WHERE "userId" = :userId) ORDER BY b."startedOn"`;
export const BUILD = `SELECT ${COLUMNS} ${FROM} WHERE b."id" = ?`;
export const CREW = `SELECT u."id", u."name" FROM "build_crew" c JOIN "users" u ON u."id" = c."userId" WHERE c."buildId" = ? ORDER BY u."name"`;

export const ENTRIES = `SELECT e."id", e."buildId", e."kind", e."sectionId", s."name" AS "sectionName", e."questionId", q."number" AS "questionNumber",
    e."title", e."lines", e."minutes", e."byId", u."name" AS "byName", e."helpers", e."doneAt", e."writtenAt", json_array_length(e."photoIds") AS "photoCount"
  FROM "entries" e JOIN "users" u ON u."id" = e."byId" LEFT JOIN "sections" s ON s."id" = e."sectionId" LEFT JOIN "questions" q ON q."id" = e."questionId"
  WHERE e."buildId" = ? AND (e."doneAt", e."id") < (?, ?) ORDER BY e."doneAt" DESC, e."id" DESC LIMIT ?`;

export const OPEN_ITEMS = `SELECT i."id", i."buildId", i."sectionId", s."name" AS "sectionName", i."questionId", i."text", i."due", i."raisedAt", i."clearedAt", i."clearedNote"
  FROM "open_items" i LEFT JOIN "sections" s ON s."id" = i."sectionId" WHERE i."buildId" = ? ORDER BY i."clearedAt" IS NOT NULL, i."raisedAt", i."id"`;
export const OPEN_ITEM = 'SELECT "id", "buildId", "clearedAt" FROM "open_items" WHERE "id" = ?';

export const STEP_STATES = `SELECT t."id" AS "stepId", coalesce(p."state", 'todo') AS "state" FROM "steps" t
  LEFT JOIN "step_progress" p ON p."stepId" = t."id" AND p."buildId" = ? WHERE t."sectionId" = ? ORDER BY t."number"`;
export const SET_STEP = `INSERT INTO "step_progress" ("buildId", "stepId", "state", "at") VALUES (?, ?, ?, ?)
  ON CONFLICT ("buildId", "stepId") DO UPDATE SET "state" = excluded."state", "at" = excluded."at"`;
