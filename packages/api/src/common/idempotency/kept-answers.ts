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
}

export const namedWrite = new AsyncLocalStorage<NamedWrite>();

const KEEP = `INSERT INTO "idempotency_keys" ("userId", "key", "method", "path", "bodyHash", "status", "response", "createdAt")
  VALUES (?, ?, ?, ?, ?, ?, ?, ?)
  ON CONFLICT ("userId", "key") DO UPDATE SET "status" = excluded."status", "response" = excluded."response"`;

/**
 * Puts the answer into the same transaction as what it tells of: a crash after the commit and before the reply then
 * still gives the first answer to the retry.
 */
export function keepAnswer(db: PreparedDb, result: unknown): void {
  const write = namedWrite.getStore();
  if (!write) return;
  const { userId, key, method, path, bodyHash, status, at } = write;
  db.run(KEEP, [userId, key, method, path, bodyHash, status, JSON.stringify(result ?? null), at]);
}
