import type { Database } from 'better-sqlite3';

/** Below this a corrected WAL fault is missing. */
export const SQLITE_AT_LEAST = [3, 51, 3] as const;

const MMAP_BYTES = 1_073_741_824;
const CACHE_KIB = 65_536;

/** NORMAL would lose acknowledged writes at power loss, hence FULL. */
export function prepareWriter(database: Database): void {
  database.pragma('journal_mode = WAL');
  database.pragma('synchronous = FULL');
  database.pragma('foreign_keys = ON');
  // Checkpoint by pages written, and give the file back to its size: the log stays small through a soak.
  database.pragma('wal_autocheckpoint = 1000');
  database.pragma('journal_size_limit = 33554432');
  prepareBoth(database);
}

export function prepareReader(database: Database): void {
  database.pragma('query_only = ON');
  prepareBoth(database);
}

function prepareBoth(database: Database): void {
  database.pragma(`mmap_size = ${MMAP_BYTES}`);
  database.pragma(`cache_size = -${CACHE_KIB}`);
  database.pragma('temp_store = MEMORY');
}

export function assertSqliteVersion(database: Database): void {
  const { version } = database.prepare('SELECT sqlite_version() AS version').get() as { version: string };
  const found = version.split('.').map(Number);
  for (const [at, least] of SQLITE_AT_LEAST.entries()) {
    const part = found[at] ?? 0;
    if (part > least) return;
    if (part < least)
      throw new Error(`SQLite ${version} is too old: ${SQLITE_AT_LEAST.join('.')} is needed.`);
  }
}
