import type { DrawnHandle, HoleCard, Units } from '@rivetside/shared';
import { placedFrom } from './fields-of-card';
import type { HoleCardFields, LayerFields } from './hole-card-fields';
import { typedFrom } from './typed-length';

const PATH = /^(layers|neighbours)\.(\d+)(?:\.(edges|bends)\.(\d+))?/;

function movedLayer(layer: LayerFields, list: string | undefined, row: number, card: Moved): LayerFields {
  const { units, layer: moved } = card;
  if (!list)
    return { ...layer, offset: { ...placedFrom(moved.offset ?? {}, units, 'pins'), over: 'centres' } };
  const distance = typedFrom(card.straight?.distance, units, 'caliper');
  if (list === 'edges') {
    const edges = layer.edges.map((edge, at) =>
      at === row ? { ...edge, distance, from: 'centre' as const } : edge,
    );
    return { ...layer, edges };
  }
  return { ...layer, bends: layer.bends.map((bend, at) => (at === row ? { ...bend, distance } : bend)) };
}

interface Moved {
  readonly units: Units;
  readonly layer: HoleCard['layers'][number];
  readonly straight: { readonly distance?: Parameters<typeof typedFrom>[0] } | undefined;
}

/** Writes a point that was moved on the drawing back into its field; `fieldOf` tells the rows of card and form apart. */
export function moveField(
  fields: HoleCardFields,
  move: { readonly handle: DrawnHandle; readonly card: HoleCard; readonly fieldOf: (path: string) => string },
  units: Units,
): HoleCardFields {
  const { handle, card, fieldOf } = move;
  const [, list, indexText, near, cardRow] = PATH.exec(handle.path)!;
  const index = Number(indexText);
  const field = PATH.exec(fieldOf(handle.path))!;
  if (list === 'neighbours') {
    const row = Number(field[2]);
    const placed = placedFrom(card.neighbours![index]!, units, 'caliper');
    const neighbours = fields.neighbours.map((one, at) =>
      at === row ? { ...one, ...placed, from: 'centre' as const } : one,
    );
    return { ...fields, neighbours };
  }
  const layer = card.layers[index]!;
  const straight = near === 'edges' ? layer.edges?.[Number(cardRow)] : layer.bends?.[Number(cardRow)];
  const layers = fields.layers.map((one, at) =>
    at === index ? movedLayer(one, near, Number(field[4]), { units, layer, straight }) : one,
  );
  return { ...fields, layers };
}
