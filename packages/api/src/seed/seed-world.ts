import { z } from 'zod';
import buildsFile from './data/builds.json' with { type: 'json' };
import chaptersFile from './data/chapters.json' with { type: 'json' };
import kitFile from './data/kit.json' with { type: 'json' };
import noticesFile from './data/notices.json' with { type: 'json' };
import openItemsFile from './data/open-items.json' with { type: 'json' };
import peopleFile from './data/people.json' with { type: 'json' };
import questionsFile from './data/questions.json' with { type: 'json' };
import {
  seedBuildsSchema,
  seedChapterSchema,
  seedKitSchema,
  seedNoticeSchema,
  seedOpenItemSchema,
  seedPersonSchema,
  seedQuestionSchema,
} from './seed.schema.js';

/** The last day of the story that the seed files tell. */
export const STORY_ENDS_ON = '2026-12-01';

const seedWorldSchema = z.strictObject({
  ...seedKitSchema.shape,
  chapters: z.array(seedChapterSchema),
  people: z.array(seedPersonSchema),
  builds: seedBuildsSchema.shape.builds,
  notices: z.array(seedNoticeSchema),
  questions: z.array(seedQuestionSchema),
  openItems: z.array(seedOpenItemSchema),
});
export type SeedWorld = z.infer<typeof seedWorldSchema>;

/** The invented world of the demo: a kit, three chapters, their people and what they asked each other. */
export function readSeedWorld(): SeedWorld {
  return seedWorldSchema.parse({
    ...kitFile,
    chapters: chaptersFile,
    people: peopleFile,
    builds: buildsFile.builds,
    notices: noticesFile,
    questions: questionsFile,
    openItems: openItemsFile,
  });
}
