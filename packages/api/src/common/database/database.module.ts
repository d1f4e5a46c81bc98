import { type DynamicModule, Global, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import type { MixedList } from 'typeorm';
import { Settings } from '../config/settings.js';
import { READER, readerOptions, writerOptions } from './data-sources.js';
import { PreparedReader } from './prepared-reader.js';
import { Reader } from './reader.js';
import { UnitOfWork } from './unit-of-work.js';

type Classes = MixedList<new () => object>;

@Global()
@Module({})
export class DatabaseModule {
  /** Entities and migrations are listed by the app, since this folder knows no feature. */
  static with(entities: Classes, migrations: Classes): DynamicModule {
    return {
      module: DatabaseModule,
      imports: [
        TypeOrmModule.forRootAsync({
          inject: [Settings],
          useFactory: (settings: Settings) => writerOptions(settings, entities, migrations),
        }),
        TypeOrmModule.forRootAsync({
          name: READER,
          inject: [Settings],
          useFactory: (settings: Settings) => ({ ...readerOptions(settings, entities), name: READER }),
        }),
      ],
      providers: [UnitOfWork, PreparedReader, Reader],
      exports: [UnitOfWork, PreparedReader, Reader],
    };
  }
}
