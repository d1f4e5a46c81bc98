import { z } from 'zod';
import { personSchema } from '../common/wire.schema.js';

export const buildSchema = z
  .strictObject({
    id: z.string(),
    kitId: z.string(),
    kitName: z.string(),
    serial: z.number().int(),
    chapterId: z.string(),
    owner: personSchema,
    crew: z.array(personSchema),
    mentor: personSchema.nullable(),
    startedOn: z.string(),
    /** The viewer may write here: owner or crew. */
    mine: z.boolean(),
  })
  .meta({ id: 'Build' });
export type Build = z.infer<typeof buildSchema>;

export const entryLineSchema = z.strictObject({ label: z.string(), text: z.string() });
export type EntryLine = z.infer<typeof entryLineSchema>;

export const ENTRY_KINDS = ['work', 'fix', 'visit', 'closeUp'] as const;
export const entrySchema = z
  .strictObject({
    id: z.string(),
    buildId: z.string(),
    kind: z.enum(ENTRY_KINDS),
    sectionId: z.string().nullable(),
    sectionName: z.string().nullable(),
    questionId: z.string().nullable(),
    questionNumber: z.string().nullable(),
    title: z.string(),
    /** found, did, basis, used, measured … as written when it was done */
    lines: z.array(entryLineSchema),
    minutes: z.number().int().nullable(),
    by: personSchema,
    helpers: z.array(z.string()),
    doneAt: z.string(),
    writtenAt: z.string(),
    photoCount: z.number().int(),
  })
  .meta({ id: 'Entry' });
export type Entry = z.infer<typeof entrySchema>;

export const openItemSchema = z
  .strictObject({
    id: z.string(),
    buildId: z.string(),
    sectionId: z.string().nullable(),
    sectionName: z.string().nullable(),
    questionId: z.string().nullable(),
    text: z.string(),
    due: z.string().nullable(),
    raisedAt: z.string(),
    clearedAt: z.string().nullable(),
    clearedNote: z.string().nullable(),
  })
  .meta({ id: 'OpenItem' });
export type OpenItem = z.infer<typeof openItemSchema>;

export const clearOpenItemSchema = z
  .strictObject({ note: z.string().trim().min(3, 'Say what was done.').max(2_000) })
  .meta({ id: 'ClearOpenItem' });
export type ClearOpenItem = z.infer<typeof clearOpenItemSchema>;

export const stepStatesSchema = z
  .strictObject({
    steps: z
      .array(z.strictObject({ stepId: z.string(), state: z.enum(['todo', 'pinned', 'driven']) }))
      .max(200, 'At most 200 steps at a time.'),
  })
  .meta({ id: 'StepStates' });
export type StepStates = z.infer<typeof stepStatesSchema>;
