import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE "sign_ups" (
      "hash" varchar PRIMARY KEY NOT NULL,
      "name" varchar NOT NULL,
      "passwordHash" varchar NOT NULL,
      CONSTRAINT "FK_1085a5ce5d198ec4fc9a8d4fefb" FOREIGN KEY ("hash") REFERENCES "mail_tokens" ("hash") ON DELETE CASCADE ON UPDATE NO ACTION
    )`,
  `CREATE TABLE "standing_changes" (
      "seq" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
      "userId" varchar NOT NULL
    )`,
];

const note = (userId: string) => `BEGIN INSERT INTO "standing_changes" ("userId") VALUES (${userId}); END`;

/** Whoever changes what somebody may do, in whichever process or by hand, leaves a line for the open sockets. */
const TRIGGERS = [
  `CREATE TRIGGER "standing_by_session_end" AFTER UPDATE OF "endedAt" ON "sessions"
    WHEN NEW."endedAt" IS NOT OLD."endedAt" ${note('NEW."userId"')}`,
  `CREATE TRIGGER "standing_by_session_gone" AFTER DELETE ON "sessions"
    WHEN OLD."endedAt" IS NULL ${note('OLD."userId"')}`,
  `CREATE TRIGGER "standing_by_account" AFTER UPDATE OF "siteRole", "disabledAt", "name" ON "users"
    WHEN NEW."siteRole" IS NOT OLD."siteRole" OR NEW."disabledAt" IS NOT OLD."disabledAt" OR NEW."name" <> OLD."name" ${note('NEW."id"')}`,
  `CREATE TRIGGER "standing_by_chapter_name" AFTER UPDATE OF "name" ON "chapters" WHEN NEW."name" <> OLD."name"
    BEGIN INSERT INTO "standing_changes" ("userId") SELECT "userId" FROM "memberships" WHERE "chapterId" = NEW."id"; END`,
  `CREATE TRIGGER "standing_by_joining" AFTER INSERT ON "memberships" ${note('NEW."userId"')}`,
  `CREATE TRIGGER "standing_by_role" AFTER UPDATE OF "chapterId", "roles", "disciplines", "status" ON "memberships"
    WHEN NEW."chapterId" <> OLD."chapterId" OR NEW."roles" <> OLD."roles"
      OR NEW."disciplines" <> OLD."disciplines" OR NEW."status" <> OLD."status" ${note('NEW."userId"')}`,
  `CREATE TRIGGER "standing_by_leaving" AFTER DELETE ON "memberships" ${note('OLD."userId"')}`,
];

const TRIGGER_NAMES = TRIGGERS.map((sql) => /"(\w+)"/.exec(sql)![1]);

/** What somebody signed up with waits beside its link; changes of standing are numbered. */
export class CreateSignUps1767312200000 implements MigrationInterface {
  async up(db: QueryRunner): Promise<void> {
    for (const sql of [...TABLES, ...TRIGGERS]) await db.query(sql);
  }

  async down(db: QueryRunner): Promise<void> {
    for (const name of TRIGGER_NAMES) await db.query(`DROP TRIGGER "${name}"`);
    for (const name of ['standing_changes', 'sign_ups']) await db.query(`DROP TABLE "${name}"`);
  }
}
