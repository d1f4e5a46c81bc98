import type { ReactNode } from 'react';
import classes from './ask-layout.module.css';
import type { Standing } from './use-hand-over';

interface SendBarProps {
  readonly standing: Standing;
  readonly onTakeBack: () => void;
}

/** The one thing to press, and after it how the question stands until its sheet opens. */
export function SendBar({ standing, onTakeBack }: SendBarProps): ReactNode {
  return (
    <div className={classes['send']}>
      <button type="submit" className="btn" aria-disabled={standing !== 'writing'}>
        Put it to the mentors
      </button>
      <div role="status">
        {standing === 'sending' && <p>On its way. Its sheet opens as soon as it is there.</p>}
        {standing === 'waiting' && (
          <p>
            <b>No network.</b> The question is kept on this device and is sent once when the network is back;
            its sheet then opens.
          </p>
        )}
      </div>
      {standing === 'waiting' && (
        <button type="button" className="btn plain" onClick={onTakeBack}>
          Take it back and change it
        </button>
      )}
    </div>
  );
}
