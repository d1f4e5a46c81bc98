import type { HoleCard } from '../fit-check/card-fields.js';
import type { RemedyCheck } from '../fit-check/hole-card.schema.js';
import type { FixKind, Mishap } from '../words/words.js';
import type { Operation } from './fix.schema.js';

/** What a mentor starts from: every line is theirs to change before it is proposed. */
export interface Traveller {
  readonly summary: string;
  readonly operations: readonly Operation[];
  readonly conditions: readonly string[];
}

/** What the trade does at such a step, and what may hurt there. Shop habits: common practice, no source. */
interface Step {
  readonly text: string;
  readonly caution?: string;
}

export interface TravellerFacts {
  readonly kind: FixKind;
  readonly mishap: Mishap;
  readonly card: HoleCard | null;
  /** The remedy of the fit check with that kind, where there is one. */
  readonly remedy: RemedyCheck | null;
}

const EYES_AND_EARS = 'Eyes and ears.';
const AIR_OFF_BIT = 'Eyes and ears. Air hose off before the bit is changed.';
const AIR_OFF_SETS = 'Air hose off before the sets are changed; never pull the trigger on an empty set.';
const CHROMATE = 'Chromate primer: no dry sanding, gloves, mask; wash before eating.';
/** Driven head: nominal 1.5 D by 0.5 D (S13, S19); below 1.3 D or 0.3 D it is replaced (S9). */
const NOMINAL_WIDTH_D = 1.5;
const NOMINAL_HEIGHT_D = 0.5;
const LEAST_WIDTH_D = 1.3;
const LEAST_HEIGHT_D = 0.3;

const inches = (value: number) => value.toFixed(3);
const diameterOf = (dash: number) => dash / 32;

/**
 * The short call-out of a rivet: 470 for a universal head, 426 for a flush one, alloy, diameter in 1/32 in, length in
 * 1/16 in.
 *
 * @example rivetCallOut({ head: 'universal', alloy: 'AD', dash: 4, lengthDash: 4.5 }) // "470 AD4-4.5"
 */
export function rivetCallOut(rivet: {
  readonly head: 'universal' | 'flush' | null;
  readonly alloy: string | null;
  readonly dash: number;
  readonly lengthDash: number | null;
}): string {
  const family = rivet.head === 'flush' ? '426 ' : rivet.head === 'universal' ? '470 ' : '';
  return `${family}${rivet.alloy ?? ''}${rivet.dash}${rivet.lengthDash === null ? '' : `-${rivet.lengthDash}`}`;
}

function rivetOf({ card, remedy }: TravellerFacts) {
  if (remedy?.rivet) return remedy.rivet;
  if (!card) return null;
  return {
    head: card.rivet.head ?? null,
    alloy: card.rivet.alloy ?? null,
    dash: card.rivet.dash,
    lengthDash: null,
  };
}

function gaugeTheHead(dash: number | null): Step {
  if (dash === null) return { text: 'Gauge the shop head; write width and height.' };
  const d = diameterOf(dash);
  const nominal = `${inches(NOMINAL_WIDTH_D * d)} × ${inches(NOMINAL_HEIGHT_D * d)}`;
  const least = `${inches(LEAST_WIDTH_D * d)} × ${inches(LEAST_HEIGHT_D * d)}`;
  return { text: `Gauge the shop head; write both readings. Nominal ${nominal}, replaced below ${least}.` };
}

const CLEAN_AND_PRIME: Step = {
  text: 'Part the layers, deburr both faces, take out every chip. Measure the edge of each layer. Touch up primer where it broke through.',
  caution: CHROMATE,
};

/** Undercutting the head keeps the hole: AC 43.13-1B page 4-12 (S2e). */
const TAKE_THE_RIVET_OUT: Step = {
  text: 'Drill the head with a bit of the rivet’s diameter to the base of the head only, break it off, back the sheet and punch the shank out.',
  caution: AIR_OFF_BIT,
};

function setTheRivet(facts: TravellerFacts): Step {
  const rivet = rivetOf(facts);
  return {
    text: rivet ? `Set the rivet, ${rivetCallOut(rivet)}.` : 'Set the rivet as drawn.',
    caution: AIR_OFF_SETS,
  };
}

function openAndRivet(facts: TravellerFacts): Step[] {
  const hole = facts.remedy?.finalHole;
  const to = hole ? `${hole.drill} (${inches(hole.diameter)})` : 'the final size';
  return [
    {
      text: 'Pin the holes on both sides. Clamp a guide bush midway between the two centres, not on either.',
      caution: EYES_AND_EARS,
    },
    {
      text: `Open the hole to ${to} through all layers in one setting, square to the sheet.`,
      caution: AIR_OFF_BIT,
    },
    CLEAN_AND_PRIME,
    setTheRivet(facts),
    gaugeTheHead(rivetOf(facts)?.dash ?? null),
  ];
}

