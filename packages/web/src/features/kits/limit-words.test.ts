import { limitWords } from './limit-words';

const NONE = {
  edgeMinimumD: null,
  pitchMinimumD: null,
  holeMaximum: null,
  shopHeadMinimumWidthD: null,
  shopHeadMinimumHeightD: null,
  source: 'Drawing note 4',
};

describe('limitWords', () => {
  it('names each limit that the kit maker gives, and no other', () => {
    expect(limitWords({ ...NONE, edgeMinimumD: 1.8, holeMaximum: 0.161 }, 'inch')).toBe(
      'edge at least 1.8 D, hole at most 0.161',
    );
    expect(
      limitWords(
        { ...NONE, pitchMinimumD: 4, shopHeadMinimumWidthD: 1.3, shopHeadMinimumHeightD: 0.3 },
        'inch',
      ),
    ).toBe('pitch at least 4 D, shop head width at least 1.3 D, shop head height at least 0.3 D');
  });

  it('gives a hole in millimetres to whoever reads in them', () => {
    expect(limitWords({ ...NONE, holeMaximum: 0.161 }, 'mm')).toBe('hole at most 4.09');
  });

  it('is empty where nothing is given', () => {
    expect(limitWords(NONE, 'inch')).toBe('');
  });
});
