import { z } from 'zod';
import { pageQueryShape } from '../common/wire.schema.js';
import { questionStateSchema } from '../words/words.js';

export const SEARCH_KINDS = ['question', 'section', 'step', 'part', 'holeLine', 'notice'] as const;
export const searchKindSchema = z.enum(SEARCH_KINDS);
export type SearchKind = z.infer<typeof searchKindSchema>;

export const searchQuerySchema = z.strictObject({
  ...pageQueryShape,
  q: z.string().trim().min(1, 'Type what to look for.').max(200, 'Keep it under 200 characters.'),
});
export type SearchRequest = z.infer<typeof searchQuerySchema>;

/** Text with the words that were found marked; never HTML. */
export const fragmentSchema = z.strictObject({ text: z.string(), hit: z.boolean() });
export type Fragment = z.infer<typeof fragmentSchema>;

export const searchHitSchema = z
  .strictObject({
    kind: searchKindSchema,
    id: z.string(),
    /** Where to go: the section of a place, nothing for a question or notice. */
    sectionId: z.string().nullable(),
    title: z.array(fragmentSchema),
    /** Where it is on the kit, in words. */
    place: z.string(),
    excerpt: z.array(fragmentSchema),
    state: questionStateSchema.nullable(),
    /** The ground of its answer moved: said before its text. */
    standing: z.enum(['withdrawn', 'held', 'expired']).nullable(),
  })
  .meta({ id: 'SearchHit' });
export type SearchHit = z.infer<typeof searchHitSchema>;
