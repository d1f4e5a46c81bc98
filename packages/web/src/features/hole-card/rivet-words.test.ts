import { readRivet, rivetTyped } from './rivet-words';

it.each([
  ['470 AD4', { head: 'universal', alloy: 'AD', dash: 4 }, null],
  ['470AD4-4.5', { head: 'universal', alloy: 'AD', dash: 4 }, 4.5],
  ['MS20470AD4-5', { head: 'universal', alloy: 'AD', dash: 4 }, 5],
  ['ms20426 ad3-3,5', { head: 'flush', alloy: 'AD', dash: 3 }, 3.5],
  ['AN470AD5', { head: 'universal', alloy: 'AD', dash: 5 }, null],
  ['AD 6', { head: null, alloy: 'AD', dash: 6 }, null],
  ['AD4 universal', { head: 'universal', alloy: 'AD', dash: 4 }, null],
  ['flush AD3', { head: 'flush', alloy: 'AD', dash: 3 }, null],
  ['-4', { head: null, alloy: null, dash: 4 }, null],
])('reads %s', (typed, rivet, lengthDash) => {
  expect(readRivet(typed)).toEqual({ ok: true, rivet, lengthDash });
});

it.each([
  ['', 'Give the rivet as drawn'],
  ['AD44', 'Rivet sizes run from 2 to 12'],
  ['pop', 'pop is not understood as a rivet'],
  ['470 AD4-4.3', 'is not understood'],
])('says what is wrong with "%s"', (typed, message) => {
  expect(readRivet(typed)).toEqual({ ok: false, message: expect.stringContaining(message) });
});

it('reads back what it writes', () => {
  const rivets = [
    { head: 'universal', alloy: 'AD', dash: 4 },
    { head: 'flush', alloy: 'DD', dash: 5 },
    { head: null, alloy: null, dash: 3 },
  ] as const;
  for (const rivet of rivets) expect(readRivet(rivetTyped(rivet))).toMatchObject({ ok: true, rivet });
});
