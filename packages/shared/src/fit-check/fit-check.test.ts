import { cardA, cardB, doublerCard } from '../testing/worked-cards.js';
import type { HoleCard } from './card-fields.js';
import { ENGINE_VERSION, fitCheck } from './fit-check.js';
import {
  fitCheckSchema,
  holeCardSchema,
  type CheckLine,
  type RemedyCheck,
  type RemedyKind,
} from './hole-card.schema.js';

function remedy(card: HoleCard, kind: RemedyKind): RemedyCheck {
  return fitCheck(card).remedies.find((one) => one.kind === kind)!;
}
function line(card: HoleCard, kind: RemedyKind, id: string): CheckLine {
  const found = remedy(card, kind).checks.find((one) => one.id === id);
  if (!found) throw new Error(`${kind} has no line ${id}`);
  return found;
}

it('answers as its own schema says, whatever is left out', () => {
  for (const card of [cardA(), cardB(), doublerCard(), { layers: [{}], rivet: { dash: 7 } }]) {
    expect(fitCheckSchema.parse(fitCheck(card))).toEqual(fitCheck(card));
  }
});

it('compares the remedies in the order of preference', () => {
  expect(fitCheck(cardA()).remedies.map(({ kind }) => kind)).toEqual([
    'leave',
    'cleanUp',
    'nextSize',
    'replacePart',
    'askKitMaker',
  ]);
  expect(fitCheck(cardA()).engineVersion).toBe(ENGINE_VERSION);
});

// Worked by hand from S1, S3, S7, S9, S20, S27, to four significant figures
describe('two AD3 holes 0.0200 apart', () => {
  it('are too large together for the rivet, and no drill serves', () => {
    expect(line(cardA(), 'leave', 'round')).toMatchObject({
      verdict: 'outside',
      code: 'over_hole_maximum',
      limit: 0.101,
    });
    expect(line(cardA(), 'leave', 'round').value).toBeCloseTo(0.118, 9);
    expect(line(cardA(), 'cleanUp', 'cleanUp')).toMatchObject({
      verdict: 'outside',
      code: 'no_drill',
      value: null,
    });
    expect(remedy(cardA(), 'cleanUp').finalHole).toBeNull();
  });

  it('clean up to #30 for an AD4-4, 0.0105 to spare', () => {
    const next = remedy(cardA(), 'nextSize');
    expect(next.finalHole).toEqual({ diameter: 0.1285, drill: '#30' });
    expect(next.rivet).toEqual({ head: 'universal', alloy: 'AD', dash: 4, lengthDash: 4 });
    expect(line(cardA(), 'nextSize', 'cleanUp').margin).toBeCloseTo(0.0105, 9);
    expect(line(cardA(), 'nextSize', 'length').value).toBeCloseTo(0.2445, 9);
  });

  it('then lie short of both edges, even with the slack used away from them', () => {
    const near = line(cardA(), 'nextSize', 'edge:0:0');
    expect(near).toMatchObject({ verdict: 'outside', code: 'below_minimum', limit: 2 });
    expect(near.value).toBeCloseTo(1.52, 9);
    expect(near.remark).toMatch(/0\.19525, 1\.562 D/);
    expect(line(cardA(), 'nextSize', 'edge:1:0').value).toBeCloseTo(1.76, 9);
    expect(remedy(cardA(), 'nextSize').verdict).toBe('outside');
    expect(fitCheck(cardA()).stopAndAsk).toContain('edge_below_minimum');
    expect(fitCheck(cardA()).stopAndAsk).not.toContain('below_floor');
  });

  it('would be 145.0 percent as strong, and bearing is what gives first then', () => {
    const strength = line(cardA(), 'nextSize', 'strength');
    expect(strength).toMatchObject({ verdict: 'inside', unit: 'percent' });
    expect(strength.value).toBeCloseTo(145.0, 1);
    expect(strength.formula).toBe('314.7 / 217.0 lb = 145.0 %');
    expect(strength.remark).toMatch(/shear of the rivet to bearing of flange/);
  });
});

