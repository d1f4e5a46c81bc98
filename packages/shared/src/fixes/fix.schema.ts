import { z } from 'zod';
import { personSchema, reasonSchema } from '../common/wire.schema.js';
import { conditionsSchema, endorsementSchema } from '../endorsements/endorsement.schema.js';
import { holeCardSchema, remedyCheckSchema } from '../fit-check/hole-card.schema.js';
import { fixKindSchema } from '../words/words.js';

/** One operation of a fix, numbered like a shop traveller: 10, 20, 30 … */
export const operationSchema = z.strictObject({
  no: z.number().int().min(1, 'Operations are numbered from 1.').max(9_990),
  text: z.string().trim().min(3, 'Say what is to be done.').max(1_000),
  caution: z.string().trim().min(1).max(300).nullish(),
});
export type Operation = z.infer<typeof operationSchema>;

const risingNumbers = (operations: readonly { no: number }[]) =>
  operations.every((operation, index) => index === 0 || operation.no > operations[index - 1]!.no);

export const proposeFixSchema = z
  .strictObject({
    kind: fixKindSchema,
    summary: z
      .string()
      .trim()
      .min(5, 'Say in a line what is to be done.')
      .max(200, 'Keep the line under 200 characters.'),
    operations: z
      .array(operationSchema)
      .min(1, 'A fix needs at least one operation.')
      .max(40)
      .refine(risingNumbers, 'Operations are numbered in rising order.'),
    conditions: conditionsSchema.optional(),
    /** Only where the fix rests on other numbers than the question's own card. */
    holeCard: holeCardSchema.nullish(),
  })
  .meta({ id: 'ProposeFix' });
export type ProposeFix = z.infer<typeof proposeFixSchema>;

export const objectSchema = z.strictObject({ reason: reasonSchema }).meta({ id: 'Object' });
export const answerObjectionSchema = z
  .strictObject({ answer: z.string().trim().min(3, 'Say how it is answered.').max(2_000) })
  .meta({ id: 'AnswerObjection' });
export type AnswerObjection = z.infer<typeof answerObjectionSchema>;

export const objectionSchema = z
  .strictObject({
    id: z.string(),
    fixId: z.string(),
    by: personSchema,
    at: z.string(),
    reason: z.string(),
    answered: z.strictObject({ at: z.string(), by: personSchema, answer: z.string() }).nullable(),
  })
  .meta({ id: 'Objection' });
export type Objection = z.infer<typeof objectionSchema>;

export const fixSchema = z
  .strictObject({
    id: z.string(),
    questionId: z.string(),
    number: z.number().int(),
    kind: fixKindSchema,
    summary: z.string(),
    operations: z.array(operationSchema),
    conditions: z.array(z.string()),
    holeCard: holeCardSchema.nullable(),
    /** The remedy's check as it stood when the fix was proposed; null for what has no numbers. */
    check: remedyCheckSchema.nullable(),
    engineVersion: z.string().nullable(),
    by: personSchema,
    at: z.string(),
    withdrawn: z.strictObject({ at: z.string(), reason: z.string() }).nullable(),
    endorsements: z.array(endorsementSchema),
    objections: z.array(objectionSchema),
  })
  .meta({ id: 'Fix' });
export type Fix = z.infer<typeof fixSchema>;
