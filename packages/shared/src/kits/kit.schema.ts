import { z } from 'zod';
import { noticeClassSchema, questionStateSchema } from '../words/words.js';

export const kitSchema = z
  .strictObject({ id: z.string(), name: z.string(), maker: z.string(), kind: z.string() })
  .meta({ id: 'Kit' });
export type Kit = z.infer<typeof kitSchema>;

/** What a place on the kit shows of the questions asked there, as far as the reader may see them. */
export const questionTallySchema = z.strictObject({
  /** open, advised or endorsed: something still waits */
  waiting: z.number().int(),
  /** under review: held by a notice or an objection */
  underReview: z.number().int(),
  total: z.number().int(),
});
export type QuestionTally = z.infer<typeof questionTallySchema>;

export const sectionSummarySchema = z
  .strictObject({
    id: z.string(),
    kitId: z.string(),
    code: z.string(),
    name: z.string(),
    position: z.number().int(),
    critical: z.boolean(),
    /** Regions of the drawn plan and side view that this section covers. */
    regions: z.array(z.string()),
    stepCount: z.number().int(),
    questions: questionTallySchema,
    /** The reader's own build: one state per step in order; empty when they have none. */
    progress: z.array(z.enum(['todo', 'pinned', 'driven'])),
  })
  .meta({ id: 'SectionSummary' });
export type SectionSummary = z.infer<typeof sectionSummarySchema>;

export const stepSchema = z
  .strictObject({
    id: z.string(),
    sectionId: z.string(),
    code: z.string(),
    number: z.number().int(),
    title: z.string(),
    work: z.enum(['fabricate', 'finish', 'assemble', 'inspect']),
    estimateHours: z.number(),
    twoPerson: z.boolean(),
    closesStructure: z.boolean(),
    hazard: z.string().nullable(),
  })
  .meta({ id: 'Step' });
export type Step = z.infer<typeof stepSchema>;

export const partSchema = z
  .strictObject({
    id: z.string(),
    sectionId: z.string(),
    number: z.string(),
    name: z.string(),
    alloy: z.string(),
    /** inch; null where a part has no one thickness */
    thickness: z.number().nullable(),
    quantity: z.number().int(),
    hands: z.string().nullable(),
    questionCount: z.number().int(),
  })
  .meta({ id: 'Part' });
export type Part = z.infer<typeof partSchema>;

/** The kit maker's own limits on a hole line; they replace the published ones and are named. Ratios in D. */
export const kitLimitsSchema = z.strictObject({
  edgeMinimumD: z.number().nullable(),
  pitchMinimumD: z.number().nullable(),
  holeMaximum: z.number().nullable(),
  shopHeadMinimumWidthD: z.number().nullable(),
  shopHeadMinimumHeightD: z.number().nullable(),
  source: z.string(),
});
export type KitLimits = z.infer<typeof kitLimitsSchema>;

export const holeLineSchema = z
  .strictObject({
    id: z.string(),
    sectionId: z.string(),
    stepId: z.string().nullable(),
    code: z.string(),
    title: z.string(),
    /** Part ids and what the hole card starts from, outermost layer first. */
    stack: z.array(
      z.strictObject({
        partId: z.string(),
        number: z.string(),
        name: z.string(),
        alloy: z.string(),
        thickness: z.number().nullable(),
      }),
    ),
    rivet: z.strictObject({
      head: z.enum(['universal', 'flush']),
      alloy: z.string(),
      dash: z.number().int(),
      lengthDash: z.number().nullable(),
    }),
    callOut: z.string(),
    drill: z.string(),
    /** inch */
    holeDiameter: z.number(),
    /** inch, centre to centre */
    pitch: z.number().nullable(),
    /** inch, centre to edge */
    edge: z.number().nullable(),
    count: z.number().int(),
    repeats: z.number().int(),
    drive: z.string().nullable(),
    revision: z.string(),
    limits: kitLimitsSchema.nullable(),
    questionCount: z.number().int(),
  })
  .meta({ id: 'HoleLine' });
export type HoleLine = z.infer<typeof holeLineSchema>;

export const noticeSchema = z
  .strictObject({
    id: z.string(),
    kitId: z.string(),
    number: z.string(),
    title: z.string(),
    class: noticeClassSchema,
    revision: z.string(),
    issuedOn: z.string(),
    serialFrom: z.number().int(),
    serialTo: z.number().int(),
    sectionCodes: z.array(z.string()),
    partNumbers: z.array(z.string()),
    holeLineCodes: z.array(z.string()),
    holes: z.string().nullable(),
    text: z.string(),
  })
  .meta({ id: 'Notice' });
export type Notice = z.infer<typeof noticeSchema>;

/** A fix that somebody carried out here, for "what others met here". */
export const metHereSchema = z.strictObject({
  questionId: z.string(),
  number: z.string(),
  title: z.string(),
  state: questionStateSchema,
  place: z.string(),
  fixSummary: z.string().nullable(),
  carriedOutAt: z.string().nullable(),
});
export type MetHere = z.infer<typeof metHereSchema>;

export const sectionSchema = z
  .strictObject({
    ...sectionSummarySchema.shape,
    kitName: z.string(),
    steward: z.string().nullable(),
    steps: z.array(stepSchema),
    parts: z.array(partSchema),
    holeLines: z.array(holeLineSchema),
    notices: z.array(noticeSchema),
    metHere: z.array(metHereSchema),
  })
  .meta({ id: 'Section' });
export type Section = z.infer<typeof sectionSchema>;
