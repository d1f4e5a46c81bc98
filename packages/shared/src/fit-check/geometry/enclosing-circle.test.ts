import fc from 'fast-check';
import { cleanUpHole } from '../sums/holes.js';
import { distance, smallestEnclosing, type Circle } from './enclosing-circle.js';

const part = fc.integer({ min: -300, max: 300 }).map((n) => n / 1000);
const circle: fc.Arbitrary<Circle> = fc.record({
  x: part,
  y: part,
  radius: fc.integer({ min: 20, max: 200 }).map((n) => n / 1000),
});

it('is a point for none and the circle itself for one', () => {
  expect(smallestEnclosing([])).toEqual({ x: 0, y: 0, radius: 0 });
  expect(smallestEnclosing([{ x: 1, y: 2, radius: 3 }])).toEqual({ x: 1, y: 2, radius: 3 });
});

it('agrees with the closed form for two', () => {
  fc.assert(
    fc.property(circle, circle, (one, other) => {
      const { minimumDiameter } = cleanUpHole({
        diameter1: 2 * one.radius,
        diameter2: 2 * other.radius,
        offset: distance(one, other),
      });
      expect(2 * smallestEnclosing([one, other]).radius).toBeCloseTo(minimumDiameter, 8);
    }),
  );
});

it('is the circle round three equal ones at the corners of a triangle', () => {
  const corners = [0, 120, 240].map((angle) => {
    const turn = (angle * Math.PI) / 180;
    return { x: 0.02 * Math.cos(turn), y: 0.02 * Math.sin(turn), radius: 0.064 };
  });
  const found = smallestEnclosing(corners);
  expect(found.radius).toBeCloseTo(0.084, 12);
  expect(Math.hypot(found.x, found.y)).toBeCloseTo(0, 12);
});

it('holds three of different size, each of them touching', () => {
  const three = [
    { x: 0, y: 0, radius: 0.06 },
    { x: 0.05, y: 0.01, radius: 0.064 },
    { x: 0.02, y: 0.06, radius: 0.049 },
  ];
  const found = smallestEnclosing(three);
  for (const one of three) expect(distance(found, one) + one.radius).toBeCloseTo(found.radius, 9);
});

it('holds all of them, and no circle nearby that is smaller does', () => {
  fc.assert(
    fc.property(fc.array(circle, { minLength: 3, maxLength: 10 }), (circles) => {
      const found = smallestEnclosing(circles);
      const need = (x: number, y: number) =>
        Math.max(...circles.map((one) => Math.hypot(one.x - x, one.y - y) + one.radius));
      expect(need(found.x, found.y)).toBeLessThanOrEqual(found.radius + 1e-8);
      // The need is convex over the plane: if no step in any direction lessens it, nowhere is better.
      const step = 1e-4;
      for (let turn = 0; turn < 360; turn += 10) {
        const rad = (turn * Math.PI) / 180;
        expect(need(found.x + step * Math.cos(rad), found.y + step * Math.sin(rad))).toBeGreaterThanOrEqual(
          found.radius - 1e-7,
        );
      }
    }),
  );
});
