import {
  type Basis,
  BASIS_WORDS,
  type Discipline,
  DISCIPLINE_WORDS,
  type StampState,
} from '@rivetside/shared';
import type { ReactNode } from 'react';
import classes from './stamp.module.css';

export interface StampProps {
  readonly stamp: {
    readonly stampNumber: string;
    readonly discipline: Discipline;
    readonly basis: Basis;
    readonly state: StampState;
  };
  /** The day as it is punched, such as "14 May 25". */
  readonly day: string;
  /** Whose it is; the caption. */
  readonly who: string;
  /** Not given yet: how it would look. */
  readonly preview?: boolean;
}

const HEXAGON = 'M22 3H66L86 38L66 73H22L2 38Z';
const INNER = 'M24.5 7.5H63.5L81 38L63.5 68.5H24.5L7 38Z';
const STATE_WORDS: Readonly<Record<StampState, string>> = {
  live: '',
  held: 'HELD',
  expired: 'RAN OUT',
  withdrawn: 'WITHDRAWN',
};

/** A mentor's inspection stamp. Its border tells what it rests on; one that no longer counts is struck through. */
export function Stamp({ stamp, day, who, preview = false }: StampProps): ReactNode {
  const { stampNumber, discipline, basis, state } = stamp;
  // There is room for one thing: "engine", of "engine and firewall forward".
  const mark = DISCIPLINE_WORDS[discipline].split(' and ')[0]!.toUpperCase();
  const struck = STATE_WORDS[state];
  const words = [
    `Stamp ${stampNumber}`,
    who,
    DISCIPLINE_WORDS[discipline],
    BASIS_WORDS[basis],
    day,
    struck.toLowerCase(),
  ];
  return (
    <figure className={classes['stamp']} data-state={state} data-preview={preview || undefined}>
      <svg viewBox="0 0 88 76" role="img" aria-label={words.filter(Boolean).join(', ')}>
        <path d={HEXAGON} className={classes['border']} data-basis={basis} />
        {basis === 'kitMakerReply' && <path d={INNER} className={classes['inner']} />}
        <text x="44" y="23" className={classes['mark']} fontSize={mark.length > 8 ? 7.6 : 9.5}>
          {mark}
        </text>
        <text x="44" y="47" className={classes['number']} fontSize={stampNumber.length > 5 ? 16 : 22}>
          {stampNumber}
        </text>
        <text x="44" y="63" className={classes['day']}>
          {day}
        </text>
        {struck && <path d="M6 66L82 10" className={classes['strike']} />}
      </svg>
      {/* Beside the stamp: across it the word would hide the number that it is about. */}
      {struck && (
        <b className={classes['struck']} aria-hidden="true">
          {struck}
        </b>
      )}
      <figcaption>{who}</figcaption>
    </figure>
  );
}
