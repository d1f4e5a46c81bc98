import type { QuestionRow } from '@rivetside/shared';
import { timesIn } from '../../lib/times';
import { waitWords } from './wait-words';

const SINCE = '2025-05-12T23:30:00.000Z';
const said = (state: QuestionRow['state'], waits: QuestionRow['waits']['for'], zone = 'UTC') =>
  waitWords({ state, waits: { for: waits, since: SINCE } }, timesIn(zone)).replaceAll('\u00a0', ' ');

it.each([
  ['open', 'firstFix', 'no fix yet, since 12 May 25'],
  ['advised', 'stamp', 'waits for a stamp, since 12 May 25'],
  ['advised', 'secondStamp', 'waits for a second stamp, since 12 May 25'],
  ['endorsed', 'builder', 'to be carried out, since 12 May 25'],
  ['referred', 'kitMaker', 'waits for the kit maker, since 12 May 25'],
  ['underReview', 'review', 'to be looked at again, since 12 May 25'],
  ['carriedOut', 'nothing', 'done 12 May 25'],
  ['withdrawn', 'nothing', 'withdrawn 12 May 25'],
] as const)('says of one that is %s and waits for %s: %s', (state, waits, words) =>
  expect(said(state, waits)).toBe(words),
);

it('breaks no line within a day', () => {
  const waits = { for: 'stamp', since: SINCE } as const;
  expect(waitWords({ state: 'advised', waits }, timesIn('UTC')).split(' ').at(-1)).toBe(
    'since\u00a012\u00a0May\u00a025',
  );
});

it('gives the day where the reader is', () => {
  expect(said('open', 'firstFix', 'Europe/London')).toBe('no fix yet, since 13 May 25');
});
