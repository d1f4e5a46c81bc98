import { type Photo, readLength, type Units } from '@rivetside/shared';

export interface AttachedPhoto {
  readonly key: string;
  readonly name: string;
  readonly file: Blob;
  readonly caption: string;
  readonly sent: Photo | null;
}

export interface TypedReading {
  readonly what: string;
  readonly value: string;
  readonly unit: string;
}

/** What the builder types, as typed. */
export interface TypedDone {
  readonly conditionsMet: readonly string[];
  readonly finalDrill: string;
  /** By layer. */
  readonly edges: readonly string[];
  readonly headWidth: string;
  readonly headHeight: string;
  readonly rivetLength: string;
  readonly readings: readonly TypedReading[];
  readonly minutes: string;
  readonly helpers: string;
  readonly note: string;
  readonly photos: readonly AttachedPhoto[];
}

export const BLANK_DONE: TypedDone = {
  conditionsMet: [],
  finalDrill: '',
  edges: [],
  headWidth: '',
  headHeight: '',
  rivetLength: '',
  readings: [],
  minutes: '',
  helpers: '',
  note: '',
  photos: [],
};

/** Not understood stays as typed: the schema then refuses it at its field. */
function inches(typed: string, units: Units): unknown {
  const reading = readLength(typed, units);
  return reading.ok ? reading.inches : typed;
}

function number(typed: string): unknown {
  const text = typed.trim().replace(',', '.');
  return text === '' || Number.isNaN(Number(text)) ? typed : Number(text);
}

const isGiven = (typed: string | undefined): typed is string => (typed ?? '').trim() !== '';

function asDoneOf(typed: TypedDone, units: Units): Record<string, unknown> {
  const { finalDrill, edges, headWidth, headHeight, rivetLength, readings } = typed;
  const hasHead = isGiven(headWidth) || isGiven(headHeight);
  const given = readings.filter(({ what, value }) => isGiven(what) || isGiven(value));
  return {
    ...(isGiven(finalDrill) ? { finalDrill: finalDrill.trim() } : {}),
    ...(edges.some(isGiven) ? { edgeDistances: edges.map((edge) => inches(edge, units)) } : {}),
    ...(hasHead ? { shopHead: { width: inches(headWidth, units), height: inches(headHeight, units) } } : {}),
    ...(isGiven(rivetLength) ? { rivetLengthDash: number(rivetLength.replace(/^-/, '')) } : {}),
    ...(given.length > 0
      ? { readings: given.map(({ what, value, unit }) => ({ what, value: number(value), unit })) }
      : {}),
  };
}

/** The body that is sent, read from what was typed. */
export function readDone(typed: TypedDone, fixId: string, units: Units): unknown {
  const { minutes, conditionsMet, helpers, note, photos } = typed;
  const names = helpers
    .split(',')
    .map((name) => name.trim())
    .filter(Boolean);
  const photoIds = photos.flatMap(({ sent }) => (sent ? [sent.id] : []));
  return {
    fixId,
    asDone: asDoneOf(typed, units),
    minutes: number(minutes),
    conditionsMet: [...conditionsMet],
    ...(names.length > 0 ? { helpers: names } : {}),
    ...(isGiven(note) ? { note: note.trim() } : {}),
    ...(photoIds.length > 0 ? { photoIds } : {}),
  };
}
