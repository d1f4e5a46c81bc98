import fc from 'fast-check';
import { cardA, cardB, doublerCard } from '../testing/worked-cards.js';
import type { HoleCard } from './card-fields.js';
import { describeHoleDrawing } from './drawing/description.js';
import {
  labelBox,
  toInches,
  toPixels,
  type DrawnLabel,
  type DrawnShape,
  type HoleDrawing,
} from './drawing/model.js';
import { overlaps } from './drawing/placing.js';
import { holeDrawing, type DrawingOptions } from './drawing.js';
import { fitCheck } from './fit-check.js';

const draw = (card: HoleCard, options?: DrawingOptions) => holeDrawing(card, fitCheck(card), options);
const of = <K extends DrawnShape['kind']>(drawing: HoleDrawing, kind: K) =>
  drawing.shapes.filter((shape): shape is Extract<DrawnShape, { kind: K }> => shape.kind === kind);
const texts = (drawing: HoleDrawing) => of(drawing, 'label').map(({ text }) => text);

function cornerCard(): HoleCard {
  const card = cardB();
  card.layers[0]!.edges = [
    { distance: 0.32, angle: 270 },
    { distance: 0.4, angle: 0 },
  ];
  card.layers[1]!.bends = [{ distance: 0.35, angle: 90 }];
  card.neighbours = [
    { x: -0.75, y: 0, dash: 4 },
    { x: 0, y: 0.6, dash: 4 },
  ];
  return card;
}

function threeLayers(): HoleCard {
  const card = doublerCard();
  card.layers.push({
    ...card.layers[0]!,
    name: 'rib',
    offset: { x: 0.02, y: -0.01 },
    edges: [{ distance: 0.3, angle: 250 }],
  });
  return card;
}

const TYPICAL: readonly (readonly [string, HoleCard])[] = [
  ['a doubler', doublerCard()],
  ['a short edge', cardA()],
  ['an oblong hole', cardB()],
  ['a corner and a bend', cornerCard()],
  ['three layers', threeLayers()],
  ['a card hardly begun', { layers: [{}, {}], rivet: { dash: 4 } }],
];
const FRAMES: readonly (readonly [string, DrawingOptions])[] = [
  ['wide', {}],
  ['wide, millimetres', { units: 'mm' }],
  ['as in a column', { width: 520, height: 300 }],
  ['on a phone', { width: 342, height: 300 }],
];
const EVERY = TYPICAL.flatMap(([what, card]) =>
  FRAMES.map(([frame, options]) => [what, frame, card, options] as const),
);

function collisions(drawing: HoleDrawing): string[] {
  const boxes = of(drawing, 'label').map((label) => ({ label, box: labelBox(drawing.frame, label) }));
  return boxes.flatMap(({ label, box }, index) =>
    boxes
      .slice(index + 1)
      .filter((other) => overlaps(box, other.box, 0))
      .map((other) => `${label.text} / ${other.label.text}`),
  );
}

it.each(EVERY)('keeps the labels of %s apart, %s', (_what, _frame, card, options) => {
  expect(collisions(draw(card, options))).toEqual([]);
});

it.each(EVERY)(
  'keeps the labels of %s inside the frame and off the holes, %s',
  (_what, _frame, card, options) => {
    const drawing = draw(card, options);
    const { frame } = drawing;
    for (const label of of(drawing, 'label')) {
      const box = labelBox(frame, label);
      expect(
        Math.min(box.left, box.top, frame.width - box.right, frame.height - box.bottom),
      ).toBeGreaterThanOrEqual(0);
      for (const circle of of(drawing, 'circle').filter(({ role }) => role !== 'ring')) {
        const centre = toPixels(frame, circle.centre);
        const x = Math.max(box.left, Math.min(centre.x, box.right)) - centre.x;
        const y = Math.max(box.top, Math.min(centre.y, box.bottom)) - centre.y;
        expect(Math.hypot(x, y)).toBeGreaterThanOrEqual(circle.radius * frame.scale - 1e-9);
      }
    }
  },
);

