import { unitVector } from '../geometry/hole-views.js';
import type { CheckLine } from '../hole-card.schema.js';
import { CODE_WORDS } from '../fit-check-words.js';
import type { Point } from '../geometry/enclosing-circle.js';
import type { DrawnShape } from './model.js';
import { acrossBox, type Scene, type Straight } from './parts.js';

export const TOO_CLOSE_WORDS = CODE_WORDS.too_close_to_call;

/** A band thinner than this would not be seen, inch. */
const LEAST_BAND = 0.006;

function band({ foot, angle }: Straight, half: number, box: { low: Point; high: Point }): DrawnShape[] {
  const line = acrossBox(foot, angle, box);
  if (!line) return [];
  const out = unitVector(angle);
  const moved = ({ x, y }: Point, by: number) => ({ x: x + out.x * by, y: y + out.y * by });
  const points = [
    moved(line.from, half),
    moved(line.to, half),
    moved(line.to, -half),
    moved(line.from, -half),
  ];
  return [{ kind: 'area', role: 'tooClose', points }];
}

function disc(centre: Point, radius: number): DrawnShape {
  return { kind: 'circle', role: 'tooClose', layer: null, centre, radius };
}

function shapesFor(scene: Scene, line: CheckLine, box: { low: Point; high: Point }): DrawnShape[] {
  const [family, first, second] = line.id.split(':');
  const half = Math.max((line.error ?? 0) * (line.unit === 'D' ? scene.dash / 32 : 1), LEAST_BAND);
  if (family === 'edge' || family === 'bend') {
    return scene.straights
      .filter(
        ({ kind, layer, index }) => kind === family && layer === Number(first) && index === Number(second),
      )
      .flatMap((straight) => band(straight, half, box));
  }
  if (family === 'pitch' || family === 'headClearance') {
    return scene.neighbours
      .filter(({ index }) => index === Number(first))
      .map(({ at, radius }) => disc(at, radius + half));
  }
  if ((family === 'round' || family === 'cleanUp') && line.value !== null) {
    return [disc(scene.seat, line.value / 2 + half)];
  }
  return [];
}

/** Hatched on the drawing: every line of the drawn remedy whose limit lies within the measuring error. */
export function tooCloseShapes(scene: Scene, box: { low: Point; high: Point }): DrawnShape[] {
  const lines = (scene.remedy?.checks ?? []).filter(({ code }) => code === 'too_close_to_call');
  return lines.flatMap((line) => shapesFor(scene, line, box));
}
