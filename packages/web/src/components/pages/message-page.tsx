import { type ReactNode, useId } from 'react';
import classes from './message-page.module.css';

interface MessagePageProps {
  readonly title: string;
  readonly children?: ReactNode;
  readonly alert?: boolean;
}

/** What stands where there is nothing to show: what is so, and what to do. */
export function MessagePage({ title, children, alert = false }: MessagePageProps): ReactNode {
  const heading = useId();
  return (
    <section className={classes['message']} aria-labelledby={heading} role={alert ? 'alert' : undefined}>
      <svg viewBox="0 0 120 40" aria-hidden="true">
        <path d="M4 20H116" />
        <circle cx="24" cy="20" r="8" />
        <circle cx="60" cy="20" r="8" strokeDasharray="4 4" />
        <circle cx="96" cy="20" r="8" />
      </svg>
      <h2 id={heading}>{title}</h2>
      <div className={classes['text']}>{children}</div>
    </section>
  );
}
