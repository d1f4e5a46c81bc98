import { z } from 'zod';
import { idSchema, pageQueryShape, personSchema } from '../common/wire.schema.js';
import { fitCheckSchema, holeCardSchema, verdictSchema } from '../fit-check/hole-card.schema.js';
import { fixSchema } from '../fixes/fix.schema.js';
import { photoIdsSchema, photoSchema } from '../photos/photo.schema.js';
import { disciplineSchema, mishapSchema, questionStateSchema } from '../words/words.js';
import { completionSchema, referralSchema } from './completion.schema.js';
import { sheetEventSchema } from './sheet-event.schema.js';

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

/** What changes on the sheet beside the event itself. */
export const sheetStandingSchema = z.strictObject({ state: questionStateSchema, waits: waitSchema });

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
