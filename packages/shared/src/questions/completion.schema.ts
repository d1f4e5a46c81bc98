import { z } from 'zod';
import { idSchema, personSchema } from '../common/wire.schema.js';
import { asDoneCheckSchema } from '../fit-check/hole-card.schema.js';
import { photoIdsSchema, photoSchema } from '../photos/photo.schema.js';

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
