import {
  known,
  valueOf,
  type HoleCard,
  type HoleCardLayer,
  type Neighbour,
  type Units,
} from '@rivetside/shared';
import {
  blankEdge,
  blankHoleCard,
  blankLayer,
  blankOffset,
  FLAGS,
  flagsOfPlace,
  type BendFields,
  type EdgeFields,
  type FlagFields,
  type HoleCardFields,
  type LayerFields,
  type NeighbourFields,
  type OffsetFields,
  type Placed,
  type PlacedBy,
} from './hole-card-fields';
import type { Tool } from './measuring-tools';
import { rivetTyped } from './rivet-words';
import { typedFrom } from './typed-length';

const WAYS: readonly (readonly [PlacedBy, 'x' | 'y', 1 | -1])[] = [
  ['right', 'x', 1],
  ['left', 'x', -1],
  ['above', 'y', 1],
  ['below', 'y', -1],
];

/** One distance where it lies along or across the row, else two. */
export function placedFrom({ x, y }: Pick<Neighbour, 'x' | 'y'>, units: Units, usual: Tool): Placed {
  const both = { x: typedFrom(x, units, usual), y: typedFrom(y, units, usual) };
  const none = typedFrom(null, units, usual);
  if (!known(x) || !known(y)) return { by: 'xy', away: none, ...both };
  const other = (axis: 'x' | 'y') => valueOf(axis === 'x' ? y : x);
  const way = WAYS.find(([, axis, sign]) => other(axis) === 0 && sign * valueOf(axis === 'x' ? x : y) >= 0);
  if (!way) return { by: 'xy', away: none, ...both };
  const [by, axis] = way;
  const along = axis === 'x' ? x : y;
  const away = typeof along === 'number' ? Math.abs(along) : { ...along, value: Math.abs(along.value) };
  return { by, away: typedFrom(away, units, usual), x: none, y: none };
}

function angleTyped(angle: number | null | undefined): string {
  return known(angle) ? String(((angle % 360) + 360) % 360) : '';
}

function edgesFrom({ edges }: HoleCardLayer, units: Units): EdgeFields[] {
  const found = (edges ?? []).map(({ distance, angle, minimumD }): EdgeFields => ({
    distance: typedFrom(distance, units, 'caliper'),
    from: 'centre',
    angle: angleTyped(angle),
    minimumD: minimumD ?? null,
  }));
  return found.length > 0 ? found : [blankEdge(units)];
}

function bendsFrom({ bends }: HoleCardLayer, units: Units): BendFields[] {
  return (bends ?? []).map(({ distance, angle, side }) => ({
    distance: typedFrom(distance, units, 'caliper'),
    angle: angleTyped(angle),
    side: side ?? '',
  }));
}

function holeFrom({ hole }: HoleCardLayer, units: Units): Partial<LayerFields> {
  if (!hole) return {};
  if (hole.shape === 'none') return { noHole: true };
  if (hole.shape === 'round') {
    const across = typedFrom(hole.diameter, units, 'pins');
    return { largest: across, smallest: across };
  }
  return {
    largest: typedFrom(hole.length, units, 'pins'),
    smallest: typedFrom(hole.width, units, 'pins'),
    holeAngle: angleTyped(hole.angle),
  };
}

function offsetFrom({ offset }: HoleCardLayer, index: number, units: Units): OffsetFields {
  const isPlaced = index > 0 && known(offset) && (known(offset.x) || known(offset.y));
  return isPlaced ? { ...placedFrom(offset, units, 'pins'), over: 'centres' } : blankOffset(units);
}

function layerFrom(layer: HoleCardLayer, index: number, units: Units): LayerFields {
  return {
    ...blankLayer(units),
    ...holeFrom(layer, units),
    name: layer.name ?? '',
    partId: layer.partId ?? null,
    alloy: layer.alloy ?? '',
    thickness: typedFrom(layer.thickness, units, 'none'),
    offset: offsetFrom(layer, index, units),
    edges: edgesFrom(layer, units),
    noEdge: layer.edges?.length === 0,
    bends: bendsFrom(layer, units),
    noBend: layer.bends?.length === 0,
    finish: layer.finish ?? '',
  };
}

function neighbourFrom(neighbour: Neighbour, units: Units): NeighbourFields {
  return {
    ...placedFrom(neighbour, units, 'caliper'),
    from: 'centre',
    dash: known(neighbour.dash) ? String(neighbour.dash) : '',
    head: neighbour.head ?? null,
  };
}

function flagsFrom(flags: HoleCard['flags']): FlagFields {
  if (!flags) return flagsOfPlace(false);
  const told = FLAGS.some((flag) => flag !== 'critical' && known(flags[flag])) || flags.critical === false;
  const marked = Object.fromEntries(FLAGS.map((flag) => [flag, flags[flag] === true]));
  return { ...(marked as Omit<FlagFields, 'told'>), told };
}

const countTyped = (count: number | null | undefined) => (known(count) ? String(count) : '');

function countsFrom(group: HoleCard['group']): Pick<HoleCardFields, 'count' | 'oversize' | 'adjacent'> {
  const { count, oversize, adjacentOversize } = group ?? {};
  return {
    count: countTyped(count),
    oversize: countTyped(oversize),
    adjacent: countTyped(adjacentOversize),
  };
}

function neighboursFrom(
  { neighbours }: HoleCard,
  units: Units,
): Pick<HoleCardFields, 'neighbours' | 'noNeighbour'> {
  const found = (neighbours ?? []).map((neighbour) => neighbourFrom(neighbour, units));
  return {
    neighbours: found.length > 0 ? found : blankHoleCard(units).neighbours,
    noNeighbour: neighbours?.length === 0,
  };
}

/** The form for a card that is there already: read again unchanged it is the same card. */
export function fieldsOfCard(card: HoleCard, units: Units): HoleCardFields {
  return {
    layers: card.layers.map((layer, index) => layerFrom(layer, index, units)),
    rivet: rivetTyped(card.rivet),
    ...neighboursFrom(card, units),
    ...countsFrom(card.group),
    flags: flagsFrom(card.flags),
    access: card.access ?? '',
    headWidth: typedFrom(card.shopHead?.width, units, 'caliper'),
    headHeight: typedFrom(card.shopHead?.height, units, 'caliper'),
    drawn: card.drawn ?? null,
    limits: card.limits ?? null,
  };
}
