import type { ReactNode } from 'react';
import { DrawnKit, type DrawnKitProps } from './drawn-kit';
import { PLAN_BOX, PLAN_DETAILS, PLAN_SHAPES } from './plan-shapes';
import classes from './plan.module.css';

/** The kit from above, by its regions. */
export function PlanView(props: DrawnKitProps): ReactNode {
  return (
    <DrawnKit {...props} shapes={PLAN_SHAPES} box={PLAN_BOX}>
      <PlanDetails />
    </DrawnKit>
  );
}

export function PlanDetails(): ReactNode {
  return (
    <g aria-hidden="true">
      <path d={PLAN_DETAILS.propeller} className={classes['hair']} />
      <path d={PLAN_DETAILS.canopy} className={classes['glass']} />
      <path d="M259 208V252" className={classes['hair']} />
      <path d="M40 230H628" className={classes['centre']} />
    </g>
  );
}
