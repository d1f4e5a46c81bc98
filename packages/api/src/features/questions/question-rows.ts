import type {
  Audience,
  Discipline,
  Headline,
  Mishap,
  QuestionRow,
  QuestionState,
  SheetEvent,
  SheetEventType,
  Wait,
} from '@rivetside/shared';

export interface ListRow {
  id: string;
  number: string;
  title: string;
  state: QuestionState;
  mishap: Mishap;
  discipline: Discipline;
  audience: Audience;
  headline: string | null;
  waitsFor: Wait;
  waitsSince: string;
  kitId: string;
  sectionId: string | null;
  sectionCode: string;
  sectionName: string;
  critical: number;
  regions: string;
  partNumber: string | null;
  holeLineCode: string | null;
  serial: number | null;
  chapterId: string;
  chapterName: string;
  askedById: string;
  askedByName: string;
  askedAt: string;
  lastActivityAt: string;
  lastSeq: number;
  seenSeq: number;
}

export interface EventRow {
  questionId: string;
  seq: number;
  type: SheetEventType;
  at: string;
  byId: string;
  byName: string;
  data: string;
}

/** Sections are few and change seldom: their regions are read from text once. */
const regionsRead = new Map<string, string[]>();
function regionsOf(text: string): string[] {
  let regions = regionsRead.get(text);
  if (!regions) {
    regions = JSON.parse(text) as string[];
    regionsRead.set(text, regions);
  }
  return regions;
}

export function presentRow(row: ListRow): QuestionRow {
  const { sectionId } = row;
  return {
    id: row.id,
    number: row.number,
    title: row.title,
    state: row.state,
    mishap: row.mishap,
    discipline: row.discipline,
    audience: row.audience,
    headline: row.headline === null ? null : (JSON.parse(row.headline) as Headline),
    waits: { for: row.waitsFor, since: row.waitsSince },
    kitId: row.kitId,
    section:
      sectionId === null
        ? null
        : {
            id: sectionId,
            code: row.sectionCode,
            name: row.sectionName,
            critical: row.critical === 1,
            regions: regionsOf(row.regions),
          },
    partNumber: row.partNumber,
    holeLineCode: row.holeLineCode,
    serial: row.serial,
    chapterId: row.chapterId,
    chapterName: row.chapterName,
    askedBy: { id: row.askedById, name: row.askedByName },
    askedAt: row.askedAt,
    lastActivityAt: row.lastActivityAt,
    unread: row.lastSeq > row.seenSeq,
  };
}

export function presentEvent(row: EventRow): SheetEvent {
  const { questionId, seq, type, at, byId, byName, data } = row;
  return {
    questionId,
    seq,
    type,
    at,
    by: { id: byId, name: byName },
    data: JSON.parse(data) as Record<string, unknown>,
  };
}