describe('the doubler', () => {
  const drawing = draw(doublerCard());

  it('shows both holes, the hole that cleans up both, and the ring of 2 D round it', () => {
    const circles = of(drawing, 'circle');
    expect(circles.filter(({ role }) => role === 'hole').map(({ centre }) => centre)).toEqual([
      { x: 0, y: 0 },
      { x: 0, y: 0.027 },
    ]);
    const final = circles.find(({ role }) => role === 'final')!;
    expect(final.radius).toBe(0.0795);
    expect(final.centre.y).toBeCloseTo(0.0135, 12);
    const ring = circles.find(({ role }) => role === 'ring')!;
    expect(ring.radius).toBe(0.3125);
    expect(ring.centre).toEqual(final.centre);
    expect(circles.filter(({ role }) => role === 'neighbour').map(({ centre }) => centre.x)).toEqual([
      -0.61, 0.64,
    ]);
  });

  it('shows each sheet edge where it lies and names it', () => {
    const edges = of(drawing, 'line').filter(({ role }) => role === 'edge');
    expect(edges.map(({ from, to }) => [from.y, to.y].map((y) => Number(y.toFixed(6))))).toEqual([
      [-0.41, -0.41],
      [0.349, 0.349],
    ]);
    expect(texts(drawing)).toEqual(expect.arrayContaining(['edge of spar 0.040', 'edge of doubler 0.063']));
  });

  it('dimensions edges, pitches and the offset from the finished hole', () => {
    expect(texts(drawing)).toEqual(
      expect.arrayContaining([
        'e 0.424 · 2.7 D',
        'e 0.336 · 2.1 D',
        '0.610',
        '0.640',
        'off 0.027',
        '2 D of an AD5',
      ]),
    );
    const long = of(drawing, 'dimension').map(({ from, to }) => Math.hypot(to.x - from.x, to.y - from.y));
    expect(long.map((length) => Number(length.toFixed(4)))).toEqual([0.61, 0.64, 0.4235, 0.3355]);
  });

  it('says in the legend what each line is', () => {
    expect(drawing.legend.map(({ text }) => text)).toEqual([
      'spar, #30',
      'doubler, #30',
      'cleans up both, 0.159 · #21',
      '2 D of an AD5',
    ]);
    expect(drawing.gridText).toBe('grid 0.100 in');
  });

  it('has a handle for whatever can be moved, at the field it stands for', () => {
    expect(drawing.handles.map(({ path, along }) => [path, along])).toEqual([
      ['layers.1.offset', null],
      ['neighbours.0', null],
      ['neighbours.1', null],
      ['layers.0.edges.0.distance', 270],
      ['layers.1.edges.0.distance', 90],
    ]);
  });

  it('speaks millimetres to whoever works in them', () => {
    const metric = draw(doublerCard(), { units: 'mm' });
    expect(texts(metric)).toEqual(expect.arrayContaining(['e 8.52 · 2.1 D', '15.50', 'off 0.69']));
    expect(metric.gridText).toBe('grid 2 mm');
  });

  it('leaves the ratios to the table where it is narrow', () => {
    expect(texts(draw(doublerCard(), { width: 342, height: 300 }))).toEqual(
      expect.arrayContaining(['e 0.424', 'e 0.336']),
    );
  });

  it('is drawn as found without a check, and as found where that is asked for', () => {
    for (const found of [holeDrawing(doublerCard()), draw(doublerCard(), { remedy: 'leave' })]) {
      expect(of(found, 'circle').some(({ role }) => role === 'final')).toBe(false);
      expect(of(found, 'circle').find(({ role }) => role === 'ring')!.radius).toBe(0.25);
      expect(texts(found)).toEqual(expect.arrayContaining(['e 0.410 · 3.3 D', 'e 0.322 · 2.6 D']));
    }
  });
});

it('draws the ring of 2.5 D under a flush head, and the kit maker’s own where the card has one', () => {
  const flush = doublerCard();
  flush.rivet.head = 'flush';
  expect(of(draw(flush), 'circle').find(({ role }) => role === 'ring')!.radius).toBeCloseTo(2.5 * 0.15625, 9);
  const kit = { ...doublerCard(), limits: { edgeMinimumD: 1.75, source: 'drawing 7' } };
  expect(of(draw(kit), 'circle').find(({ role }) => role === 'ring')!.radius).toBeCloseTo(1.75 * 0.15625, 9);
});

