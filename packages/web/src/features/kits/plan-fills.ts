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
    const fill = shows === 'questions' && section.id === chosenId ? 'chosen' : drawn;
    const count = section.questions.waiting + section.questions.underReview;
    for (const region of section.regions) regions[region] = { label: section.name, fill, count };
  }
  return regions;
}

/** "8 steps · 3 open questions · critical" */
export function sectionLine({ stepCount, questions, critical }: SectionSummary): string {
  const open = questions.waiting + questions.underReview;
  const asked = open === 0 ? 'none open' : `${open} open ${open === 1 ? 'question' : 'questions'}`;
  return [`${stepCount} steps`, asked, critical && 'critical'].filter(Boolean).join(' · ');
}

/** "3 of 8 steps driven, 2 begun", for a reader who does not see the line. */
export function progressWords(progress: SectionSummary['progress']): string {
  const count = (state: 'pinned' | 'driven') => progress.filter((one) => one === state).length;
  const begun = count('pinned');
  return `${count('driven')} of ${progress.length} steps driven${begun > 0 ? `, ${begun} begun` : ''}`;
}
