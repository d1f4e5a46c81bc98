import fc from 'fast-check';
import { BODY_DEPTH_MAX, isTooDeep } from './body-depth.js';

/** As many arrays, one in the other, the innermost empty. */
const nested = (levels: number) => JSON.parse('['.repeat(levels) + ']'.repeat(levels)) as unknown;

describe('isTooDeep', () => {
  it.each([
    { levels: 1, expected: false },
    { levels: BODY_DEPTH_MAX, expected: false },
    { levels: BODY_DEPTH_MAX + 1, expected: true },
    { levels: 5_000, expected: true },
    { levels: 200_000, expected: true },
  ])('is $expected for $levels levels', ({ levels, expected }) =>
    expect(isTooDeep(nested(levels))).toBe(expected),
  );

  it.each([null, undefined, 'text', 3, true])('is false for %p', (body) =>
    expect(isTooDeep(body)).toBe(false),
  );

  it('agrees with the depth counted by recursion', () => {
    const depthOf = (value: unknown): number =>
      typeof value === 'object' && value !== null ? 1 + Math.max(0, ...Object.values(value).map(depthOf)) : 0;
    fc.assert(
      fc.property(fc.jsonValue({ maxDepth: 8 }), fc.integer({ min: 1, max: 6 }), (body, limit) => {
        expect(isTooDeep(body, limit)).toBe(depthOf(body) > limit);
      }),
    );
  });
});
