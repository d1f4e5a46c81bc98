import { OneAtATime } from './one-at-a-time.js';

const later = () => new Promise<void>((resolve) => setTimeout(resolve, 5));

describe('one at a time', () => {
  it('runs what has the same name in order of arrival, a failure or not', async () => {
    const turns = new OneAtATime();
    const seen: string[] = [];
    const work =
      (name: string, fails = false) =>
      async () => {
        seen.push(`${name} begins`);
        await later();
        seen.push(`${name} ends`);
        if (fails) throw new Error(name);
        return name;
      };
    const first = turns.run('a', work('first', true));
    const second = turns.run('a', work('second'));
    await expect(first).rejects.toThrow('first');
    await expect(second).resolves.toBe('second');
    expect(seen).toEqual(['first begins', 'first ends', 'second begins', 'second ends']);
  });

  it('does not hold up another name', async () => {
    const turns = new OneAtATime();
    let release = () => {};
    const held = turns.run('a', () => new Promise<void>((resolve) => (release = resolve)));
    await expect(turns.run('b', () => Promise.resolve('b'))).resolves.toBe('b');
    release();
    await held;
  });
});
