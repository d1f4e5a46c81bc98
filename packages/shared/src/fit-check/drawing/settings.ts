import { formatAgainst, formatLength } from '../../measures/length-words.js';
import type { Units } from '../../measures/read-length.js';
import { layerName } from '../bench.js';
import { distance, type Point } from '../geometry/enclosing-circle.js';
import { known, valueOf } from '../measured.js';
import { toPixels, type DrawnLabel } from './model.js';
import { fromSeat, type Scene, type Straight } from './parts.js';
import { labelAt, type DimensionWish, type Segment, type Setting, type Sheet } from './placing.js';

/** How much the labels say. */
export interface Saying {
  readonly units: Units;
  /** On a narrow drawing the ratios are left to the table. */
  readonly isNarrow: boolean;
}

/** Whether the remedy drawn moves the hole; then everything is measured from where the rivet would sit. */
function moves({ remedy }: Scene): boolean {
  return remedy?.finalHole !== null && remedy?.finalHole !== undefined && remedy.centre !== null;
}

function edgeText(scene: Scene, straight: Straight, length: number, { units, isNarrow }: Saying): string {
  const word = straight.kind === 'edge' ? 'e' : 'bend';
  const own = scene.card.layers[straight.layer]!.edges?.[straight.index]?.minimumD;
  const limit = straight.kind === 'edge' ? (own ?? scene.ringD) : 1;
  const ratio = formatAgainst(length / (scene.dash / 32), limit, 1);
  const said = `${word} ${formatLength(length, units)}`;
  return isNarrow ? said : `${said} · ${ratio} D`;
}

/** The dimension of an edge or a bend: from the seat of the rivet, or from the layer's own hole where none is moved. */
export function straightWish(scene: Scene, straight: Straight, clear: number, saying: Saying): DimensionWish {
  const moved = moves(scene);
  const length = moved ? fromSeat(scene, straight) : straight.measured;
  const from = moved ? scene.seat : scene.centres[straight.layer]!;
  const rad = (straight.angle * Math.PI) / 180;
  const to = { x: from.x + Math.cos(rad) * length, y: from.y + Math.sin(rad) * length };
  const text = edgeText(scene, straight, length, saying);
  const named = { role: straight.kind, layer: straight.layer, text, isMono: true };
  return { named, from, to, clear, isToPoint: false };
}

/** Nearly along the row is drawn along it: two pitches of one row then stand on one line. */
const NEARLY_LEVEL = 0.12;

export function pitchWish(scene: Scene, neighbour: Point, clear: number, { units }: Saying): DimensionWish {
  const text = formatLength(distance(scene.seat, neighbour), units);
  const [dx, dy] = [neighbour.x - scene.seat.x, neighbour.y - scene.seat.y];
  const to = Math.abs(dy) < NEARLY_LEVEL * Math.abs(dx) ? { x: neighbour.x, y: scene.seat.y } : neighbour;
  return {
    named: { role: 'pitch', layer: null, text, isMono: true },
    from: scene.seat,
    to,
    clear,
    isToPoint: true,
  };
}

function nameOf(scene: Scene, { kind, layer }: Straight, units: Units): string {
  const { thickness } = scene.card.layers[layer]!;
  const gauge = known(thickness) ? ` ${formatLength(valueOf(thickness), units)}` : '';
  return `${kind === 'edge' ? 'edge' : 'bend'} of ${layerName(scene.card, layer)}${gauge}`;
}

/** Names of edges that lie in one line stand one under the other. */
const NAME_ROW = 16;
const ALONG_EDGE = [0.97, 0.03, 0.8, 0.2, 0.65, 0.35, 0.5];

function anchorAlong(along: number): DrawnLabel['anchor'] {
  if (along > 0.6) return 'end';
  return along < 0.4 ? 'start' : 'middle';
}

