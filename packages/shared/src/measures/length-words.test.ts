import fc from 'fast-check';
import {
  drillName,
  formatAgainst,
  formatHole,
  formatLength,
  formatLengthUnit,
  formatWithError,
  fractionName,
  roundHalfEven,
} from './length-words.js';
import { readLength } from './read-length.js';

it.each([
  [0.1285, 'inch', '0.128'],
  [0.1555, 'inch', '0.156'],
  [0.322 + 0.0135, 'inch', '0.336'],
  [0.04, 'inch', '0.040'],
  [1.0005, 'inch', '1.000'],
  [-0.61, 'inch', '-0.610'],
  [-0.0001, 'inch', '0.000'],
  [0.1285, 'mm', '3.26'],
  [1, 'mm', '25.40'],
] as const)('shows %f in %s as %s', (inches, units, shown) => {
  expect(formatLength(inches, units)).toBe(shown);
});

it('puts the unit and the measuring error beside a length', () => {
  expect(formatLengthUnit(0.322, 'inch')).toBe('0.322 in');
  expect(formatLengthUnit(0.322, 'mm')).toBe('8.18 mm');
  expect(formatWithError(0.322, 0.005, 'inch')).toBe('0.322 ± 0.005');
  expect(formatWithError(0.322, 0.005, 'mm')).toBe('8.18 ± 0.13');
  expect(formatWithError(0.322, null, 'inch')).toBe('0.322');
  expect(formatWithError(0.322, 0, 'inch')).toBe('0.322');
});

// S20: drill series of ANSI/ASME B94.11M
it('names the drill beside a hole, and no drill where none is near', () => {
  expect(formatHole(0.1285, 'inch')).toBe('0.128 · #30');
  expect(formatHole(0.159, 'mm')).toBe('4.04 · #21');
  expect(formatHole(0.25, 'inch')).toBe('0.250 · E');
  expect(formatHole(0.131, 'inch')).toBe('0.131');
  expect(drillName(0.1564)).toBe('5/32');
  expect(drillName(0.1566)).toBeNull();
});

it.each([
  [0.15625, '5/32'],
  [1.375, '1 3/8'],
  [2, '2'],
  [5.5 / 16, '11/32'],
  [0.13, null],
  [0, null],
])('says %f as %s', (inches, fraction) => expect(fractionName(inches)).toBe(fraction));

it('shows as many decimals as it takes to tell a value from its limit', () => {
  expect(formatAgainst(3.9, 3, 1)).toBe('3.9');
  expect(formatAgainst(1.504, 2, 1)).toBe('1.5');
  expect(formatAgainst(1.96, 2, 1)).toBe('1.96');
  expect(formatAgainst(1.9996, 2, 1)).toBe('1.9996');
  expect(formatAgainst(2, 2, 1)).toBe('2.0');
  expect(formatAgainst(2, null, 1)).toBe('2.0');
});

it('never shows a value on the other side of its limit', () => {
  const ratio = fc.integer({ min: 0, max: 60_000 }).map((n) => n / 10_000);
  fc.assert(
    fc.property(ratio, ratio, (value, limit) => {
      fc.pre(value !== limit);
      const shown = Number(formatAgainst(value, limit, 1));
      expect(Math.sign(shown - limit)).toBe(Math.sign(value - limit));
    }),
  );
});

it('rounds to within half of the last place', () => {
  fc.assert(
    fc.property(fc.double({ min: -100, max: 100, noNaN: true }), (value) => {
      expect(Math.abs(Number(roundHalfEven(value, 3)) - value)).toBeLessThanOrEqual(0.0005 + 2e-9);
    }),
  );
});

it('reads back what it shows', () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 99_999 }), (thousandths) => {
      const reading = readLength(formatLength(thousandths / 1000, 'inch'));
      expect(reading).toMatchObject({ ok: true, inches: thousandths / 1000 });
    }),
  );
});
