import type { SectionSummary } from '@rivetside/shared';
import type { PlanRegion, RegionFill } from '../../components/drawn-kit';

export type Shows = 'questions' | 'progress';

function progressFill({ progress }: SectionSummary): RegionFill {
  if (progress.length === 0 || progress.every((state) => state === 'todo')) return 'todo';
  return progress.every((state) => state === 'driven') ? 'driven' : 'pinned';
}

function questionsFill({ questions }: SectionSummary): RegionFill {
  if (questions.underReview > 0) return 'held';
  return questions.waiting > 0 ? 'waits' : 'none';
}

/** How each region of the plan is filled: by what waits there, or by how far the reader's own build has come. */
export function planFills(
  sections: readonly SectionSummary[],
  shows: Shows,
  chosenId: string | null,
): Record<string, PlanRegion> {
  const regions: Record<string, PlanRegion> = {};
  for (const section of sections) {
    const drawn = shows === 'progress' ? progressFill(section) : questionsFill(section);
    const isChosen = section.id === chosenId;
    const fill = shows === 'questions' && isChosen ? 'chosen' : drawn;
    const count = section.questions.waiting + section.questions.underReview;
    for (const region of section.regions) {
      // Where two sections share a region the chosen one shows, else the first in order.
      if (regions[region] && !isChosen) continue;
      regions[region] = { label: section.name, fill, count, isChosen };
    }
  }
  return regions;
}

/** The section that a tap means. Where two share a region, a second tap means the next. */
export function sectionAt(
  sections: readonly SectionSummary[],
  region: string,
  chosenId: string | null,
): SectionSummary | undefined {
  const there = sections.filter(({ regions }) => regions.includes(region));
  const at = there.findIndex(({ id }) => id === chosenId);
  return there[(at + 1) % there.length];
}

/** "8 steps · 3 open questions · critical" */
export function sectionLine({ stepCount, questions, critical }: SectionSummary): string {
  const open = questions.waiting + questions.underReview;
  const asked = open === 0 ? 'none open' : `${open} open ${open === 1 ? 'question' : 'questions'}`;
  return [stepCount === 1 ? '1 step' : `${stepCount} steps`, asked, critical && 'critical']
    .filter(Boolean)
    .join(' · ');
}

/** "3 of 8 steps driven, 2 pinned", for a reader who does not see the line. */
export function progressWords(progress: SectionSummary['progress']): string {
  const count = (state: 'pinned' | 'driven') => progress.filter((one) => one === state).length;
  const pinned = count('pinned');
  return `${count('driven')} of ${progress.length} steps driven${pinned > 0 ? `, ${pinned} pinned` : ''}`;
}
