import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager } from 'typeorm';
import { READER } from './data-sources.js';

/** Reads through entities where speed does not matter. The connection refuses every write. */
@Injectable()
export class Reader {
  readonly manager: EntityManager;

  constructor(@InjectDataSource(READER) source: DataSource) {
    this.manager = source.manager;
  }
}
