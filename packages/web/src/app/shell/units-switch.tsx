import type { ReactNode } from 'react';
import { useSetUnits, useUnits } from '../../lib/units';
import classes from './top-bar.module.css';

export function UnitsSwitch(): ReactNode {
  const units = useUnits();
  const setUnits = useSetUnits();
  return (
    <div role="group" aria-label="Lengths in" className={classes['units']}>
      {(['inch', 'mm'] as const).map((one) => (
        <button key={one} type="button" aria-pressed={units === one} onClick={() => setUnits(one)}>
          {one}
        </button>
      ))}
    </div>
  );
}
