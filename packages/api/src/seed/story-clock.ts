import { Clock } from '../common/time/clock.js';

/** The time at which the story stands: what the app writes while it is told is dated then, not now. */
export class StoryClock extends Clock {
  private at = new Date(0);

  override now(): Date {
    return this.at;
  }

  standAt(moment: string): string {
    this.at = new Date(moment);
    return this.instant();
  }
}
