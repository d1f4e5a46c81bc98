import { z } from 'zod';
import { idSchema, pageQueryShape, personSchema } from '../common/wire.schema.js';
import {
  asDoneCheckSchema,
  fitCheckSchema,
  holeCardSchema,
  verdictSchema,
} from '../fit-check/hole-card.schema.js';
import { fixSchema } from '../fixes/fix.schema.js';
import { photoIdsSchema, photoSchema } from '../photos/photo.schema.js';
import { disciplineSchema, mishapSchema, questionStateSchema } from '../words/words.js';

export const QUESTION_TITLE_MAX = 160;
export const QUESTION_BODY_MAX = 10_000;
export const MESSAGE_MAX = 4_000;

export const AUDIENCES = ['chapter', 'kit'] as const;
export const audienceSchema = z.enum(AUDIENCES);
export type Audience = z.infer<typeof audienceSchema>;

/** One hole of a hole line: the repeat (which rib, which side) and the hole in it, both counted from 1. */
export const holePlaceSchema = z.strictObject({
  repeat: z.number().int().min(1).max(9_999),
  hole: z.number().int().min(1).max(9_999),
});
export type HolePlace = z.infer<typeof holePlaceSchema>;

export const askQuestionSchema = z
  .strictObject({
    kitId: idSchema,
    sectionId: idSchema.nullish(),
    stepId: idSchema.nullish(),
    partId: idSchema.nullish(),
    holeLineId: idSchema.nullish(),
    holes: z.array(holePlaceSchema).max(200, 'At most 200 holes in one question.').nullish(),
    buildId: idSchema.nullish(),
    chapterId: idSchema,
    audience: audienceSchema,
    discipline: disciplineSchema,
    mishap: mishapSchema,
    title: z
      .string()
      .trim()
      .min(8, 'Say in one line what is wrong: at least 8 characters.')
      .max(QUESTION_TITLE_MAX, `Keep the line under ${QUESTION_TITLE_MAX} characters.`),
    body: z
      .string()
      .trim()
      .min(1, 'Say what you see and what you have done so far.')
      .max(QUESTION_BODY_MAX, `Keep the text under ${QUESTION_BODY_MAX} characters.`),
    holeCard: holeCardSchema.nullish(),
    photoIds: photoIdsSchema.nullish(),
  })
  .meta({ id: 'AskQuestion' });
export type AskQuestion = z.infer<typeof askQuestionSchema>;

export const writeMessageSchema = z
  .strictObject({
    body: z
      .string()
      .trim()
      .min(1, 'Write a line first.')
      .max(MESSAGE_MAX, `Keep it under ${MESSAGE_MAX} characters.`),
    photoIds: photoIdsSchema.nullish(),
  })
  .meta({ id: 'WriteMessage' });
export type WriteMessage = z.infer<typeof writeMessageSchema>;

const inchesMeasured = z
  .number('Give a number in inches.')
  .positive('A measured length is more than nothing.')
  .max(100);

/** What was really done, measured again. Lengths in inches. */
export const asDoneSchema = z.strictObject({
  finalDrill: z.string().trim().min(1).max(20).optional(),
  edgeDistances: z.array(inchesMeasured).max(5).optional(),
  shopHead: z.strictObject({ width: inchesMeasured, height: inchesMeasured }).optional(),
  rivetLengthDash: z.number().min(1).max(64).optional(),
  readings: z
    .array(
      z.strictObject({
        what: z.string().trim().min(1).max(120),
        value: z.number(),
        unit: z.string().trim().min(1).max(20),
        u: z.number().min(0).optional(),
      }),
    )
    .max(40)
    .optional(),
});
export type AsDone = z.infer<typeof asDoneSchema>;

export const completeSchema = z
  .strictObject({
    fixId: idSchema,
    asDone: asDoneSchema,
    minutes: z
      .number('Give the minutes as a number.')
      .int('Whole minutes.')
      .min(0)
      .max(24 * 60 * 14, 'More than two weeks: give the working time only.'),
    conditionsMet: z.array(z.string().trim().min(1).max(300)).max(60).optional(),
    helpers: z.array(z.string().trim().min(1).max(120)).max(20).optional(),
    photoIds: photoIdsSchema.optional(),
    note: z.string().trim().max(4_000).optional(),
  })
  .meta({ id: 'CarryOut' });
export type Complete = z.infer<typeof completeSchema>;

export const referSchema = z
  .strictObject({ note: z.string().trim().max(4_000).optional() })
  .meta({ id: 'Refer' });
export type Refer = z.infer<typeof referSchema>;
export const referralAnswerSchema = z
  .strictObject({
    answer: z.string().trim().min(3, 'Write what the kit maker answered.').max(10_000),
    reference: z.string().trim().min(1, 'Give the reference on the answer.').max(300),
  })
  .meta({ id: 'ReferralAnswer' });
export type ReferralAnswer = z.infer<typeof referralAnswerSchema>;

/** What a question waits for, and since when. */
export const WAITS = [
  'firstFix',
  'stamp',
  'secondStamp',
  'builder',
  'kitMaker',
  'review',
  'nothing',
] as const;
export type Wait = (typeof WAITS)[number];
export const waitSchema = z.strictObject({ for: z.enum(WAITS), since: z.string() });

export const headlineSchema = z.strictObject({ text: z.string(), verdict: verdictSchema });
export type Headline = z.infer<typeof headlineSchema>;

const sectionPlaceSchema = z.strictObject({
  id: z.string(),
  code: z.string(),
  name: z.string(),
  critical: z.boolean(),
  regions: z.array(z.string()),
});

