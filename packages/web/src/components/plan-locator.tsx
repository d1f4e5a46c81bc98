import type { ReactNode } from 'react';
import { PLAN_BOX, PLAN_SHAPES } from './plan-shapes';
import { PlanDetails } from './plan-view';
import classes from './plan.module.css';

/** Where on the kit, at the size of a thumbnail. What it shows stands beside it in words. */
export function PlanLocator({
  regions,
  size = 72,
}: {
  readonly regions: readonly string[];
  readonly size?: number;
}): ReactNode {
  return (
    <svg
      className={classes['locator']}
      viewBox={PLAN_BOX}
      width={size}
      height={(size * 444) / 600}
      aria-hidden="true"
    >
      {Object.entries(PLAN_SHAPES).map(([region, shape]) => (
        <path
          key={region}
          d={shape}
          className={classes['region']}
          data-fill={regions.includes(region) ? 'chosen' : 'none'}
        />
      ))}
      <PlanDetails />
    </svg>
  );
}
