import type { ReactNode } from 'react';
import classes from './dialog.module.css';

interface FormFootProps {
  readonly send: string;
  readonly isPending: boolean;
  readonly onLater: () => void;
  /** When what was typed was kept on this device. */
  readonly keptAt?: string | null;
}

/** Sends, or closes for later. A press while it is under way does nothing. */
export function FormFoot({ send, isPending, onLater, keptAt }: FormFootProps): ReactNode {
  return (
    <div className={classes['buttons']}>
      <button type="submit" className="btn" aria-disabled={isPending || undefined}>
        {isPending ? 'Sending…' : send}
      </button>
      <button type="button" className="btn plain" onClick={onLater}>
        Not yet
      </button>
      {keptAt && <span className={classes['kept']}>kept on this device, {keptAt}</span>}
    </div>
  );
}
