import { drillName, formatHole, formatLength } from '../measures/length-words.js';
import type { Units } from '../measures/read-length.js';
import { directionName, layerName, neighbourName } from './bench.js';
import type { HoleCard } from './card-fields.js';
import { gridFor } from './drawing/grid.js';
import { toInches, toPixels, type DrawnHandle, type DrawnShape, type Frame } from './drawing/model.js';
import type { HoleDrawing, LegendItem } from './drawing/model.js';
import { acrossBox, cutAt, holeShape, REACH, sceneOf, type Scene, type Straight } from './drawing/parts.js';
import { dimensionSettings, place, placeIfFree, type DimensionWish, type Sheet } from './drawing/placing.js';
import {
  nameSettings,
  offsetSettings,
  pitchWish,
  ringText,
  ringSettings,
  straightWish,
  type OffsetSetting,
  type Saying,
} from './drawing/settings.js';
import { TOO_CLOSE_WORDS, tooCloseShapes } from './drawing/too-close.js';
import { distance, type Point } from './geometry/enclosing-circle.js';
import type { FitCheck, RemedyKind } from './hole-card.schema.js';
import { valueOf } from './measured.js';

export interface DrawingOptions {
  readonly units?: Units;
  /** Frame for which the labels are placed, pixels. */
  readonly width?: number;
  readonly height?: number;
  /** The remedy to draw; unsaid, the foremost. */
  readonly remedy?: RemedyKind;
  /** Kept while a point is dragged, so that the paper does not move under the hand. */
  readonly frame?: Frame | undefined;
}

const USUAL_FRAME = { width: 620, height: 340 };
const NARROW = 460;
const MARGIN = { x: 26, y: 38 };
const LARGEST_SCALE = 400;
const NEIGHBOURS_DIMENSIONED = 4;
const MARK = 0.022;

/** Everything that must be seen, inch. */
function extentOf(scene: Scene): Point[] {
  const round = ({ x, y }: Point, radius: number) => [
    { x: x - radius, y: y - radius },
    { x: x + radius, y: y + radius },
  ];
  const ring = (scene.ringD * scene.dash) / 32;
  return [
    ...round(scene.seat, ring * 1.05),
    ...scene.centres.flatMap((centre) => round(centre, 0.1)),
    ...scene.straights.map(({ foot }) => foot),
    ...nearNeighbours(scene).flatMap(({ at, radius }) => round(at, radius + MARK)),
  ];
}

function nearNeighbours(scene: Scene): Scene['neighbours'] {
  return scene.neighbours.filter(({ at }) => distance(at, scene.seat) <= REACH);
}

function frameFor(points: readonly Point[], width: number, height: number): Frame {
  const [xs, ys] = [points.map(({ x }) => x), points.map(({ y }) => y)];
  const [left, right, low, high] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const scale = Math.min(
    (width - 2 * MARGIN.x) / (right - left),
    (height - 2 * MARGIN.y) / (high - low),
    LARGEST_SCALE,
  );
  return { width, height, scale, centre: { x: (left + right) / 2, y: (low + high) / 2 } };
}

function frameBox(frame: Frame): { low: Point; high: Point } {
  return {
    low: toInches(frame, { x: 0, y: frame.height }),
    high: toInches(frame, { x: frame.width, y: 0 }),
  };
}

function overlapArea(scene: Scene, { low, high }: { low: Point; high: Point }): DrawnShape[] {
  const whole = [low, { x: high.x, y: low.y }, high, { x: low.x, y: high.y }];
  const edges = scene.straights.filter(({ kind }) => kind === 'edge');
  const points = edges.reduce<Point[]>(cutAt, whole);
  return points.length > 2 ? [{ kind: 'area', role: 'overlap', points }] : [];
}

function crossMark(centre: Point, radius: number, layer: number | null): DrawnShape[] {
  const reach = radius + MARK;
  const across = (x: number, y: number): DrawnShape => ({
    kind: 'line',
    role: 'centreMark',
    layer,
    from: { x: centre.x - x, y: centre.y - y },
    to: { x: centre.x + x, y: centre.y + y },
  });
  return [across(reach, 0), across(0, reach)];
}

function holeShapes(scene: Scene): DrawnShape[] {
  const { remedy, seat } = scene;
  const neighbours = nearNeighbours(scene).flatMap(({ at, radius }): DrawnShape[] => [
    { kind: 'circle', role: 'neighbour', layer: null, centre: at, radius },
    ...crossMark(at, radius, null),
  ]);
  const ring: DrawnShape = {
    kind: 'circle',
    role: 'ring',
    layer: null,
    centre: seat,
    radius: (scene.ringD * scene.dash) / 32,
  };
  const final: DrawnShape[] =
    remedy?.finalHole && remedy.centre
      ? [{ kind: 'circle', role: 'final', layer: null, centre: seat, radius: remedy.finalHole.diameter / 2 }]
      : [];
  const holes = scene.card.layers.flatMap((_, layer) => holeShape(scene, layer) ?? []);
  return [...neighbours, ring, ...final, ...holes];
}

