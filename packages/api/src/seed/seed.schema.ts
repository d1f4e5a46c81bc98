import {
  asDoneSchema,
  audienceSchema,
  basisSchema,
  chapterRoleSchema,
  disciplineSchema,
  fixKindSchema,
  holeCardSchema,
  holePlaceSchema,
  kitLimitsSchema,
  mishapSchema,
  noticeClassSchema,
  operationSchema,
  photoMarkSchema,
  questionStateSchema,
  siteRoleSchema,
} from '@rivetside/shared';
import { z } from 'zod';

/** Stable names of things in the seed files: "P01", "B1", "Q01". They never leave the loader. */
const key = z.string().min(1);
const day = z.iso.date();
/** As it was said there and then, with the offset of the place. */
const moment = z.iso.datetime({ offset: true });

export const seedStepSchema = z.strictObject({
  code: z.string(),
  number: z.number().int(),
  title: z.string(),
  work: z.enum(['fabricate', 'finish', 'assemble', 'inspect']),
  estimateHours: z.number(),
  twoPerson: z.boolean(),
  closesStructure: z.boolean(),
  hazard: z.string().nullable(),
});

export const seedKitSchema = z.strictObject({
  kit: z.strictObject({ key, name: z.string(), maker: z.string(), kind: z.string() }),
  sections: z.array(
    z.strictObject({
      code: z.string(),
      name: z.string(),
      critical: z.boolean(),
      steward: key,
      regions: z.array(z.string()).min(1),
      steps: z.array(seedStepSchema),
    }),
  ),
  parts: z.array(
    z.strictObject({
      number: z.string(),
      section: z.string(),
      name: z.string(),
      alloy: z.string(),
      /** What the stock is, where the alloy alone does not say it: an extruded angle, a hinge. */
      form: z.string().nullable(),
      thickness: z.number(),
      quantity: z.number().int(),
      hands: z.string().nullable(),
    }),
  ),
  holeLines: z.array(
    z.strictObject({
      code: z.string(),
      section: z.string(),
      step: z.string(),
      title: z.string(),
      structure: z.enum(['primary', 'secondary']),
      stack: z.array(z.string()).min(2),
      head: z.enum(['universal', 'flush']),
      alloy: z.string(),
      dash: z.number().int(),
      callOut: z.string(),
      lengthDash: z.number(),
      drill: z.string(),
      holeDiameter: z.number(),
      pitch: z.number(),
      edge: z.number(),
      count: z.number().int(),
      repeats: z.number().int(),
      drive: z.string(),
      revision: z.string(),
      limits: kitLimitsSchema,
    }),
  ),
});
export type SeedKit = z.infer<typeof seedKitSchema>;

export const seedChapterSchema = z.strictObject({
  key,
  name: z.string(),
  zone: z.string(),
  currency: z.string(),
  meets: z.string(),
  place: z.string(),
  joining: z.enum(['open', 'approval']),
  ruleProfile: key,
  cribKeeper: key,
  foundedOn: day,
});

export const seedPersonSchema = z.strictObject({
  key,
  name: z.string(),
  email: z.email(),
  siteRole: siteRoleSchema,
  units: z.enum(['inch', 'mm']),
  zone: z.string(),
  joinedOn: day,
  works: z.string().nullable(),
  age: z.number().int().nullable(),
  guardian: key.nullable(),
  skills: z.array(key),
  membership: z
    .strictObject({
      chapter: key,
      roles: z.array(chapterRoleSchema),
      disciplines: z.array(disciplineSchema),
      stampNumber: z.string().nullable(),
      capacity: z.number().int().nullable(),
    })
    .nullable(),
});
export type SeedPerson = z.infer<typeof seedPersonSchema>;

export const seedBuildsSchema = z.strictObject({
  ruleProfiles: z.array(
    z.strictObject({ key, name: z.string(), stageInspectionsMandatory: z.boolean(), text: z.string() }),
  ),
  builds: z.array(
    z.strictObject({
      key,
      serial: z.number().int(),
      owner: key,
      crew: z.array(key),
      chapter: key,
      mentor: key.nullable(),
      ruleProfile: key,
      startedOn: day,
      now: z.array(z.string()),
      closed: z.array(z.string()),
      flown: z.boolean(),
      flightHours: z.number().nullable(),
      handOverTo: key.nullable(),
      handOverOn: day.nullable(),
      progress: z.record(z.string(), z.enum(['todo', 'pinned', 'driven'])),
    }),
  ),
});
export type SeedBuild = z.infer<typeof seedBuildsSchema>['builds'][number];

