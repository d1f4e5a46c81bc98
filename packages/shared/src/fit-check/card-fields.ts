import { z } from 'zod';
import { measured } from './measured.js';

export const LAYERS_MAX = 5;
export const EDGES_MAX = 8;
export const NEIGHBOURS_MAX = 24;

/** Degrees from +x, counter-clockwise. */
const angleSchema = z
  .number('Give the direction in degrees, counter-clockwise from along the row.')
  .min(-360, 'A direction lies between -360 and 360 degrees.')
  .max(360, 'A direction lies between -360 and 360 degrees.')
  .nullish();

const holeDiameter = (what: string) => measured({ what, longest: 2 });

/** What is in the layer now: a round hole, an oblong one, or none yet. */
export const layerHoleSchema = z.discriminatedUnion(
  'shape',
  [
    z.strictObject({ shape: z.literal('round'), diameter: holeDiameter('hole diameter') }),
    z.strictObject({
      shape: z.literal('oblong'),
      width: holeDiameter('hole width'),
      length: holeDiameter('hole length'),
      angle: angleSchema,
    }),
    z.strictObject({ shape: z.literal('none') }),
  ],
  'A hole is round, oblong or none.',
);
export type LayerHole = z.infer<typeof layerHoleSchema>;

export const EDGE_LIMIT_LOWEST_D = 0.5;
export const EDGE_LIMIT_HIGHEST_D = 10;
const limitInD = (what: string) =>
  z
    .number(`Give the ${what} in rivet diameters.`)
    .min(EDGE_LIMIT_LOWEST_D, `A ${what} under ${EDGE_LIMIT_LOWEST_D} D cannot be.`)
    .max(EDGE_LIMIT_HIGHEST_D, `A ${what} over ${EDGE_LIMIT_HIGHEST_D} D cannot be.`)
    .nullish();

export const layerEdgeSchema = z.strictObject({
  distance: measured({ what: 'edge' }).nullish(),
  angle: angleSchema,
  /** The kit maker's own limit for this edge. */
  minimumD: limitInD('edge limit'),
});
export type LayerEdge = z.infer<typeof layerEdgeSchema>;

export const BEND_SIDES = ['head', 'shop'] as const;
export const layerBendSchema = z.strictObject({
  distance: measured({ what: 'bend', zero: true }).nullish(),
  angle: angleSchema,
  /** Which head lies on the side of the bend; unsaid, the wider one is taken. */
  side: z.enum(BEND_SIDES).nullish(),
});
export type LayerBend = z.infer<typeof layerBendSchema>;

export const FINISHES = ['bare', 'primed', 'dimpled', 'countersunk'] as const;

const offsetPart = measured({ what: 'offset', signed: true, longest: 2 });
export const holeCardLayerSchema = z.strictObject({
  name: z.string().trim().max(120, 'Keep the name of the layer under 120 characters.').nullish(),
  partId: z.string().max(100).nullish(),
  alloy: z.string().trim().max(60, 'Keep the alloy under 60 characters.').nullish(),
  thickness: measured({ what: 'thickness', longest: 2 }).nullish(),
  hole: layerHoleSchema.nullish(),
  offset: z.strictObject({ x: offsetPart.nullish(), y: offsetPart.nullish() }).nullish(),
  edges: z.array(layerEdgeSchema).max(EDGES_MAX, `At most ${EDGES_MAX} edges in one layer.`).nullish(),
  bends: z.array(layerBendSchema).max(EDGES_MAX, `At most ${EDGES_MAX} bends in one layer.`).nullish(),
  finish: z.enum(FINISHES, 'A layer is bare, primed, dimpled or countersunk.').nullish(),
});
export type HoleCardLayer = z.infer<typeof holeCardLayerSchema>;

export const HEADS = ['universal', 'flush'] as const;
export const rivetHeadSchema = z.enum(HEADS, 'The rivet head is universal or flush.');
export type RivetHead = z.infer<typeof rivetHeadSchema>;

