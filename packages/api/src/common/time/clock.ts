import { Injectable } from '@nestjs/common';

/** The time, as something a test may replace. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }

  /** The instant as it is stored and sent: ISO 8601, UTC, milliseconds. */
  instant(): string {
    return this.now().toISOString();
  }
}
