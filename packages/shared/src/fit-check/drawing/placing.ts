import type { Point } from '../geometry/enclosing-circle.js';
import { labelBox, toInches, toPixels, type Box, type DrawnLabel, type Frame } from './model.js';

/** Everything placed so far, in pixels, that a further label must keep clear of. */
export interface Sheet {
  readonly frame: Frame;
  readonly boxes: Box[];
  readonly segments: Segment[];
  readonly discs: Disc[];
}
export interface Segment {
  readonly from: Point;
  readonly to: Point;
}
interface Disc {
  readonly centre: Point;
  readonly radius: number;
}

const CLEARANCE = 2;
const EDGE_OF_FRAME = 3;

export function overlaps(one: Box, other: Box, clearance = CLEARANCE): boolean {
  return (
    one.left < other.right + clearance &&
    other.left < one.right + clearance &&
    one.top < other.bottom + clearance &&
    other.top < one.bottom + clearance
  );
}

function within({ width, height }: Frame, box: Box): boolean {
  return (
    box.left >= EDGE_OF_FRAME &&
    box.top >= EDGE_OF_FRAME &&
    box.right <= width - EDGE_OF_FRAME &&
    box.bottom <= height - EDGE_OF_FRAME
  );
}

function touchesDisc(box: Box, { centre, radius }: Disc): boolean {
  const x = Math.max(box.left, Math.min(centre.x, box.right)) - centre.x;
  const y = Math.max(box.top, Math.min(centre.y, box.bottom)) - centre.y;
  return x * x + y * y < (radius + CLEARANCE) ** 2;
}

function grown({ left, top, right, bottom }: Box): Box {
  return {
    left: left - CLEARANCE,
    top: top - CLEARANCE,
    right: right + CLEARANCE,
    bottom: bottom + CLEARANCE,
  };
}

/** Whether a segment runs through a box: clipped against its four sides. */
export function crossesBox({ from, to }: Segment, box: Box): boolean {
  let [enter, leave] = [0, 1];
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const sides = [
    [-dx, from.x - box.left],
    [dx, box.right - from.x],
    [-dy, from.y - box.top],
    [dy, box.bottom - from.y],
  ] as const;
  for (const [step, room] of sides) {
    if (step === 0 && room < 0) return false;
    if (step < 0) enter = Math.max(enter, room / step);
    if (step > 0) leave = Math.min(leave, room / step);
  }
  return enter <= leave;
}

function nearest({ from, to }: Segment, point: Point): number {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const length = dx * dx + dy * dy;
  const part = length === 0 ? 0 : ((point.x - from.x) * dx + (point.y - from.y) * dy) / length;
  const along = Math.max(0, Math.min(1, part));
  return Math.hypot(from.x + along * dx - point.x, from.y + along * dy - point.y);
}

/** One way to set a label, with the lines that come with it. Pixels. */
export interface Setting {
  readonly label: DrawnLabel;
  readonly segments: readonly Segment[];
  /** What this setting costs beside collisions: farther off, less usual. */
  readonly cost: number;
}

const COLLISION = 1000;
const CROSSED_TEXT = 400;
const THROUGH_HOLE = 60;

function costOf(sheet: Sheet, { label, segments, cost }: Setting): number {
  const box = labelBox(sheet.frame, label);
  const hits = sheet.boxes.filter((other) => overlaps(box, other)).length;
  const covered = sheet.discs.filter((disc) => touchesDisc(box, disc)).length;
  const outside = within(sheet.frame, box) ? 0 : 2;
  const through = sheet.segments.filter((segment) => crossesBox(segment, grown(box))).length;
  const cut = segments.flatMap((segment) => sheet.boxes.filter((other) => crossesBox(segment, other))).length;
  const holes = segments.flatMap((one) =>
    sheet.discs.filter((disc) => nearest(one, disc.centre) < disc.radius),
  ).length;
  return (
    cost + COLLISION * (hits + covered + outside) + CROSSED_TEXT * (through + cut) + THROUGH_HOLE * holes
  );
}

function best(sheet: Sheet, settings: readonly Setting[]): { setting: Setting; cost: number } {
  let [found, least] = [settings[0]!, Infinity];
  for (const setting of settings.toSorted((one, other) => one.cost - other.cost)) {
    // Collisions only add to a cost: from here on none can be better.
    if (setting.cost >= least) break;
    const cost = costOf(sheet, setting);
    if (cost < least) [found, least] = [setting, cost];
  }
  return { setting: found, cost: least };
}

