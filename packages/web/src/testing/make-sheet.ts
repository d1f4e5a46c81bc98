import {
  type Endorsement,
  type Fix,
  fitCheck,
  type HoleCard,
  type Question,
  type SheetEvent,
} from '@rivetside/shared';
import { makeMe } from './make-me';
import { makeQuestionRow } from './make-question-row';

export const MENTOR = { id: '0190a0b0-0000-7000-8000-0000000000d1', name: 'Imke Vosterlund' };
export const SECOND = { id: '0190a0b0-0000-7000-8000-0000000000d2', name: 'Dezso Harrowmeck' };
export const SHEET_ID = '0190a0b0-0000-7000-8000-00000000bb01';

/** Somebody who mentors in the asker's chapter. */
export function makeMentor(person = MENTOR) {
  const [membership] = makeMe().memberships;
  return makeMe({
    ...person,
    memberships: [{ ...membership!, roles: ['mentor'], disciplines: ['sheetMetal', 'riveting'] }],
  });
}

/** Two sheets of 0.040 whose holes lie 0.0200 apart, well inside of every edge. */
export function makeHoleCard(): HoleCard {
  const layer = (name: string, y: number) => ({
    name,
    alloy: '2024-T3 clad' as const,
    thickness: 0.04,
    hole: { shape: 'round' as const, diameter: 0.1285 },
    offset: { x: 0, y },
    edges: [{ distance: 0.4, angle: 270 }],
    bends: [],
  });
  return {
    layers: [layer('spar', 0), layer('doubler', 0.02)],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [{ x: 0.75, y: 0, dash: 4 }],
    access: 'both',
  };
}

export function makeEvent(facts: Partial<SheetEvent> & { readonly seq: number }): SheetEvent {
  return {
    questionId: SHEET_ID,
    type: 'message',
    at: '2026-11-10T19:02:00.000Z',
    by: MENTOR,
    data: { id: `message ${facts.seq}`, body: `line ${facts.seq}`, photos: [] },
    ...facts,
  };
}

export function makeFix(facts: Partial<Fix> = {}): Fix {
  return {
    id: '0190a0b0-0000-7000-8000-00000000cc01',
    questionId: SHEET_ID,
    number: 1,
    kind: 'nextSize',
    summary: 'Open to #21 and drive one AD5',
    operations: [{ no: 10, text: 'Open the hole to #21.', caution: 'Eyes and ears.' }],
    conditions: ['a photo of the clean hole'],
    holeCard: null,
    check: fitCheck(makeHoleCard()).remedies.find(({ kind }) => kind === 'nextSize') ?? null,
    engineVersion: '1.0',
    by: MENTOR,
    at: '2026-11-10T20:00:00.000Z',
    withdrawn: null,
    endorsements: [],
    objections: [],
    ...facts,
  };
}

export function makeStamp(facts: Partial<Endorsement> = {}): Endorsement {
  return {
    id: '0190a0b0-0000-7000-8000-00000000ee01',
    fixId: makeFix().id,
    questionId: SHEET_ID,
    stampNumber: 'M-08',
    by: SECOND,
    discipline: 'sheetMetal',
    basis: 'drawingNote',
    reference: 'note 4',
    scope: null,
    conditions: ['hole 7 only'],
    givenAt: '2026-11-11T08:00:00.000Z',
    goodUntil: '2028-11-11',
    reason: null,
    state: 'live',
    held: null,
    withdrawn: null,
    reviews: [],
    ...facts,
  };
}

/** A sheet of the reader's own chapter, asked by the builder that `makeMe` makes. */
export function makeSheet(facts: Partial<Question> = {}): Question {
  const { id, name, memberships } = makeMe();
  const holeCard = makeHoleCard();
  return {
    ...makeQuestionRow({ id: SHEET_ID }),
    chapterId: memberships[0]!.chapterId,
    discipline: 'sheetMetal',
    askedBy: { id, name },
    state: 'open',
    body: 'A pin does not drop.',
    kitName: 'Alderfly A-2',
    step: null,
    part: null,
    holeLine: null,
    holes: [],
    buildId: null,
    builderIds: [id],
    holeCard,
    fitCheck: fitCheck(holeCard),
    photos: [],
    fixes: [],
    referral: null,
    completion: null,
    withdrawn: null,
    events: [makeEvent({ seq: 1, type: 'asked', by: { id, name }, data: {} })],
    lastSeq: 1,
    seenSeq: 1,
    ...facts,
  };
}
