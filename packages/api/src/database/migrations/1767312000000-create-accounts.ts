import type { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = [
  `CREATE TABLE "users" (
      "id" varchar PRIMARY KEY NOT NULL,
      "email" varchar NOT NULL,
      "name" varchar NOT NULL,
      "passwordHash" varchar NOT NULL,
      "emailConfirmedAt" varchar,
      "units" varchar NOT NULL,
      "zone" varchar NOT NULL,
      "siteRole" varchar,
      "disabledAt" varchar,
      "createdAt" varchar NOT NULL,
      CONSTRAINT "UQ_97672ac88f789774dd47f7c8be3" UNIQUE ("email")
    )`,
  `CREATE TABLE "sessions" (
      "id" varchar PRIMARY KEY NOT NULL,
      "userId" varchar NOT NULL,
      "device" varchar NOT NULL,
      "createdAt" varchar NOT NULL,
      "lastUsedAt" varchar NOT NULL,
      "endedAt" varchar,
      "endedReason" varchar,
      CONSTRAINT "FK_57de40bc620f456c7311aa3a1e6" FOREIGN KEY ("userId") REFERENCES "users" ("id") ON DELETE CASCADE ON UPDATE NO ACTION
    )`,
  `CREATE TABLE "refresh_tokens" (
      "hash" varchar PRIMARY KEY NOT NULL,
      "sessionId" varchar NOT NULL,
      "issuedAt" varchar NOT NULL,
      "expiresAt" varchar NOT NULL,
      "usedAt" varchar,
      CONSTRAINT "FK_b25a58a00578bd1b7a01623d2dd" FOREIGN KEY ("sessionId") REFERENCES "sessions" ("id") ON DELETE CASCADE ON UPDATE NO ACTION
    )`,
  `CREATE TABLE "mail_tokens" (
      "hash" varchar PRIMARY KEY NOT NULL,
      "userId" varchar NOT NULL,
      "purpose" varchar NOT NULL,
      "email" varchar,
      "expiresAt" varchar NOT NULL,
      "usedAt" varchar,
      CONSTRAINT "FK_ea612d3855cc2abcd9be01c0c13" FOREIGN KEY ("userId") REFERENCES "users" ("id") ON DELETE CASCADE ON UPDATE NO ACTION
    )`,
  `CREATE TABLE "chapters" (
      "id" varchar PRIMARY KEY NOT NULL,
      "key" varchar NOT NULL,
      "name" varchar NOT NULL,
      "zone" varchar NOT NULL,
      "currency" varchar NOT NULL,
      "meets" varchar NOT NULL,
      "place" varchar NOT NULL,
      "joining" varchar NOT NULL,
      "createdAt" varchar NOT NULL,
      CONSTRAINT "UQ_06df847dbe532b494f38d6b5b2c" UNIQUE ("key")
    )`,
  `CREATE TABLE "memberships" (
      "id" varchar PRIMARY KEY NOT NULL,
      "chapterId" varchar NOT NULL,
      "userId" varchar NOT NULL,
      "roles" text NOT NULL,
      "disciplines" text NOT NULL,
      "status" varchar NOT NULL,
      "stampNumber" varchar,
      "joinedAt" varchar NOT NULL,
      CONSTRAINT "FK_c16ffeedab7b93dae9f3fa0852a" FOREIGN KEY ("chapterId") REFERENCES "chapters" ("id") ON DELETE CASCADE ON UPDATE NO ACTION,
      CONSTRAINT "FK_187d573e43b2c2aa3960df20b78" FOREIGN KEY ("userId") REFERENCES "users" ("id") ON DELETE CASCADE ON UPDATE NO ACTION
    )`,
  `CREATE TABLE "outbox" (
      "id" varchar PRIMARY KEY NOT NULL,
      "to" varchar NOT NULL,
      "subject" varchar NOT NULL,
      "text" text NOT NULL,
      "html" text NOT NULL,
      "createdAt" varchar NOT NULL,
      "dueAt" varchar NOT NULL,
      "attempts" integer NOT NULL,
      "sentAt" varchar,
      "lastError" varchar
    )`,
  `CREATE TABLE "idempotency_keys" (
      "userId" varchar NOT NULL,
      "key" varchar NOT NULL,
      "method" varchar NOT NULL,
      "path" varchar NOT NULL,
      "bodyHash" varchar NOT NULL,
      "status" integer NOT NULL,
      "response" text NOT NULL,
      "createdAt" varchar NOT NULL,
      PRIMARY KEY ("userId", "key")
    )`,
  `CREATE TABLE "audit_trail" (
      "id" varchar PRIMARY KEY NOT NULL,
      "at" varchar NOT NULL,
      "byId" varchar,
      "what" varchar NOT NULL,
      "subjectType" varchar NOT NULL,
      "subjectId" varchar NOT NULL,
      "detail" text NOT NULL
    )`,
];

const INDEXES = [
  `CREATE INDEX "mail_tokens_of_user" ON "mail_tokens" ("userId", "purpose")`,
  `CREATE INDEX "refresh_tokens_of_session" ON "refresh_tokens" ("sessionId")`,
  `CREATE INDEX "sessions_of_user" ON "sessions" ("userId", "endedAt")`,
  `CREATE INDEX "memberships_of_user" ON "memberships" ("userId")`,
  `CREATE UNIQUE INDEX "member_of_chapter" ON "memberships" ("chapterId", "userId")`,
  `CREATE INDEX "outbox_to_send" ON "outbox" ("sentAt", "dueAt")`,
  `CREATE INDEX "idempotency_keys_by_age" ON "idempotency_keys" ("createdAt")`,
  `CREATE INDEX "audit_of_subject" ON "audit_trail" ("subjectType", "subjectId", "at")`,
];

/** The audit trail cannot be rewritten by the app: the database itself refuses. */
const TRIGGERS = [
  `CREATE TRIGGER "audit_never_changes" BEFORE UPDATE ON "audit_trail" BEGIN SELECT RAISE(ABORT, 'the audit trail is never changed'); END`,
  `CREATE TRIGGER "audit_never_goes" BEFORE DELETE ON "audit_trail" BEGIN SELECT RAISE(ABORT, 'the audit trail is never shortened'); END`,
];

const NAMES = [
  'users',
  'sessions',
  'refresh_tokens',
  'mail_tokens',
  'chapters',
  'memberships',
  'outbox',
  'idempotency_keys',
  'audit_trail',
];

export class CreateAccounts1767312000000 implements MigrationInterface {
  async up(db: QueryRunner): Promise<void> {
    for (const sql of [...TABLES, ...INDEXES, ...TRIGGERS]) await db.query(sql);
  }

  async down(db: QueryRunner): Promise<void> {
    for (const name of [...NAMES].reverse()) await db.query(`DROP TABLE "${name}"`);
  }
}