describe('one of six AD4 opened to AD5', () => {
  it('is inside on every line', () => {
    const next = remedy(cardB(), 'nextSize');
    expect(next.checks.map(({ id, verdict }) => [id, verdict])).toEqual(
      next.checks.map(({ id }) => [id, 'inside']),
    );
    expect(next).toMatchObject({ verdict: 'inside', finalHole: { diameter: 0.159, drill: '#21' } });
    expect(next.rivet).toMatchObject({ dash: 5, lengthDash: 5 });
    expect(fitCheck(cardB()).stopAndAsk).toEqual([]);
  });

  it.each([
    ['cleanUp', 0.159],
    ['edge:0:0', 2.048],
    ['edge:1:0', 2.048],
    ['pitch:0', 5.6912],
    ['thickness:1', 0.2048],
    ['strength', 108.93],
    ['length', 0.306375],
    ['pattern', 1],
  ])('has %s %f', (id, value) => expect(line(cardB(), 'nextSize', id).value).toBeCloseTo(value, 2));

  it('has 0.0090 to spare in the hole and moves half the lengthening', () => {
    expect(line(cardB(), 'nextSize', 'cleanUp').margin).toBeCloseTo(0.009, 9);
    expect(remedy(cardB(), 'nextSize').centre!.x).toBeCloseTo(0.01075, 9);
    expect(line(cardB(), 'nextSize', 'strength').formula).toBe('2536.0 / 2328.0 lb = 108.9 %');
  });
});

describe('a hole of the doubler 0.027 from the spar’s', () => {
  it('needs 0.1555, which is over 0.132', () => {
    const round = line(doublerCard(), 'leave', 'round');
    expect(round).toMatchObject({ verdict: 'outside', limit: 0.132 });
    expect(round.value).toBeCloseTo(0.1555, 9);
    expect(round.error).toBeCloseTo(0.002, 9);
  });

  it('takes an AD5-5.5 in #21 with the doubler’s edge at 2.15 D and the pitch at 3.9 D', () => {
    const next = remedy(doublerCard(), 'nextSize');
    expect(next).toMatchObject({ verdict: 'marginal', finalHole: { diameter: 0.159, drill: '#21' } });
    expect(next.rivet).toEqual({ head: 'universal', alloy: 'AD', dash: 5, lengthDash: 5.5 });
    expect(line(doublerCard(), 'nextSize', 'edge:1:0').value).toBeCloseTo(0.3355 / 0.15625, 9);
    expect(line(doublerCard(), 'nextSize', 'pitch:0')).toMatchObject({ verdict: 'marginal', code: 'tight' });
    expect(line(doublerCard(), 'nextSize', 'pitch:0').value).toBeCloseTo(3.905, 3);
    expect(next.checks.filter(({ verdict }) => verdict !== 'inside').map(({ id }) => id)).toEqual([
      'pitch:0',
    ]);
  });

  it('is short at 1.97 D had the near edge been on the other side', () => {
    const card = doublerCard();
    card.layers[1]!.edges![0]!.angle = 270;
    const edge = line(card, 'nextSize', 'edge:1:0');
    expect(edge.value).toBeCloseTo(1.974, 3);
    expect(edge).toMatchObject({ verdict: 'marginal', code: 'too_close_to_call' });
    expect(edge.remark).toMatch(/pins/);
  });

  it('needs 0.1825 when the drill is held on the spar’s hole', () => {
    expect(remedy(doublerCard(), 'nextSize').remarks[0]).toMatch(/^Held on the centre of spar .* 0\.1825\.$/);
  });

  it('is too close to call with the first reading, 0.030 ± 0.005', () => {
    const card = doublerCard();
    card.layers[1]!.offset = { x: 0, y: { value: 0.03, u: 0.005 } };
    expect(line(card, 'nextSize', 'cleanUp')).toMatchObject({
      verdict: 'marginal',
      code: 'too_close_to_call',
    });
    expect(line(card, 'nextSize', 'cleanUp').remark).toMatch(/no shop tool settles 0\.0005 in/);
  });

  it('is as drawn with a new doubler', () => {
    const fresh = remedy(doublerCard(), 'replacePart');
    expect(fresh).toMatchObject({ verdict: 'inside', finalHole: { diameter: 0.1285, drill: '#30' } });
    expect(line(doublerCard(), 'replacePart', 'edge:1:0').value).toBeCloseTo(0.349 / 0.125, 9);
  });
});

