import type { ReactNode } from 'react';
import classes from './search.module.css';

export function SearchPage({ children }: { readonly children: ReactNode }): ReactNode {
  return (
    <div className={classes['page']}>
      <h1 className="unseen">Find</h1>
      {children}
    </div>
  );
}
