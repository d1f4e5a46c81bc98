import type { ReactNode } from 'react';
import { useOnline } from '../../lib/online';
import classes from './shell.module.css';

/** The place it is told in is always there: else a screen reader would not notice that something came. */
export function OfflineBanner(): ReactNode {
  const isOnline = useOnline();
  return (
    <div aria-live="polite">
      {!isOnline && (
        <div className={classes['banner']}>
          <span>
            <b>No network.</b> What you type is kept on this device and sent when the network is back.
          </span>
        </div>
      )}
    </div>
  );
}
