import type { ReactNode } from 'react';
import classes from './route-error.module.css';

/** Before the first page: the shell stands already, so this is only words. */
export function PageLoading(): ReactNode {
  return (
    <p role="status" className={classes['loading']}>
      Opening the page…
    </p>
  );
}
