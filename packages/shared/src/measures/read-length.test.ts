import fc from 'fast-check';
import { DRILLS } from '../trade/drills.js';
import { drillNamed, readLength, type ReadLength, type Units } from './read-length.js';

const read = (typed: string, usual: Units = 'inch'): ReadLength => {
  const reading = readLength(typed, usual);
  if (!reading.ok) throw new Error(`${typed}: ${reading.message}`);
  return reading;
};

it.each([
  ['.128', 0.128],
  ['0.128', 0.128],
  ['0,128', 0.128],
  [' 0.128 in', 0.128],
  ['0.128"', 0.128],
  ['128 thou', 0.128],
  ['5/32', 0.15625],
  ['5/32"', 0.15625],
  ['1 3/8', 1.375],
  ['1-3/8 inch', 1.375],
  ['3.97 mm', 3.97 / 25.4],
  ['3,97mm', 3.97 / 25.4],
  ['-0.61', -0.61],
  ['−0.61', -0.61],
  ['-1/16', -0.0625],
])('reads %s as %f inch', (typed, inches) => {
  expect(read(typed)).toMatchObject({ inches, u: null, drill: null, typed });
});

// S20: drill series of ANSI/ASME B94.11M
it.each([
  ['#30', '#30', 0.1285],
  ['No 30', '#30', 0.1285],
  ['no. 30', '#30', 0.1285],
  ['drill 30', '#30', 0.1285],
  ['# 07', '#7', 0.201],
  ['F', 'F', 0.257],
  ['f', 'F', 0.257],
  ['letter F', 'F', 0.257],
])('reads the drill %s', (typed, drill, inches) => {
  expect(read(typed)).toMatchObject({ drill, inches, unit: 'inch' });
  expect(read(typed, 'mm')).toMatchObject({ drill, inches, unit: 'inch' });
});

it.each([
  ['0.322 ± 0.005', 0.322, 0.005],
  ['0.322±.005', 0.322, 0.005],
  ['0.322 +/- 0.005', 0.322, 0.005],
  ['0.322 in +- 5 thou', 0.322, 0.005],
  ['8.2 ± 0.1 mm', 8.2 / 25.4, 0.1 / 25.4],
  ['8.2 mm ± 0.1', 8.2 / 25.4, 0.1 / 25.4],
  ['5/16 ± 1/64', 0.3125, 1 / 64],
  ['#30 ± 0.001', 0.1285, 0.001],
])('reads %s with its measuring error', (typed, inches, u) => {
  expect(read(typed).inches).toBeCloseTo(inches, 12);
  expect(read(typed).u).toBeCloseTo(u, 12);
});

it('takes a bare number in the usual unit, and an error beside it too', () => {
  expect(read('3.97', 'mm')).toMatchObject({ inches: 3.97 / 25.4, unit: 'mm' });
  expect(read('8.2 ± 0.1', 'mm').u).toBeCloseTo(0.1 / 25.4, 12);
  expect(read('5/32', 'mm')).toMatchObject({ inches: 0.15625, unit: 'inch' });
});

it.each([
  ['', 'Give a length'],
  ['   ', 'Give a length'],
  ['#99', 'There is no drill #99'],
  ['#0', 'There is no drill #0'],
  ['1/0', 'A fraction over 0'],
  ['1,234.5', 'has a point and a comma'],
  ['about 5', 'is not understood'],
  ['1e5', 'is not understood'],
  ['5/32 mm', 'drills and fractions are inches'],
  ['#30 mm', 'drills and fractions are inches'],
  ['0.3 ± 0.1 ± 0.1', 'one measuring error'],
  ['0.3 ± #30', 'Give the measuring error as a length'],
  ['0.3 ± -0.1', 'Give the measuring error as a length'],
  ['0.3 ± x y', 'After the ±'],
  ['NaN', 'is not understood'],
  ['Infinity', 'is not understood'],
])('says what is wrong with "%s" and keeps it', (typed, message) => {
  expect(readLength(typed)).toEqual({ ok: false, message: expect.stringContaining(message), typed });
});

it('reads every drill by its own name', () => {
  for (const { name, diameter } of DRILLS) expect(read(name).inches).toBe(diameter);
  expect(drillNamed(' f ')).toMatchObject({ name: 'F', series: 'letter' });
  expect(drillNamed('#81')).toBeNull();
});

it('reads the same length whatever the unit it is typed in', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 40_000 }), (tenThousandths) => {
      const inches = tenThousandths / 10_000;
      const typedInMm = `${(inches * 25.4).toFixed(6)} mm`;
      expect(read(typedInMm).inches).toBeCloseTo(read(String(inches)).inches, 6);
      expect(read(String(inches).replace('.', ',')).inches).toBe(inches);
    }),
  );
});

it('never throws, whatever is typed', () => {
  fc.assert(fc.property(fc.string(), (typed) => void readLength(typed)));
});
