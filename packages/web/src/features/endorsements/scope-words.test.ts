import { readHoles, readSerials, scopeWords } from './scope-words';

describe('the scope of a stamp as it is typed', () => {
  it.each([
    ['', []],
    ['141', [141]],
    ['101-140, 158', [{ from: 101, to: 140 }, 158]],
    ['101 to 140', [{ from: 101, to: 140 }]],
    ['about 12', ['about 12']],
  ])('reads serials %j', (typed, expected) => expect(readSerials(typed)).toEqual(expected));

  it('reads hole numbers, one after the other', () => expect(readHoles('7, 8\n9')).toEqual([7, 8, 9]));
});

describe('scopeWords', () => {
  it.each([
    [null, 'this case only'],
    [{}, 'this case only'],
    [{ serials: [{ from: 101, to: 140 }, 158] }, 'serials 101 to 140, 158'],
    [{ holeLineIds: ['a'], holes: [7, { repeat: 2, hole: 8 }] }, 'this hole line, holes 7, 8 of repeat 2'],
  ])('says %j', (scope, expected) => expect(scopeWords(scope)).toBe(expected));
});
