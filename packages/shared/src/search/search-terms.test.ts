import fc from 'fast-check';
import { searchQuery, searchTerms } from './search-terms.js';

describe('searchTerms', () => {
  it.each([
    { text: 'edge 0.387 AD6', words: ['edge'], numbers: ['n0p387', 'rivetad6'] },
    { text: '.387', words: [], numbers: ['n0p387'] },
    { text: '0,387', words: [], numbers: ['n0p387'] },
    { text: '0.3870', words: [], numbers: ['n0p387'] },
    { text: '#30', words: [], numbers: ['drill30'] },
    { text: 'No 30', words: [], numbers: ['drill30'] },
    { text: 'no. 30', words: [], numbers: ['drill30'] },
    { text: '5/32', words: [], numbers: ['f5over32'] },
    { text: 'MS20470AD4-4.5', words: [], numbers: ['rivetad4', 'family470', 'rivetad4l4p5'] },
    { text: '470 AD4-4.5', words: [], numbers: ['rivetad4', 'family470', 'rivetad4l4p5'] },
    { text: 'AD 6', words: [], numbers: ['rivetad6'] },
    { text: 'STB/dr-03', words: ['stb', 'dr', '03'], numbers: [] },
    { text: '3.97 mm', words: [], numbers: ['n3p97'] },
    { text: 'hole 7, "crescent"', words: ['hole', '7', 'crescent'], numbers: [] },
  ])('reads $text', ({ text, words, numbers }) => expect(searchTerms(text)).toEqual({ words, numbers }));

  it('never throws, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 300 }), (text) => {
        const { words, numbers } = searchTerms(text);
        expect([...words, ...numbers].every((term) => /^[\p{L}\p{N}]+$/u.test(term))).toBe(true);
      }),
    );
  });

  it('finds whatever it indexes: a piece of a text gives terms that the text has', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom('edge', '0.387', '#30', 'AD6', '5/32', 'STB/dr-03'), { minLength: 1 }),
        (pieces) => {
          const indexed = searchTerms(pieces.join(' '));
          const asked = searchTerms(pieces[0]!);
          expect(indexed.words).toEqual(expect.arrayContaining([...asked.words]));
          expect(indexed.numbers).toEqual(expect.arrayContaining([...asked.numbers]));
        },
      ),
    );
  });
});

describe('searchQuery', () => {
  it('quotes every term and lets the last word be a beginning', () =>
    expect(searchQuery('doubler cresc')).toBe('"doubler" AND "cresc"*'));
  it('asks for any of the terms where told', () =>
    expect(searchQuery('doubler cresc', 'any')).toBe('"doubler" OR "cresc"*'));
  it('is null where there is nothing to search', () => expect(searchQuery(' -- "" ')).toBeNull());
  it('takes an operator for a word', () => expect(searchQuery('NEAR OR')).toBe('"near" AND "or"*'));
});
