import { type ReactNode, useId } from 'react';
import classes from './plan.module.css';

type Shown = 'waits' | 'held' | 'chosen' | 'driven' | 'pinned' | 'todo';
const WORDS: Readonly<Record<Shown, string>> = {
  waits: 'a question waits',
  held: 'held or under review',
  chosen: 'chosen',
  driven: 'driven',
  pinned: 'pinned',
  todo: 'to do',
};

/** What the fills of the plan mean. */
export function PlanKey({ shows }: { readonly shows: readonly Shown[] }): ReactNode {
  const id = useId();
  return (
    <div className={classes['key']}>
      {shows.map((fill) => (
        <span key={fill}>
          <svg width="26" height="18" viewBox="0 0 26 18" aria-hidden="true">
            <pattern
              id={`${id}${fill}`}
              width="7"
              height="7"
              patternUnits="userSpaceOnUse"
              patternTransform="rotate(45)"
            >
              <rect width="7" height="7" className={classes['ground']} />
              <path d={fill === 'held' ? 'M0 0V7M0 0H7' : 'M0 0V7'} className={classes[fill]} />
            </pattern>
            <rect
              x="1"
              y="1"
              width="24"
              height="16"
              className={classes['region']}
              data-fill={fill}
              style={fill === 'waits' || fill === 'held' ? { fill: `url(#${id}${fill})` } : undefined}
            />
          </svg>
          {WORDS[fill]}
        </span>
      ))}
    </div>
  );
}
