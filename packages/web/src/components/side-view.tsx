import type { ReactNode } from 'react';
import { DrawnKit, type DrawnKitProps } from './drawn-kit';
import { SIDE_BOX, SIDE_DETAILS, SIDE_SHAPES } from './plan-shapes';
import classes from './plan.module.css';

/** The kit from the left side, by its regions; of the wing its root is seen. */
export function SideView(props: DrawnKitProps): ReactNode {
  return (
    <DrawnKit {...props} shapes={SIDE_SHAPES} box={SIDE_BOX}>
      <g aria-hidden="true">
        <path d={SIDE_DETAILS.canopy} className={classes['glazed']} />
        <path d="M246 51V86" className={classes['hair']} />
        <path d="M57 76V158" className={classes['hair']} />
      </g>
    </DrawnKit>
  );
}
