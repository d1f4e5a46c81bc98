import type {
  AsDone,
  AsDoneCheck,
  Basis,
  Completion,
  Discipline,
  Endorsement,
  Fix,
  FixKind,
  HoleCard,
  Objection,
  Operation,
  Photo,
  Referral,
  RemedyCheck,
  StampScope,
  StampState,
} from '@rivetside/shared';

export interface FixRow {
  id: string;
  questionId: string;
  number: number;
  kind: FixKind;
  summary: string;
  operations: string;
  conditions: string;
  holeCard: string | null;
  check: string | null;
  engineVersion: string | null;
  byId: string;
  byName: string;
  at: string;
  withdrawnAt: string | null;
  withdrawnReason: string | null;
}
export interface StampRow {
  id: string;
  fixId: string;
  questionId: string;
  stampNumber: string;
  byId: string;
  byName: string;
  discipline: Discipline;
  basis: Basis;
  reference: string | null;
  scope: string | null;
  conditions: string;
  givenAt: string;
  goodUntil: string;
  reason: string | null;
  heldAt: string | null;
  heldReason: string | null;
  heldByNoticeId: string | null;
  withdrawnAt: string | null;
  withdrawnReason: string | null;
  reviews: string;
}
export interface ObjectionRow {
  id: string;
  fixId: string;
  byId: string;
  byName: string;
  at: string;
  reason: string;
  answeredAt: string | null;
  answeredById: string | null;
  answeredByName: string | null;
  answer: string | null;
}
export interface ReferralRow {
  id: string;
  at: string;
  byId: string;
  byName: string;
  note: string | null;
  answeredAt: string | null;
  answeredById: string | null;
  answeredByName: string | null;
  answer: string | null;
  reference: string | null;
}
export interface CompletionRow {
  id: string;
  fixId: string;
  asDone: string;
  check: string | null;
  minutes: number;
  conditionsMet: string;
  conditionsLeft: string;
  helpers: string;
  note: string | null;
  byId: string;
  byName: string;
  at: string;
  entryId: string | null;
}

const read = <T>(text: string) => JSON.parse(text) as T;
const readOrNull = <T>(text: string | null) => (text === null ? null : (JSON.parse(text) as T));

/** How a stamp stands on a day. Withdrawn outranks all: it never comes back. */
export function stampState(
  stamp: Pick<StampRow, 'withdrawnAt' | 'heldAt' | 'goodUntil'>,
  today: string,
): StampState {
  if (stamp.withdrawnAt !== null) return 'withdrawn';
  if (stamp.goodUntil < today) return 'expired';
  return stamp.heldAt === null ? 'live' : 'held';
}

type ReviewRow = { at: string; byId: string; decision: 'keep' | 'change' | 'withdraw'; reason: string };

export function presentStamp(row: StampRow, today: string, nameOf: (userId: string) => string): Endorsement {
  const { id, fixId, questionId, stampNumber, discipline, basis, reference, givenAt, goodUntil, reason } =
    row;
  return {
    id,
    fixId,
    questionId,
    stampNumber,
    by: { id: row.byId, name: row.byName },
    discipline,
    basis,
    reference,
    scope: readOrNull<StampScope>(row.scope),
    conditions: read<string[]>(row.conditions),
    givenAt,
    goodUntil,
    reason,
    state: stampState(row, today),
    held:
      row.heldAt === null
        ? null
        : { at: row.heldAt, reason: row.heldReason ?? '', noticeId: row.heldByNoticeId },
    withdrawn: row.withdrawnAt === null ? null : { at: row.withdrawnAt, reason: row.withdrawnReason ?? '' },
    reviews: read<ReviewRow[]>(row.reviews).map(({ at, byId, decision, reason: why }) => ({
      at,
      by: { id: byId, name: nameOf(byId) },
      decision,
      reason: why,
    })),
  };
}

export function presentObjection(row: ObjectionRow): Objection {
  const { id, fixId, at, reason } = row;
  const answered =
    row.answeredAt === null
      ? null
      : {
          at: row.answeredAt,
          by: { id: row.answeredById ?? '', name: row.answeredByName ?? '' },
          answer: row.answer ?? '',
        };
  return { id, fixId, by: { id: row.byId, name: row.byName }, at, reason, answered };
}

export function presentFix(row: FixRow, endorsements: Endorsement[], objections: Objection[]): Fix {
  const { id, questionId, number, kind, summary, engineVersion, at } = row;
  return {
    id,
    questionId,
    number,
    kind,
    summary,
    operations: read<Operation[]>(row.operations),
    conditions: read<string[]>(row.conditions),
    holeCard: readOrNull<HoleCard>(row.holeCard),
    check: readOrNull<RemedyCheck>(row.check),
    engineVersion,
    by: { id: row.byId, name: row.byName },
    at,
    withdrawn: row.withdrawnAt === null ? null : { at: row.withdrawnAt, reason: row.withdrawnReason ?? '' },
    endorsements,
    objections,
  };
}

export function presentReferral(row: ReferralRow): Referral {
  const { id, at, note } = row;
  const answered =
    row.answeredAt === null
      ? null
      : {
          at: row.answeredAt,
          by: { id: row.answeredById ?? '', name: row.answeredByName ?? '' },
          answer: row.answer ?? '',
          reference: row.reference ?? '',
        };
  return { id, at, by: { id: row.byId, name: row.byName }, note, answered };
}

export function presentCompletion(row: CompletionRow, photos: Photo[]): Completion {
  const { id, fixId, minutes, note, at, entryId } = row;
  return {
    id,
    fixId,
    asDone: read<AsDone>(row.asDone),
    check: readOrNull<AsDoneCheck>(row.check),
    minutes,
    conditionsMet: read<string[]>(row.conditionsMet),
    conditionsLeft: read<string[]>(row.conditionsLeft),
    helpers: read<string[]>(row.helpers),
    note,
    by: { id: row.byId, name: row.byName },
    at,
    entryId,
    photos,
  };
}
