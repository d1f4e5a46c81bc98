import { known, said, valueOf } from './measured.js';
import type { HoleCard, HoleCardLayer, LayerHole } from './card-fields.js';

/** Something on the card that cannot be, at the field where it can be put right. */
export interface CardFault {
  readonly path: (string | number)[];
  readonly message: string;
}

/** Lengths that agree to this are equal; a millimetre typed and turned into inches is never exact. */
const EVEN = 1e-6;
const RADIANS = Math.PI / 180;

/** Half the hole in the direction of `angle`; 0 where there is no hole to speak of. */
export function halfHole(hole: LayerHole | null | undefined, angle: number | null | undefined): number {
  if (!hole || hole.shape === 'none') return 0;
  if (hole.shape === 'round') return valueOf(hole.diameter) / 2;
  const half = valueOf(hole.width) / 2;
  if (!known(angle) || !known(hole.angle)) return half;
  const reach = (valueOf(hole.length) - valueOf(hole.width)) / 2;
  return half + reach * Math.abs(Math.cos((hole.angle - angle) * RADIANS));
}

function oblongFault(layer: HoleCardLayer): CardFault | null {
  const hole = layer.hole;
  if (hole?.shape !== 'oblong') return null;
  const [width, length] = [valueOf(hole.width), valueOf(hole.length)];
  if (length >= width - EVEN) return null;
  const message = `hole length ${said(length)} is less than its width ${said(width)}: turn them round.`;
  return { path: ['hole', 'length'], message };
}

function edgeFault(layer: HoleCardLayer, index: number): CardFault | null {
  const edge = layer.edges![index]!;
  if (!known(edge.distance)) return null;
  const half = halfHole(layer.hole, edge.angle);
  if (valueOf(edge.distance) >= half - EVEN) return null;
  const message = `edge ${said(valueOf(edge.distance))} is less than half the hole (${said(half)}): measure from the centre of the hole.`;
  return { path: ['edges', index, 'distance'], message };
}

function layerFaults(layer: HoleCardLayer): CardFault[] {
  const edges = (layer.edges ?? []).map((_, index) => edgeFault(layer, index));
  return [oblongFault(layer), ...edges].filter((fault) => fault !== null);
}

function neighbourFault(card: HoleCard, index: number): CardFault | null {
  const { x, y, dash } = card.neighbours![index]!;
  if (!known(x) || !known(y)) return null;
  const pitch = Math.hypot(valueOf(x), valueOf(y));
  const least = halfHole(card.layers[0]?.hole, null) + (dash ?? 0) / 64;
  if (pitch >= least - EVEN && pitch > 0) return null;
  const message = `pitch ${said(pitch)} is less than the two half holes together (${said(least)}): measure from centre to centre.`;
  return { path: ['neighbours', index, 'x'], message };
}

function groupFaults(card: HoleCard): CardFault[] {
  const { count, oversize, adjacentOversize } = card.group ?? {};
  const faults: CardFault[] = [];
  if (count === 0) faults.push({ path: ['group', 'count'], message: 'A pattern has at least this rivet.' });
  if (count && known(oversize) && oversize > count) {
    const message = `${oversize} oversize rivets are more than the ${count} of the pattern.`;
    faults.push({ path: ['group', 'oversize'], message });
  }
  if (known(oversize) && known(adjacentOversize) && adjacentOversize > oversize) {
    const message = `${adjacentOversize} adjacent oversize rivets are more than the ${oversize} oversize ones.`;
    faults.push({ path: ['group', 'adjacentOversize'], message });
  }
  return faults;
}

/** What cannot be although every field by itself could: each with the field's path and words of the trade. */
export function cardFaults(card: HoleCard): CardFault[] {
  const ofLayers = card.layers.flatMap((layer, index) =>
    layerFaults(layer).map(({ path, message }) => ({ path: ['layers', index, ...path], message })),
  );
  const ofNeighbours = (card.neighbours ?? []).map((_, index) => neighbourFault(card, index));
  return [...ofLayers, ...ofNeighbours.filter((fault) => fault !== null), ...groupFaults(card)];
}
