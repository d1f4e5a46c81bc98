import { holeCardSchema, type HoleCard, type Units } from '@rivetside/shared';
import { FLAGS, type FlagFields, type HoleCardFields } from './hole-card-fields';
import { readLayer } from './read-layer';
import { readNeighbour } from './read-neighbour';
import { Readings } from './readings';
import { readRivet } from './rivet-words';

export interface HoleCardReading {
  /** Null while nothing was filled in, and while something on it cannot be. */
  readonly card: HoleCard | null;
  /** Nothing at all was filled in: the question goes without a hole card. */
  readonly isBlank: boolean;
  /** By field: what cannot be, in words of the trade. */
  readonly errors: Readonly<Record<string, string>>;
  /** By field: what was reckoned from what was typed. */
  readonly notes: Readonly<Record<string, string>>;
  /** The field that a path of the card came from: `layers.1.edges.0.distance.value` is `layers.1.edges.2.distance`. */
  readonly fieldOf: (path: string) => string;
}

/** Nothing measured and no rivet told: a name or an alloy alone makes no hole card. */
export function isBlankCard(fields: HoleCardFields): boolean {
  const lengths = [
    ...fields.layers.flatMap(({ largest, smallest, offset, edges, bends }) => [
      largest,
      smallest,
      offset.away,
      offset.x,
      offset.y,
      ...[...edges, ...bends].map(({ distance }) => distance),
    ]),
    ...fields.neighbours.flatMap(({ away, x, y }) => [away, x, y]),
    fields.headWidth,
    fields.headHeight,
  ];
  return lengths.every(({ typed }) => !typed.trim()) && !fields.rivet.trim();
}

function flagsFrom(flags: FlagFields): HoleCard['flags'] {
  if (flags.told) return Object.fromEntries(FLAGS.map((flag) => [flag, flags[flag]]));
  return flags.critical ? { critical: true } : null;
}

function countFrom(readings: Readings, key: string, typed: string): number | null {
  const text = typed.trim();
  if (!text) return null;
  if (/^\d{1,5}$/.test(text)) return Number(text);
  readings.refuse(key, 'Give a whole number of rivets.');
  return null;
}

function groupFrom(readings: Readings, { count, oversize, adjacent }: HoleCardFields): HoleCard['group'] {
  const group = {
    count: countFrom(readings, 'group.count', count),
    oversize: countFrom(readings, 'group.oversize', oversize),
    adjacentOversize: countFrom(readings, 'group.adjacentOversize', adjacent),
  };
  return Object.values(group).every((value) => value === null) ? null : group;
}

function shopHeadFrom(readings: Readings, { headWidth, headHeight }: HoleCardFields): HoleCard['shopHead'] {
  const width = readings.length('shopHead.width', headWidth);
  const height = readings.length('shopHead.height', headHeight);
  return width === null && height === null ? null : { width, height };
}

function neighboursFrom(
  readings: Readings,
  fields: HoleCardFields,
  first: HoleCard['layers'][number] | undefined,
  dash: number,
): HoleCard['neighbours'] {
  if (fields.noNeighbour) return [];
  const found = fields.neighbours.flatMap((neighbour, index) => {
    const read = readNeighbour(readings, `neighbours.${index}`, neighbour, { hole: first?.hole, dash });
    return read ? [{ index, read }] : [];
  });
  readings.renumber(
    'neighbours',
    found.map(({ index }) => index),
  );
  return found.length > 0 ? found.map(({ read }) => read) : null;
}

function rivetFrom(readings: Readings, typed: string): HoleCard['rivet'] | null {
  const reading = readRivet(typed);
  if (reading.ok) return reading.rivet;
  readings.refuse('rivet', reading.message);
  return null;
}

function partsFrom(readings: Readings, fields: HoleCardFields, dash: number) {
  const layers: HoleCard['layers'] = [];
  fields.layers.forEach((layer, index) => {
    layers.push(readLayer(readings, `layers.${index}`, layer, layers[0] ?? null));
  });
  return {
    layers,
    neighbours: neighboursFrom(readings, fields, layers[0], dash),
    group: groupFrom(readings, fields),
    flags: flagsFrom(fields.flags),
    access: fields.access || null,
    shopHead: shopHeadFrom(readings, fields),
    drawn: fields.drawn ?? null,
    limits: fields.limits,
  };
}

/** Where the rivet is not told yet, half of a usual one stands for it in sums that are only shown. */
const USUAL_DASH = 4;

/**
 * Reads the form as a hole card. A field that is not understood has its message and is left out, so that drawing and
 * check stand while one number is being typed; a card that cannot be is none.
 */
export function readHoleCard(fields: HoleCardFields, units: Units): HoleCardReading {
  const readings = new Readings(units);
  const { errors, notes } = readings;
  const answer = { errors, notes, fieldOf: (path: string) => readings.fieldOf(path) };
  if (isBlankCard(fields)) return { card: null, isBlank: true, ...answer };
  const rivet = rivetFrom(readings, fields.rivet);
  const parts = partsFrom(readings, fields, rivet?.dash ?? USUAL_DASH);
  if (!rivet) return { card: null, isBlank: false, ...answer };
  const parsed = holeCardSchema.safeParse({ ...parts, rivet });
  for (const { path, message } of parsed.error?.issues ?? []) {
    readings.refuse(readings.fieldOf(path.join('.')), message);
  }
  return { card: parsed.success ? parsed.data : null, isBlank: false, ...answer };
}
