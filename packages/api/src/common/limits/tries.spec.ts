import { TooMany } from '../errors/app-error.js';
import { TestClock } from '../../testing/test-clock.js';
import { Tries, type TryLimit } from './tries.js';

const THREE: TryLimit = { name: 'three', most: 3, withinMs: 60_000 };
const MINUTE = 60_000;

function waitOf(work: () => void): number | null {
  try {
    work();
    return null;
  } catch (error) {
    if (error instanceof TooMany) return error.retryAfterSeconds;
    throw error;
  }
}

describe('tries', () => {
  let clock: TestClock;
  let tries: Tries;
  beforeEach(() => {
    clock = new TestClock();
    tries = new Tries(clock);
  });
  afterEach(() => tries.onApplicationShutdown());

  it('lets through as many as the limit and refuses the next with a wait', () => {
    const waits = [1, 2, 3, 4].map(() => waitOf(() => tries.take(THREE, 'a')));
    expect(waits.slice(0, 3)).toEqual([null, null, null]);
    expect(waits[3]).toBeGreaterThan(0);
    expect(waits[3]).toBeLessThanOrEqual(60);
  });

  it('counts each name and each limit apart', () => {
    for (let n = 0; n < 3; n += 1) tries.take(THREE, 'a');
    expect(waitOf(() => tries.take(THREE, 'b'))).toBeNull();
    expect(waitOf(() => tries.take({ ...THREE, name: 'other' }, 'a'))).toBeNull();
  });

  it('counts nothing while it only asks', () => {
    for (let n = 0; n < 10; n += 1) tries.refuseIfSpent(THREE, 'a');
    expect(tries.isSpent(THREE, 'a')).toBe(false);
  });

  it('does not lengthen the wait of whoever goes on trying', () => {
    for (let n = 0; n < 3; n += 1) tries.take(THREE, 'a');
    clock.advance(30_000);
    expect(waitOf(() => tries.take(THREE, 'a'))).toBeLessThanOrEqual(30);
    clock.advance(30_000);
    expect(waitOf(() => tries.take(THREE, 'a'))).toBeNull();
  });

  it('slides: one leaves the window, one more may come', () => {
    tries.take(THREE, 'a');
    clock.advance(40_000);
    tries.take(THREE, 'a');
    tries.take(THREE, 'a');
    clock.advance(20_000);
    expect(waitOf(() => tries.take(THREE, 'a'))).toBeNull();
    expect(waitOf(() => tries.take(THREE, 'a'))).toBeGreaterThan(0);
  });

  it('forgives all that was counted', () => {
    for (let n = 0; n < 3; n += 1) tries.take(THREE, 'a');
    tries.forgive(THREE, 'a');
    for (let n = 0; n < 3; n += 1) expect(waitOf(() => tries.take(THREE, 'a'))).toBeNull();
    clock.advance(MINUTE);
    expect(tries.isSpent(THREE, 'a')).toBe(false);
  });
});
