import type { ReactNode } from 'react';
import classes from './call-out.module.css';

/** A part number, hole line or rivet as the drawing writes it. */
export function CallOut({ children }: { readonly children: ReactNode }): ReactNode {
  return <span className={classes['call']}>{children}</span>;
}
