import type { Point } from '../geometry/enclosing-circle.js';

/** Which part of the drawing a shape is; the page gives each its line and colour, and never colour alone. */
export type LineRole = 'edge' | 'bend' | 'centreMark' | 'extension';
export type LabelRole = 'edgeName' | 'bendName' | 'edge' | 'bend' | 'pitch' | 'offset' | 'ring';

interface OfLayer {
  /** Index of the layer that it belongs to; null for what belongs to none. */
  readonly layer: number | null;
}

export interface DrawnArea {
  readonly kind: 'area';
  /** Where every layer lies over the others; where a line may lie within its measuring error. */
  readonly role: 'overlap' | 'tooClose';
  readonly points: readonly Point[];
}
export interface DrawnLine extends OfLayer {
  readonly kind: 'line';
  readonly role: LineRole;
  readonly from: Point;
  readonly to: Point;
}
export interface DrawnCircle extends OfLayer {
  readonly kind: 'circle';
  readonly role: 'hole' | 'neighbour' | 'final' | 'ring' | 'tooClose';
  readonly centre: Point;
  readonly radius: number;
}
export interface DrawnSlot extends OfLayer {
  readonly kind: 'slot';
  readonly role: 'hole';
  readonly centre: Point;
  readonly width: number;
  readonly length: number;
  /** Degrees, counter-clockwise from the row. */
  readonly angle: number;
}
export interface DrawnDimension extends OfLayer {
  readonly kind: 'dimension';
  readonly role: 'edge' | 'bend' | 'pitch';
  readonly from: Point;
  readonly to: Point;
}
export interface DrawnLeader extends OfLayer {
  readonly kind: 'leader';
  readonly role: 'offset';
  readonly points: readonly Point[];
}
export interface DrawnLabel extends OfLayer {
  readonly kind: 'label';
  readonly role: LabelRole;
  /** Start, middle or end of the baseline. */
  readonly at: Point;
  readonly anchor: 'start' | 'middle' | 'end';
  readonly text: string;
  /** Dimensions stand in the monospaced face. */
  readonly isMono: boolean;
}
export type DrawnShape =
  DrawnArea | DrawnLine | DrawnCircle | DrawnSlot | DrawnDimension | DrawnLeader | DrawnLabel;

/** A point that may be dragged or moved by keys: the field of the card that it stands for. */
export interface DrawnHandle {
  readonly path: string;
  readonly kind: 'offset' | 'neighbour' | 'edge' | 'bend';
  readonly label: string;
  readonly at: Point;
  /** The length that it stands for, inch: edges and bends from their layer's own hole, the others from the first. */
  readonly measured: number;
  /** Edges and bends move along this direction alone, degrees; the others freely. */
  readonly along: number | null;
}

export interface LegendItem {
  readonly role: 'hole' | 'final' | 'ring' | 'tooClose';
  readonly layer: number | null;
  readonly text: string;
}

/** The frame for which the labels were placed: pixels, and how inches fall into it. */
export interface Frame {
  readonly width: number;
  readonly height: number;
  /** Pixels per inch. */
  readonly scale: number;
  /** The point of the card in the middle of the frame, inch. */
  readonly centre: Point;
}

/** Everything in inches in the frame of the card: x along the row, y across it and upward. */
export interface HoleDrawing {
  readonly frame: Frame;
  /** Spacing of the grid, inch. */
  readonly grid: number;
  readonly gridText: string;
  readonly shapes: readonly DrawnShape[];
  readonly legend: readonly LegendItem[];
  readonly handles: readonly DrawnHandle[];
  /** What lies too far off to be drawn to this scale, in words. */
  readonly beyond: readonly string[];
}

/** Type sizes, pixels, for which the labels were placed. */
export const MONO_SIZE = 14;
export const TEXT_SIZE = 12.5;
const MONO_ADVANCE = 0.6;
const TEXT_ADVANCE = 0.54;

/** A point of the card in the pixels of the frame, y downward. */
export function toPixels(frame: Frame, { x, y }: Point): Point {
  return {
    x: frame.width / 2 + (x - frame.centre.x) * frame.scale,
    y: frame.height / 2 - (y - frame.centre.y) * frame.scale,
  };
}

/** A point of the frame in inches of the card. */
export function toInches(frame: Frame, { x, y }: Point): Point {
  return {
    x: frame.centre.x + (x - frame.width / 2) / frame.scale,
    y: frame.centre.y - (y - frame.height / 2) / frame.scale,
  };
}

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** The pixels that a label takes, reckoned from the mean advance of its face. */
export function labelBox(frame: Frame, label: Pick<DrawnLabel, 'at' | 'anchor' | 'text' | 'isMono'>): Box {
  const size = label.isMono ? MONO_SIZE : TEXT_SIZE;
  const width = label.text.length * size * (label.isMono ? MONO_ADVANCE : TEXT_ADVANCE);
  const at = toPixels(frame, label.at);
  const left = at.x - { start: 0, middle: width / 2, end: width }[label.anchor];
  return { left, top: at.y - size * 0.8, right: left + width, bottom: at.y + size * 0.25 };
}
