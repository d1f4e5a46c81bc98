const COLUMNS = `p."id", p."width", p."height", p."bytes", p."contentType", p."caption", p."marks"`;
export const ONE = `SELECT ${COLUMNS}, p."ownerId" FROM "photos" p WHERE p."id" = ?`;
export const ON_QUESTION = `SELECT ${COLUMNS}, u."usedIn" FROM "photo_uses" u JOIN "photos" p ON p."id" = u."photoId"
  WHERE u."questionId" = ? ORDER BY u."usedIn", u."position"`;
export const UNUSED = `SELECT p."id" FROM "photos" p LEFT JOIN "photo_uses" u ON u."photoId" = p."id"
  WHERE u."photoId" IS NULL AND p."storedAt" < ? LIMIT 200`;
