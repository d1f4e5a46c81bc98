import { cardA, cardB, doublerCard } from '../testing/worked-cards.js';
import type { HoleCard } from './card-fields.js';
import { fitCheck } from './fit-check.js';
import type { CheckLine, RemedyCheck, RemedyKind } from './hole-card.schema.js';

type Change = (card: HoleCard) => void;

/** The card whose every line is inside at the next size, changed in one thing. */
function changed(change: Change): HoleCard {
  const card = cardB();
  change(card);
  return card;
}
function remedy(card: HoleCard, kind: RemedyKind): RemedyCheck {
  return fitCheck(card).remedies.find((one) => one.kind === kind)!;
}
function line(card: HoleCard, id: string, kind: RemedyKind = 'nextSize'): CheckLine {
  return remedy(card, kind).checks.find((one) => one.id === id)!;
}

// S7, S21: D of an AD5 is 0.15625
it.each([
  [0.2343, 'outside', 'below_floor'],
  [0.2344, 'outside', 'below_minimum'],
  [0.3124, 'outside', 'below_minimum'],
  [0.3125, 'inside', 'ok'],
  [0.625, 'inside', 'ok'],
  [0.7, 'inside', 'ok'],
])('takes an edge of %f as %s, %s', (distance, verdict, code) => {
  const card = changed((c) => (c.layers[0]!.edges = [{ distance, angle: 270 }]));
  expect(line(card, 'edge:0:0')).toMatchObject({ verdict, code });
});

it('says beside an edge beyond 4 D that only the nearest row is meant', () => {
  const card = changed((c) => (c.layers[0]!.edges = [{ distance: 0.7, angle: 270 }]));
  expect(line(card, 'edge:0:0').remark).toMatch(/Beyond 4 D/);
});

it('asks more of a flush head', () => {
  const card = changed((c) => {
    c.rivet.head = 'flush';
    c.layers[0]!.finish = c.layers[1]!.finish = 'dimpled';
  });
  expect(line(card, 'edge:0:0')).toMatchObject({ limit: 2.5, verdict: 'outside' });
  expect(line(card, 'strength').remark).toMatch(/Flush joint: advisory/);
});

it('measures to the corner where two edges meet, and not where they face each other', () => {
  const square = changed(
    (c) =>
      (c.layers[0]!.edges = [
        { distance: 0.32, angle: 270 },
        { distance: 0.33, angle: 0 },
      ]),
  );
  const corner = line(square, 'corner:0', 'leave');
  expect(corner).toMatchObject({ verdict: 'inside', limit: 2 });
  expect(corner.value).toBeCloseTo(Math.hypot(0.32, 0.33) / 0.125, 9);
  const moved = line(square, 'corner:0');
  expect(moved.value).toBeCloseTo(Math.hypot(0.32, 0.33 - 0.01075) / 0.15625, 9);
  const facing = changed(
    (c) =>
      (c.layers[0]!.edges = [
        { distance: 0.32, angle: 270 },
        { distance: 0.33, angle: 90 },
      ]),
  );
  expect(line(facing, 'corner:0')).toBeUndefined();
});

// S7, S3, S21: pitch in D of the larger rivet, 0.15625; the new centre is 0.01075 nearer
it.each([
  [0.4794, 'outside', 'too_close'],
  [0.4796, 'marginal', 'tight'],
  [0.6356, 'marginal', 'tight'],
  [0.6359, 'inside', 'ok'],
  [1.5731, 'inside', 'ok'],
  [1.5735, 'marginal', 'too_far'],
])('takes a neighbour at %f as %s, %s', (x, verdict, code) => {
  const card = changed((c) => (c.neighbours = [{ x, y: 0, dash: 4 }]));
  expect(line(card, 'pitch:0')).toMatchObject({ verdict, code });
});