describe('measuring error', () => {
  const edgeAt = (distance: number, u: number) => {
    const card = doublerCard();
    card.layers[0]!.edges = [{ distance: { value: distance, u }, angle: 270 }];
    return line(card, 'leave', 'edge:0:0');
  };

  // S7: 2 D of an AD4 is 0.250
  it.each([
    [0.255, 0.005, 'inside', 'ok'],
    [0.2549, 0.005, 'marginal', 'too_close_to_call'],
    [0.245, 0.005, 'marginal', 'too_close_to_call'],
    [0.2449, 0.005, 'outside', 'below_minimum'],
    [0.25, 0, 'inside', 'ok'],
    [0.2499, 0, 'outside', 'below_minimum'],
  ])('finds an edge of %f ± %f', (distance, u, ...[verdict, code]) => {
    expect(edgeAt(distance, u)).toMatchObject({ verdict, code });
  });

  it.each([
    [0.2501, 0.005, 'no shop tool settles'],
    [0.254, 0.005, 'pins'],
    [0.256, 0.01, 'a caliper'],
    [0.262, 0.022, 'a steel rule'],
  ])('names for %f ± %f what would settle it', (distance, u, tool) => {
    expect(edgeAt(distance, u).remark).toContain(tool);
  });

  it('combines as the root of the sum of squares', () => {
    const edge = line(doublerCard(), 'nextSize', 'edge:1:0');
    expect(edge.error).toBeCloseTo(Math.hypot(0.005, 0.001) / 0.15625, 9);
  });

  it('counts as zero where none is given, and says so', () => {
    expect(line(cardA(), 'leave', 'edge:0:0').error).toBeNull();
    expect(fitCheck(cardA()).assumptions).toContain('No measuring error was given: it counts as zero.');
    expect(fitCheck(doublerCard()).assumptions).not.toContain(
      'No measuring error was given: it counts as zero.',
    );
  });
});

describe('the kit maker’s own limits', () => {
  it('replace the published ones and are named', () => {
    const card = cardA();
    card.limits = {
      edgeMinimumD: 1.5,
      pitchMinimumD: 6.5,
      holeMaximum: 0.119,
      source: 'drawing 7 revision C',
    };
    expect(line(card, 'nextSize', 'edge:0:0')).toMatchObject({
      verdict: 'inside',
      limit: 1.5,
      source: 'drawing 7 revision C',
    });
    expect(line(card, 'nextSize', 'pitch:0')).toMatchObject({
      verdict: 'outside',
      limit: 6.5,
      source: 'drawing 7 revision C',
    });
    expect(line(card, 'leave', 'round')).toMatchObject({
      verdict: 'inside',
      limit: 0.119,
      source: 'drawing 7 revision C',
    });
    expect(fitCheck(card).assumptions.join()).toContain('drawing 7 revision C');
  });

  it('give way to the limit of one edge', () => {
    const card = cardA();
    card.limits = { edgeMinimumD: 1.5, source: 'drawing 7' };
    card.layers[0]!.edges![0]!.minimumD = 1.75;
    expect(line(card, 'nextSize', 'edge:0:0')).toMatchObject({ verdict: 'outside', limit: 1.75 });
  });

  it('of a hole hold for the rivet as drawn alone', () => {
    const card = cardB();
    card.limits = { holeMaximum: 0.2, source: 'drawing 7' };
    expect(line(card, 'leave', 'round').limit).toBe(0.2);
    expect(remedy(card, 'cleanUp')).toMatchObject({ finalHole: { diameter: 0.152, drill: '#24' } });
    expect(remedy(card, 'nextSize').finalHole).toEqual({ diameter: 0.159, drill: '#21' });
  });
});