export const DASH_SMALLEST = 2;
export const DASH_LARGEST = 12;
/** Rivet diameter in 1/32 inch. */
const dashSchema = z
  .number('Give the rivet size as its dash number: 4 for 1/8 inch.')
  .int('A rivet size is a whole number of 1/32 inch: 4 for 1/8 inch.')
  .min(DASH_SMALLEST, `Rivet sizes run from ${DASH_SMALLEST} to ${DASH_LARGEST} thirty-seconds.`)
  .max(DASH_LARGEST, `Rivet sizes run from ${DASH_SMALLEST} to ${DASH_LARGEST} thirty-seconds.`);

const place = (what: string) => measured({ what, signed: true });
export const neighbourSchema = z.strictObject({
  x: place('distance along the row').nullish(),
  y: place('distance across the row').nullish(),
  dash: dashSchema.nullish(),
  /** Unsaid, the head of the rivet as drawn. */
  head: rivetHeadSchema.nullish(),
});
export type Neighbour = z.infer<typeof neighbourSchema>;

const rivetCount = z
  .number('Give a number of rivets.')
  .int('Give a whole number of rivets.')
  .min(0, 'A number of rivets is not less than nothing.')
  .max(10_000, 'More than 10,000 rivets is no pattern.')
  .nullish();

export const ACCESSES = ['both', 'squeezer', 'oneSide'] as const;

/** The kit maker's own limits; they replace the published ones and are named by `source`. Ratios in D, holes in inch. */
export const holeCardLimitsSchema = z.strictObject({
  edgeMinimumD: limitInD('edge limit'),
  pitchMinimumD: limitInD('pitch limit'),
  /** Largest hole for the rivet as drawn. */
  holeMaximum: holeDiameterLimit(),
  shopHeadMinimumWidthD: limitInD('shop head width limit'),
  shopHeadMinimumHeightD: z.number('Give the shop head height limit in D.').positive().max(3).nullish(),
  source: z.string().trim().min(1, 'Say where the limit stands.').max(200),
});
export type HoleCardLimits = z.infer<typeof holeCardLimitsSchema>;

function holeDiameterLimit() {
  return z
    .number('Give the largest hole in inches.')
    .positive('The largest hole is more than nothing.')
    .max(2, 'A largest hole over 2 in cannot be: is it in millimetres?')
    .nullish();
}

const flag = z.boolean('Say yes or no.').nullish();

export const HOLE_CARD_FIELDS = z.strictObject({
  layers: z
    .array(holeCardLayerSchema, 'Give the layers of the stack.')
    .min(1, 'Give at least one layer of the stack.')
    .max(LAYERS_MAX, `At most ${LAYERS_MAX} layers in one stack.`),
  rivet: z.strictObject(
    {
      head: rivetHeadSchema.nullish(),
      alloy: z.string().trim().max(20, 'Keep the rivet alloy under 20 characters.').nullish(),
      dash: dashSchema,
    },
    'Give the rivet as drawn.',
  ),
  neighbours: z
    .array(neighbourSchema)
    .max(NEIGHBOURS_MAX, `At most ${NEIGHBOURS_MAX} neighbours: the nearest decide.`)
    .nullish(),
  group: z.strictObject({ count: rivetCount, oversize: rivetCount, adjacentOversize: rivetCount }).nullish(),
  flags: z
    .strictObject({
      critical: flag,
      controlSurface: flag,
      fuelWet: flag,
      pressurised: flag,
      crack: flag,
      hingeOrEngineMount: flag,
    })
    .nullish(),
  access: z.enum(ACCESSES, 'Access is from both sides, by squeezer only, or from one side only.').nullish(),
  /** The driven head where the trouble is a rivet already set. */
  shopHead: z
    .strictObject({
      width: measured({ what: 'shop head width', longest: 3 }).nullish(),
      height: measured({ what: 'shop head height', longest: 3 }).nullish(),
    })
    .nullish(),
  /** The pitch and edge distance on the drawing, inch: what a new part would have. */
  drawn: z
    .strictObject({
      pitch: measured({ what: 'pitch' }).nullish(),
      edge: measured({ what: 'edge' }).nullish(),
    })
    .nullish(),
  limits: holeCardLimitsSchema.nullish(),
});

export type HoleCard = z.infer<typeof HOLE_CARD_FIELDS>;
