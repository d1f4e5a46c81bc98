import { AsyncLocalStorage } from 'node:async_hooks';
import type { PreparedDb } from '../database/prepared.js';

/** The write that is being answered, where its sender named it with an Idempotency-Key. */
export interface NamedWrite {
  readonly userId: string;
  readonly key: string;
  readonly method: string;
  readonly path: string;
  readonly bodyHash: string;
  readonly status: number;
  readonly at: string;
  /** The answer as a unit of work put it down, as JSON. */
  kept?: string;
}

const namedWrite = new AsyncLocalStorage<NamedWrite | undefined>();

const KEEP = `INSERT INTO "idempotency_keys" ("userId", "key", "method", "path", "bodyHash", "status", "response", "createdAt")
  VALUES (?, ?, ?, ?, ?, ?, ?, ?)
  ON CONFLICT ("userId", "key") DO UPDATE SET "method" = excluded."method", "path" = excluded."path",
    "bodyHash" = excluded."bodyHash", "status" = excluded."status", "response" = excluded."response",
    "createdAt" = excluded."createdAt"`;
const CORRECT = `UPDATE "idempotency_keys" SET "status" = ?, "response" = ? WHERE "userId" = ? AND "key" = ?`;

export function asNamedWrite<T>(write: NamedWrite, work: () => T): T {
  return namedWrite.run(write, work);
}

/** What others do on hearing of a write is not its answer. */
export function asNobodysAnswer<T>(work: () => T): T {
  return namedWrite.run(undefined, work);
}

/**
 * Puts the answer into the same transaction as what it tells of: a crash after the commit and before the reply then
 * still gives the first answer to the retry.
 */
export function keepAnswer(db: PreparedDb, result: unknown): void {
  const write = namedWrite.getStore();
  if (!write) return;
  const { userId, key, method, path, bodyHash, status, at } = write;
  write.kept = JSON.stringify(result ?? null);
  db.run(KEEP, [userId, key, method, path, bodyHash, status, write.kept, at]);
}

/** Where the reply was another than what the unit returned. A unit that was rolled back has left no row to correct. */
export function correctAnswer(
  db: PreparedDb,
  { userId, key }: NamedWrite,
  answer: { readonly status: number; readonly response: string },
): void {
  db.run(CORRECT, [answer.status, answer.response, userId, key]);
}
