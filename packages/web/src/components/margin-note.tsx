import type { ReactNode } from 'react';
import classes from './margin-note.module.css';

interface MarginNoteProps {
  readonly name: string;
  /** What stands beside the name: the date, and in what capacity. */
  readonly when: ReactNode;
  readonly children: ReactNode;
  readonly waiting?: boolean;
}

export function initialsOf(name: string): string {
  const words = name.split(/\s+/).filter(Boolean);
  return [words[0], words.length > 1 ? words.at(-1) : undefined]
    .map((word) => word?.[0] ?? '')
    .join('')
    .toUpperCase();
}

/** A dated note in the margin, signed with initials as one signs a drawing. */
export function MarginNote({ name, when, children, waiting = false }: MarginNoteProps): ReactNode {
  return (
    <div className={classes['note']} data-waiting={waiting || undefined}>
      <span className={classes['initials']} aria-hidden="true">
        {initialsOf(name)}
      </span>
      <div className={classes['body']}>
        <p className={classes['who']}>
          <b>{name}</b> {when}
        </p>
        <div className={classes['text']}>{children}</div>
      </div>
    </div>
  );
}
