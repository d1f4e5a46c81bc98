import type { PhotoMark } from '@rivetside/shared';
import type { ReactNode } from 'react';
import classes from './photo-strip.module.css';

/** What somebody pointed at in the picture, at its place. */
export function PhotoMarks({
  marks,
  withLabels,
}: {
  marks: readonly PhotoMark[];
  withLabels: boolean;
}): ReactNode {
  return marks.map(({ x, y, label }, index) => (
    <span
      key={index}
      className={classes['mark']}
      style={{ left: `${x * 100}%`, top: `${y * 100}%` }}
      data-side={x > 0.6 ? 'left' : 'right'}
    >
      <span className={classes['markRing']} aria-hidden="true" />
      {withLabels && label && <span className={classes['markLabel']}>{label}</span>}
    </span>
  ));
}