export const seedNoticeSchema = z.strictObject({
  number: z.string(),
  title: z.string(),
  issuedOn: day,
  revision: z.string(),
  class: noticeClassSchema,
  serialFrom: z.number().int(),
  serialTo: z.number().int(),
  sections: z.array(z.string()),
  parts: z.array(z.string()),
  holeLines: z.array(z.string()),
  holes: z.string().nullable(),
  text: z.string(),
  reason: z.string(),
});

export const seedOpenItemSchema = z.strictObject({
  key,
  build: key,
  section: z.string(),
  kind: z.string(),
  text: z.string(),
  question: key.nullable(),
  notice: z.string().nullable(),
  raisedOn: day,
  due: z.string(),
  closeUp: key.nullable(),
  cleared: z.strictObject({ on: day, by: key, note: z.string() }).nullable(),
  note: z.string().nullable(),
});

const said = z.strictObject({ by: key, at: moment });

export const seedStampSchema = said.extend({
  stampNumber: z.string(),
  basis: basisSchema,
  reference: z.string().nullable(),
  scope: z.strictObject({
    serials: z.array(
      z.union([z.number().int(), z.strictObject({ from: z.number().int(), to: z.number().int() })]),
    ),
    holeLines: z.array(z.string()).optional(),
    holes: z.array(holePlaceSchema).optional(),
  }),
  conditions: z.array(z.string()),
  goodUntil: day,
  reason: z.string().nullable(),
  held: said.extend({ notice: z.string(), reason: z.string() }).nullable(),
  reviews: z.array(said.extend({ decision: z.enum(['keep', 'change', 'withdraw']), reason: z.string() })),
  withdrawn: said.extend({ reason: z.string() }).nullable(),
});
export type SeedStamp = z.infer<typeof seedStampSchema>;

export const seedFixSchema = said.extend({
  number: z.number().int(),
  kind: fixKindSchema,
  summary: z.string().max(200),
  operations: z.array(operationSchema).min(1),
  conditions: z.array(z.string()),
  withdrawn: z.strictObject({ at: moment, reason: z.string() }).nullable(),
  endorsements: z.array(seedStampSchema),
  objections: z.array(
    said.extend({ reason: z.string(), answer: said.extend({ text: z.string() }).nullable() }),
  ),
});
export type SeedFix = z.infer<typeof seedFixSchema>;

export const seedPhotoSchema = z.strictObject({
  key,
  caption: z.string(),
  marks: z.array(photoMarkSchema),
  usedIn: z.enum(['question', 'completion']),
});
export type SeedPhoto = z.infer<typeof seedPhotoSchema>;

export const seedMeasurementSchema = z.strictObject({
  what: z.string(),
  value: z.number(),
  u: z.number(),
  unit: z.string(),
  tool: z.string(),
  note: z.string().nullable(),
  /** Where a reader meets it: on the hole card, in the words of the question, in the talk, in the record. */
  told: z.enum(['card', 'body', 'talk', 'record']),
});

export const seedQuestionSchema = z.strictObject({
  key,
  number: z.string(),
  build: key,
  chapter: key,
  askedBy: key,
  askedAt: moment,
  section: z.string().nullable(),
  step: z.string().nullable(),
  part: z.string().nullable(),
  parts: z.array(z.string()),
  holeLine: z.string().nullable(),
  holes: z.array(holePlaceSchema),
  mishap: mishapSchema,
  discipline: disciplineSchema,
  audience: audienceSchema,
  title: z.string().min(8).max(160),
  body: z.string().min(1),
  written: z.strictObject({
    place: z.string(),
    temperatureC: z.number(),
    signal: z.string(),
    gloves: z.boolean(),
    handsFree: z.number().int(),
    offline: z.boolean(),
  }),
  holeCard: holeCardSchema.nullable(),
  measurements: z.array(seedMeasurementSchema),
  photos: z.array(seedPhotoSchema),
  talk: z.array(said.extend({ body: z.string() })),
  fixes: z.array(seedFixSchema),
  referral: said
    .extend({
      note: z.string(),
      answer: said.extend({ answer: z.string(), reference: z.string() }).nullable(),
    })
    .nullable(),
  completion: said
    .extend({
      fix: z.number().int(),
      asDone: asDoneSchema,
      minutes: z.number().int(),
      conditionsMet: z.array(z.string()),
      helpers: z.array(z.string()),
      used: z.array(z.string()),
      note: z.string(),
    })
    .nullable(),
  notices: z.array(z.string()),
  /** How it stands at the end of the story; the loader derives it and never copies it. */
  state: questionStateSchema,
});
export type SeedQuestion = z.infer<typeof seedQuestionSchema>;
