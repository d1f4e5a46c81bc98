import { useState, type ReactNode } from 'react';
import classes from './hole-card.module.css';

interface PutAwayProps {
  readonly title: string;
  /** Something in it was filled in, or is wrong: it cannot be out of sight. */
  readonly isNeeded: boolean;
  readonly children: ReactNode;
}

/** What is seldom asked for, out of the way until it is. */
export function PutAway({ title, isNeeded, children }: PutAwayProps): ReactNode {
  const [isOpen, setOpen] = useState(isNeeded);
  return (
    <details
      className={classes['more']}
      open={isOpen || isNeeded}
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary>{title}</summary>
      {(isOpen || isNeeded) && <div className={classes['moreFields']}>{children}</div>}
    </details>
  );
}
