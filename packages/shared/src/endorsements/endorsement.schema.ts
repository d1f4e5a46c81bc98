import { z } from 'zod';
import { daySchema, personSchema, reasonSchema } from '../common/wire.schema.js';
import { basisSchema, disciplineSchema } from '../words/words.js';

/** Months that a stamp may live at most; a thin basis shortens it. House rule: product words, section 2. */
export const STAMP_LIFE_MONTHS = {
  kitMakerReply: 24,
  drawingNote: 24,
  handbook: 24,
  ruleText: 24,
  experience: 12,
} as const;

const serialSchema = z.number().int().min(1).max(999_999);
const holeNumberSchema = z.number().int().min(1).max(9_999);

/** What a stamp speaks for. Nothing named means: the case that was asked, and no other. */
export const stampScopeSchema = z.strictObject({
  serials: z
    .array(z.union([serialSchema, z.strictObject({ from: serialSchema, to: serialSchema })]))
    .max(20)
    .optional(),
  holeLineIds: z.array(z.uuid()).max(20).optional(),
  holes: z
    .array(
      z.union([
        holeNumberSchema,
        z.strictObject({ repeat: holeNumberSchema.optional(), hole: holeNumberSchema }),
      ]),
    )
    .max(200)
    .optional(),
});
export type StampScope = z.infer<typeof stampScopeSchema>;

export const conditionsSchema = z
  .array(z.string().trim().min(3, 'A condition needs words.').max(300))
  .max(20, 'At most 20 conditions.');

export const endorseSchema = z
  .strictObject({
    basis: basisSchema.default('experience'),
    reference: z.string().trim().min(1).max(300).optional(),
    scope: stampScopeSchema.optional(),
    conditions: conditionsSchema.optional(),
    goodUntil: daySchema.optional(),
    reason: reasonSchema.optional(),
  })
  .meta({ id: 'Endorse' });
export type Endorse = z.infer<typeof endorseSchema>;
/** As a client may send it: the basis has a default. */
export type EndorseInput = z.input<typeof endorseSchema>;

export const STAMP_STATES = ['live', 'held', 'expired', 'withdrawn'] as const;
export type StampState = (typeof STAMP_STATES)[number];

export const endorsementSchema = z
  .strictObject({
    id: z.string(),
    fixId: z.string(),
    questionId: z.string(),
    stampNumber: z.string(),
    by: personSchema,
    discipline: disciplineSchema,
    basis: basisSchema,
    reference: z.string().nullable(),
    scope: stampScopeSchema.nullable(),
    conditions: z.array(z.string()),
    givenAt: z.string(),
    goodUntil: z.string(),
    /** Why it was given although a line of the check is outside; shown with the stamp forever. */
    reason: z.string().nullable(),
    state: z.enum(STAMP_STATES),
    held: z.strictObject({ at: z.string(), reason: z.string(), noticeId: z.string().nullable() }).nullable(),
    withdrawn: z.strictObject({ at: z.string(), reason: z.string() }).nullable(),
    /** Past decisions on holds, oldest first: kept or changed, when and why. */
    reviews: z.array(
      z.strictObject({
        at: z.string(),
        by: personSchema,
        decision: z.enum(['keep', 'change', 'withdraw']),
        reason: z.string(),
      }),
    ),
  })
  .meta({ id: 'Endorsement' });
export type Endorsement = z.infer<typeof endorsementSchema>;

export const reviewStampSchema = z
  .strictObject({ decision: z.enum(['keep', 'change', 'withdraw']), reason: reasonSchema })
  .meta({ id: 'ReviewStamp' });
export type ReviewStamp = z.infer<typeof reviewStampSchema>;