/** Names along an edge or bend: outside the sheet first, near one end. `line` runs from left to right in pixels. */
export function nameSettings(
  sheet: Sheet,
  scene: Scene,
  straight: Straight,
  line: Segment & { units: Units },
) {
  const named = {
    role: straight.kind === 'edge' ? ('edgeName' as const) : ('bendName' as const),
    layer: straight.layer,
    text: nameOf(scene, straight, line.units),
    isMono: false,
  };
  const [from, to] = line.from.x <= line.to.x ? [line.from, line.to] : [line.to, line.from];
  const flat = Math.abs(to.x - from.x) > Math.abs(to.y - from.y);
  const rad = (straight.angle * Math.PI) / 180;
  const isUpOrRight = flat ? Math.sin(rad) > 0 : Math.cos(rad) > 0;
  const labelOn = (along: number, outside: boolean, row = 0): DrawnLabel => {
    const [x, y] = [from.x + (to.x - from.x) * along, from.y + (to.y - from.y) * along];
    const first = isUpOrRight === outside;
    if (flat) {
      const line = first ? y - 7 - row * NAME_ROW : y + 16 + row * NAME_ROW;
      return labelAt(sheet, named, { x, y: line }, anchorAlong(along));
    }
    const beside = { x: first ? x + 7 : x - 7, y: y + (0.5 - along) * 14 + 4 };
    return labelAt(sheet, named, beside, first ? 'start' : 'end');
  };
  return ALONG_EDGE.flatMap((along, index): Setting[] => [
    { label: labelOn(along, true), segments: [], cost: index },
    { label: labelOn(along, false), segments: [], cost: index + 8 },
    { label: labelOn(along, true, 1), segments: [], cost: index + 16 },
  ]);
}

const RING_TURNS = [-25, 205, 25, 155, -55, 235, 55, 125, -80, 260, 0, 180];

/** What the ring stands for: "2 D of an AD5". */
export function ringText({ card, dash, ringD }: Scene): string {
  return card.rivet.alloy ? `${ringD} D of an ${card.rivet.alloy}${dash}` : `${ringD} D of a -${dash}`;
}

/** The name of the ring, just outside it. */
export function ringSettings(sheet: Sheet, scene: Scene, radius: number): Setting[] {
  const named = { role: 'ring' as const, layer: null, text: ringText(scene), isMono: false };
  const centre = toPixels(sheet.frame, scene.seat);
  return RING_TURNS.map((turn, cost) => {
    const rad = (turn * Math.PI) / 180;
    const [x, y] = [centre.x + Math.cos(rad) * (radius + 6), centre.y - Math.sin(rad) * (radius + 6) + 4];
    const side = Math.cos(rad);
    const anchor = side > 0.2 ? 'start' : side < -0.2 ? 'end' : 'middle';
    return { label: labelAt(sheet, named, { x, y }, anchor), segments: [], cost };
  });
}

const LEADER_TURNS = [40, 140, -40, -140, 65, 115, -65, -115, 15, 165, -15, -165];
const LEADER_REACHES = [46, 62, 80, 104, 132, 164];
const LEADER_TEXT = 8.4;

export interface OffsetSetting extends Setting {
  /** Rim of the hole, elbow, end of the line under the text; pixels. */
  readonly points: readonly [Point, Point, Point];
}

/** How far a layer's hole lies from the first one's, on a leader that bends to the level. */
export function offsetSettings(
  sheet: Sheet,
  scene: Scene,
  layer: number,
  { units }: Saying,
): OffsetSetting[] {
  const away = distance(scene.centres[layer]!, scene.centres[0]!);
  const whose = scene.card.layers.length > 2 ? ` ${layerName(scene.card, layer)}` : '';
  const text = `off ${formatLength(away, units)}${whose}`;
  const named = { role: 'offset' as const, layer, text, isMono: true };
  const centre = toPixels(sheet.frame, scene.centres[layer]!);
  const hole = scene.card.layers[layer]!.hole;
  const rim = hole?.shape === 'round' ? (valueOf(hole.diameter) / 2) * sheet.frame.scale : 8;
  return LEADER_TURNS.flatMap((turn, order) =>
    LEADER_REACHES.map((reach, step): OffsetSetting => {
      const rad = (turn * Math.PI) / 180;
      const out = (length: number) => ({
        x: centre.x + Math.cos(rad) * length,
        y: centre.y - Math.sin(rad) * length,
      });
      const right = Math.cos(rad) > 0;
      const elbow = out(rim + reach);
      const end = { x: elbow.x + (right ? 1 : -1) * text.length * LEADER_TEXT, y: elbow.y };
      const at = { x: elbow.x + (right ? 2 : -2), y: elbow.y - 6 };
      return {
        label: labelAt(sheet, named, at, right ? 'start' : 'end'),
        points: [out(rim), elbow, end],
        segments: [
          { from: out(rim), to: elbow },
          { from: elbow, to: end },
        ],
        cost: order + step * 3,
      };
    }),
  );
}