function sheetFor(scene: Scene, frame: Frame, shapes: readonly DrawnShape[]): Sheet {
  const discs = shapes.flatMap((shape) => {
    if (shape.kind === 'slot')
      return [{ centre: toPixels(frame, shape.centre), radius: (shape.length / 2) * frame.scale }];
    if (shape.kind !== 'circle' || shape.role === 'ring') return [];
    return [{ centre: toPixels(frame, shape.centre), radius: shape.radius * frame.scale }];
  });
  const box = frameBox(frame);
  const segments = scene.straights.flatMap(({ foot, angle }) => {
    const line = acrossBox(foot, angle, box);
    return line ? [{ from: toPixels(frame, line.from), to: toPixels(frame, line.to) }] : [];
  });
  return { frame, boxes: [], segments, discs };
}

/** Sets one dimension: its line, its extension lines and its text. */
function dimensionShapes(sheet: Sheet, wish: DimensionWish): DrawnShape[] {
  const { label, segments } = place(sheet, dimensionSettings(sheet, wish));
  const [line, ...extensions] = segments;
  const { role, layer } = wish.named;
  const inch = (point: Point) => toInches(sheet.frame, point);
  return [
    ...extensions.map(({ from, to }): DrawnShape => ({
      kind: 'line',
      role: 'extension',
      layer,
      from: inch(from),
      to: inch(to),
    })),
    { kind: 'dimension', role: role as 'edge', layer, from: inch(line!.from), to: inch(line!.to) },
    label,
  ];
}

function offsetShapes(sheet: Sheet, scene: Scene, layer: number, saying: Saying): DrawnShape[] {
  const away = distance(scene.centres[layer]!, scene.centres[0]!);
  if (away < 1e-6 || !scene.card.layers[layer]!.hole) return [];
  const chosen = place(sheet, offsetSettings(sheet, scene, layer, saying)) as OffsetSetting;
  const points = chosen.points.map((point) => toInches(sheet.frame, point));
  return [{ kind: 'leader', role: 'offset', layer, points }, chosen.label];
}

function straightShapes(sheet: Sheet, scene: Scene, straight: Straight, units: Units): DrawnShape[] {
  const line = acrossBox(straight.foot, straight.angle, frameBox(sheet.frame));
  if (!line) return [];
  const pixels = { from: toPixels(sheet.frame, line.from), to: toPixels(sheet.frame, line.to), units };
  const { label } = place(sheet, nameSettings(sheet, scene, straight, pixels));
  return [{ kind: 'line', role: straight.kind, layer: straight.layer, ...line }, label];
}

/** Edges of two layers that lie in one line have one dimension. */
function straightWishes(scene: Scene, clear: number, saying: Saying): DimensionWish[] {
  const wishes = scene.straights.map((one) => straightWish(scene, one, clear, saying));
  const isSame = (one: DimensionWish, other: DimensionWish) =>
    one.named.text === other.named.text &&
    distance(one.to, other.to) < 1e-3 &&
    distance(one.from, other.from) < 1e-3;
  return wishes.filter((wish, index) => wishes.findIndex((other) => isSame(wish, other)) === index);
}

function dimensioned(sheet: Sheet, scene: Scene, saying: Saying): DrawnShape[] {
  const hole = Math.max(0, ...sheet.discs.map(({ radius }) => radius));
  const clear = hole + 12;
  const pitches = nearNeighbours(scene).slice(0, NEIGHBOURS_DIMENSIONED);
  const ring = ((scene.ringD * scene.dash) / 32) * sheet.frame.scale;
  // The order is that of need: what is placed first has the better place.
  const shapes = [
    ...pitches.flatMap(({ at }) => dimensionShapes(sheet, pitchWish(scene, at, clear, saying))),
    ...straightWishes(scene, clear, saying).flatMap((wish) => dimensionShapes(sheet, wish)),
    ...scene.card.layers.flatMap((_, layer) =>
      layer === 0 ? [] : offsetShapes(sheet, scene, layer, saying),
    ),
    ...scene.straights.flatMap((one) => straightShapes(sheet, scene, one, saying.units)),
  ];
  const ringName = placeIfFree(sheet, ringSettings(sheet, scene, ring));
  return ringName ? [...shapes, ringName.label] : shapes;
}