it('draws an oblong hole along its own direction and a bend as a bend', () => {
  const drawing = draw(cornerCard());
  expect(of(drawing, 'slot')).toEqual([
    {
      kind: 'slot',
      role: 'hole',
      layer: 1,
      centre: { x: 0.01075, y: 0 },
      width: 0.1285,
      length: 0.15,
      angle: 0,
    },
  ]);
  expect(of(drawing, 'line').filter(({ role }) => role === 'bend')).toHaveLength(1);
});

it('says what lies too far off to be drawn', () => {
  const card = doublerCard();
  card.layers[0]!.edges = [{ distance: 3, angle: 270 }];
  card.neighbours = [{ x: 2, y: 0, dash: 4 }];
  const drawing = draw(card);
  expect(drawing.beyond).toEqual(['edge of spar, below: 3.000', 'next rivet, right: 2.000']);
  expect(texts(drawing)).not.toContain('edge of spar 0.040');
});

it('gives two layers that end in one line one dimension', () => {
  expect(texts(draw(cardB())).filter((text) => text.startsWith('e '))).toEqual(['e 0.320 · 2.05 D']);
});

it('finds a point of the frame again', () => {
  const { frame } = draw(doublerCard());
  const part = fc.integer({ min: -1000, max: 1000 }).map((n) => n / 1000);
  fc.assert(
    fc.property(part, part, (x, y) => {
      const back = toInches(frame, toPixels(frame, { x, y }));
      expect(back.x).toBeCloseTo(x, 9);
      expect(back.y).toBeCloseTo(y, 9);
    }),
  );
});

it('hatches an edge whose measuring error crosses the limit, and only that', () => {
  const card = doublerCard();
  card.layers[1]!.edges = [{ distance: { value: 0.3, u: 0.01 }, angle: 90 }];
  const drawing = draw(card);
  const bands = of(drawing, 'area').filter(({ role }) => role === 'tooClose');
  // The edge as the card has it, 0.300 above the doubler's own hole, which lies 0.027 above the first.
  expect(bands).toHaveLength(1);
  const heights = bands[0]!.points.map(({ y }) => y);
  expect((Math.max(...heights) + Math.min(...heights)) / 2).toBeCloseTo(0.327, 9);
  expect(Math.max(...heights) - Math.min(...heights)).toBeGreaterThanOrEqual(2 * 0.01);
  expect(drawing.legend.at(-1)).toMatchObject({ role: 'tooClose' });
  expect(of(draw(doublerCard()), 'area').map(({ role }) => role)).toEqual(['overlap']);
});

it('keeps to the frame that it is given', () => {
  const { frame } = draw(doublerCard());
  const moved = doublerCard();
  moved.neighbours = [{ x: -1.1, y: 0, dash: 4 }];
  expect(draw(moved).frame).not.toEqual(frame);
  expect(draw(moved, { frame }).frame).toEqual(frame);
});

describe('the drawing in words', () => {
  it('lists every dimension that is drawn', () => {
    for (const card of [doublerCard(), cardA(), cardB(), cornerCard(), threeLayers()]) {
      const said = describeHoleDrawing(card, fitCheck(card)).join('\n');
      const numbers = of(draw(card), 'label')
        .filter(({ role }: DrawnLabel) => ['edge', 'bend', 'pitch', 'offset'].includes(role))
        .map(({ text }) => /\d+\.\d{3}/.exec(text)![0]);
      expect(numbers.length).toBeGreaterThan(2);
      for (const number of numbers) expect(said).toContain(number);
    }
  });

  it('tells each layer, its hole, its place and its edges', () => {
    const said = describeHoleDrawing(doublerCard(), fitCheck(doublerCard()));
    expect(said).toContain(
      'Layer 2, doubler: 2024-T3 clad; thickness 0.063; primed; round hole 0.128 · #30; hole 0.027 ± 0.002 above the first hole; edge above 0.322 ± 0.005 from its hole; no bend near.',
    );
    expect(said.at(-1)).toMatch(
      /^Next rivet size, AD5: final hole 0\.159 · #21; centred 0\.014 above the first hole;.*marginal: pitch 3\.9 D\.$/,
    );
  });

  it('says what was not measured', () => {
    const said = describeHoleDrawing({ layers: [{}], rivet: { dash: 4 } }, null).join(' ');
    expect(said).toMatch(/thickness not measured; hole not measured.*edge not measured; bend not measured/);
    expect(said).toMatch(/Next rivets not measured/);
  });
});