describe('what was not measured', () => {
  const without = (change: (card: HoleCard) => void) => {
    const card = cardB();
    change(card);
    return card;
  };

  it.each<[string, (card: HoleCard) => void, RemedyKind, string, RegExp]>([
    ['a hole', (c) => delete c.layers[1]!.hole, 'leave', 'round', /hole of every layer/],
    [
      'the direction of an oblong',
      (c) => delete (c.layers[1]!.hole as { angle?: number }).angle,
      'nextSize',
      'cleanUp',
      /hole of every layer/,
    ],
    ['an offset', (c) => delete c.layers[1]!.offset, 'nextSize', 'cleanUp', /how far the holes lie apart/],
    [
      'the edges of a layer',
      (c) => delete c.layers[0]!.edges,
      'leave',
      'edge:0:0',
      /edges near the hole in rib/,
    ],
    ['an edge', (c) => (c.layers[0]!.edges = [{ angle: 270 }]), 'leave', 'edge:0:0', /the edge of rib/],
    [
      'the side of an edge',
      (c) => delete c.layers[0]!.edges![0]!.angle,
      'nextSize',
      'edge:0:0',
      /on which side the edge of rib/,
    ],
    ['the neighbours', (c) => delete c.neighbours, 'leave', 'pitch:0', /next rivets/],
    [
      'the place of a neighbour',
      (c) => (c.neighbours = [{ x: 0.9, dash: 4 }]),
      'leave',
      'pitch:0',
      /the place of/,
    ],
    [
      'the size of a neighbour',
      (c) => (c.neighbours = [{ x: 0.9, y: 0 }]),
      'leave',
      'pitch:0',
      /the size of the next rivet/,
    ],
    ['the bends', (c) => delete c.layers[0]!.bends, 'leave', 'bend:0:0', /bends near the hole in rib/],
    ['a thickness', (c) => delete c.layers[0]!.thickness, 'leave', 'thickness:0', /thickness of rib/],
    ['the grip', (c) => delete c.layers[0]!.thickness, 'leave', 'length', /thickness of every layer/],
    ['the alloy of a sheet', (c) => delete c.layers[0]!.alloy, 'leave', 'strength', /alloy of rib/],
    ['the alloy of the rivet', (c) => delete c.rivet.alloy, 'leave', 'strength', /alloy of the rivet/],
    ['the pattern', (c) => delete c.group, 'nextSize', 'pattern', /how many rivets the pattern has/],
    ['the head', (c) => delete c.rivet.head, 'leave', 'edge:0:0', /rivet head/],
  ])('%s is not known and is named', (_, change, ...[kind, id, named]) => {
    const card = without(change);
    expect(line(card, kind, id)).toMatchObject({ verdict: 'unknown', code: 'not_measured' });
    expect(fitCheck(card).missing.join('; ')).toMatch(named);
    expect(remedy(card, kind).verdict).not.toBe('inside');
  });

  it('does not hide that what was measured is too large already', () => {
    const card = without((c) => delete c.layers[0]!.hole);
    expect(line(card, 'leave', 'round')).toMatchObject({ verdict: 'outside', value: 0.15 });
  });

  it('does not hide that a rivet of unknown size is too close already', () => {
    const card = without((c) => (c.neighbours = [{ x: 0.35, y: 0 }]));
    expect(line(card, 'leave', 'pitch:0')).toMatchObject({ verdict: 'outside', code: 'too_close' });
  });

  it('is another thing than nothing near', () => {
    const card = without((c) => c.layers.forEach((layer) => (layer.edges = [])));
    card.neighbours = [];
    const leave = remedy(card, 'leave');
    expect(leave.checks.some(({ id }) => /^(edge|pitch)/.test(id))).toBe(false);
    expect(leave.checks.find(({ id }) => id === 'strength')).toMatchObject({ verdict: 'inside', value: 100 });
  });
});

describe('a card with everything that may stand on it', () => {
  // As it comes over the wire: nulls, bare numbers, an oblong hole, a bend.
  const wire: unknown = JSON.parse(`{
    "layers": [
      { "name": "rear spar", "partId": null, "alloy": "2024-T3 clad", "thickness": 0.04,
        "hole": { "shape": "round", "diameter": 0.1285 }, "offset": { "x": 0, "y": 0 },
        "edges": [{ "distance": 0.41, "angle": 270 }], "bends": [], "finish": "primed" },
      { "name": "doubler", "partId": null, "alloy": "2024-T3 clad", "thickness": 0.063,
        "hole": { "shape": "oblong", "width": 0.1285, "length": 0.131, "angle": 90 }, "offset": { "x": 0, "y": 0.027 },
        "edges": [{ "distance": 0.322, "angle": 90, "minimumD": null }],
        "bends": [{ "distance": 0.31, "angle": 270 }], "finish": "primed" }
    ],
    "rivet": { "head": "universal", "alloy": "AD", "dash": 4 },
    "neighbours": [{ "x": -0.61, "y": 0, "dash": 4 }, { "x": 0.64, "y": 0, "dash": 4 }],
    "group": { "count": 22, "oversize": 0, "adjacentOversize": 0 },
    "flags": { "critical": false, "controlSurface": false, "fuelWet": false, "pressurised": false, "crack": false },
    "access": "both"
  }`);
  const card = holeCardSchema.parse(wire);

  it('is checked on every line', () => {
    const next = remedy(card, 'nextSize');
    expect(fitCheck(card)).toMatchObject({ missing: [], stopAndAsk: [] });
    expect(next.checks.map(({ id }) => id)).toEqual([
      'cleanUp',
      'edge:0:0',
      'edge:1:0',
      'pitch:0',
      'headClearance:0',
      'pitch:1',
      'headClearance:1',
      'bend:1:0',
      'thickness:0',
      'thickness:1',
      'strength',
      'length',
      'pattern',
    ]);
  });

  it('needs 0.15675 for the far end of the oblong, and has the bend where the centre moves to', () => {
    expect(line(card, 'leave', 'round').value).toBeCloseTo(0.1285 + 0.027 + 0.00125, 9);
    expect(remedy(card, 'nextSize').centre!.y).toBeCloseTo(0.014125, 9);
    expect(line(card, 'nextSize', 'bend:1:0').value).toBeCloseTo((0.31 - 0.012875) / 0.15625, 9);
  });
});
