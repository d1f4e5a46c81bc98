import fc from 'fast-check';
import type { HoleCard, HoleCardLayer, LayerHole } from './card-fields.js';
import { severityOf } from './checks/judge.js';
import { asDoneCheck } from './as-done-check.js';
import { fitCheck } from './fit-check.js';
import {
  fitCheckSchema,
  holeCardSchema,
  type CheckLine,
  type FitCheck,
  type Verdict,
} from './hole-card.schema.js';
import { headlineTrouble } from './headline.js';
import { valueOf, type Measured } from './measured.js';

const thousandths = (min: number, max: number) => fc.integer({ min, max }).map((n) => n / 1000);
const angle = fc.integer({ min: 0, max: 359 });
const u = thousandths(0, 22);
const withError = (length: fc.Arbitrary<number>): fc.Arbitrary<Measured> =>
  fc.oneof(length, fc.record({ value: length, u }));
/** Absent, null and given all happen. */
const maybe = <T>(arbitrary: fc.Arbitrary<T>) =>
  fc.oneof({ weight: 6, arbitrary }, { weight: 1, arbitrary: fc.constantFrom(null, undefined) });

const round = fc.record({ shape: fc.constant('round' as const), diameter: withError(thousandths(90, 260)) });
const oblong = fc
  .tuple(thousandths(90, 200), thousandths(0, 60), maybe(angle))
  .map(([width, longer, direction]) => ({
    shape: 'oblong' as const,
    width,
    length: width + longer,
    angle: direction,
  }));
const hole: fc.Arbitrary<LayerHole> = fc.oneof(round, oblong, fc.constant({ shape: 'none' as const }));

const layer: fc.Arbitrary<HoleCardLayer> = fc.record({
  name: maybe(fc.constantFrom('spar', 'doubler', 'skin')),
  alloy: maybe(fc.constantFrom('2024-T3 clad', '2024-T3', '6061-T6', 'tin')),
  thickness: maybe(withError(thousandths(16, 125))),
  hole: maybe(hole),
  offset: maybe(
    fc.record({ x: maybe(withError(thousandths(-60, 60))), y: maybe(withError(thousandths(-60, 60))) }),
  ),
  edges: maybe(
    fc.array(fc.record({ distance: maybe(withError(thousandths(150, 900))), angle: maybe(angle) }), {
      maxLength: 4,
    }),
  ),
  bends: maybe(
    fc.array(fc.record({ distance: maybe(withError(thousandths(0, 500))), angle: maybe(angle) }), {
      maxLength: 2,
    }),
  ),
  finish: maybe(
    fc.constantFrom('bare' as const, 'primed' as const, 'dimpled' as const, 'countersunk' as const),
  ),
});

const anyCard: fc.Arbitrary<HoleCard> = fc.record({
  layers: fc.array(layer, { minLength: 1, maxLength: 5 }),
  rivet: fc.record({
    head: maybe(fc.constantFrom('universal' as const, 'flush' as const)),
    alloy: maybe(fc.constantFrom('AD', 'DD', 'D', 'A')),
    dash: fc.integer({ min: 2, max: 12 }),
  }),
  neighbours: maybe(
    fc.array(
      fc.record({
        x: maybe(withError(thousandths(400, 900))),
        y: maybe(withError(thousandths(-200, 200))),
        dash: maybe(fc.integer({ min: 2, max: 8 })),
      }),
      { maxLength: 3 },
    ),
  ),
  group: maybe(
    fc.record({
      count: maybe(fc.integer({ min: 10, max: 60 })),
      oversize: maybe(fc.integer({ min: 3, max: 9 })),
      adjacentOversize: maybe(fc.integer({ min: 0, max: 3 })),
    }),
  ),
  access: maybe(fc.constantFrom('both' as const, 'squeezer' as const, 'oneSide' as const)),
});
const validCard = anyCard.filter((card) => holeCardSchema.safeParse(card).success);

/** A card on which everything is known: two layers, a whole answer. */
const known = fc.record({
  diameter: fc.constantFrom(0.098, 0.1285, 0.159),
  offset: fc.record({ x: thousandths(-30, 30), y: thousandths(-30, 30) }),
  edges: fc.array(fc.record({ distance: thousandths(150, 900), angle }), { minLength: 2, maxLength: 2 }),
  neighbour: fc.record({ x: thousandths(450, 1500), y: thousandths(-100, 100) }),
  errors: fc.record({ edge: u, offset: fc.constantFrom<number[]>(0, 0.002, 0.005) }),
});
type Known = typeof known extends fc.Arbitrary<infer T> ? T : never;