const STEPS: Readonly<Record<FixKind, (facts: TravellerFacts) => Step[]>> = {
  leave: (facts) => [
    { text: 'Drop a pin of the drill’s size through all layers; it must go without force.' },
    setTheRivet(facts),
    gaugeTheHead(rivetOf(facts)?.dash ?? null),
  ],
  cleanUp: openAndRivet,
  nextSize: openAndRivet,
  addRivets: (facts) => [
    { text: 'Fill the bad hole with a rivet that fits it; it counts for nothing.', caution: AIR_OFF_SETS },
    {
      text: 'Lay out a hole in clean metal midway to the neighbour; check pitch and edge before the punch.',
      caution: AIR_OFF_BIT,
    },
    CLEAN_AND_PRIME,
    setTheRivet(facts),
    gaugeTheHead(rivetOf(facts)?.dash ?? null),
  ],
  relocate: (facts) => [
    {
      text: 'Lay out the new hole in clean metal; check pitch and edge before the punch.',
      caution: AIR_OFF_BIT,
    },
    CLEAN_AND_PRIME,
    { text: 'Fill the old hole with a rivet that fits it.', caution: AIR_OFF_SETS },
    setTheRivet(facts),
  ],
  doubler: (facts) => [
    {
      text: 'Cut a doubler of the same alloy and at least the same thickness, with full edge distance on every side.',
      caution: 'Eyes; gloves for the cut edge.',
    },
    { text: 'Match-drill through the good holes, deburr, prime the faying surfaces.', caution: CHROMATE },
    setTheRivet(facts),
    gaugeTheHead(rivetOf(facts)?.dash ?? null),
  ],
  rework: ({ mishap, card }) =>
    mishap === 'badRivet'
      ? [
          TAKE_THE_RIVET_OUT,
          { text: 'Measure the hole both ways. Stop here if it is past the maximum for the rivet.' },
          {
            text: 'Close the layers with clamps and set a new rivet of the same call-out.',
            caution: AIR_OFF_SETS,
          },
          gaugeTheHead(card?.rivet.dash ?? null),
        ]
      : [
          { text: 'Write down what is measured before anything is touched; take a photo.' },
          { text: 'Bring it back to the drawing, a little at a time, and measure after each.' },
          { text: 'Look with a magnifier for cracks; touch up the finish.', caution: CHROMATE },
        ],
  replacePart: () => [
    { text: 'Take the rivets out without enlarging the holes of the parts that stay.', caution: AIR_OFF_BIT },
    { text: 'Match-drill the new part, deburr, prime.', caution: CHROMATE },
    { text: 'Set the rivets as drawn and gauge the shop heads.', caution: AIR_OFF_SETS },
  ],
  defer: () => [
    { text: 'Tag the place so that nobody closes over it; write what it waits for.' },
    { text: 'Do the work before the gate named in the conditions.' },
  ],
  askKitMaker: () => [
    { text: 'Do not drill. Send the kit maker the sheet with drawing, numbers and photos.' },
    { text: 'Write the answer and its reference on this sheet.' },
  ],
};

const SUMMARIES: Readonly<Record<FixKind, string>> = {
  leave: 'Leave it and set the rivet as drawn',
  cleanUp: 'Clean up the hole and set the same rivet',
  nextSize: 'Open the hole and drive the next size',
  addRivets: 'Fill the bad hole and add a rivet in clean metal',
  relocate: 'Drill a new hole in clean metal, fill the old',
  doubler: 'Fit a doubler over the place',
  rework: 'Rework it to the drawing',
  replacePart: 'Replace the part',
  defer: 'Put it off until the gate',
  askKitMaker: 'Ask the kit maker before anything is drilled',
};

function summaryOf({ kind, remedy, card }: TravellerFacts): string {
  const hole = remedy?.finalHole;
  if (kind === 'nextSize' && hole && remedy.rivet)
    return `Open to ${hole.drill} and drive one ${remedy.rivet.alloy ?? ''}${remedy.rivet.dash}`;
  if (kind === 'cleanUp' && hole) return `Clean up to ${hole.drill} and drive the same rivet`;
  if (kind === 'rework' && card === null) return SUMMARIES.rework;
  return SUMMARIES[kind];
}

function conditionsOf({ kind, remedy, card }: TravellerFacts): string[] {
  const opened = kind === 'nextSize' || kind === 'cleanUp';
  const conditions: string[] = [];
  if (opened && remedy?.finalHole)
    conditions.push(`finished hole round, ${remedy.finalHole.drill} drops in and the next drill does not`);
  if (opened) conditions.push('a photo of the clean hole before driving');
  if (kind === 'defer') conditions.push('done before the section is closed');
  // A control surface that gained weight is balanced again before it is hung (engine notes, mass_balance).
  if (card?.flags?.controlSurface) conditions.push('balance the control surface again before it is hung');
  return conditions;
}

/**
 * The operations, conditions and summary that a fix of this kind usually has, numbered 10, 20, 30 …, with cautions at
 * the point of use. Drills, rivet call-out and length come from the remedy of the fit check. Lengths in inch.
 */
export function travellerFor(facts: TravellerFacts): Traveller {
  const steps = STEPS[facts.kind](facts);
  return {
    summary: summaryOf(facts),
    operations: steps.map(({ text, caution }, index) => ({
      no: (index + 1) * 10,
      text,
      caution: caution ?? null,
    })),
    conditions: conditionsOf(facts),
  };
}
