import { lastGoodDay } from './stamp-life.js';

describe('lastGoodDay', () => {
  it.each([
    { basis: 'drawingNote', kind: 'cleanUp', expected: '2028-12-01' },
    { basis: 'experience', kind: 'cleanUp', expected: '2027-12-01' },
    { basis: 'kitMakerReply', kind: 'defer', expected: '2027-06-01' },
  ] as const)('is $expected on $basis under $kind, given on 2026-12-01', ({ basis, kind, expected }) => {
    expect(lastGoodDay('2026-12-01', basis, kind)).toBe(expected);
  });

  it('ends with a short month where the day is not in it', () => {
    expect(lastGoodDay('2026-08-31', 'handbook', 'defer')).toBe('2027-02-28');
    expect(lastGoodDay('2024-02-29', 'experience', 'leave')).toBe('2025-02-28');
  });
});
