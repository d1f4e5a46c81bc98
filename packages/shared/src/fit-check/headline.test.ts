import { cardA, cardB, doublerCard } from '../testing/worked-cards.js';
import type { HoleCard } from './card-fields.js';
import {
  CHECK_WORDS,
  checkFamily,
  CODE_WORDS,
  remedyName,
  STOP_WORDS,
  VERDICT_WORDS,
} from './fit-check-words.js';
import { fitCheck } from './fit-check.js';
import { foremostRemedy, headlineTrouble, remedyHeadline } from './headline.js';
import { CHECK_CODES, STOP_CODES, type RemedyKind } from './hole-card.schema.js';

const said = (card: HoleCard, kind: RemedyKind, units: 'inch' | 'mm' = 'inch') =>
  remedyHeadline(
    fitCheck(card).remedies.find((one) => one.kind === kind)!,
    units,
  );

describe('what decides each remedy', () => {
  it.each<[RemedyKind, string, string]>([
    ['leave', '0.156 over 0.132', 'outside'],
    ['cleanUp', 'needs 0.156', 'outside'],
    ['nextSize', 'pitch 3.9 D', 'marginal'],
    ['replacePart', 'as drawn', 'inside'],
    ['askKitMaker', 'their word decides', 'unknown'],
  ])('%s: %s', (kind, text, verdict) => expect(said(doublerCard(), kind)).toEqual({ text, verdict }));

  it('is said in millimetres to whoever works in them', () => {
    expect(said(doublerCard(), 'leave', 'mm').text).toBe('3.95 over 3.35');
  });

  it('is said to be inside published numbers, never more', () => {
    expect(said(cardB(), 'nextSize')).toEqual({ text: 'inside published numbers', verdict: 'inside' });
  });

  it.each<[string, (card: HoleCard) => void, RemedyKind, string]>([
    ['a size skipped', (c) => (c.layers[1]!.offset = { x: 0.05, y: 0 }), 'nextSize', 'skips a size, 0.191'],
    [
      'heads that touch',
      (c) =>
        (c.neighbours = [
          { x: 0.24, y: 0, dash: 3, head: 'universal' },
          { x: 2, y: 0, dash: 4 },
        ]),
      'leave',
      '0.200 over 0.132',
    ],
    ['an edge not measured', (c) => delete c.layers[0]!.edges, 'nextSize', 'edge to measure'],
    [
      'a full pattern',
      (c) => (c.group = { count: 6, oversize: 1, adjacentOversize: 0 }),
      'nextSize',
      '2 oversize, 1 allowed',
    ],
    ['a strength nobody knows', (c) => (c.layers[0]!.alloy = 'tin'), 'nextSize', 'strength not known'],
    ['a thin sheet', (c) => (c.layers[1]!.thickness = 0.025), 'nextSize', 'sheet 0.16 D'],
    ['a bend', (c) => (c.layers[0]!.bends = [{ distance: 0.05, angle: 90 }]), 'nextSize', 'bend 0.3 D'],
  ])('tells of %s', (_, change, kind, text) => {
    const card = cardB();
    if (text.startsWith('0.200')) card.layers[1]!.hole = { shape: 'round', diameter: 0.2 };
    change(card);
    expect(said(card, kind).text).toBe(text);
  });
});

describe('the one line of a question in a list', () => {
  it('is about the mishap', () => {
    const check = fitCheck(doublerCard());
    expect(headlineTrouble('misalignedHole', check)).toEqual({
      text: '0.156 over 0.132',
      verdict: 'outside',
    });
    expect(headlineTrouble('edgeTooNear', check)).toEqual({ text: 'edge 2.6 D', verdict: 'inside' });
  });

  it('tells an edge that is short with as many decimals as it takes', () => {
    const card = cardB();
    card.layers[0]!.edges = [{ distance: 0.188, angle: 270 }];
    expect(headlineTrouble('edgeTooNear', fitCheck(card))).toEqual({
      text: 'edge 1.5 D',
      verdict: 'outside',
    });
    card.layers[0]!.edges = [{ distance: 0.2495, angle: 270 }];
    expect(headlineTrouble('edgeTooNear', fitCheck(card))).toEqual({
      text: 'edge 1.996 D',
      verdict: 'outside',
    });
  });

  it('tells of a driven head', () => {
    const card = cardB();
    card.shopHead = { width: 0.2, height: 0.044 };
    expect(headlineTrouble('badRivet', fitCheck(card))).toEqual({
      text: 'height 0.35 D',
      verdict: 'marginal',
    });
  });

  it('puts what was measured before what was not', () => {
    const card = cardA();
    delete card.layers[0]!.bends;
    expect(headlineTrouble(null, fitCheck(card))!.text).toBe('0.118 over 0.101');
    card.layers.forEach((layer) => (layer.hole = { shape: 'round', diameter: 0.098 }));
    card.layers[1]!.offset = { x: 0, y: 0 };
    expect(headlineTrouble(null, fitCheck(card))).toEqual({ text: 'bend to measure', verdict: 'unknown' });
  });

  it('is none without a check', () => {
    expect(headlineTrouble('misalignedHole', null)).toBeNull();
  });
});

it('puts the first workable remedy foremost, and the kit maker where none is', () => {
  expect(foremostRemedy(fitCheck(doublerCard())).kind).toBe('nextSize');
  expect(foremostRemedy(fitCheck(cardA())).kind).toBe('replacePart');
  expect(foremostRemedy(fitCheck({ layers: [{}], rivet: { dash: 4 } })).kind).toBe('askKitMaker');
});

it('has words for every code and every kind of check, and none that the product never says', () => {
  const never = /approved|certified|\bsafe\b|airworthy|accepted|solved/i;
  const words = [...Object.values(CODE_WORDS), ...Object.values(STOP_WORDS), ...Object.values(VERDICT_WORDS)];
  expect(Object.keys(CODE_WORDS).sort()).toEqual([...CHECK_CODES].sort());
  expect(Object.keys(STOP_WORDS).sort()).toEqual([...STOP_CODES].sort());
  for (const text of words) expect(text).not.toMatch(never);
  for (const card of [cardA(), cardB(), doublerCard()]) {
    for (const { checks } of fitCheck(card).remedies) {
      for (const { id } of checks) expect(CHECK_WORDS[checkFamily(id)]).toBeTruthy();
    }
    expect(JSON.stringify(fitCheck(card))).not.toMatch(never);
  }
});

it('names a remedy with the rivet it takes', () => {
  const named = fitCheck(doublerCard()).remedies.map(remedyName);
  expect(named).toEqual([
    'Leave as is',
    'Clean up, same rivet',
    'Next rivet size, AD5',
    'Replace the part',
    'Ask the kit maker',
  ]);
});
