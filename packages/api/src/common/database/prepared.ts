import type { Database, Statement } from 'better-sqlite3';

export type SqlValue = string | number | null;
export type SqlParams = readonly SqlValue[] | Readonly<Record<string, SqlValue>>;

/** Prepared statements of one connection, each compiled once. SQL text is always a constant of ours. */
export class PreparedStatements {
  private readonly known = new Map<string, Statement>();

  constructor(private readonly database: Database) {}

  statement(sql: string): Statement {
    let found = this.known.get(sql);
    if (!found) {
      found = this.database.prepare(sql);
      this.known.set(sql, found);
    }
    return found;
  }

  all<Row>(sql: string, params: SqlParams = []): Row[] {
    return this.statement(sql).all(params) as Row[];
  }

  get<Row>(sql: string, params: SqlParams = []): Row | undefined {
    return this.statement(sql).get(params) as Row | undefined;
  }
}

/** The writer's connection inside a prepared unit. */
export class PreparedDb extends PreparedStatements {
  run(sql: string, params: SqlParams = []): { changes: number; lastInsertRowid: number | bigint } {
    return this.statement(sql).run(params);
  }
}
