import { SHEET_GAUGES } from '../trade/sheets.js';
import { lacking, layBench, layerName, type Bench } from './bench.js';
import type { HoleCard } from './card-fields.js';
import { holeCardSchema, type FitCheck } from './hole-card.schema.js';
import { errorOf, known, said, valueOf, type Measured } from './measured.js';
import { askKitMakerRemedy } from './remedies/ask-kit-maker.js';
import { cleanUpRemedy } from './remedies/clean-up.js';
import { leaveRemedy } from './remedies/leave.js';
import { nextSizeRemedy } from './remedies/next-size.js';
import { replacePartRemedy } from './remedies/replace-part.js';
import { stopAndAsk } from './stop-and-ask.js';

/** Goes up with every change that can change a line of any check; it is frozen beside each question and fix. */
export const ENGINE_VERSION = '1.0';

/** Sheets are rolled to a few thousandths of a gauge; further off, the number wants confirming. Inch. */
const GAUGE_NEARNESS = 0.0015;

function lengthsOf(card: HoleCard): Measured[] {
  const layers = card.layers.flatMap(({ thickness, hole, offset, edges, bends }) => [
    thickness,
    ...(hole?.shape === 'round' ? [hole.diameter] : []),
    ...(hole?.shape === 'oblong' ? [hole.width, hole.length] : []),
    offset?.x,
    offset?.y,
    ...[...(edges ?? []), ...(bends ?? [])].map(({ distance }) => distance),
  ]);
  const neighbours = (card.neighbours ?? []).flatMap(({ x, y }) => [x, y]);
  return [...layers, ...neighbours].filter(known);
}

function noteAssumptions(bench: Bench): void {
  const { card, assumptions, limits } = bench;
  const lengths = lengthsOf(card);
  if (lengths.length > 0 && lengths.every((length) => errorOf(length) === 0)) {
    assumptions.add('No measuring error was given: it counts as zero.');
  }
  card.layers.forEach(({ thickness }, layer) => {
    if (!known(thickness)) return;
    const t = valueOf(thickness);
    const listed = SHEET_GAUGES.some((gauge) => Math.abs(gauge - t) <= GAUGE_NEARNESS);
    if (!listed) assumptions.add(`${said(t)} of ${layerName(card, layer)} is no listed gauge: confirm it.`);
  });
  if (limits) assumptions.add(`The kit maker’s limits stand above the published ones: ${limits.source}.`);
  if (card.access === 'oneSide') {
    assumptions.add(
      'From one side only no solid rivet can be driven; the numbers are those of a solid rivet.',
    );
  }
}

function noteMissing(bench: Bench): void {
  const { flags, access } = bench.card;
  if (!flags)
    lacking(bench, 'whether this is critical, a control surface, wet with fuel, pressurised, or cracked');
  if (!access) lacking(bench, 'whether both sides can be reached');
}

function validCard(input: HoleCard): HoleCard {
  const parsed = holeCardSchema.safeParse(input);
  if (parsed.success) return parsed.data;
  const [issue] = parsed.error.issues;
  throw new RangeError(`${issue!.path.join('.') || 'holeCard'}: ${issue!.message}`);
}

/**
 * Checks a hole card against published practice, remedy by remedy in the order in which the trade prefers them. Inch,
 * degrees, pound-force; the kit maker's own limits replace the published ones. What was not measured is *unknown* and
 * is named; nothing is ever called more than inside published numbers. Sources stand on every line. Pure: the page
 * and the server get the same result. Throws RangeError naming the field of a card that cannot be.
 *
 * @example fitCheck({ layers: [{ thickness: 0.04 }, { thickness: 0.063 }], rivet: { head: 'universal', alloy: 'AD', dash: 4 } })
 */
export function fitCheck(holeCard: HoleCard): FitCheck {
  const card = validCard(holeCard);
  const bench = layBench(card);
  const remedies = [
    leaveRemedy(bench),
    cleanUpRemedy(bench),
    nextSizeRemedy(bench),
    replacePartRemedy(bench),
    askKitMakerRemedy(),
  ];
  noteAssumptions(bench);
  noteMissing(bench);
  return {
    engineVersion: ENGINE_VERSION,
    assumptions: [...bench.assumptions],
    missing: [...bench.missing],
    stopAndAsk: stopAndAsk(card, remedies),
    remedies,
  };
}
