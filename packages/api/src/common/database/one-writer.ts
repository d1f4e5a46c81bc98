import type { OnApplicationShutdown } from '@nestjs/common';
import Database from 'better-sqlite3';
import { SettingsFault } from '../config/env.js';

/**
 * Two processes that write would each think their queue the only one. The lock is the operating system's: it goes
 * with the process, however that ends, and it holds between containers that share the folder, where a file with a
 * process number in it would not.
 */
export class OneWriter implements OnApplicationShutdown {
  private constructor(private readonly lock: Database.Database) {}

  static claim(file: string): OneWriter {
    const lock = new Database(file, { timeout: 0 });
    try {
      lock.exec('BEGIN EXCLUSIVE');
    } catch (error) {
      lock.close();
      if ((error as { code?: string }).code !== 'SQLITE_BUSY') throw error;
      throw new SettingsFault([
        'Another process already writes to DATA_DIR: stop it, or start this one with ROLE=live.',
      ]);
    }
    return new OneWriter(lock);
  }

  onApplicationShutdown(): void {
    this.release();
  }

  release(): void {
    this.lock.close();
  }
}
