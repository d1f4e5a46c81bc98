import fc from 'fast-check';
import { BadInput } from '../errors/app-error.js';
import { decodeCursor, encodeCursor, pageOfRows } from './cursor.js';

describe('a cursor', () => {
  it('gives back the key that it was made of', () => {
    const part = fc.oneof(fc.string(), fc.integer(), fc.double({ noNaN: true, noDefaultInfinity: true }));
    fc.assert(
      fc.property(fc.array(part, { minLength: 1, maxLength: 6 }), (key) => {
        // JSON knows no negative zero.
        const plain = key.map((one) => (Object.is(one, -0) ? 0 : one));
        expect(decodeCursor(encodeCursor(plain))).toEqual(plain);
      }),
    );
  });

  it('is refused at its field, whatever was made up', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        try {
          expect(Array.isArray(decodeCursor(text))).toBe(true);
        } catch (error) {
          expect(error).toBeInstanceOf(BadInput);
          expect((error as BadInput).faults[0]?.path).toBe('cursor');
        }
      }),
    );
  });

  it.each(['e30', 'W10', 'W251bGxd', 'W3t9XQ', 'bnVsbA'])('of another form is refused: %s', (text) =>
    expect(() => decodeCursor(text)).toThrow(BadInput),
  );
});

describe('pageOfRows', () => {
  const rows = [{ id: 'a' }, { id: 'b' }, { id: 'c' }];
  const page = (limit: number) =>
    pageOfRows(
      rows,
      limit,
      ({ id }) => id.toUpperCase(),
      ({ id }) => [id],
    );

  it('names the last row shown while there are more', () => {
    const { items, nextCursor } = page(2);
    expect(items).toEqual(['A', 'B']);
    expect(decodeCursor(nextCursor!)).toEqual(['b']);
  });

  it.each([3, 4])('has no next one when %d were asked for', (limit) =>
    expect(page(limit)).toEqual({ items: ['A', 'B', 'C'], nextCursor: null }),
  );

  it('is empty without rows', () => {
    const none = pageOfRows(
      [] as { id: string }[],
      5,
      ({ id }) => id,
      ({ id }) => [id],
    );
    expect(none).toEqual({ items: [], nextCursor: null });
  });
});