/** A row of the list: its place, its measured trouble, its state and what it waits for. */
export const questionRowSchema = z
  .strictObject({
    id: z.string(),
    number: z.string(),
    title: z.string(),
    state: questionStateSchema,
    mishap: mishapSchema,
    discipline: disciplineSchema,
    audience: audienceSchema,
    headline: headlineSchema.nullable(),
    waits: waitSchema,
    kitId: z.string(),
    section: sectionPlaceSchema.nullable(),
    partNumber: z.string().nullable(),
    holeLineCode: z.string().nullable(),
    serial: z.number().int().nullable(),
    chapterId: z.string(),
    chapterName: z.string(),
    askedBy: personSchema,
    askedAt: z.string(),
    lastActivityAt: z.string(),
    /** Something was written since the reader last had the sheet open. */
    unread: z.boolean(),
  })
  .meta({ id: 'QuestionRow' });
export type QuestionRow = z.infer<typeof questionRowSchema>;

export const questionQuerySchema = z.strictObject({
  ...pageQueryShape,
  kitId: idSchema.optional(),
  sectionId: idSchema.optional(),
  partId: idSchema.optional(),
  holeLineId: idSchema.optional(),
  state: questionStateSchema.optional(),
  discipline: disciplineSchema.optional(),
  chapterId: idSchema.optional(),
  /** asked by me, or on a build that I own or help on */
  mine: z.enum(['true', 'false']).optional(),
  q: z.string().trim().min(1).max(200).optional(),
  sort: z.enum(['activity', 'newest', 'waiting']).optional(),
});
export type QuestionQuery = z.infer<typeof questionQuerySchema>;

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

/** What changes on the sheet beside the event itself. */
export const sheetStandingSchema = z.strictObject({ state: questionStateSchema, waits: waitSchema });

export const completionSchema = z
  .strictObject({
    id: z.string(),
    fixId: z.string(),
    asDone: asDoneSchema,
    check: asDoneCheckSchema.nullable(),
    minutes: z.number().int(),
    conditionsMet: z.array(z.string()),
    conditionsLeft: z.array(z.string()),
    helpers: z.array(z.string()),
    note: z.string().nullable(),
    by: personSchema,
    at: z.string(),
    entryId: z.string().nullable(),
    photos: z.array(photoSchema),
  })
  .meta({ id: 'Completion' });
export type Completion = z.infer<typeof completionSchema>;

export const referralSchema = z
  .strictObject({
    id: z.string(),
    at: z.string(),
    by: personSchema,
    note: z.string().nullable(),
    answered: z
      .strictObject({ at: z.string(), by: personSchema, answer: z.string(), reference: z.string() })
      .nullable(),
  })
  .meta({ id: 'Referral' });
export type Referral = z.infer<typeof referralSchema>;

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

/** The whole sheet. */
export const questionSchema = z
  .strictObject({
    ...questionRowSchema.shape,
    body: z.string(),
    kitName: z.string(),
    step: z.strictObject({ id: z.string(), code: z.string(), title: z.string() }).nullable(),
    part: z.strictObject({ id: z.string(), number: z.string(), name: z.string() }).nullable(),
    holeLine: z
      .strictObject({
        id: z.string(),
        code: z.string(),
        title: z.string(),
        callOut: z.string(),
        count: z.number().int(),
        repeats: z.number().int(),
        revision: z.string(),
      })
      .nullable(),
    holes: z.array(holePlaceSchema),
    buildId: z.string().nullable(),
    /** Owner and crew of the build: they may carry out. */
    builderIds: z.array(z.string()),
    holeCard: holeCardSchema.nullable(),
    /** Frozen when the question was asked. */
    fitCheck: fitCheckSchema.nullable(),
    photos: z.array(photoSchema),
    fixes: z.array(fixSchema),
    referral: referralSchema.nullable(),
    completion: completionSchema.nullable(),
    withdrawn: z.strictObject({ at: z.string(), reason: z.string() }).nullable(),
    /** The newest events, oldest first. */
    events: z.array(sheetEventSchema),
    lastSeq: z.number().int(),
    /** The newest event that the reader has seen before this reading. */
    seenSeq: z.number().int(),
  })
  .meta({ id: 'Question' });
export type Question = z.infer<typeof questionSchema>;

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

export const seenSchema = z.strictObject({ seq: z.number().int().min(0) }).meta({ id: 'Seen' });
export type Seen = z.infer<typeof seenSchema>;

/** What waits for a mentor: a first fix, a stamp, another look at what was held. */
export const deskSchema = z
  .strictObject({
    firstFix: z.array(questionRowSchema),
    stamp: z.array(questionRowSchema),
    review: z.array(questionRowSchema),
  })
  .meta({ id: 'Desk' });
export type Desk = z.infer<typeof deskSchema>;

export const similarQuerySchema = z
  .strictObject({
    holeCard: holeCardSchema.nullish(),
    sectionId: idSchema.nullish(),
    partId: idSchema.nullish(),
    text: z.string().trim().max(500).nullish(),
  })
  .meta({ id: 'SimilarQuery' });
export type SimilarQuery = z.infer<typeof similarQuerySchema>;

/** The same as an address: beside a question, or for a place and words. */
export const similarAskedSchema = z.strictObject({
  questionId: idSchema.optional(),
  sectionId: idSchema.optional(),
  partId: idSchema.optional(),
  text: z.string().trim().max(500).optional(),
});
export type SimilarAsked = z.infer<typeof similarAskedSchema>;

/** A question met before. Why it is shown is said in words; nothing is ranked by a number on screen. */
export const similarQuestionSchema = z
  .strictObject({
    question: questionRowSchema,
    alikeIn: z.array(z.string()),
    differsIn: z.array(z.string()),
    score: z.number(),
    holeCard: holeCardSchema.nullable(),
  })
  .meta({ id: 'SimilarQuestion' });
export type SimilarQuestion = z.infer<typeof similarQuestionSchema>;
