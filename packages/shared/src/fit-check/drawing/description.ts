import { formatAgainst, formatHole, formatLength, formatWithError } from '../../measures/length-words.js';
import type { Units } from '../../measures/read-length.js';
import { directionName, layerName, neighbourName, rivetName } from '../bench.js';
import type { HoleCard, HoleCardLayer, LayerHole } from '../card-fields.js';
import { remedyName, VERDICT_WORDS } from '../fit-check-words.js';
import { remedyHeadline } from '../headline.js';
import type { CheckLine, FitCheck, RemedyCheck } from '../hole-card.schema.js';
import { errorOf, known, valueOf, type Measured } from '../measured.js';
import { ringOf, sceneOf } from './parts.js';

const NOT_MEASURED = 'not measured';

function length(measured: Measured | null | undefined, units: Units): string {
  return known(measured) ? formatWithError(valueOf(measured), errorOf(measured), units) : NOT_MEASURED;
}

function sideOf(angle: number | null | undefined): string {
  return known(angle) ? directionName(angle) : 'side not told';
}

function holeWords(hole: LayerHole | null | undefined, units: Units): string {
  if (!hole) return `hole ${NOT_MEASURED}`;
  if (hole.shape === 'none') return 'no hole yet';
  if (hole.shape === 'round') return `round hole ${formatHole(valueOf(hole.diameter), units)}`;
  const size = `${length(hole.width, units)} by ${length(hole.length, units)}`;
  return `oblong hole ${size}, long way ${sideOf(hole.angle)}`;
}

/** "above the first hole", "to the left of the first hole". */
function fromFirst(angle: number): string {
  const direction = directionName(angle);
  if (direction === 'left' || direction === 'right') return `to the ${direction} of the first hole`;
  return `${direction.replace(/^(above|below) /, '$1 and to the ').replace(/(left|right)$/, '$1 of')} the first hole`;
}

function offsetWords(layer: HoleCardLayer, index: number, units: Units): string[] {
  if (index === 0) return ['the first hole, from which the others are placed'];
  const { x, y } = layer.offset ?? {};
  if (!known(x) || !known(y))
    return layer.hole?.shape === 'none' ? [] : [`place of the hole ${NOT_MEASURED}`];
  const away = Math.hypot(valueOf(x), valueOf(y));
  if (away < 1e-9) return ['hole in line with the first'];
  const angle = (Math.atan2(valueOf(y), valueOf(x)) * 180) / Math.PI;
  const error = Math.hypot(errorOf(x), errorOf(y));
  return [`hole ${formatWithError(away, error, units)} ${fromFirst(angle)}`];
}

function nearWords(layer: HoleCardLayer, units: Units): string[] {
  const of = (kind: 'edge' | 'bend', list: HoleCardLayer['edges'] | HoleCardLayer['bends']) => {
    if (!list) return [`${kind} ${NOT_MEASURED}`];
    if (list.length === 0) return [`no ${kind} near`];
    return list.map(
      ({ distance, angle }) => `${kind} ${sideOf(angle)} ${length(distance, units)} from its hole`,
    );
  };
  return [...of('edge', layer.edges), ...of('bend', layer.bends)];
}

function layerWords(card: HoleCard, index: number, units: Units): string {
  const layer = card.layers[index]!;
  const stuff = [layer.alloy, `thickness ${length(layer.thickness, units)}`, layer.finish].filter(known);
  const parts = [
    ...stuff,
    holeWords(layer.hole, units),
    ...offsetWords(layer, index, units),
    ...nearWords(layer, units),
  ];
  return `Layer ${index + 1}, ${layerName(card, index)}: ${parts.join('; ')}.`;
}

function neighbourWords(card: HoleCard, units: Units): string[] {
  if (!card.neighbours) return [`Next rivets ${NOT_MEASURED}.`];
  if (card.neighbours.length === 0) return ['No rivet near.'];
  return card.neighbours.map(({ x, y, dash }, index) => {
    const placed = known(x) && known(y);
    const pitch = placed
      ? `${formatLength(Math.hypot(valueOf(x), valueOf(y)), units)} centre to centre`
      : NOT_MEASURED;
    const name = neighbourName(card, index);
    return `${name[0]!.toUpperCase()}${name.slice(1)}: ${pitch}${known(dash) ? `, ${rivetName(card, dash)}` : ''}.`;
  });
}

/** A line in D, with the length that it stands for. */
function ratioWords(card: HoleCard, dash: number, line: CheckLine, units: Units): string {
  const { id, label, value, limit, error } = line;
  if (value === null) return `${label} ${NOT_MEASURED}`;
  const [family, index] = id.split(':');
  const other = family === 'pitch' ? (card.neighbours?.[Number(index)]?.dash ?? 0) : 0;
  const inches = (value * Math.max(dash, other)) / 32;
  const about = error !== null && error >= 0.005 ? ` ± ${error.toFixed(2)}` : '';
  return `${label} ${formatLength(inches, units)}, ${formatAgainst(value, limit, 2)}${about} D`;
}

function centreWords({ centre }: RemedyCheck, units: Units): string[] {
  if (!centre) return [];
  const away = Math.hypot(centre.x, centre.y);
  if (away < 1e-6) return ['centred on the first hole'];
  const angle = (Math.atan2(centre.y, centre.x) * 180) / Math.PI;
  return [`centred ${formatLength(away, units)} ${fromFirst(angle)}`];
}

function remedyWords(card: HoleCard, remedy: RemedyCheck, units: Units): string {
  const { text, verdict } = remedyHeadline(remedy, units);
  const hole = remedy.finalHole
    ? [`final hole ${formatHole(remedy.finalHole.diameter, units, remedy.finalHole.drill)}`]
    : [];
  const dash = remedy.rivet?.dash ?? card.rivet.dash;
  const ratios = remedy.checks
    .filter(({ unit, id }) => unit === 'D' && /^(edge|corner|pitch|bend):/.test(id))
    .map((line) => ratioWords(card, dash, line, units));
  const parts = [
    ...hole,
    ...centreWords(remedy, units),
    ...ratios,
    `${VERDICT_WORDS[verdict]}${text === VERDICT_WORDS[verdict] ? '' : `: ${text}`}`,
  ];
  return `${remedyName(remedy)}: ${parts.join('; ')}.`;
}

function rivetWords(card: HoleCard, units: Units): string {
  const { head, dash } = card.rivet;
  const diameter = formatLength(dash / 32, units);
  return `Rivet as drawn: ${head ?? 'head not told'}, ${rivetName(card, dash)}, ${diameter} across; ring of ${ringOf(card)} D.`;
}

/** The drawing in words, a sentence a thing: every dimension that it shows, and what is not measured. For readers who do not see it. */
export function describeHoleDrawing(card: HoleCard, check: FitCheck | null, units: Units = 'inch'): string[] {
  const { remedy } = sceneOf(card, check);
  return [
    `Lengths in ${units === 'mm' ? 'millimetres' : 'inches'}; left and right along the row, above and below across it.`,
    rivetWords(card, units),
    ...card.layers.map((_, index) => layerWords(card, index, units)),
    ...neighbourWords(card, units),
    ...(remedy ? [remedyWords(card, remedy, units)] : []),
  ];
}
