import { Injectable } from '@nestjs/common';
import { ThrottlerStorageService } from '@nestjs/throttler';
import { TooMany } from '../errors/app-error.js';

export interface TryLimit {
  readonly name: string;
  readonly most: number;
  readonly withinMs: number;
}

/** Counts tries at what is guessed or flooded. In memory: a restart forgives. */
@Injectable()
export class Tries {
  private readonly storage = new ThrottlerStorageService();

  /** Counts one and refuses with the wait once there were too many. */
  async count(limit: TryLimit, who: string): Promise<void> {
    const { isBlocked, timeToBlockExpire } = await this.storage.increment(
      `${limit.name}:${who}`,
      limit.withinMs,
      limit.most,
      limit.withinMs,
      limit.name,
    );
    if (isBlocked) throw new TooMany(Math.max(1, timeToBlockExpire));
  }

  /** Forgives what was counted, after a success. */
  forgive(limit: TryLimit, who: string): void {
    this.storage.storage.delete(`${limit.name}:${who}`);
  }

  onApplicationShutdown(): void {
    this.storage.onApplicationShutdown();
  }
}
