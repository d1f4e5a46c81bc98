import type { ReactNode } from 'react';
import classes from './skeletons.module.css';

/** Lines of what is on its way. */
export function LinesSkeleton({ lines = 4 }: { readonly lines?: number }): ReactNode {
  return (
    <div className={classes['lines']} role="status">
      <span className="unseen">Loading…</span>
      {Array.from({ length: lines }, (_, at) => (
        <span key={at} className={classes['line']} style={{ width: `${92 - ((at * 17) % 40)}%` }} />
      ))}
    </div>
  );
}

/** A card of what is on its way. */
export function CardSkeleton({ lines = 5 }: { readonly lines?: number }): ReactNode {
  return (
    <div className={classes['card']}>
      <LinesSkeleton lines={lines} />
    </div>
  );
}
