import type { Database } from 'better-sqlite3';
import { assertSqliteVersion } from './pragmas.js';

const saying = (version: string) =>
  ({ prepare: () => ({ get: () => ({ version }) }) }) as unknown as Database;

describe('assertSqliteVersion', () => {
  it.each(['3.51.3', '3.51.10', '3.52.0', '4.0.0'])('takes %s', (version) =>
    expect(() => assertSqliteVersion(saying(version))).not.toThrow(),
  );
  it.each(['3.51.2', '3.50.9', '2.99.99', '3.51'])('refuses %s', (version) =>
    expect(() => assertSqliteVersion(saying(version))).toThrow(`SQLite ${version} is too old`),
  );
});
