import { isGuessable } from './password-guesses.js';

describe('isGuessable', () => {
  it.each([
    ['on the list of common ones', '1qaz2wsx3edc'],
    ['on the list in other case', 'LeaveMeAlone'],
    ['a common word and a year', 'Password2024!!'],
    ['a common word in disguise', 'p4ssw0rd1234'],
    ['a common word twice', 'dragondragon'],
    ['one letter again and again', 'aaaaaaaaaaaa'],
    ['three letters again and again', 'xyzxyzxyzxyz'],
    ['digits in order', '123456789012'],
    ['digits backwards', '987654321098'],
    ['letters in order', 'abcdefghijkl'],
    ['a row of keys', 'qwertyuiopas'],
    ['a row of keys backwards', 'lkjhgfdsapoi'],
    ['the name of the product', 'rivetside1234'],
    ['the name of the product twice', 'RivetsideRivetside'],
    ['words of the product alone', 'builder-mentor'],
    ['the own name', 'wenna.trevose'],
    ['the own address', 'trevose.wenna99'],
  ])('refuses %s', (_, password) => {
    expect(isGuessable(password, ['Wenna Trevose', 'wenna.trevose'])).toBe(true);
  });

  it.each([
    ['four words', 'maple copper lantern drizzle'],
    ['lower-case letters only', 'ghtrwmplzkvyqos'],
    ['signs of another script', 'зелёный-якорь-7'],
    ['pictures', '🔩🛠️✈️🔩 alloy'],
    ['a word of the product among others', 'rivet maple copper'],
    ['the own name among others', 'trevose maple copper'],
    ['spaces at its ends', '  mapcoplant  '],
  ])('takes %s', (_, password) => {
    expect(isGuessable(password, ['Wenna Trevose', 'wenna.trevose'])).toBe(false);
  });

  it('does not hold a name of three letters against a password', () => {
    expect(isGuessable('annex-lamp-one', ['Ann'])).toBe(false);
  });
});
