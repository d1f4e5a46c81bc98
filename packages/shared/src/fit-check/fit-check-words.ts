import { FIX_KIND_WORDS } from '../words/words.js';
import type { CheckCode, RemedyCheck, RemedyKind, StopCode, Verdict } from './hole-card.schema.js';

/** A verdict as it is said on screen. Inside is never more than inside published numbers. */
export const VERDICT_WORDS: Readonly<Record<Verdict, string>> = {
  inside: 'inside published numbers',
  marginal: 'marginal',
  outside: 'outside',
  unknown: 'not known',
};

/** The sign beside the word, so that colour never stands alone. */
export const VERDICT_SIGNS: Readonly<Record<Verdict, string>> = {
  inside: '≥',
  marginal: '~',
  outside: '<',
  unknown: '?',
};

export const REMEDY_WORDS: Readonly<Record<RemedyKind, string>> = FIX_KIND_WORDS;

/** The remedy with the rivet it takes: "Next rivet size, AD5". */
export function remedyName({ kind, rivet }: Pick<RemedyCheck, 'kind' | 'rivet'>): string {
  const name = REMEDY_WORDS[kind];
  return kind === 'nextSize' && rivet ? `${name}, ${rivet.alloy ?? ''}${rivet.dash}` : name;
}

/** Check ids without what they are about: `edge` of `edge:1:0`. */
export const CHECK_FAMILIES = [
  'round',
  'cleanUp',
  'edge',
  'corner',
  'pitch',
  'headClearance',
  'bend',
  'thickness',
  'countersink',
  'strength',
  'pattern',
  'length',
  'shopHead',
  'finalHole',
] as const;
export type CheckFamily = (typeof CHECK_FAMILIES)[number];

export const CHECK_WORDS: Readonly<Record<CheckFamily, string>> = {
  round: 'Holes taken together',
  cleanUp: 'Final hole',
  edge: 'Edge, e/D',
  corner: 'Corner, e/D',
  pitch: 'Pitch, p/D',
  headClearance: 'Between heads',
  bend: 'To the bend',
  thickness: 'Thickness, t/D',
  countersink: 'Countersink',
  strength: 'Strength',
  pattern: 'Oversize in the pattern',
  length: 'Rivet length',
  shopHead: 'Shop head',
  finalHole: 'Hole as drilled',
};

/** What a check is about, from its id. */
export function checkFamily(id: string): CheckFamily {
  return id.split(':')[0] as CheckFamily;
}

/** Why a line stands as it does, in words of the trade; a code itself is never shown. */
export const CODE_WORDS: Readonly<Record<CheckCode, string>> = {
  ok: 'inside published numbers',
  too_close_to_call: 'too close to call with this measurement',
  not_measured: 'not measured',
  below_floor: 'below 1.5 D, where no bearing strength is tabulated',
  below_minimum: 'short of the edge distance',
  above_maximum: 'so far from the edge that it can lift',
  too_close: 'too close to the next rivet',
  tight: 'closer than usual to the next rivet',
  too_far: 'far from the next rivet',
  over_hole_maximum: 'larger than the rivet fills',
  no_drill: 'no drill serves',
  not_cleaned: 'does not clean up every hole',
  skips_size: 'a rivet size would be skipped',
  heads_touch: 'the heads would touch',
  heads_close: 'hardly room for the set between the heads',
  near_bend: 'the head reaches the bend',
  on_bend: 'the head would sit on the bend',
  not_tabulated: 'not tabulated',
  countersink_ok: 'thick enough to countersink',
  between: 'thinner than the countersink table has it',
  knife_edge: 'the countersink would leave a knife edge',
  weaker: 'a little weaker than drawn',
  needs_compensation: 'weaker than drawn: needs compensation',
  unknown_alloy: 'strength of this alloy not known here',
  pattern_limit: 'more oversize rivets than the pattern takes',
  adjacent_limit: 'more than two oversize rivets side by side',
  reject: 'to be replaced',
  below_nominal: 'smaller than it should be',
  overdriven: 'struck too often',
  short_rivet: 'too short',
  long_rivet: 'too long',
  no_rivet: 'no rivet of a listed size fits',
};

/** Why to stop and ask the kit maker, or a licensed engineer or mechanic. */
export const STOP_WORDS: Readonly<Record<StopCode, string>> = {
  critical_section: 'Critical structure: never on one’s own authority.',
  crack: 'A crack: nothing is drilled or driven before it is looked at.',
  skips_size: 'A rivet size would be skipped.',
  pattern_limit: 'The pattern takes no more oversize rivets.',
  below_floor: 'An edge under 1.5 D.',
  fuel_wet: 'Wet with fuel: sealant and its maker’s sheet come in.',
  pressurised: 'Pressurised structure.',
  edge_below_minimum: 'An edge under its minimum.',
  hinge_or_engine_mount: 'A hinge or the engine mount.',
  mass_balance: 'A control surface that gained weight is balanced again before it is hung.',
  unknown_alloy: 'The strength of an alloy is not known here.',
};