it('counts the pitch in D of a larger neighbour', () => {
  const card = changed((c) => (c.neighbours = [{ x: 0.9, y: 0, dash: 8 }]));
  expect(line(card, 'pitch:0', 'leave').value).toBeCloseTo(3.6, 9);
});

// Heads: 2 D universal (memory), 1.5 D shop head (S13); a gap of 0.02 is house
it.each([
  [0.2499, 'outside', 'heads_touch'],
  [0.2501, 'marginal', 'heads_close'],
  [0.2699, 'marginal', 'heads_close'],
  [0.2701, 'inside', 'ok'],
])('takes heads of AD4 at a pitch of %f as %s, %s', (x, verdict, code) => {
  const card = changed((c) => (c.neighbours = [{ x, y: 0, dash: 4 }]));
  expect(line(card, 'headClearance:0', 'leave')).toMatchObject({ verdict, code });
});

// Bends: 1 D and 0.75 D, a head on the radius from 0.5 D down (house)
it.each([
  [0.15625, 'head', 'inside', 'ok'],
  [0.1562, 'head', 'marginal', 'near_bend'],
  [0.1562, 'shop', 'inside', 'ok'],
  [0.1172, 'shop', 'inside', 'ok'],
  [0.1171, 'shop', 'marginal', 'near_bend'],
  [0.078, 'shop', 'outside', 'on_bend'],
] as const)('takes a bend at %f on the %s side', (distance, side, ...[verdict, code]) => {
  const card = changed((c) => (c.layers[0]!.bends = [{ distance, angle: 90, side }]));
  expect(line(card, 'bend:0:0')).toMatchObject({ verdict, code });
});

it('takes the wider head where nobody says which lies on the bend, and says so', () => {
  const card = changed((c) => (c.layers[0]!.bends = [{ distance: 0.2, angle: 90 }]));
  expect(line(card, 'bend:0:0').limit).toBe(1);
  expect(fitCheck(card).assumptions.join()).toMatch(/side of the bend in rib/);
});

// S9: bearing is tabulated from t/D 0.18
it('shows no percentage of a strength that is not tabulated for so thin a sheet', () => {
  const card = changed((c) => (c.layers[1]!.thickness = 0.028));
  expect(line(card, 'thickness:1')).toMatchObject({ verdict: 'marginal', code: 'not_tabulated' });
  expect(line(card, 'strength')).toMatchObject({ verdict: 'marginal', code: 'not_tabulated', value: null });
  expect(line(card, 'strength').formula).not.toMatch(/%/);
});

it('says that a group is weaker where bearing gives first in a short edge', () => {
  const card = cardA();
  card.rivet.dash = 4;
  card.layers.forEach((layer) => {
    layer.hole = { shape: 'round', diameter: 0.1285 };
    layer.thickness = 0.025;
    layer.edges = [{ distance: 0.25, angle: 90 }];
  });
  card.layers[1]!.offset = { x: 0, y: 0.06 };
  // Shear 388 before; 0.22 / 0.125 = 1.76 D after, where 97 to 121 ksi (S27) gives 109.48 ksi
  expect(line(card, 'strength', 'cleanUp')).toMatchObject({ verdict: 'outside', code: 'needs_compensation' });
  expect(line(card, 'strength', 'cleanUp').value).toBeCloseTo((100 * 109_480 * 0.1285 * 0.025) / 388, 1);
});

it('has no strength below 1.5 D, where none is tabulated', () => {
  const card = changed((c) => (c.layers[0]!.edges = [{ distance: 0.2, angle: 270 }]));
  expect(line(card, 'strength')).toMatchObject({ verdict: 'unknown', code: 'below_floor', value: null });
});

