import { useEffect, useRef, type ReactNode } from 'react';
import { focusField } from './field';
import classes from './fault-summary.module.css';

export interface Fault {
  /** Name of the field; empty where it belongs to none. */
  readonly field: string;
  readonly message: string;
}

interface FaultSummaryProps {
  readonly title: string;
  readonly faults: readonly Fault[];
  /** Grows with every try, so that a second refusal takes the focus again. */
  readonly tries: number;
}

/** Everything that keeps a form from being sent, at its top, with the focus; each line leads to its field. */
export function FaultSummary({ title, faults, tries }: FaultSummaryProps): ReactNode {
  const box = useRef<HTMLDivElement>(null);
  const isShown = faults.length > 0;
  useEffect(() => {
    if (!isShown || tries === 0) return;
    box.current?.focus();
    box.current?.scrollIntoView({ block: 'nearest' });
  }, [isShown, tries]);
  if (!isShown) return null;
  return (
    <div ref={box} tabIndex={-1} role="alert" className={classes['summary']}>
      <b>{title}</b>
      <ul>
        {faults.map(({ field, message }) => (
          <li key={`${field} ${message}`}>
            {field ? (
              <button type="button" onClick={() => focusField(field)}>
                {message}
              </button>
            ) : (
              message
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
