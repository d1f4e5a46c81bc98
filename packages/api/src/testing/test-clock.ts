import { Clock } from '../common/time/clock.js';

/** The real time, moved by what a test says: what waits for a day need not be waited for. */
export class TestClock extends Clock {
  private aheadMs = 0;

  override now(): Date {
    return new Date(Date.now() + this.aheadMs);
  }

  advance(ms: number): void {
    this.aheadMs += ms;
  }

  set(instant: string): void {
    this.aheadMs = new Date(instant).getTime() - Date.now();
  }
}
