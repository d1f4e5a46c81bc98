import { requestIdOf } from './request-id.js';

describe('requestIdOf', () => {
  it('takes over the id of a proxy', () => {
    expect(requestIdOf({ headers: { 'x-request-id': 'edge:7f-3.a_1' } })).toBe('edge:7f-3.a_1');
  });

  it.each(['', 'a b', 'x'.repeat(65), '{"a":1}', 'a\u0000b', 'a,b'])(
    'makes its own in place of %j',
    (given) => {
      const id = requestIdOf({ headers: { 'x-request-id': given } });
      expect(id).toMatch(/^[\w-]{8}-\d+$/);
    },
  );

  it('makes a new one each time', () => {
    const ids = Array.from({ length: 100 }, () => requestIdOf({ headers: {} }));
    expect(new Set(ids).size).toBe(100);
  });
});
