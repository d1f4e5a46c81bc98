import type { ReactNode } from 'react';
import classes from './accounts.module.css';

export function Refusal({ children }: { readonly children: string | null }): ReactNode {
  return children === null ? null : (
    <p role="alert" className={classes['refusal']}>
      {children}
    </p>
  );
}

interface SendButtonProps {
  readonly isSending: boolean;
  readonly children: string;
}

export function SendButton({ isSending, children }: SendButtonProps): ReactNode {
  return (
    <button type="submit" className="btn" aria-disabled={isSending || undefined}>
      {children}
    </button>
  );
}

interface DoorProps {
  readonly title: string;
  readonly children: ReactNode;
}

/** The card in the middle of a page that has nothing else on it. */
export function Door({ title, children }: DoorProps): ReactNode {
  return (
    <section className={classes['door']}>
      <h1>{title}</h1>
      {children}
    </section>
  );
}

export function OtherDoors({ children }: { readonly children: ReactNode }): ReactNode {
  return <nav className={classes['others']}>{children}</nav>;
}

export function AccountCards({ children }: { readonly children: ReactNode }): ReactNode {
  return (
    <>
      <h1 className="unseen">Your account</h1>
      <div className={classes['sheets']}>{children}</div>
    </>
  );
}

export function AccountCard({ title, children }: DoorProps): ReactNode {
  return (
    <section className={classes['card']} aria-label={title}>
      <h2>{title}</h2>
      {children}
    </section>
  );
}