it.each<[string, Change, string]>([
  ['a sheet', (c) => (c.layers[0]!.alloy = '7075-T6'), 'unknown_alloy'],
  ['a rivet', (c) => (c.rivet.alloy = 'A'), 'unknown_alloy'],
  ['a thickness', (c) => (c.layers[0]!.thickness = 0.3), 'not_tabulated'],
  ['a size', (c) => (c.rivet.dash = 7), 'not_tabulated'],
])('does not know the strength of %s that is not tabulated, and checks the geometry', (_, change, code) => {
  expect(line(changed(change), 'strength', 'leave')).toMatchObject({ verdict: 'unknown', code });
  expect(line(changed(change), 'edge:0:0', 'leave').value).not.toBeNull();
});

// S11, S25: least sheet for a machine countersink 0.050 under an AD4, 0.064 under an AD5
it.each([
  [0.063, 'leave', 'inside', 'countersink_ok'],
  [0.063, 'nextSize', 'marginal', 'between'],
  [0.05, 'nextSize', 'outside', 'knife_edge'],
  [{ value: 0.0635, u: 0.001 }, 'nextSize', 'marginal', 'too_close_to_call'],
] as const)('finds a countersunk sheet of %p to %s %s', (thickness, kind, ...[verdict, code]) => {
  const card = changed((c) => {
    c.layers[0] = { ...c.layers[0]!, thickness, finish: 'countersunk' };
    c.rivet.head = 'flush';
  });
  expect(line(card, 'countersink:0', kind)).toMatchObject({ verdict, code });
});

it('asks how the sheet under a flush head is formed', () => {
  const card = changed((c) => {
    c.rivet.head = 'flush';
    c.layers.forEach((layer) => delete layer.finish);
  });
  expect(line(card, 'countersink:0')).toMatchObject({ verdict: 'unknown' });
  expect(fitCheck(card).missing.join()).toMatch(/dimpled or countersunk/);
});

// S8: a fifth of the pattern, at most ten, no more than two side by side
it.each([
  [22, 3, 0, 'inside', 'ok'],
  [22, 4, 0, 'outside', 'pattern_limit'],
  [22, 2, 1, 'inside', 'ok'],
  [22, 2, 2, 'outside', 'adjacent_limit'],
  [4, 0, 0, 'outside', 'pattern_limit'],
  [5, 0, 0, 'inside', 'ok'],
  [80, 9, 0, 'inside', 'ok'],
  [80, 10, 0, 'outside', 'pattern_limit'],
])(
  'takes %i rivets with %i oversize, %i side by side',
  (count, oversize, adjacentOversize, ...[verdict, code]) => {
    const card = changed((c) => (c.group = { count, oversize, adjacentOversize }));
    expect(line(card, 'pattern')).toMatchObject({ verdict, code });
    expect(fitCheck(card).stopAndAsk.includes('pattern_limit')).toBe(verdict === 'outside');
  },
);

describe('the size of the rivet', () => {
  const offsetBy = (offset: number, dash: number, diameter: number) =>
    changed((c) => {
      c.rivet.dash = dash;
      c.layers[0]!.hole = c.layers[1]!.hole = { shape: 'round', diameter };
      c.layers[1]!.offset = { x: offset, y: 0 };
    });

  it('stays where a drill serves inside the hole maximum', () => {
    const card = offsetBy(0.0015, 5, 0.159);
    expect(remedy(card, 'cleanUp')).toMatchObject({
      finalHole: { diameter: 0.161, drill: '#20' },
      rivet: { dash: 5 },
    });
    expect(line(card, 'cleanUp', 'cleanUp')).toMatchObject({ verdict: 'inside', code: 'ok' });
  });

  it('is never given a hole smaller than its own', () => {
    const card = offsetBy(0.001, 4, 0.12);
    expect(remedy(card, 'cleanUp').finalHole).toEqual({ diameter: 0.1285, drill: '#30' });
  });

  it('skips one at its peril', () => {
    const card = offsetBy(0.05, 4, 0.1285);
    expect(remedy(card, 'nextSize')).toMatchObject({
      verdict: 'outside',
      finalHole: { drill: '#11' },
      rivet: { dash: 6 },
    });
    expect(line(card, 'cleanUp')).toMatchObject({ verdict: 'outside', code: 'skips_size' });
    expect(fitCheck(card).stopAndAsk).toContain('skips_size');
  });

  it('goes from 3/16 to 1/4, since 7/32 is no stocked size', () => {
    const next = remedy(offsetBy(0.028, 6, 0.191), 'nextSize');
    expect(next).toMatchObject({ finalHole: { diameter: 0.257, drill: 'F' }, rivet: { dash: 8 } });
    expect(line(offsetBy(0.028, 6, 0.191), 'cleanUp').code).toBe('ok');
  });

  it('has none above 1/4, and no drill above F', () => {
    expect(remedy(offsetBy(0.01, 8, 0.257), 'nextSize')).toMatchObject({
      finalHole: null,
      rivet: null,
      verdict: 'outside',
    });
    expect(line(offsetBy(0.2, 4, 0.1285), 'cleanUp')).toMatchObject({ code: 'no_drill', verdict: 'outside' });
  });
});

