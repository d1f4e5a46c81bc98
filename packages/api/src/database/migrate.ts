import { existsSync } from 'node:fs';
import Database from 'better-sqlite3';
import { DataSource } from 'typeorm';
import { SettingsFault } from '../common/config/env.js';
import type { Settings } from '../common/config/settings.js';
import { writerOptions } from '../common/database/data-sources.js';
import { assertSqliteVersion } from '../common/database/pragmas.js';
import { rawConnection } from '../common/database/raw-connection.js';
import { entities } from './entities.js';
import { migrations } from './migrations/index.js';

/** Brings the file up to date before anything opens it for reading. */
export async function migrate(settings: Settings): Promise<void> {
  const source = new DataSource(writerOptions(settings, entities, migrations));
  await source.initialize();
  try {
    assertSqliteVersion(rawConnection(source));
    refuseNewer(rawConnection(source));
    await source.runMigrations({ transaction: 'each' });
  } finally {
    await source.destroy();
  }
}

/** A process that only reads cannot bring the file up to date: it waits for the one that can. */
export function refuseUnmigrated(settings: Settings): void {
  const newest = migrations.at(-1)!.name;
  const done = existsSync(settings.databaseFile) ? migrationsOf(settings.databaseFile) : [];
  if (!done.includes(newest))
    throw new SettingsFault(['The data in DATA_DIR are not ready: start the main process first.']);
}

/** An older app would write beside columns that it does not know. */
function refuseNewer(database: Database.Database): void {
  const known = new Set(migrations.map(({ name }) => name));
  const stranger = namesIn(database).find((name) => !known.has(name));
  if (stranger)
    throw new SettingsFault([
      `The data in DATA_DIR were written by a newer version (${stranger}): start that version, or restore a backup.`,
    ]);
}

function migrationsOf(file: string): string[] {
  const database = new Database(file, { readonly: true });
  try {
    return namesIn(database);
  } finally {
    database.close();
  }
}

function namesIn(database: Database.Database): string[] {
  const table = database.prepare(`SELECT 1 FROM sqlite_master WHERE type = 'table' AND name = 'migrations'`);
  if (!table.get()) return [];
  const rows = database.prepare('SELECT "name" FROM "migrations"').all() as { name: string }[];
  return rows.map(({ name }) => name);
}
