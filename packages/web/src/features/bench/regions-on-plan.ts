import type { SectionSummary } from '@rivetside/shared';

/** As the plan takes them. */
export interface RegionOnPlan {
  readonly label: string;
  readonly fill: 'none' | 'chosen' | 'waits' | 'held';
  readonly count?: number;
}

function fillOf({ questions }: SectionSummary): RegionOnPlan['fill'] {
  if (questions.underReview > 0) return 'held';
  return questions.waiting > 0 ? 'waits' : 'none';
}

/** The section in hand filled, the others by what waits there; where two share a region the first in order has it. */
export function regionsOnPlan(
  sections: readonly SectionSummary[],
  inHand: SectionSummary | null,
): Record<string, RegionOnPlan> {
  const regions: Record<string, RegionOnPlan> = {};
  const rest = sections.filter(({ id }) => id !== inHand?.id);
  for (const section of inHand ? [inHand, ...rest] : rest)
    for (const region of section.regions)
      regions[region] ??= {
        label: section.name,
        fill: section.id === inHand?.id ? 'chosen' : fillOf(section),
        count: section.questions.waiting + section.questions.underReview,
      };
  return regions;
}

/** Whose region it is. */
export function sectionAt(
  sections: readonly SectionSummary[],
  inHand: SectionSummary | null,
  region: string,
): SectionSummary | undefined {
  if (inHand?.regions.includes(region)) return inHand;
  return sections.find(({ regions }) => regions.includes(region));
}
