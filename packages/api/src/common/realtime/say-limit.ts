/** A burst of so many messages, and then as many a second as somebody can mean. */
const BURST = 40;
const PER_SECOND = 10;
/** Whoever goes on all the same is put out. */
const REFUSED_MAX = 100;

/** How much one socket may say. Time in milliseconds. */
export class SayLimit {
  private left = BURST;
  private refused = 0;

  constructor(private lastAt: number) {}

  next(now: number): 'ok' | 'refused' | 'out' {
    this.left = Math.min(BURST, this.left + ((now - this.lastAt) / 1_000) * PER_SECOND);
    this.lastAt = now;
    if (this.left >= 1) {
      this.left -= 1;
      this.refused = 0;
      return 'ok';
    }
    this.refused += 1;
    return this.refused > REFUSED_MAX ? 'out' : 'refused';
  }
}
