import fc from 'fast-check';
import { excerptOf, fragmentsOf } from './fragments.js';

describe('fragmentsOf', () => {
  it('marks words, beginnings and numbers of the trade', () => {
    const marked = fragmentsOf('Edge of 0.387 with AD6 in the doubler', '.387 ad6 doub')
      .filter(({ hit }) => hit)
      .map(({ text }) => text);
    expect(marked).toEqual(['0.387', 'AD6', 'doubler']);
  });

  it('loses nothing of the text', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 200 }), fc.string({ maxLength: 20 }), (text, query) => {
        expect(
          fragmentsOf(text, query)
            .map((one) => one.text)
            .join(''),
        ).toBe(text);
      }),
    );
  });
});

describe('excerptOf', () => {
  it('shows the place where it was found', () => {
    const long = `${'nothing here '.repeat(40)}the crescent at hole seven ${'and more '.repeat(40)}`;
    const text = excerptOf(long, 'crescent')
      .map((one) => one.text)
      .join('');
    expect(text).toContain('crescent');
    expect(text.startsWith('… ')).toBe(true);
    expect(text.length).toBeLessThan(180);
  });
});
