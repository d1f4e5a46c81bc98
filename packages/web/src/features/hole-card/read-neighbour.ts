import { rivetHole, type LayerHole, type Neighbour } from '@rivetside/shared';
import type { NeighbourFields } from './hole-card-fields';
import { placedPoint } from './placed';
import { halfOf } from './read-layer';
import type { Readings } from './readings';
import { clean } from './typed-length';

interface AtHole {
  readonly hole: LayerHole | null | undefined;
  readonly dash: number;
}

function readDash(readings: Readings, key: string, typed: string): number | null {
  const text = typed.trim().replace(/^[A-Za-z]*-?/, '');
  if (!text) return null;
  if (/^\d{1,2}$/.test(text)) return Number(text);
  readings.refuse(`${key}.dash`, 'Give the size of the next rivet in thirty-seconds: 4 for 1/8 inch.');
  return null;
}

/** Reads a next rivet; null where the row is blank. Rim to rim, half of both holes is added. */
export function readNeighbour(
  readings: Readings,
  key: string,
  fields: NeighbourFields,
  { hole, dash }: AtHole,
): Neighbour | null {
  const size = readDash(readings, key, fields.dash) ?? dash;
  const point = placedPoint(readings, key, fields, (inches, u) => {
    if (fields.from === 'centre') return { inches, u };
    const own = halfOf(hole, null);
    const next = rivetHole(size);
    if (!own || !next) {
      readings.refuse(key, 'Rim to rim, half of both holes is added: give the hole’s largest across first.');
      return null;
    }
    const halves = clean(own.half + next.nominal / 2);
    const pitch = clean(inches + halves);
    readings.note(
      key,
      `${readings.said(inches)} rim to rim + ${readings.said(halves)} half of both holes = ${readings.said(pitch)} centre to centre`,
    );
    return { inches: pitch, u: Math.hypot(u ?? 0, own.u) || null };
  });
  if (!point) return null;
  return { ...point, dash: size, head: fields.head };
}
