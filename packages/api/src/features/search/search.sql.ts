/** Title, place and numbers of the trade weigh more than running words. */
const RANK = 'bm25("search_index", 8.0, 4.0, 1.0, 6.0)';

/**
 * The best rows for a query within what one may see: everything of the kit that is open to its chapters, and what was
 * asked in one's own. Parameters: query, chapter ids, kit ids (both JSON), how many.
 */
export const SEARCH = `SELECT d."kind", d."refId", d."questionId", f.title AS "docTitle", f.place AS "docPlace", f.words AS "docWords", ${RANK} AS "rank"
  FROM "search_index" f JOIN "search_docs" d ON d."id" = f.rowid
  WHERE "search_index" MATCH ?
    AND (d."chapterId" IN (SELECT value FROM json_each(?)) OR (d."chapterId" IS NULL AND d."kitId" IN (SELECT value FROM json_each(?))))
  ORDER BY "rank" LIMIT ?`;

export const QUESTION_OF_HIT = `SELECT q."id", q."number", q."title", q."state", q."body", s."name" AS "sectionName", p."number" AS "partNumber", h."code" AS "holeLineCode",
    (SELECT CASE WHEN e."withdrawnAt" IS NOT NULL THEN 'withdrawn' WHEN e."heldAt" IS NOT NULL THEN 'held' WHEN e."goodUntil" < ? THEN 'expired' END
       FROM "endorsements" e WHERE e."questionId" = q."id" ORDER BY e."givenAt" DESC LIMIT 1) AS "standing"
  FROM "questions" q LEFT JOIN "sections" s ON s."id" = q."sectionId" LEFT JOIN "parts" p ON p."id" = q."partId"
  LEFT JOIN "hole_lines" h ON h."id" = q."holeLineId" WHERE q."id" = ?`;

export const SECTION_OF: Readonly<Record<string, string>> = {
  section: 'SELECT "id" AS "sectionId" FROM "sections" WHERE "id" = ?',
  step: 'SELECT "sectionId" FROM "steps" WHERE "id" = ?',
  part: 'SELECT "sectionId" FROM "parts" WHERE "id" = ?',
  holeLine: 'SELECT "sectionId" FROM "hole_lines" WHERE "id" = ?',
};

export const KITS_OF_CHAPTERS = `SELECT DISTINCT "kitId" FROM "kit_chapters" WHERE "chapterId" IN (SELECT value FROM json_each(?))`;
export const ALL_KITS = 'SELECT "id" AS "kitId" FROM "kits"';
export const ALL_CHAPTERS = 'SELECT "id" FROM "chapters"';
