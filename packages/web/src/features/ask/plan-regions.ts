import type { SectionSummary } from '@rivetside/shared';

export interface PlanRegion {
  readonly label: string;
  readonly fill: 'none' | 'chosen';
}

/** Every region that a section covers, under the section's name; those of the chosen one are filled. */
export function planRegions(
  sections: readonly SectionSummary[],
  chosen: string | null,
): Record<string, PlanRegion> {
  const inOrder = [...sections].sort((one, other) => Number(one.id === chosen) - Number(other.id === chosen));
  return Object.fromEntries(
    inOrder.flatMap(({ id, name, regions }) =>
      regions.map((region) => [region, { label: name, fill: id === chosen ? 'chosen' : 'none' }] as const),
    ),
  );
}

/** The section that a tap means. Where two share a region, a second tap means the next. */
export function sectionAt(
  sections: readonly SectionSummary[],
  region: string,
  chosen: string | null,
): string | null {
  const there = sections.filter(({ regions }) => regions.includes(region));
  const at = there.findIndex(({ id }) => id === chosen);
  return there[(at + 1) % there.length]?.id ?? null;
}
