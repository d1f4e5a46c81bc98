import { z } from 'zod';
import { HOLE_CARD_FIELDS, rivetHeadSchema } from './card-fields.js';
import { cardFaults } from './card-faults.js';

/**
 * What a builder fills in about a hole. Inch; x along the hole line, y across it; angles in degrees from +x,
 * counter-clockwise; origin at the centre of the hole in the first layer. Edges and bends are measured from
 * that layer's own hole centre. What is absent is not known; an empty list says that nothing is near.
 */
export const holeCardSchema = HOLE_CARD_FIELDS.superRefine((card, context) => {
  for (const { path, message } of cardFaults(card)) context.addIssue({ code: 'custom', path, message });
}).meta({ id: 'HoleCard' });

/** How a line stands against its limit. On screen *inside* reads "inside published numbers". */
export const VERDICTS = ['inside', 'marginal', 'outside', 'unknown'] as const;
export const verdictSchema = z.enum(VERDICTS);
export type Verdict = z.infer<typeof verdictSchema>;

export const REMEDY_KINDS = [
  'leave',
  'cleanUp',
  'nextSize',
  'addRivets',
  'relocate',
  'doubler',
  'replacePart',
  'askKitMaker',
] as const;
export const remedyKindSchema = z.enum(REMEDY_KINDS);
export type RemedyKind = z.infer<typeof remedyKindSchema>;

export const CHECK_UNITS = ['in', 'D', 'percent', 'rivets'] as const;

/** Why a line stands as it does. */
export const CHECK_CODES = [
  'ok',
  'too_close_to_call',
  'not_measured',
  'below_floor',
  'below_minimum',
  'above_maximum',
  'too_close',
  'tight',
  'too_far',
  'over_hole_maximum',
  'no_drill',
  'not_cleaned',
  'skips_size',
  'heads_touch',
  'heads_close',
  'near_bend',
  'on_bend',
  'not_tabulated',
  'countersink_ok',
  'between',
  'knife_edge',
  'weaker',
  'needs_compensation',
  'unknown_alloy',
  'pattern_limit',
  'adjacent_limit',
  'reject',
  'below_nominal',
  'overdriven',
  'short_rivet',
  'long_rivet',
  'no_rivet',
] as const;
export const checkCodeSchema = z.enum(CHECK_CODES);
export type CheckCode = z.infer<typeof checkCodeSchema>;

/** One line of the fit check. */
export const checkLineSchema = z
  .strictObject({
    id: z.string(),
    label: z.string(),
    value: z.number().nullable(),
    unit: z.enum(CHECK_UNITS),
    limit: z.number().nullable(),
    /** How far inside the limit, in the line's unit; below zero is short. */
    margin: z.number().nullable(),
    verdict: verdictSchema,
    code: checkCodeSchema,
    source: z.string(),
    /** The formula with this card's numbers in it. */
    formula: z.string(),
    /** Measuring error of the value, in the line's unit; null where none was given. */
    error: z.number().nullable(),
    /** What stands beside the number: the tool that would settle it, what is missing, the best case. */
    remark: z.string().nullable(),
  })
  .meta({ id: 'CheckLine' });
export type CheckLine = z.infer<typeof checkLineSchema>;

/** One remedy with its own lines; the worst of them is its verdict. */
export const remedyCheckSchema = z
  .strictObject({
    kind: remedyKindSchema,
    verdict: verdictSchema,
    finalHole: z.strictObject({ diameter: z.number(), drill: z.string() }).nullable(),
    rivet: z
      .strictObject({
        head: rivetHeadSchema.nullable(),
        alloy: z.string().nullable(),
        dash: z.number().int(),
        lengthDash: z.number().nullable(),
      })
      .nullable(),
    checks: z.array(checkLineSchema),
    /** Where the finished hole is centred, inch from the origin of the card; null where it is not moved or not known. */
    centre: z.strictObject({ x: z.number(), y: z.number() }).nullable(),
    remarks: z.array(z.string()),
  })
  .meta({ id: 'RemedyCheck' });
export type RemedyCheck = z.infer<typeof remedyCheckSchema>;

/** Reasons to stop and ask the kit maker, or a licensed engineer or mechanic. */
export const STOP_CODES = [
  'critical_section',
  'crack',
  'skips_size',
  'pattern_limit',
  'below_floor',
  'fuel_wet',
  'pressurised',
  'edge_below_minimum',
  'hinge_or_engine_mount',
  'mass_balance',
  'unknown_alloy',
] as const;
export const stopCodeSchema = z.enum(STOP_CODES);
export type StopCode = z.infer<typeof stopCodeSchema>;

/** The numeric check of a hole card against published practice. */
export const fitCheckSchema = z
  .strictObject({
    engineVersion: z.string(),
    assumptions: z.array(z.string()),
    missing: z.array(z.string()),
    stopAndAsk: z.array(stopCodeSchema),
    remedies: z.array(remedyCheckSchema),
  })
  .meta({ id: 'FitCheck' });
export type FitCheck = z.infer<typeof fitCheckSchema>;

/** The second look, at what was really done. */
export const asDoneCheckSchema = z
  .strictObject({
    engineVersion: z.string(),
    verdict: verdictSchema,
    /** The rivet size that the finished hole takes; null where no listed size fits it. */
    rivetDash: z.number().int().nullable(),
    missing: z.array(z.string()),
    checks: z.array(checkLineSchema),
  })
  .meta({ id: 'AsDoneCheck' });
export type AsDoneCheck = z.infer<typeof asDoneCheckSchema>;

/** What is sent to be checked, and nothing else. */
export const askFitCheckSchema = z.strictObject({ holeCard: holeCardSchema }).meta({ id: 'AskFitCheck' });
export type AskFitCheck = z.infer<typeof askFitCheckSchema>;
