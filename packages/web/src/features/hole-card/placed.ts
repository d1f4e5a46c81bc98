import type { Measured } from '@rivetside/shared';
import type { Placed, PlacedBy } from './hole-card-fields';
import type { Readings } from './readings';
import { asMeasured } from './typed-length';

export const PLACED_WORDS: Readonly<Record<PlacedBy, string>> = {
  right: 'right, along the row',
  above: 'up, square to row',
  left: 'left, along the row',
  below: 'down, square to row',
  xy: 'along and across',
};

const TOWARD: Readonly<Record<Exclude<PlacedBy, 'xy'>, readonly [number, number]>> = {
  right: [1, 0],
  above: [0, 1],
  left: [-1, 0],
  below: [0, -1],
};

type Reckon = (inches: number, u: number | null) => { inches: number; u: number | null } | null;

/** Where a thing lies from the first hole; null where it was not measured. A single distance passes through `reckon`. */
export function placedPoint(
  readings: Readings,
  key: string,
  placed: Placed,
  reckon: Reckon,
): { x: Measured | null; y: Measured | null } | null {
  if (placed.by === 'xy') {
    const x = readings.length(key, placed.x);
    const y = readings.length(key, placed.y);
    return x === null && y === null ? null : { x, y };
  }
  const reading = readings.read(key, placed.away);
  if (reading.kind !== 'read') return null;
  const away = reckon(reading.inches, reading.u);
  if (!away) return null;
  const [x, y] = TOWARD[placed.by];
  const measured = (sign: number) => (sign === 0 ? 0 : asMeasured(sign * away.inches + 0, away.u));
  return { x: measured(x), y: measured(y) };
}