function legendOf(scene: Scene, units: Units): LegendItem[] {
  const { card, remedy } = scene;
  const holes = card.layers.flatMap(({ hole }, layer): LegendItem[] => {
    if (!hole || hole.shape === 'none') return [];
    const size =
      hole.shape === 'round'
        ? (drillName(valueOf(hole.diameter)) ?? formatLength(valueOf(hole.diameter), units))
        : `${formatLength(valueOf(hole.width), units)} × ${formatLength(valueOf(hole.length), units)}`;
    return [{ role: 'hole', layer, text: `${layerName(card, layer)}, ${size}` }];
  });
  const ring: LegendItem = { role: 'ring', layer: null, text: ringText(scene) };
  if (!remedy?.finalHole || !remedy.centre) return [...holes, ring];
  const words = ['final hole', 'final hole', 'cleans up both'][holes.length] ?? 'cleans up all';
  const text = `${words}, ${formatHole(remedy.finalHole.diameter, units, remedy.finalHole.drill)}`;
  return [...holes, { role: 'final', layer: null, text }, ring];
}

const TOO_CLOSE_LEGEND: LegendItem = { role: 'tooClose', layer: null, text: TOO_CLOSE_WORDS };

function fromOrigin(at: Point): Pick<DrawnHandle, 'at' | 'measured' | 'along'> {
  return { at, measured: Math.hypot(at.x, at.y), along: null };
}

function handlesOf(scene: Scene): DrawnHandle[] {
  const { card } = scene;
  const offsets = card.layers.flatMap((layer, index): DrawnHandle[] => {
    if (index === 0 || !layer.hole) return [];
    const label = `Hole in ${layerName(card, index)}`;
    return [{ path: `layers.${index}.offset`, kind: 'offset', label, ...fromOrigin(scene.centres[index]!) }];
  });
  const neighbours = nearNeighbours(scene).map(({ index, at }): DrawnHandle => {
    const name = neighbourName(card, index);
    const label = `${name[0]!.toUpperCase()}${name.slice(1)}`;
    return { path: `neighbours.${index}`, kind: 'neighbour', label, ...fromOrigin(at) };
  });
  const straights = scene.straights.map(({ layer, index, kind, angle, foot, measured }): DrawnHandle => {
    const list = kind === 'edge' ? 'edges' : 'bends';
    const label = `${kind === 'edge' ? 'Edge' : 'Bend'} of ${layerName(card, layer)}, ${directionName(angle)}`;
    return {
      path: `layers.${layer}.${list}.${index}.distance`,
      kind,
      label,
      at: foot,
      measured,
      along: angle,
    };
  });
  return [...offsets, ...neighbours, ...straights];
}

function beyondWords(scene: Scene, units: Units): string[] {
  const straights = scene.beyond.map(({ kind, layer, measured, angle }) => {
    const name = `${kind} of ${layerName(scene.card, layer)}`;
    return `${name}, ${directionName(angle)}: ${formatLength(measured, units)}`;
  });
  const near = nearNeighbours(scene);
  const far = scene.neighbours.filter((one) => !near.includes(one));
  return [
    ...straights,
    ...far.map(
      ({ index, at }) =>
        `${neighbourName(scene.card, index)}: ${formatLength(distance(at, scene.seat), units)}`,
    ),
  ];
}

/**
 * The hole card drawn to scale: sheet edges, bends, neighbours, each layer's hole, what the foremost remedy would drill,
 * the ring of least edge distance, dimensions and their labels, placed so that they keep clear of one another. Pure;
 * inches in the frame of the card; the page and the printed sheet draw the same model.
 */
export function holeDrawing(
  card: HoleCard,
  check: FitCheck | null = null,
  options: DrawingOptions = {},
): HoleDrawing {
  const { units = 'inch', width = USUAL_FRAME.width, height = USUAL_FRAME.height } = options;
  const scene = sceneOf(card, check, options.remedy);
  const frame = options.frame ?? frameFor(extentOf(scene), width, height);
  const holes = holeShapes(scene);
  const sheet = sheetFor(scene, frame, holes);
  const tooClose = tooCloseShapes(scene, frameBox(frame));
  const [grid, gridText] = gridFor(frame, units);
  return {
    frame,
    grid,
    gridText,
    shapes: [
      ...overlapArea(scene, frameBox(frame)),
      ...tooClose,
      ...holes,
      ...dimensioned(sheet, scene, { units, isNarrow: width < NARROW }),
    ],
    legend: [...legendOf(scene, units), ...(tooClose.length > 0 ? [TOO_CLOSE_LEGEND] : [])],
    handles: handlesOf(scene),
    beyond: beyondWords(scene, units),
  };
}
