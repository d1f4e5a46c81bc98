import { timesIn } from './times';

const { date, dateTime, since } = timesIn('Europe/London');

it('shows an instant in the reader’s zone', () => {
  expect(dateTime('2025-05-12T06:15:00.000Z')).toBe('12 May 25, 07:15');
  expect(timesIn('America/New_York').dateTime('2025-05-12T03:15:00.000Z')).toBe('11 May 25, 23:15');
});

it('shows midnight as 00:00', () => expect(timesIn('UTC').time('2025-05-12T00:00:00.000Z')).toBe('00:00'));

it('never shifts a calendar day', () => {
  expect(timesIn('America/Los_Angeles').date('2025-05-12')).toBe('12 May 25');
  expect(date('2025-05-12')).toBe('12 May 25');
});

it('falls back to the device for a zone that it does not know', () => {
  expect(timesIn('Mars/Olympus').date('2025-05-12T12:00:00.000Z')).toBe('12 May 25');
});

it.each([
  [59_999, 'a moment'],
  [60_000, '1 minute'],
  [3_600_000 - 1, '59 minutes'],
  [3_600_000, '1 hour'],
  [86_400_000 * 3, '3 days'],
  [86_400_000 * 7, '1 week'],
  [86_400_000 * 364, '12 months'],
  [86_400_000 * 730, '2 years'],
])('says %d ms as %s', (ms, words) => {
  const now = new Date('2025-05-12T12:00:00.000Z');
  expect(since(new Date(now.getTime() - ms).toISOString(), now)).toBe(words);
});
