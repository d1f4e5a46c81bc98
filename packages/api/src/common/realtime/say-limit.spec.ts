import { SayLimit } from './say-limit.js';

const say = (limit: SayLimit, times: number, now: number) =>
  Array.from({ length: times }, () => limit.next(now));

describe('what a socket may say', () => {
  it('takes a burst of 40 and refuses the next', () => {
    const said = say(new SayLimit(0), 41, 0);
    expect(said.slice(0, 40)).toEqual(Array(40).fill('ok'));
    expect(said[40]).toBe('refused');
  });

  it('gives ten back in a second, and never more than the burst', () => {
    const limit = new SayLimit(0);
    say(limit, 40, 0);
    expect(say(limit, 11, 1_000)).toEqual([...Array<string>(10).fill('ok'), 'refused']);
    expect(say(limit, 41, 3_600_000).at(-1)).toBe('refused');
  });

  it('puts out whoever goes on through a hundred refusals', () => {
    const limit = new SayLimit(0);
    say(limit, 40, 0);
    expect(say(limit, 101, 0)).toEqual([...Array<string>(100).fill('refused'), 'out']);
  });

  it('forgets refusals once something was taken', () => {
    const limit = new SayLimit(0);
    say(limit, 140, 0);
    expect(limit.next(1_000)).toBe('ok');
    expect(say(limit, 9 + 100, 1_000).at(-1)).toBe('refused');
  });
});
