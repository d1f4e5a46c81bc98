import {
  USUAL_DISCIPLINE,
  type AskQuestion,
  type Audience,
  type Discipline,
  type HoleLine,
  type Mishap,
  type Part,
  type Section,
  type Step,
} from '@rivetside/shared';

/** Where on the kit, by what was chosen; everything but the kit may stay open. */
export interface AskedPlace {
  readonly kitId: string | null;
  /** The question is about the whole build and no section of it. */
  readonly wholeBuild: boolean;
  readonly sectionId: string | null;
  readonly stepId: string | null;
  readonly partId: string | null;
  readonly holeLineId: string | null;
  /** Which of the line's repeats: which rib, which side. */
  readonly repeat: number;
  /** Hole numbers as typed. */
  readonly holes: string;
}

/** A question as it is being written. `C` is the hole card's form, `P` a photo of the draft: each its own feature's. */
export interface AskDraft<C = unknown, P = unknown> {
  readonly place: AskedPlace;
  /** Undefined until it is chosen: then the asker's own build counts; null is none of them. */
  readonly buildId: string | null | undefined;
  readonly chapterId: string | null;
  readonly audience: Audience;
  readonly mishap: Mishap | null;
  readonly discipline: Discipline | null;
  /** The asker chose the discipline; another mishap does not change it any more. */
  readonly isDisciplineChosen: boolean;
  readonly title: string;
  readonly body: string;
  readonly holeCard: C | null;
  readonly photos: readonly P[];
  /**
   * Put to the mentors and not answered yet: the question as it was then, all but the photos, whose names come with
   * their sending. What is sent again after a lost answer has to be the same to the letter.
   */
  readonly handedOver: HandedOver | null;
}

export type HandedOver = Omit<AskQuestion, 'photoIds'>;

export const NOWHERE: AskedPlace = {
  kitId: null,
  wholeBuild: false,
  sectionId: null,
  stepId: null,
  partId: null,
  holeLineId: null,
  repeat: 1,
  holes: '',
};

export function blankDraft<C, P>(): AskDraft<C, P> {
  return {
    place: NOWHERE,
    buildId: undefined,
    chapterId: null,
    audience: 'chapter',
    mishap: null,
    discipline: null,
    isDisciplineChosen: false,
    title: '',
    body: '',
    holeCard: null,
    photos: [],
    handedOver: null,
  };
}

/** Nothing in it that would be missed. */
export function isEmptyDraft({ title, body, mishap, holeCard, photos }: AskDraft): boolean {
  return !title.trim() && !body.trim() && mishap === null && holeCard === null && photos.length === 0;
}

/** The mishap brings its usual discipline along, until the asker chooses one. */
export function withMishap<D extends AskDraft>(draft: D, mishap: Mishap): D {
  const discipline = draft.isDisciplineChosen ? draft.discipline : USUAL_DISCIPLINE[mishap];
  return { ...draft, mishap, discipline };
}

/** Another kit: nothing of the old one lies in it. */
export function inKit(place: AskedPlace, kitId: string): AskedPlace {
  return place.kitId === kitId ? place : { ...NOWHERE, kitId };
}

/** Another section: what was chosen within the old one does not lie in it. */
export function inSection(place: AskedPlace, sectionId: string | null): AskedPlace {
  if (place.sectionId === sectionId && !place.wholeBuild) return place;
  return { ...NOWHERE, kitId: place.kitId, sectionId };
}

export function aboutWholeBuild(place: AskedPlace, wholeBuild: boolean): AskedPlace {
  return { ...NOWHERE, kitId: place.kitId, wholeBuild };
}

/** A hole line lies in one step, and goes through its own parts: what disagrees with it is let go. */
export function onHoleLine(place: AskedPlace, line: HoleLine | null): AskedPlace {
  if (!line) return { ...place, holeLineId: null, holes: '', repeat: 1 };
  const isThrough = line.stack.some(({ partId }) => partId === place.partId);
  return {
    ...inSection(place, line.sectionId),
    holeLineId: line.id,
    stepId: line.stepId ?? place.stepId,
    partId: isThrough ? place.partId : null,
    holes: place.holeLineId === line.id ? place.holes : '',
    repeat: place.holeLineId === line.id ? place.repeat : 1,
  };
}

export function atStep(place: AskedPlace, step: Step | null, section: Section | undefined): AskedPlace {
  if (!step) return { ...place, stepId: null };
  const line = section?.holeLines.find(({ id }) => id === place.holeLineId);
  const next = { ...inSection(place, step.sectionId), stepId: step.id };
  return line && line.stepId !== step.id ? onHoleLine(next, null) : next;
}

export function atPart(place: AskedPlace, part: Part | null, section: Section | undefined): AskedPlace {
  if (!part) return { ...place, partId: null };
  const line = section?.holeLines.find(({ id }) => id === place.holeLineId);
  const next = { ...inSection(place, part.sectionId), partId: part.id };
  const isThrough = !line || line.stack.some(({ partId }) => partId === part.id);
  return isThrough ? next : onHoleLine(next, null);
}

/** Hole lines that fit what is chosen so far: those of the step, those through the part. */
export function fittingLines(section: Section | undefined, { stepId, partId }: AskedPlace): HoleLine[] {
  return (section?.holeLines ?? []).filter(
    (line) =>
      (!stepId || line.stepId === null || line.stepId === stepId) &&
      (!partId || line.stack.some((part) => part.partId === partId)),
  );
}

/** What was changed in `next` of the draft as it was shown; what was filled in as usual and stands is not kept as chosen. */
export function changedFrom<D extends AskDraft>(shown: D, next: D): Partial<D> {
  const keys = Object.keys(next) as (keyof D)[];
  return Object.fromEntries(
    keys.filter((key) => next[key] !== shown[key]).map((key) => [key, next[key]]),
  ) as Partial<D>;
}
