import {
  errorOf,
  halfHole,
  valueOf,
  type HoleCard,
  type HoleCardLayer,
  type LayerBend,
  type LayerEdge,
  type LayerHole,
} from '@rivetside/shared';
import type { BendFields, EdgeFields, LayerFields, OffsetFields, TypedAngle } from './hole-card-fields';
import { placedPoint } from './placed';
import type { Readings } from './readings';
import { asMeasured, clean } from './typed-length';

const RIM_NEEDS_HOLE = 'From the rim, half the hole is added: give the hole’s largest across first.';

/** Half the hole toward a direction, with its error; null where the hole is not known. */
export function halfOf(hole: LayerHole | null | undefined, angle: number | null) {
  if (!hole || hole.shape === 'none') return null;
  const across = hole.shape === 'round' ? hole.diameter : hole.width;
  return { half: clean(halfHole(hole, angle)), u: errorOf(across) / 2 };
}

/** Degrees as typed; null where the side was not told. */
export function readAngle(readings: Readings, key: string, typed: TypedAngle): number | null {
  const text = typed.trim().replace(',', '.').replace(/°$/, '');
  if (!text) return null;
  const degrees = Number(text);
  if (Number.isFinite(degrees)) return degrees;
  readings.refuse(key, 'Give the direction in degrees: 90 is above the hole, 0 to its right.');
  return null;
}

function readHole(readings: Readings, key: string, layer: LayerFields): LayerHole | null {
  if (layer.noHole) return { shape: 'none' };
  const largest = readings.length(`${key}.largest`, layer.largest);
  const smallest = readings.length(`${key}.smallest`, layer.smallest);
  const only = largest ?? smallest;
  if (only === null) return null;
  if (largest === null || smallest === null || valueOf(largest) === valueOf(smallest)) {
    return { shape: 'round', diameter: only };
  }
  const angle = readAngle(readings, `${key}.holeAngle`, layer.holeAngle);
  return { shape: 'oblong', width: smallest, length: largest, angle };
}

interface Within {
  readonly readings: Readings;
  readonly key: string;
  readonly hole: LayerHole | null;
}

function readEdge({ readings, key, hole }: Within, edge: EdgeFields): LayerEdge | null {
  const at = `${key}.distance`;
  const reading = readings.read(at, edge.distance);
  if (reading.kind !== 'read') return null;
  const angle = readAngle(readings, `${key}.angle`, edge.angle);
  const kept = { angle, minimumD: edge.minimumD };
  if (edge.from === 'centre') return { distance: asMeasured(reading.inches, reading.u), ...kept };
  const rim = halfOf(hole, angle);
  if (!rim) {
    readings.refuse(at, RIM_NEEDS_HOLE);
    return null;
  }
  const inches = clean(reading.inches + rim.half);
  readings.note(
    at,
    `${readings.said(reading.inches)} from the rim + ${readings.said(rim.half)} half the hole = ${readings.said(inches)} from the centre`,
  );
  return { distance: asMeasured(inches, clean(Math.hypot(reading.u ?? 0, rim.u)) || null), ...kept };
}

function readBend({ readings, key }: Within, bend: BendFields): LayerBend | null {
  const distance = readings.length(`${key}.distance`, bend.distance);
  if (distance === null) return null;
  return { distance, angle: readAngle(readings, `${key}.angle`, bend.angle), side: bend.side || null };
}

/** An empty list says that nothing is near, none at all that nobody looked. */
function readNear<F, T>(
  { readings, key, hole }: Within,
  near: { list: 'edges' | 'bends'; none: boolean; fields: readonly F[] },
  read: (within: Within, field: F) => T | null,
): T[] | null {
  if (near.none) return [];
  const found = near.fields.flatMap((field, index) => {
    const one = read({ readings, hole, key: `${key}.${near.list}.${index}` }, field);
    return one ? [{ index, one }] : [];
  });
  readings.renumber(
    `${key}.${near.list}`,
    found.map(({ index }) => index),
  );
  return found.length > 0 ? found.map(({ one }) => one) : null;
}

function readOffset(
  readings: Readings,
  key: string,
  offset: OffsetFields,
  holes: readonly (LayerHole | null)[],
): HoleCardLayer['offset'] {
  const point = placedPoint(readings, key, offset, (inches, u) => {
    if (offset.over === 'centres') return { inches, u };
    const [first, own] = holes.map((hole) => halfOf(hole, null));
    if (!first || !own) {
      readings.refuse(key, 'Over pins, half of both holes is taken off: give both holes first.');
      return null;
    }
    const apart = clean(inches - first.half - own.half);
    readings.note(
      key,
      `${readings.said(inches)} over the pins − ${readings.said(clean(first.half + own.half))} half of both = ${readings.said(apart)} between centres`,
    );
    return { inches: apart, u: Math.hypot(u ?? 0, first.u, own.u) || null };
  });
  return point;
}

/** Reads one layer; `first` is the first layer as read, null while it is being read itself. */
export function readLayer(
  readings: Readings,
  key: string,
  layer: LayerFields,
  first: HoleCard['layers'][number] | null,
): HoleCardLayer {
  const hole = readHole(readings, key, layer);
  const within = { readings, key, hole };
  return {
    name: layer.name.trim() || null,
    partId: layer.partId,
    alloy: layer.alloy.trim() || null,
    thickness: readings.length(`${key}.thickness`, layer.thickness),
    hole,
    offset: first
      ? readOffset(readings, `${key}.offset`, layer.offset, [first.hole ?? null, hole])
      : { x: 0, y: 0 },
    edges: readNear(within, { list: 'edges', none: layer.noEdge, fields: layer.edges }, readEdge),
    bends: readNear(within, { list: 'bends', none: layer.noBend, fields: layer.bends }, readBend),
    finish: layer.finish || null,
  };
}