function cardOf({ diameter, offset, edges, neighbour, errors }: Known): HoleCard {
  const dash = { 0.098: 3, 0.1285: 4, 0.159: 5 }[diameter]!;
  return {
    layers: [0, 1].map((index) => ({
      name: `sheet ${index + 1}`,
      alloy: '2024-T3 clad',
      thickness: 0.04,
      hole: { shape: 'round' as const, diameter },
      offset:
        index === 0
          ? { x: 0, y: 0 }
          : { x: offset.x, y: errors.offset ? { value: offset.y, u: errors.offset } : offset.y },
      edges: [{ distance: { value: edges[index]!.distance, u: errors.edge }, angle: edges[index]!.angle }],
      bends: [],
    })),
    rivet: { head: 'universal', alloy: 'AD', dash },
    neighbours: [{ ...neighbour, dash }],
    group: { count: 22, oversize: 0, adjacentOversize: 0 },
    flags: {},
    access: 'both',
  };
}

const linesOf = (check: FitCheck): CheckLine[] => check.remedies.flatMap(({ checks }) => checks);
const verdictsOf = (check: FitCheck): Verdict[] => [
  ...check.remedies.map(({ verdict }) => verdict),
  ...linesOf(check).map(({ verdict }) => verdict),
];

it('never throws on a card that can be, and answers as its schema says', () => {
  fc.assert(
    fc.property(validCard, (card) => {
      const check = fitCheck(card);
      expect(fitCheckSchema.safeParse(check).error).toBeUndefined();
      headlineTrouble(null, check);
    }),
    { numRuns: 300 },
  );
});

it('looks at what was done without throwing, whatever is told', () => {
  const asDone = fc.record(
    {
      finalDrill: fc.oneof(fc.string(), fc.constantFrom('#30', '#21', 'F', '5/32')),
      edgeDistances: fc.array(thousandths(1, 900), { maxLength: 5 }),
      shopHead: fc.record({ width: thousandths(1, 400), height: thousandths(1, 200) }),
      rivetLengthDash: fc.integer({ min: 1, max: 40 }),
    },
    { requiredKeys: [] },
  );
  fc.assert(
    fc.property(validCard, asDone, (card, done) => {
      const planned = fitCheck(card).remedies[2]!;
      expect(asDoneCheck(card, done, planned).checks.length).toBeGreaterThan(0);
    }),
    { numRuns: 200 },
  );
});

it('puts a remedy where its worst line is, and no unknown above that', () => {
  fc.assert(
    fc.property(validCard, (card) => {
      for (const { checks, verdict } of fitCheck(card).remedies) {
        const worst =
          checks.length > 0
            ? Math.max(...checks.map((line) => severityOf(line.verdict)))
            : severityOf('unknown');
        expect(severityOf(verdict)).toBe(worst);
      }
    }),
    { numRuns: 200 },
  );
});

it('is the same check twice', () => {
  fc.assert(
    fc.property(validCard, (card) => expect(fitCheck(card)).toEqual(fitCheck(structuredClone(card)))),
    { numRuns: 50 },
  );
});

it('is never better with less edge', () => {
  fc.assert(
    fc.property(known, thousandths(1, 200), fc.integer({ min: 0, max: 1 }), (facts, less, which) => {
      const distance = facts.edges[which]!.distance - less;
      fc.pre(distance > facts.diameter / 2);
      const edges = facts.edges.map((edge, index) => (index === which ? { ...edge, distance } : edge));
      const [before, after] = [fitCheck(cardOf(facts)), fitCheck(cardOf({ ...facts, edges }))];
      const before_ = linesOf(before).filter(({ id }) => id.startsWith('edge:'));
      const after_ = linesOf(after).filter(({ id }) => id.startsWith('edge:'));
      after_.forEach((line, index) => {
        if (line.remark?.startsWith('Missing')) return;
        expect(severityOf(line.verdict)).toBeGreaterThanOrEqual(severityOf(before_[index]!.verdict));
      });
    }),
  );
});

it('is never better with less pitch, from the usual ten D down', () => {
  fc.assert(
    fc.property(known, thousandths(1, 300), (facts, less) => {
      const near = { ...facts, neighbour: { x: facts.neighbour.x - less, y: 0 } };
      fc.pre(near.neighbour.x > 0.3 && facts.neighbour.x < 0.85);
      const far = { ...facts, neighbour: { x: facts.neighbour.x, y: 0 } };
      const pitchesOf = (card: HoleCard) =>
        linesOf(fitCheck(card)).filter(
          ({ id, remark }) => /^(pitch|headClearance):/.test(id) && !remark?.startsWith('Missing'),
        );
      const [before, after] = [pitchesOf(cardOf(far)), pitchesOf(cardOf(near))];
      fc.pre(before.length === after.length);
      after.forEach((line, index) =>
        expect(severityOf(line.verdict)).toBeGreaterThanOrEqual(severityOf(before[index]!.verdict)),
      );
    }),
  );
});

