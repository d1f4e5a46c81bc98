import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { DataSource } from 'typeorm';
import { readEnv } from '../common/config/env.js';
import { Settings } from '../common/config/settings.js';
import { writerOptions } from '../common/database/data-sources.js';
import { entities } from './entities.js';
import { migrate, refuseUnmigrated } from './migrate.js';
import { migrations } from './migrations/index.js';

describe('the migrations', () => {
  let folder: string;
  let settings: Settings;
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'rivetside-migrations-'));
    settings = new Settings(readEnv({ NODE_ENV: 'test', DATA_DIR: folder }));
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  async function within<T>(work: (source: DataSource) => Promise<T>): Promise<T> {
    const source = await new DataSource(writerOptions(settings, entities, migrations)).initialize();
    return work(source).finally(() => source.destroy());
  }
  const schema = () =>
    within((source) =>
      source.query<{ name: string; sql: string }[]>(
        `SELECT "name", "sql" FROM sqlite_master WHERE "name" NOT LIKE 'sqlite_%' AND "name" <> 'migrations' ORDER BY "name"`,
      ),
    );

  it('leave nothing between the migrated schema and the entities', async () => {
    await migrate(settings);
    const { upQueries } = await within((source) => source.driver.createSchemaBuilder().log());
    expect(upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('are listed in the order in which they run', () => {
    const stamps = migrations.map(({ name }) => Number(/\d{13}$/.exec(name)![0]));
    expect(stamps).toEqual([...stamps].sort((a, b) => a - b));
    expect(new Set(stamps).size).toBe(stamps.length);
  });

  it('run once: a second start changes nothing', async () => {
    await migrate(settings);
    const first = await schema();
    await migrate(settings);
    expect(await schema()).toEqual(first);
    expect(first.length).toBeGreaterThan(20);
  });

  it('can be taken back to an empty file and run again', async () => {
    await migrate(settings);
    const first = await schema();
    await within(async (source) => {
      for (let at = 0; at < migrations.length; at += 1)
        await source.undoLastMigration({ transaction: 'each' });
    });
    expect(await schema()).toEqual([]);
    await migrate(settings);
    expect(await schema()).toEqual(first);
  });

  it('refuse data that a newer version wrote', async () => {
    await migrate(settings);
    await within((source) =>
      source.query(
        `INSERT INTO "migrations" ("timestamp", "name") VALUES (9999999999999, 'FoldWings9999999999999')`,
      ),
    );
    await expect(migrate(settings)).rejects.toThrow(
      'were written by a newer version (FoldWings9999999999999)',
    );
  });

  it('keep a reading process waiting until they have run', async () => {
    expect(() => refuseUnmigrated(settings)).toThrow('start the main process first');
    await migrate(settings);
    expect(() => refuseUnmigrated(settings)).not.toThrow();
  });

  it('leave an audit trail that nobody rewrites', async () => {
    await migrate(settings);
    const insert = `INSERT INTO "audit_trail" ("id", "at", "byId", "what", "subjectType", "subjectId", "detail")
      VALUES ('a', '2026-01-01T00:00:00.000Z', NULL, 'x', 'y', 'z', '{}')`;
    await within(async (source) => {
      await source.query(insert);
      await expect(source.query(`UPDATE "audit_trail" SET "what" = 'other'`)).rejects.toThrow(
        'never changed',
      );
      await expect(source.query(`DELETE FROM "audit_trail"`)).rejects.toThrow('never shortened');
    });
  });
});
