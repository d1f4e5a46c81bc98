import { Injectable } from '@nestjs/common';
import {
  type Actor,
  canSeeQuestion,
  EVENTS_ON_SHEET,
  EVENTS_PER_PAGE,
  type EventsQuery,
  type FitCheck,
  type Fix,
  type HoleCard,
  type HolePlace,
  type Photo,
  type Question,
  type SheetEvent,
} from '@rivetside/shared';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { NotFound } from '../../common/errors/app-error.js';
import { Clock } from '../../common/time/clock.js';
import { PhotosService } from '../photos/photos.service.js';
import { QuestionDoorService } from './question-door.service.js';
import { type EventRow, type ListRow, presentEvent, presentRow } from './question-rows.js';
import * as sql from './questions.sql.js';
import {
  type CompletionRow,
  type FixRow,
  type ObjectionRow,
  presentCompletion,
  presentFix,
  presentObjection,
  presentReferral,
  presentStamp,
  type ReferralRow,
  type StampRow,
} from './sheet-rows.js';

interface SheetRow extends ListRow {
  body: string;
  holes: string;
  buildId: string | null;
  holeCard: string | null;
  fitCheck: string | null;
  withdrawnAt: string | null;
  withdrawnReason: string | null;
  kitChapterIds: string;
  builderIds: string;
  kitName: string;
  stepId: string | null;
  stepCode: string;
  stepTitle: string;
  partId: string | null;
  partName: string;
  holeLineId: string | null;
  holeLineTitle: string;
  callOut: string;
  count: number;
  repeats: number;
  revision: string;
}

const parsed = <T>(text: string | null) => (text === null ? null : (JSON.parse(text) as T));

/** The whole sheet in a fixed number of look-ups, whatever the size of the database. */
@Injectable()
export class QuestionSheetService {
  constructor(
    private readonly reader: PreparedReader,
    private readonly door: QuestionDoorService,
    private readonly photos: PhotosService,
    private readonly clock: Clock,
  ) {}

  read(actor: Actor, id: string): Question {
    const row = this.requireVisible(actor, id);
    const photos = this.photos.ofQuestion(id);
    const fixes = this.fixes(id);
    // Nothing is carried out but a fix.
    const completion = fixes.length > 0 ? this.reader.get<CompletionRow>(sql.COMPLETION, [id]) : undefined;
    const referral = this.reader.get<ReferralRow>(sql.REFERRAL, [id]);
    return {
      ...presentRow(row),
      ...placeOf(row),
      body: row.body,
      kitName: row.kitName,
      holes: JSON.parse(row.holes) as HolePlace[],
      buildId: row.buildId,
      builderIds: JSON.parse(row.builderIds) as string[],
      holeCard: parsed<HoleCard>(row.holeCard),
      fitCheck: parsed<FitCheck>(row.fitCheck),
      photos: photos.get('question') ?? [],
      fixes,
      referral: referral ? presentReferral(referral) : null,
      completion: completion ? presentCompletion(completion, photos.get(completion.id) ?? []) : null,
      withdrawn: row.withdrawnAt === null ? null : { at: row.withdrawnAt, reason: row.withdrawnReason ?? '' },
      events: this.newest(id, photos),
      lastSeq: row.lastSeq,
      seenSeq: row.seenSeq,
    };
  }

  events(actor: Actor, id: string, { after, before, limit = EVENTS_PER_PAGE }: EventsQuery) {
    const { lastSeq } = this.door.requireVisible(actor, id);
    const items = before === undefined ? this.after(id, after, limit) : this.before(id, before, limit);
    const last = items.at(-1)?.seq ?? lastSeq;
    return { items, lastSeq, nextCursor: before === undefined && last < lastSeq ? String(last) : null };
  }

  after(id: string, seq: number, limit: number): SheetEvent[] {
    return this.withPhotos(
      id,
      this.reader.all<EventRow>(sql.EVENTS_AFTER, [id, seq, limit]).map(presentEvent),
    );
  }

  fixes(questionId: string): Fix[] {
    const rows = this.reader.all<FixRow>(sql.FIXES, [questionId]);
    if (rows.length === 0) return [];
    const today = this.clock.instant().slice(0, 10);
    const stamps = this.reader
      .all<StampRow>(sql.STAMPS, [questionId])
      .map((row) => presentStamp(row, today, (userId) => this.nameOf(userId)));
    const objections = this.reader.all<ObjectionRow>(sql.OBJECTIONS, [questionId]).map(presentObjection);
    return rows.map((row) =>
      presentFix(
        row,
        stamps.filter(({ fixId }) => fixId === row.id),
        objections.filter(({ fixId }) => fixId === row.id),
      ),
    );
  }

  private requireVisible(actor: Actor, id: string): SheetRow {
    const row = this.reader.get<SheetRow>(sql.SHEET, { id, userId: actor.id });
    const sight = row && { ...row, kitChapterIds: JSON.parse(row.kitChapterIds) as string[] };
    if (!sight || !canSeeQuestion(actor, sight)) throw new NotFound('question');
    return row;
  }

  private newest(id: string, photos: Map<string, Photo[]>): SheetEvent[] {
    const rows = this.reader.all<EventRow>(sql.EVENTS_BEFORE, [id, Number.MAX_SAFE_INTEGER, EVENTS_ON_SHEET]);
    return rows.reverse().map((row) => withOwnPhotos(presentEvent(row), photos));
  }

  private before(id: string, seq: number, limit: number): SheetEvent[] {
    const rows = this.reader.all<EventRow>(sql.EVENTS_BEFORE, [id, seq, limit]);
    return this.withPhotos(id, rows.reverse().map(presentEvent));
  }

  private withPhotos(id: string, events: SheetEvent[]): SheetEvent[] {
    if (!events.some(({ data }) => Array.isArray(data['photoIds']) && data['photoIds'].length > 0))
      return events.map((one) => withOwnPhotos(one, NO_PHOTOS));
    const photos = this.photos.ofQuestion(id);
    return events.map((event) => withOwnPhotos(event, photos));
  }

  private nameOf(userId: string): string {
    return this.reader.get<{ name: string }>(sql.REVIEWER_NAME, [userId])?.name ?? '';
  }
}

const NO_PHOTOS = new Map<string, Photo[]>();

/** Addresses of photos are signed for a while only, so the log keeps ids and the photos are put in when it is read. */
function withOwnPhotos(event: SheetEvent, photos: Map<string, Photo[]>): SheetEvent {
  if (event.type !== 'message') return event;
  const { photoIds, id, ...data } = event.data;
  const shown = Array.isArray(photoIds) && photoIds.length > 0 ? (photos.get(String(id)) ?? []) : [];
  return { ...event, data: { ...data, id, photos: shown } };
}

function placeOf(row: SheetRow): Pick<Question, 'step' | 'part' | 'holeLine'> {
  const { stepId, partId, holeLineId } = row;
  const { count, repeats, revision, callOut } = row;
  return {
    step: stepId === null ? null : { id: stepId, code: row.stepCode, title: row.stepTitle },
    part: partId === null ? null : { id: partId, number: row.partNumber ?? '', name: row.partName },
    holeLine:
      holeLineId === null
        ? null
        : {
            id: holeLineId,
            code: row.holeLineCode ?? '',
            title: row.holeLineTitle,
            callOut,
            count,
            repeats,
            revision,
          },
  };
}