describe('three layers and oblong holes', () => {
  it('need the smallest circle round all of them', () => {
    const card = doublerCard();
    card.layers.push({ ...card.layers[0]!, name: 'rib', offset: { x: 0.02, y: 0.0135 } });
    const round = line(card, 'round', 'leave');
    expect(round.value!).toBeGreaterThan(0.1555);
    const centre = remedy(card, 'nextSize').centre!;
    for (const { offset } of card.layers) {
      const at = offset as { x: number; y: number | { value: number } };
      const y = typeof at.y === 'number' ? at.y : at.y.value;
      const away = Math.hypot(at.x - centre.x, y - centre.y);
      expect(away + 0.1285 / 2).toBeLessThanOrEqual(round.value! / 2 + 1e-9);
    }
  });

  it('take a hole not drilled yet as no hole at all', () => {
    const card = changed((c) => (c.layers[1] = { ...c.layers[1]!, hole: { shape: 'none' }, offset: null }));
    expect(line(card, 'round', 'leave')).toMatchObject({ verdict: 'inside', value: 0.1285 });
  });
});

describe('a driven head on the card', () => {
  const driven = (width: number, height: number) => changed((c) => (c.shopHead = { width, height }));

  // S9: 1.3 D by 0.3 D; AD4
  it('is checked where it is to be left', () => {
    expect(line(driven(0.155, 0.07), 'shopHead:width', 'leave')).toMatchObject({
      verdict: 'outside',
      code: 'reject',
    });
    expect(line(driven(0.215, 0.045), 'shopHead:height', 'leave')).toMatchObject({
      verdict: 'marginal',
      code: 'overdriven',
    });
    expect(line(driven(0.188, 0.045), 'shopHead:height', 'leave')).toMatchObject({ code: 'below_nominal' });
    expect(line(driven(0.188, 0.063), 'shopHead:width', 'leave')).toMatchObject({
      verdict: 'inside',
      code: 'ok',
    });
    expect(line(driven(0.188, 0.063), 'shopHead:width')).toBeUndefined();
  });
});

describe('reasons to stop and ask', () => {
  it.each([
    ['critical', 'critical_section'],
    ['crack', 'crack'],
    ['fuelWet', 'fuel_wet'],
    ['pressurised', 'pressurised'],
    ['hingeOrEngineMount', 'hinge_or_engine_mount'],
    ['controlSurface', 'mass_balance'],
  ] as const)('%s', (flag, code) => {
    expect(fitCheck(changed((c) => (c.flags = { ...c.flags, [flag]: true }))).stopAndAsk).toEqual([code]);
    expect(fitCheck(changed((c) => (c.flags = { ...c.flags, [flag]: false }))).stopAndAsk).toEqual([]);
  });

  it('an alloy whose strength nobody knows here', () => {
    expect(fitCheck(changed((c) => (c.layers[0]!.alloy = '2014-T6'))).stopAndAsk).toEqual(['unknown_alloy']);
  });

  it('an edge below the floor', () => {
    const card = changed((c) => (c.layers[0]!.edges = [{ distance: 0.18, angle: 270 }]));
    expect(fitCheck(card).stopAndAsk).toEqual(['below_floor', 'edge_below_minimum']);
  });

  it('are none where a clean hole is left as it is, though the next size would be short', () => {
    const card = changed((c) => {
      c.layers[1]!.hole = { shape: 'round', diameter: 0.1285 };
      c.layers[1]!.offset = { x: 0, y: 0 };
      c.layers[0]!.edges = [{ distance: 0.26, angle: 270 }];
    });
    expect(remedy(card, 'leave').verdict).toBe('inside');
    expect(line(card, 'edge:0:0').verdict).toBe('outside');
    expect(fitCheck(card).stopAndAsk).toEqual([]);
  });
});

