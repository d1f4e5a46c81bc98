import { z } from 'zod';
import { personSchema } from '../common/wire.schema.js';

/** Everything that can happen on a sheet. `seq` grows by one per question. */
export const SHEET_EVENTS = [
  'asked',
  'message',
  'fix',
  'fixWithdrawn',
  'endorsement',
  'endorsementWithdrawn',
  'endorsementHeld',
  'endorsementReviewed',
  'endorsementExpired',
  'objection',
  'objectionAnswered',
  'completion',
  'referral',
  'referralAnswer',
  'withdrawn',
] as const;
export type SheetEventType = (typeof SHEET_EVENTS)[number];

/**
 * `data` by type: message {body, photos}; fix, fixWithdrawn {fix}; endorsement… {endorsement};
 * objection, objectionAnswered {objection}; completion {completion}; referral, referralAnswer {referral};
 * asked {}; withdrawn {reason}. All but message carry `standing` besides.
 */
export const sheetEventSchema = z
  .strictObject({
    questionId: z.string(),
    seq: z.number().int(),
    type: z.enum(SHEET_EVENTS),
    at: z.string(),
    by: personSchema,
    data: z.record(z.string(), z.unknown()),
  })
  .meta({ id: 'SheetEvent' });
export type SheetEvent = z.infer<typeof sheetEventSchema>;

export const EVENTS_ON_SHEET = 50;
export const EVENTS_PER_PAGE = 200;

export const eventsQuerySchema = z.strictObject({
  after: z.coerce.number().int().min(0).default(0),
  /** Go back from here instead: the events before this seq, oldest first. */
  before: z.coerce.number().int().min(1).optional(),
  limit: z.coerce.number().int().min(1).max(EVENTS_PER_PAGE).optional(),
});
export type EventsQuery = z.infer<typeof eventsQuerySchema>;
export const eventsAnswerSchema = z
  .strictObject({
    items: z.array(sheetEventSchema),
    lastSeq: z.number().int(),
    nextCursor: z.string().nullable(),
  })
  .meta({ id: 'SheetEvents' });

export type SheetEvents = z.infer<typeof eventsAnswerSchema>;