function keepClear(sheet: Sheet, setting: Setting): Setting {
  sheet.boxes.push(labelBox(sheet.frame, setting.label));
  sheet.segments.push(...setting.segments);
  return setting;
}

/** Takes the setting that collides least, and keeps its place clear from then on. */
export function place(sheet: Sheet, settings: readonly Setting[]): Setting {
  return keepClear(sheet, best(sheet, settings).setting);
}

/** The same for what is said elsewhere too: left out where it would collide. */
export function placeIfFree(sheet: Sheet, settings: readonly Setting[]): Setting | null {
  const { setting, cost } = best(sheet, settings);
  return cost >= CROSSED_TEXT ? null : keepClear(sheet, setting);
}

type Named = Pick<DrawnLabel, 'role' | 'layer' | 'text' | 'isMono'>;

export function labelAt(sheet: Sheet, named: Named, at: Point, anchor: DrawnLabel['anchor']): DrawnLabel {
  return { kind: 'label', ...named, at: toInches(sheet.frame, at), anchor };
}

const LANES = [0, 22, 34, 46, 60, 76, 92, 110, 128, 150, 175, 205, 240];
const ALONG = [0.5, 0.35, 0.65, 0.22, 0.78];
const LANE_COST = 0.1;

/** Texts beside a dimension line: left and right of a steep one, above and below a flat one. */
function textSettings(sheet: Sheet, named: Named, line: Segment): { label: DrawnLabel; cost: number }[] {
  const [dx, dy] = [line.to.x - line.from.x, line.to.y - line.from.y];
  const steep = Math.abs(dy) > Math.abs(dx);
  return ALONG.flatMap((along, index) => {
    const [x, y] = [line.from.x + dx * along, line.from.y + dy * along];
    const cost = index * 2;
    if (!steep) {
      return [
        { label: labelAt(sheet, named, { x, y: y - 6 }, 'middle'), cost },
        { label: labelAt(sheet, named, { x, y: y + 17 }, 'middle'), cost: cost + 3 },
      ];
    }
    return [
      { label: labelAt(sheet, named, { x: x - 8, y: y + 5 }, 'end'), cost },
      { label: labelAt(sheet, named, { x: x + 8, y: y + 5 }, 'start'), cost: cost + 1 },
    ];
  });
}

export interface DimensionWish {
  readonly named: Named;
  /** What is measured, inch: from a centre to an edge, a tangent or another centre. */
  readonly from: Point;
  readonly to: Point;
  /** Nearest lane that may be taken, pixels, so that the line keeps clear of what it measures. */
  readonly clear: number;
  /** An edge is a line and needs no extension line; a hole does. */
  readonly isToPoint: boolean;
}

/** Dimensions lie below a row and to the left of what stands upright, so that those of one row line up. */
function usualSide({ x, y }: Point): Point {
  const isUsual = Math.abs(y) > Math.abs(x) ? y > 0 : x < 0;
  return isUsual ? { x, y } : { x: -x, y: -y };
}

/** Ways to set a dimension: in lanes to both sides of what it measures. */
export function dimensionSettings(sheet: Sheet, wish: DimensionWish): Setting[] {
  const [from, to] = [toPixels(sheet.frame, wish.from), toPixels(sheet.frame, wish.to)];
  const length = Math.max(Math.hypot(to.x - from.x, to.y - from.y), 1e-9);
  const across = usualSide({ x: -(to.y - from.y) / length, y: (to.x - from.x) / length });
  const lanes = LANES.filter((lane) => lane >= wish.clear).flatMap((lane) => [lane, -lane]);
  return lanes.flatMap((lane) => {
    const aside = (point: Point) => ({ x: point.x + across.x * lane, y: point.y + across.y * lane });
    const line = { from: aside(from), to: aside(to) };
    const extensions = [{ from, to: line.from }, ...(wish.isToPoint ? [{ from: to, to: line.to }] : [])];
    return textSettings(sheet, wish.named, line).map(({ label, cost }) => ({
      label,
      segments: [line, ...(lane === 0 ? [] : extensions)],
      cost: cost + Math.abs(lane) * LANE_COST,
    }));
  });
}
