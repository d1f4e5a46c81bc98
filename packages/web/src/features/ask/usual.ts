import { USUAL_DISCIPLINE, type Build, type Kit, type Membership, type Section } from '@rivetside/shared';
import { NOWHERE, onHoleLine, type AskDraft, type AskedPlace } from './ask-draft';

/** What the asker belongs to. Undefined while it is not loaded. */
export interface Belongings {
  readonly kits: readonly Kit[] | undefined;
  readonly builds: readonly Build[] | undefined;
  /** Chapters in which the asker is a builder. */
  readonly chapters: readonly Membership[];
  /** The chosen section, once it is loaded. */
  readonly section: Section | undefined;
}

/** Where the address leads to, as a step or a hole line of the kit does; null where it leads nowhere in particular. */
export function placeOfAddress(query: URLSearchParams): AskedPlace | null {
  const sectionId = query.get('sectionId');
  if (!sectionId) return null;
  const repeat = Number(query.get('repeat'));
  return {
    ...NOWHERE,
    sectionId,
    stepId: query.get('stepId'),
    partId: query.get('partId'),
    holeLineId: query.get('holeLineId'),
    holes: query.get('hole') ?? '',
    repeat: Number.isInteger(repeat) && repeat > 0 ? repeat : 1,
  };
}

export function isSamePlace(one: AskedPlace, other: AskedPlace): boolean {
  return (['sectionId', 'partId', 'holeLineId', 'holes', 'repeat'] as const).every(
    (key) => one[key] === other[key],
  );
}

/** A hole line that came by its address alone brings its step along. */
function settledPlace(place: AskedPlace, section: Section | undefined, kitId: string | null): AskedPlace {
  const settled = place.kitId === kitId ? place : { ...place, kitId };
  const line = section?.holeLines.find(({ id }) => id === place.holeLineId);
  if (!line || place.stepId !== null) return settled;
  return onHoleLine({ ...settled, stepId: null }, line);
}

function kitOf({ place, buildId }: AskDraft, { kits, builds = [], section }: Belongings): string | null {
  const build = builds.find(({ id, mine }) => (buildId ? id === buildId : mine));
  return place.kitId ?? section?.kitId ?? build?.kitId ?? kits?.[0]?.id ?? null;
}

/** The build that was chosen, none of them, or the asker's own of that kit. */
function buildOf({ buildId }: AskDraft, kitId: string | null, builds: readonly Build[]): string | null {
  if (buildId !== undefined) return buildId;
  return builds.find((build) => build.kitId === kitId && build.mine)?.id ?? null;
}

/** The chapter of the build where the asker is a builder there, else the first in which they are one. */
function chapterOf({ chapters, builds = [] }: Belongings, buildId: string | null): string | null {
  const home = builds.find(({ id }) => id === buildId)?.chapterId;
  const usual = chapters.find(({ chapterId }) => chapterId === home) ?? chapters[0];
  return usual?.chapterId ?? null;
}

/**
 * The draft with what is usual where nothing was chosen: the asker's own build of that kit, its chapter, the discipline
 * of the mishap. Filled in on reading alone, so that a draft that was kept does not freeze what has changed since.
 */
export function withUsual<D extends AskDraft>(draft: D, belongings: Belongings): D {
  const kitId = kitOf(draft, belongings);
  const buildId = buildOf(draft, kitId, belongings.builds ?? []);
  return {
    ...draft,
    place: settledPlace(draft.place, belongings.section, kitId),
    buildId,
    chapterId: draft.chapterId ?? chapterOf(belongings, buildId),
    discipline: draft.discipline ?? (draft.mishap && USUAL_DISCIPLINE[draft.mishap]),
  };
}
