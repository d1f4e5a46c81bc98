import type { Database } from 'better-sqlite3';
import type { DataSourceOptions, MixedList } from 'typeorm';
import type { Settings } from '../config/settings.js';
import { prepareReader, prepareWriter } from './pragmas.js';

/** Name of the read-only data source; the writer is the default one. */
export const READER = 'reader';
const BUSY_MS = 5_000;

type Classes = MixedList<new () => object>;

/**
 * A data source has one connection, and two transactions on it become one: hence one to write and one to read. In a
 * process that does not write, the one to write cannot.
 */
export function writerOptions(settings: Settings, entities: Classes, migrations: Classes): DataSourceOptions {
  if (!settings.writes) return readerOptions(settings, entities);
  return {
    type: 'better-sqlite3',
    database: settings.databaseFile,
    entities: entities as never,
    migrations: migrations as never,
    synchronize: false,
    enableWAL: true,
    timeout: BUSY_MS,
    prepareDatabase: (database: Database) => prepareWriter(database),
  };
}

export function readerOptions(settings: Settings, entities: Classes): DataSourceOptions {
  return {
    type: 'better-sqlite3',
    database: settings.databaseFile,
    entities: entities as never,
    readonly: true,
    synchronize: false,
    timeout: BUSY_MS,
    prepareDatabase: (database: Database) => prepareReader(database),
  };
}
