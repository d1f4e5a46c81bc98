import type { Database } from 'better-sqlite3';
import type { DataSource } from 'typeorm';

/** The better-sqlite3 connection under a data source; only common/database may hold it. */
export function rawConnection(source: DataSource): Database {
  return (source.driver as unknown as { databaseConnection: Database }).databaseConnection;
}
