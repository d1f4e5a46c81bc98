import { z } from 'zod';
import { idSchema } from '../common/wire.schema.js';
import { holeCardSchema } from '../fit-check/hole-card.schema.js';
import { questionRowSchema } from './question.schema.js';

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
