import { z } from 'zod';
import { chapterRoleSchema } from '../access/roles.js';
import { disciplineSchema } from '../words/words.js';

export const chapterSchema = z
  .strictObject({
    id: z.string(),
    name: z.string(),
    zone: z.string(),
    currency: z.string(),
    meets: z.string(),
    place: z.string(),
    /** The reader is an active member. */
    member: z.boolean(),
  })
  .meta({ id: 'Chapter' });
export type Chapter = z.infer<typeof chapterSchema>;

export const chapterMemberSchema = z
  .strictObject({
    userId: z.string(),
    name: z.string(),
    roles: z.array(chapterRoleSchema),
    disciplines: z.array(disciplineSchema),
    stampNumber: z.string().nullable(),
  })
  .meta({ id: 'ChapterMember' });
export type ChapterMember = z.infer<typeof chapterMemberSchema>;
