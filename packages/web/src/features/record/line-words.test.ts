import { timesIn } from '../../lib/times';
import { lineWords } from './line-words';

it.each([
  ['Op 10 Pin the holes. Op 20 Open to #21.', 'Op 10 Pin the holes.\nOp 20 Open to #21.'],
  ['stamp M-08, 2026-06-02, rule text', 'stamp M-08, 2 Jun 26, rule text'],
  ['stamps of 2025-08-24 and 2025-08-25', 'stamps of 24 Aug 25 and 25 Aug 25'],
  ['hinge 12-05-2025-01', 'hinge 12-05-2025-01'],
  ['holes not over 0.161', 'holes not over 0.161'],
])('writes “%s” for a reader', (text, words) => expect(lineWords(text, timesIn('UTC'))).toBe(words));

it('leaves a calendar day the same day everywhere', () => {
  expect(lineWords('2026-06-02', timesIn('Pacific/Honolulu'))).toBe('2 Jun 26');
});
