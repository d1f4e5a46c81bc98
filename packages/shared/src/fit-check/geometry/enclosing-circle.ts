export interface Point {
  readonly x: number;
  readonly y: number;
}
export interface Circle extends Point {
  readonly radius: number;
}

export const ORIGIN: Point = { x: 0, y: 0 };
const NEGLIGIBLE = 1e-12;

export function distance(one: Point, other: Point): number {
  const [x, y] = [one.x - other.x, one.y - other.y];
  return Math.sqrt(x * x + y * y);
}

/** Exact for two: the larger one, or the circle that touches both from outside on the line of their centres. */
function roundTwo(one: Circle, other: Circle): Circle {
  const apart = distance(one, other);
  if (apart <= Math.abs(one.radius - other.radius) + NEGLIGIBLE)
    return one.radius >= other.radius ? one : other;
  const radius = (one.radius + other.radius + apart) / 2;
  const part = (radius - one.radius) / apart;
  return { x: one.x + (other.x - one.x) * part, y: one.y + (other.y - one.y) * part, radius };
}

interface Line {
  readonly a: number;
  readonly b: number;
  readonly c: number;
  readonly d: number;
}

/** a x + b y + c r = d, what is left when the equations of two circles touched from inside are subtracted. */
function difference(one: Circle, other: Circle): Line {
  const square = ({ x, y, radius }: Circle) => x * x + y * y - radius * radius;
  return {
    a: 2 * (other.x - one.x),
    b: 2 * (other.y - one.y),
    c: -2 * (other.radius - one.radius),
    d: square(other) - square(one),
  };
}

/** Circles that touch three from outside; none where the three centres lie on a line, since two then decide. */
function roundThree(first: Circle, second: Circle, third: Circle): Circle[] {
  const [one, two] = [difference(first, second), difference(first, third)];
  const det = one.a * two.b - two.a * one.b;
  if (Math.abs(det) < NEGLIGIBLE) return [];
  // x = x0 + x1 r, y = y0 + y1 r
  const x0 = (one.d * two.b - two.d * one.b) / det - first.x;
  const x1 = (two.c * one.b - one.c * two.b) / det;
  const y0 = (one.a * two.d - two.a * one.d) / det - first.y;
  const y1 = (two.a * one.c - one.a * two.c) / det;
  // (x - xf)² + (y - yf)² = (r - rf)²
  const qa = x1 * x1 + y1 * y1 - 1;
  const qb = 2 * (x0 * x1 + y0 * y1 + first.radius);
  const qc = x0 * x0 + y0 * y0 - first.radius ** 2;
  const root = Math.sqrt(Math.max(qb * qb - 4 * qa * qc, 0));
  const radii = Math.abs(qa) < NEGLIGIBLE ? [-qc / qb] : [(-qb - root) / (2 * qa), (-qb + root) / (2 * qa)];
  return radii
    .filter((radius) => Number.isFinite(radius) && radius > 0)
    .map((radius) => ({ x: first.x + x0 + x1 * radius, y: first.y + y0 + y1 * radius, radius }));
}

function holds(outer: Circle, circles: readonly Circle[]): boolean {
  const room = outer.radius + 1e-9;
  return circles.every((circle) => distance(outer, circle) + circle.radius <= room);
}

/** No circle that holds all can be smaller than the one round a pair: where that holds all, it is the answer. */
function decidedByTwo(circles: readonly Circle[]): Circle | null {
  for (let i = 0; i < circles.length; i += 1) {
    for (let j = i + 1; j < circles.length; j += 1) {
      const found = roundTwo(circles[i]!, circles[j]!);
      if (holds(found, circles)) return found;
    }
  }
  return null;
}

/** Radius that a circle about that centre needs to hold all. */
function reach(centre: Point, circles: readonly Circle[]): number {
  return circles.reduce((most, circle) => Math.max(most, distance(centre, circle) + circle.radius), 0);
}

/**
 * A stack has ten circles at most, so trying every three is quick. Judged by what each centre needs: three centres
 * nearly in line make a poor centre, and the answer must hold all circles whatever the rounding.
 */
function decidedByThree(circles: readonly Circle[]): Circle {
  let best: Circle = { ...circles[0]!, radius: reach(circles[0]!, circles) };
  for (let i = 0; i < circles.length; i += 1) {
    for (let j = i + 1; j < circles.length; j += 1) {
      for (let k = j + 1; k < circles.length; k += 1) {
        for (const { x, y } of roundThree(circles[i]!, circles[j]!, circles[k]!)) {
          const radius = reach({ x, y }, circles);
          if (radius < best.radius) best = { x, y, radius };
        }
      }
    }
  }
  return best;
}

/** The smallest circle that holds all of them: the hole that cleans them all up. Of none, a point at the origin. */
export function smallestEnclosing(circles: readonly Circle[]): Circle {
  if (circles.length === 0) return { ...ORIGIN, radius: 0 };
  const largest = circles.reduce((best, circle) => (circle.radius > best.radius ? circle : best));
  if (holds(largest, circles)) return largest;
  return decidedByTwo(circles) ?? decidedByThree(circles);
}
