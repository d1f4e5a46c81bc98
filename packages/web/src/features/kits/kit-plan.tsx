import type { SectionSummary } from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { PageCard } from '../../components/page-card';
import { PlanKey } from '../../components/plan-key';
import { PlanView } from '../../components/plan-view';
import { SideView } from '../../components/side-view';
import { planFills, sectionAt, type Shows } from './plan-fills';
import classes from './kits.module.css';

interface KitPlanProps {
  readonly sections: readonly SectionSummary[];
  readonly chosenId: string | null;
  readonly onChoose: (sectionId: string) => void;
}

/** The kit from above and from the side; a region leads to its section. */
export function KitPlan({ sections, chosenId, onChoose }: KitPlanProps): ReactNode {
  const [shows, setShows] = useState<Shows>('questions');
  const hasBuild = sections.some(({ progress }) => progress.length > 0);
  const regions = planFills(sections, shows, chosenId);
  const chooseRegion = (region: string) => {
    const section = sectionAt(sections, region, chosenId);
    if (section) onChoose(section.id);
  };
  return (
    <PageCard title="Plan and side view" aside="tap a region">
      <div className={classes['drawn']}>
        <PlanView name="Plan view of the kit" regions={regions} onChoose={chooseRegion} />
        <SideView name="Side view of the kit" regions={regions} onChoose={chooseRegion} />
      </div>
      <div className={classes['foot']}>
        <PlanKey shows={shows === 'questions' ? ['waits', 'held', 'chosen'] : ['driven', 'pinned', 'todo']} />
        {hasBuild && (
          <button
            type="button"
            className="btn plain"
            onClick={() => setShows(shows === 'questions' ? 'progress' : 'questions')}
          >
            {shows === 'questions' ? 'Show my progress' : 'Show open questions'}
          </button>
        )}
      </div>
    </PageCard>
  );
}
