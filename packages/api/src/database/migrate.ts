import { DataSource } from 'typeorm';
import { writerOptions } from '../common/database/data-sources.js';
import { assertSqliteVersion } from '../common/database/pragmas.js';
import { rawConnection } from '../common/database/raw-connection.js';
import type { Settings } from '../common/config/settings.js';
import { entities } from './entities.js';
import { migrations } from './migrations/index.js';

/** Brings the file up to date before anything opens it for reading. */
export async function migrate(settings: Settings): Promise<void> {
  const source = new DataSource(writerOptions(settings, entities, migrations));
  await source.initialize();
  try {
    assertSqliteVersion(rawConnection(source));
    await source.runMigrations({ transaction: 'each' });
  } finally {
    await source.destroy();
  }
}