it('calls nothing inside because it was measured worse', () => {
  fc.assert(
    fc.property(known, thousandths(1, 30), (facts, worse) => {
      const errors = { edge: facts.errors.edge + worse, offset: facts.errors.offset + worse };
      const [before, after] = [
        linesOf(fitCheck(cardOf(facts))),
        linesOf(fitCheck(cardOf({ ...facts, errors }))),
      ];
      after.forEach((line, index) => {
        if (line.verdict === 'inside') expect(before[index]!.verdict).toBe('inside');
        // A new part's line that is no longer clearly inside is not known, and has no value then.
        if (line.value !== null) expect(line.value).toBe(before[index]!.value);
      });
    }),
  );
});

/** Turns the whole card, and mirrors it where asked: the same metal seen from elsewhere. */
function seenFrom(card: HoleCard, turn: number, mirror: boolean): HoleCard {
  const rad = (turn * Math.PI) / 180;
  const turned = (x: number, y: number) => {
    const flipped = mirror ? -y : y;
    return { x: x * Math.cos(rad) - flipped * Math.sin(rad), y: x * Math.sin(rad) + flipped * Math.cos(rad) };
  };
  const angleOf = (direction: number) => ((((mirror ? -direction : direction) + turn) % 360) + 360) % 360;
  return {
    ...card,
    layers: card.layers.map((one) => ({
      ...one,
      offset: turned(valueOf(one.offset!.x!), valueOf(one.offset!.y!)),
      edges: one.edges!.map((edge) => ({ ...edge, angle: angleOf(edge.angle!) })),
    })),
    neighbours: card.neighbours!.map((one) => ({ ...one, ...turned(valueOf(one.x!), valueOf(one.y!)) })),
  };
}

it('does not depend on where it is looked at from', () => {
  fc.assert(
    fc.property(known, angle, fc.boolean(), (facts, turn, mirror) => {
      const still = cardOf({ ...facts, errors: { edge: facts.errors.edge, offset: 0 } });
      const [here, there] = [linesOf(fitCheck(still)), linesOf(fitCheck(seenFrom(still, turn, mirror)))];
      there.forEach(({ id, value, verdict }, index) => {
        expect(id).toBe(here[index]!.id);
        if (value === null) expect(here[index]!.value).toBeNull();
        else expect(value).toBeCloseTo(here[index]!.value!, 6);
        const onTheLimit = Math.abs(here[index]!.margin ?? 1) < 1e-6;
        if (!onTheLimit) expect(verdict).toBe(here[index]!.verdict);
      });
    }),
  );
});

it('does not depend on the order of the layers', () => {
  fc.assert(
    fc.property(known, (facts) => {
      const card = cardOf(facts);
      const back = { ...card, layers: card.layers.toReversed() };
      const [here, there] = [fitCheck(card), fitCheck(back)];
      const sorted = (check: FitCheck, index: number) =>
        [...check.remedies[index]!.checks.map(({ verdict }) => verdict)].sort();
      // Left as it is, the pitch is measured from the first layer's hole; a cleaned hole has but one centre.
      for (const index of [1, 2]) expect(sorted(there, index)).toEqual(sorted(here, index));
    }),
  );
});

it('does not depend on the unit in which a length was typed', () => {
  fc.assert(
    fc.property(known, (facts) => {
      const card = cardOf(facts);
      const viaMm = (length: number) => Number((length * 25.4).toFixed(6)) / 25.4;
      const typed: HoleCard = {
        ...card,
        layers: card.layers.map((one) => ({
          ...one,
          edges: one.edges!.map((edge) => ({ ...edge, distance: viaMm(valueOf(edge.distance!)) })),
        })),
      };
      const exact: HoleCard = {
        ...card,
        layers: card.layers.map((one) => ({
          ...one,
          edges: one.edges!.map((edge) => ({ ...edge, distance: valueOf(edge.distance!) })),
        })),
      };
      const margins = linesOf(fitCheck(exact)).map(({ margin }) => Math.abs(margin ?? 1));
      fc.pre(Math.min(...margins.filter((margin) => margin > 1e-9)) > 1e-5);
      expect(verdictsOf(fitCheck(typed))).toEqual(verdictsOf(fitCheck(exact)));
    }),
  );
});
