import { Injectable } from '@nestjs/common';
import {
  type Audience,
  type FixFacts,
  type Person,
  type QuestionFacts,
  type QuestionState,
  questionState,
  questionWaitsFor,
  type SheetEvent,
  type SheetEventType,
} from '@rivetside/shared';
import type { PreparedDb } from '../../common/database/prepared.js';
import type { Tx } from '../../common/database/unit-of-work.js';
import { Conflict } from '../../common/errors/app-error.js';
import type { DomainEvent } from '../../common/events/domain-event.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { SheetMoved } from './questions.events.js';
import { ADD_EVENT, NEXT_SEQ } from './questions.sql.js';
import { type StampRow, stampState } from './sheet-rows.js';

export interface Happening {
  readonly type: SheetEventType;
  readonly by: Person;
  readonly data: Record<string, unknown>;
}
export interface LogPlace {
  readonly id: string;
  readonly sectionId: string | null;
  readonly chapterId: string;
  readonly kitId: string;
  readonly audience: Audience;
}
export interface Standing {
  readonly state: string;
  readonly waits: { for: string; since: string };
}

const FACTS = `SELECT q."state", q."waitsFor", q."waitsSince", q."withdrawnAt", coalesce(s."critical", 0) AS "critical",
    EXISTS (SELECT 1 FROM "completions" c WHERE c."questionId" = q."id") AS "completed",
    EXISTS (SELECT 1 FROM "referrals" r WHERE r."questionId" = q."id" AND r."answeredAt" IS NULL) AS "referralWaiting"
  FROM "questions" q LEFT JOIN "sections" s ON s."id" = q."sectionId" WHERE q."id" = ?`;
const STATE = 'SELECT "state" FROM "questions" WHERE "id" = ?';
const FIX_FACTS = `SELECT f."id", f."withdrawnAt", EXISTS (SELECT 1 FROM "objections" o WHERE o."fixId" = f."id" AND o."answeredAt" IS NULL) AS "openObjection"
  FROM "fixes" f WHERE f."questionId" = ?`;
const STAMP_FACTS = `SELECT "fixId", "byId", "basis", "withdrawnAt", "heldAt", "goodUntil" FROM "endorsements" WHERE "questionId" = ?`;

type StampFacts = Pick<StampRow, 'fixId' | 'byId' | 'basis' | 'withdrawnAt' | 'heldAt' | 'goodUntil'>;
interface FactsRow {
  state: string;
  waitsFor: string;
  waitsSince: string;
  withdrawnAt: string | null;
  critical: number;
  completed: number;
  referralWaiting: number;
}

/** Writes what happens on a sheet, numbered, and keeps the question's state true to its facts; always in one unit. */
@Injectable()
export class QuestionLogService {
  constructor(private readonly clock: Clock) {}

  /** For what changes how the question stands: state first, so that the event tells it. */
  async append(tx: Tx, place: LogPlace, happening: Happening): Promise<SheetEvent> {
    const standing = await this.restate(tx, place.id);
    const at = this.clock.instant();
    const rows = (await tx.manager.query(NEXT_SEQ, [at, place.id])) as { lastSeq: number }[];
    const data = { ...happening.data, standing };
    const event = {
      questionId: place.id,
      seq: rows[0]!.lastSeq,
      type: happening.type,
      at,
      by: happening.by,
      data,
    };
    await tx.manager.query(ADD_EVENT, [
      place.id,
      event.seq,
      newId(),
      event.type,
      at,
      event.by.id,
      JSON.stringify(data),
    ]);
    tx.record(new SheetMoved(event, place));
    return event;
  }

  /** For talk, which changes nothing else: prepared, because it is what happens most. */
  appendPrepared(
    db: PreparedDb,
    place: LogPlace,
    happening: Happening & { readonly id: string },
    record: (event: DomainEvent) => void,
  ): SheetEvent {
    const at = this.clock.instant();
    const { lastSeq: seq } = db.get<{ lastSeq: number }>(NEXT_SEQ, [at, place.id])!;
    const { type, by, data } = happening;
    db.run(ADD_EVENT, [place.id, seq, happening.id, type, at, by.id, JSON.stringify(data)]);
    const event = { questionId: place.id, seq, type, at, by, data };
    record(new SheetMoved(event, place));
    return event;
  }

  /** Asked inside the unit: what others wrote while this one waited its turn counts. */
  async requireState(
    tx: Tx,
    questionId: string,
    allows: (question: { state: QuestionState }) => boolean,
    why: string,
  ): Promise<void> {
    const rows = (await tx.manager.query(STATE, [questionId])) as { state: QuestionState }[];
    if (!allows(rows[0]!)) throw new Conflict(why, { state: rows[0]!.state });
  }

  /** Derives the state anew from its facts. What it waits for keeps its "since" unless it changed. */
  async restate(tx: Tx, questionId: string): Promise<Standing> {
    const [row] = (await tx.manager.query(FACTS, [questionId])) as FactsRow[];
    const facts = await this.factsOf(tx, questionId, row!);
    const state = questionState(facts);
    const waitsFor = questionWaitsFor(facts);
    const since = waitsFor === row!.waitsFor ? row!.waitsSince : this.clock.instant();
    await tx.manager.query(
      'UPDATE "questions" SET "state" = ?, "waitsFor" = ?, "waitsSince" = ? WHERE "id" = ?',
      [state, waitsFor, since, questionId],
    );
    return { state, waits: { for: waitsFor, since } };
  }

  private async factsOf(tx: Tx, questionId: string, row: FactsRow): Promise<QuestionFacts> {
    const today = this.clock.instant().slice(0, 10);
    const stamps = (await tx.manager.query(STAMP_FACTS, [questionId])) as StampFacts[];
    type FixRow = { id: string; withdrawnAt: string | null; openObjection: number };
    const fixes = (await tx.manager.query(FIX_FACTS, [questionId])) as FixRow[];
    const factsOfFix = ({ id, withdrawnAt, openObjection }: FixRow): FixFacts => ({
      withdrawn: withdrawnAt !== null,
      openObjection: openObjection === 1,
      stamps: stamps
        .filter(({ fixId }) => fixId === id)
        .map((stamp) => ({ state: stampState(stamp, today), basis: stamp.basis, byId: stamp.byId })),
    });
    return {
      critical: row.critical === 1,
      withdrawn: row.withdrawnAt !== null,
      completed: row.completed === 1,
      referralWaiting: row.referralWaiting === 1,
      fixes: fixes.map(factsOfFix),
    };
  }
}
