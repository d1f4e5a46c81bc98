import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { TooMany } from '../errors/app-error.js';
import { Clock } from '../time/clock.js';

export interface TryLimit {
  readonly name: string;
  readonly most: number;
  readonly withinMs: number;
}

interface Counted {
  /** When each was made, oldest first; never more than the limit. */
  readonly at: number[];
  readonly withinMs: number;
}

const SWEEP_MS = 60_000;

/**
 * Counts tries at what is guessed or flooded, over a window that slides. In memory, for each process apart: a restart
 * forgives.
 */
@Injectable()
export class Tries implements OnApplicationShutdown {
  private readonly counted = new Map<string, Counted>();
  private readonly sweeping = setInterval(() => this.sweep(), SWEEP_MS).unref();

  constructor(private readonly clock: Clock) {}

  /** Counts one, or refuses with the wait once there were as many as the limit allows. */
  take(limit: TryLimit, who: string): void {
    this.refuseIfSpent(limit, who);
    this.count(limit, who);
  }

  /** Refuses with the wait, and counts nothing. */
  refuseIfSpent(limit: TryLimit, who: string): void {
    const waitMs = this.waitMs(limit, who);
    if (waitMs > 0) throw new TooMany(Math.ceil(waitMs / 1_000));
  }

  isSpent(limit: TryLimit, who: string): boolean {
    return this.waitMs(limit, who) > 0;
  }

  count({ name, most, withinMs }: TryLimit, who: string): void {
    const key = keyOf(name, who);
    const at = this.counted.get(key)?.at ?? [];
    at.push(this.clock.now().getTime());
    if (at.length > most) at.shift();
    this.counted.set(key, { at, withinMs });
  }

  /** Forgives what was counted, after a success. */
  forgive({ name }: TryLimit, who: string): void {
    this.counted.delete(keyOf(name, who));
  }

  onApplicationShutdown(): void {
    clearInterval(this.sweeping);
  }

  /** Until the oldest of a full window leaves it. */
  private waitMs({ name, most, withinMs }: TryLimit, who: string): number {
    const at = this.counted.get(keyOf(name, who))?.at ?? [];
    return at.length < most ? 0 : at[0]! + withinMs - this.clock.now().getTime();
  }

  /** Guessers leave many names behind: none is kept longer than it counts. */
  private sweep(): void {
    const now = this.clock.now().getTime();
    for (const [key, { at, withinMs }] of this.counted)
      if (at.at(-1)! + withinMs <= now) this.counted.delete(key);
  }
}

function keyOf(name: string, who: string): string {
  return `${name}:${who}`;
}
