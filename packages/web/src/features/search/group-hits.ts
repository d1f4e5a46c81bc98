import type { SearchHit, SearchKind } from '@rivetside/shared';

export const KIND_WORDS: Readonly<Record<SearchKind, string>> = {
  question: 'Questions',
  section: 'Sections',
  step: 'Steps',
  part: 'Parts',
  holeLine: 'Hole lines',
  notice: 'Notices',
};

export interface HitGroup {
  readonly kind: SearchKind;
  readonly hits: readonly SearchHit[];
}

/** One group a kind; the group with the best hit comes first, and within it the order of the answer stands. */
export function groupHits(hits: readonly SearchHit[]): HitGroup[] {
  const groups = new Map<SearchKind, SearchHit[]>();
  for (const hit of hits) groups.set(hit.kind, [...(groups.get(hit.kind) ?? []), hit]);
  return [...groups].map(([kind, those]) => ({ kind, hits: those }));
}

/** Where a hit leads; a notice has no page of its own. */
export function addressOfHit({ kind, id, sectionId }: SearchHit): string | null {
  if (kind === 'question') return `/questions/${id}`;
  return sectionId === null ? null : `/sections/${sectionId}`;
}
