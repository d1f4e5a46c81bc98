import { minutesInWords } from './minutes-in-words';

it.each([
  [0, '0 minutes'],
  [1, '1 minute'],
  [18, '18 minutes'],
  [59, '59 minutes'],
  [60, '1 hour'],
  [61, '1 hour 1 minute'],
  [125, '2 hours 5 minutes'],
])('says %i minutes as %s', (minutes, words) => expect(minutesInWords(minutes)).toBe(words));
