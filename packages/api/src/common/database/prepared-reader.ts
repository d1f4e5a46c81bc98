import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { Database } from 'better-sqlite3';
import { DataSource } from 'typeorm';
import { READER } from './data-sources.js';
import { PreparedStatements, type SqlParams } from './prepared.js';
import { rawConnection } from './raw-connection.js';

/** Hot reads: prepared SQL on the reader's connection, which never sees a row that is not committed. */
@Injectable()
export class PreparedReader {
  private readonly statements: PreparedStatements;

  constructor(@InjectDataSource(READER) reader: DataSource) {
    const database: Database = rawConnection(reader);
    this.statements = new PreparedStatements(database);
  }

  all<Row>(sql: string, params?: SqlParams): Row[] {
    return this.statements.all<Row>(sql, params);
  }

  get<Row>(sql: string, params?: SqlParams): Row | undefined {
    return this.statements.get<Row>(sql, params);
  }
}
