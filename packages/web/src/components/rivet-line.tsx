import type { ReactNode } from 'react';
import classes from './rivet-line.module.css';

export type RivetState = 'todo' | 'pinned' | 'driven';
interface RivetLineProps {
  readonly states: readonly RivetState[];
  /** What the line stands for, in words. */
  readonly label: string;
}

const GAP = 19;
const R = 6;

/** How far something has come, as a row of holes: a ring is to do, half filled is pinned, filled is driven. */
export function RivetLine({ states, label }: RivetLineProps): ReactNode {
  const width = states.length * GAP + 2;
  return (
    <svg
      className={classes['line']}
      width={width}
      height="20"
      viewBox={`0 0 ${width} 20`}
      role="img"
      aria-label={label}
    >
      <path d={`M2 10H${width - 2}`} className={classes['row']} />
      {states.map((state, at) => (
        <Rivet key={at} x={10 + at * GAP} state={state} />
      ))}
    </svg>
  );
}

function Rivet({ x, state }: { readonly x: number; readonly state: RivetState }): ReactNode {
  if (state === 'todo') return <circle cx={x} cy="10" r={R - 0.5} className={classes['todo']} />;
  if (state === 'pinned')
    return (
      <>
        <circle cx={x} cy="10" r={R} className={classes['pinned']} />
        <path d={`M${x - R} 10A${R} ${R} 0 0 0 ${x + R} 10Z`} className={classes['driven']} />
      </>
    );
  return (
    <>
      <circle cx={x} cy="10" r={R} className={classes['driven']} />
      <circle cx={x - 1.6} cy="8.2" r="1.6" className={classes['shine']} />
    </>
  );
}