it('notes what it takes for granted', () => {
  const card = changed((c) => {
    c.layers[0]!.thickness = 0.045;
    c.rivet.alloy = 'D';
    c.access = 'oneSide';
  });
  const said = fitCheck(card).assumptions.join(' ');
  expect(said).toMatch(/0\.045 of rib is no listed gauge/);
  expect(said).toMatch(/2017 rivets/);
  expect(said).toMatch(/one side only/);
  expect(said).toMatch(/share the load equally/);
});

describe('a new part', () => {
  it('is not known where the measured edge is itself what is short', () => {
    const card = changed((c) => (c.layers[0]!.edges = [{ distance: 0.2, angle: 270 }]));
    expect(line(card, 'edge:0:0', 'replacePart')).toMatchObject({ verdict: 'unknown', code: 'not_measured' });
  });

  it('is as the drawing says where the card tells', () => {
    const card = changed((c) => {
      c.layers[0]!.edges = [{ distance: 0.2, angle: 270 }];
      c.drawn = { edge: 0.3125, pitch: 0.75 };
    });
    expect(line(card, 'edge:0:0', 'replacePart')).toMatchObject({ verdict: 'inside', value: 2.5 });
    expect(line(card, 'pitch:0', 'replacePart')).toMatchObject({ verdict: 'inside', value: 6 });
  });
});

describe('a card that cannot be', () => {
  it.each<[string, Change]>([
    [
      'layers.0.edges.0.distance: edge 0.03 is less than half the hole',
      (c) => (c.layers[0]!.edges![0]!.distance = 0.03),
    ],
    [
      'layers.1.hole.length: hole length 0.1',
      (c) => (c.layers[1]!.hole = { shape: 'oblong', width: 0.1285, length: 0.1, angle: 0 }),
    ],
    [
      'neighbours.0.x: pitch 0.1 is less than the two half holes together',
      (c) => (c.neighbours = [{ x: 0.1, y: 0, dash: 4 }]),
    ],
    ['layers.0.thickness: thickness -0.04 is less than nothing', (c) => (c.layers[0]!.thickness = -0.04)],
    [
      'layers.0.thickness: thickness 25.4 in cannot be: is it in millimetres',
      (c) => (c.layers[0]!.thickness = 25.4),
    ],
    [
      'layers.0.edges.0.distance: Give the edge as a number in inches',
      (c) => (c.layers[0]!.edges![0]!.distance = Infinity),
    ],
    ['rivet.dash: ', (c) => (c.rivet.dash = -4)],
    ['layers: Give at least one layer', (c) => (c.layers = [])],
    ['group.oversize: 7 oversize rivets are more than the 6', (c) => (c.group = { count: 6, oversize: 7 })],
    ['group.adjacentOversize: 2 adjacent', (c) => (c.group = { count: 6, oversize: 1, adjacentOversize: 2 })],
  ])('%s', (message, change) => {
    expect(() => fitCheck(changed(change))).toThrow(RangeError);
    expect(() => fitCheck(changed(change))).toThrow(message);
  });
});
