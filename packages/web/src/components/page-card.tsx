import { type ReactNode, useId } from 'react';
import classes from './page-card.module.css';

interface PageCardProps {
  readonly title: ReactNode;
  /** A short remark at the right of the title. */
  readonly aside?: ReactNode;
  readonly id?: string;
  readonly children: ReactNode;
}

/** One thing on a page, with its name. */
export function PageCard({ title, aside, id, children }: PageCardProps): ReactNode {
  const heading = useId();
  return (
    <section className={classes['card']} id={id} aria-labelledby={heading}>
      <header className={classes['head']}>
        <h2 id={heading}>{title}</h2>
        {aside ? <small>{aside}</small> : null}
      </header>
      {children}
    </section>
  );
}
