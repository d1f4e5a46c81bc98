import type { QuestionRow, Wait } from '@rivetside/shared';
import type { Times } from '../../lib/times';

const WAIT_WORDS: Readonly<Record<Exclude<Wait, 'nothing'>, string>> = {
  firstFix: 'no fix yet',
  stamp: 'waits for a stamp',
  secondStamp: 'waits for a second stamp',
  builder: 'to be carried out',
  kitMaker: 'waits for the kit maker',
  review: 'to be looked at again',
};

/** No line is broken within a day: "since 5" alone says nothing. */
const unbroken = (text: string) => text.replaceAll(' ', '\u00a0');

/** What a question waits for and since when; one that waits for nothing says when it ended. */
export function waitWords({ waits, state }: Pick<QuestionRow, 'waits' | 'state'>, { date }: Times): string {
  const day = unbroken(date(waits.since));
  if (waits.for !== 'nothing') return `${WAIT_WORDS[waits.for]}, ${unbroken(`since ${day}`)}`;
  return state === 'withdrawn' ? `withdrawn ${day}` : `done ${day}`;
}
