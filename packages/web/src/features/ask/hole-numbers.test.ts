import { readHoleNumbers } from './hole-numbers';

const line = { code: 'HL-STB-3', count: 22, repeats: 2 };
const holesOf = (typed: string) => {
  const read = readHoleNumbers(typed, 2, line);
  return read.ok ? read.holes.map(({ hole }) => hole) : read.message;
};

it.each([
  ['', []],
  ['7', [7]],
  ['3-5, 9', [3, 4, 5, 9]],
  ['3 to 5; 4', [3, 4, 5]],
  ['22', [22]],
])('reads %s', (typed, holes) => expect(holesOf(typed)).toEqual(holes));

it.each([
  ['23', 'HL-STB-3 has 22 holes: 23 is none of them.'],
  ['0', 'HL-STB-3 has 22 holes: 0 is none of them.'],
  ['seven', 'seven is no hole number: write 7, or 3-5, 9.'],
  ['5-3', '5-3 is no hole number: write 7, or 3-5, 9.'],
])('says what is wrong with %s', (typed, message) => expect(holesOf(typed)).toBe(message));

it('counts every hole in the repeat that was chosen', () => {
  expect(readHoleNumbers('1-2', 2, line)).toEqual({
    ok: true,
    holes: [
      { repeat: 2, hole: 1 },
      { repeat: 2, hole: 2 },
    ],
  });
});
