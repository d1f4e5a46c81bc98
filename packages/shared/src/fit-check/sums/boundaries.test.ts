import fc from 'fast-check';
import { RIVET_DASHES } from '../../trade/rivets.js';
import { SPLICE_DIAMETERS, SPLICE_TABLES, SPLICES } from '../../trade/splices.js';
import { bend } from './bend.js';
import { interRivetBuckling, RIVET_FIXITY } from './buckling.js';
import { edgeDistance, rivetPitch } from './edge-and-pitch.js';
import { countersinkCheck, drivenHead } from './heads.js';
import { cleanUpHole, drillAtLeast, holeForRivet, nextDash } from './holes.js';
import { oversizeAllowed } from './pattern.js';
import { lengthDashFor, rivetLength } from './rivet-length.js';
import { spliceRivets } from './splices.js';
import { groupStrength, rivetStrength, strengthVerdict } from './strength.js';
import { boltTorque, tapDrill, threadEngagement } from './threads.js';

const HAIR = 1e-6;

// S7: 2 D protruding, 2.5 D flush, 4 D at most; S21: floor of 1.5 D
it.each([
  ['a hair under the floor', 0.1875 - HAIR, 'universal', 'outside', 'below_floor'],
  ['on the floor', 0.1875, 'universal', 'outside', 'below_minimum'],
  ['a hair under the minimum', 0.25 - HAIR, 'universal', 'outside', 'below_minimum'],
  ['on the minimum', 0.25, 'universal', 'inside', 'ok'],
  ['a hair under the flush minimum', 0.3125 - HAIR, 'flush', 'outside', 'below_minimum'],
  ['on the flush minimum', 0.3125, 'flush', 'inside', 'ok'],
  ['on the maximum', 0.5, 'universal', 'inside', 'ok'],
  ['a hair over the maximum', 0.5 + HAIR, 'universal', 'marginal', 'above_maximum'],
] as const)('finds an edge %s', (_, edge, head, ...[verdict, code]) => {
  expect(edgeDistance({ edge, dash: 4, head })).toMatchObject({ verdict, code });
});

// S7, S3, S12: 3 D; S3, S21: tight to 4 D; S7: 10 D at most
it.each([
  ['a hair under 3 D', 0.375 - HAIR, 'outside', 'too_close'],
  ['at 3 D', 0.375, 'marginal', 'tight'],
  ['a hair under 4 D', 0.5 - HAIR, 'marginal', 'tight'],
  ['at 4 D', 0.5, 'inside', 'ok'],
  ['at 10 D', 1.25, 'inside', 'ok'],
  ['a hair over 10 D', 1.25 + HAIR, 'marginal', 'too_far'],
])('finds a pitch %s', (_, pitch, verdict, code) => {
  expect(rivetPitch({ pitch, dash: 4 })).toMatchObject({ verdict, code });
});

it('counts a pitch in D of the larger rivet of the pair', () => {
  expect(rivetPitch({ pitch: 0.6, dash: 3, neighbourDash: 5 }).ratio).toBeCloseTo(3.84, 9);
  expect(rivetPitch({ pitch: 0.6, dash: 5, neighbourDash: 3 }).ratio).toBeCloseTo(3.84, 9);
});

// S9: 1.3 D by 0.3 D; 1.4 D, 0.4 D and 1.6 D are house
it.each([
  ['too narrow', 1.3 - HAIR, 0.5, 'outside', 'reject'],
  ['just wide enough', 1.3, 0.5, 'marginal', 'below_nominal'],
  ['wide', 1.4, 0.5, 'inside', 'ok'],
  ['too flat', 1.5, 0.3 - HAIR, 'outside', 'reject'],
  ['just high enough', 1.5, 0.3, 'marginal', 'below_nominal'],
  ['high', 1.5, 0.4, 'inside', 'ok'],
  ['wide and flat', 1.6 + HAIR, 0.35, 'marginal', 'overdriven'],
])('finds a driven head %s', (_, width, height, ...[verdict, code]) => {
  expect(drivenHead({ width: width / 8, height: height / 8, dash: 4 })).toMatchObject({ verdict, code });
});

// S11: least sheet; S25 and memory: head height
it.each([
  [0.042, 4, 'outside', 'knife_edge'],
  [0.042 + HAIR, 4, 'marginal', 'between'],
  [0.05 - HAIR, 4, 'marginal', 'between'],
  [0.05, 4, 'inside', 'countersink_ok'],
  [0.072, 6, 'inside', 'countersink_ok'],
  [0.095, 8, 'outside', 'knife_edge'],
  [0.2, 8, 'unknown', 'not_tabulated'],
])('finds a sheet of %f under a countersunk AD%i %s', (thickness, dash, verdict, code) => {
  expect(countersinkCheck({ thickness, dash })).toMatchObject({ verdict, code });
});

it.each([
  [100, 'inside'],
  [100 - 1e-6, 'marginal'],
  [95, 'marginal'],
  [95 - 1e-6, 'outside'],
  [null, 'unknown'],
])('takes a strength of %s percent as %s', (percent, verdict) => {
  expect(strengthVerdict(percent)).toBe(verdict);
});

// S8: a fifth, at most ten; one from five up is house
it.each([
  [1, 0],
  [4, 0],
  [5, 1],
  [9, 1],
  [10, 2],
  [22, 4],
  [49, 9],
  [50, 10],
  [1000, 10],
])('allows of %i rivets %i oversize', (count, allowed) => expect(oversizeAllowed(count)).toBe(allowed));

it('never calls out a rivet that is short', () => {
  expect(lengthDashFor(5 / 16)).toBe(5);
  expect(lengthDashFor(5 / 16 + HAIR)).toBe(5.5);
  const stack = fc.array(fc.integer({ min: 16, max: 250 }), { minLength: 1, maxLength: 5 });
  fc.assert(
    fc.property(stack, fc.constantFrom(...RIVET_DASHES), (thousandths, dash) => {
      const { length, dashRoundedUp } = rivetLength({ layers: thousandths.map((t) => t / 1000), dash });
      const called = lengthDashFor(length);
      expect(called / 16).toBeGreaterThanOrEqual(length - 1e-9);
      expect(called / 16 - length).toBeLessThan(1 / 32);
      expect(dashRoundedUp).toBeGreaterThanOrEqual(called);
    }),
  );
});

// S20: number, letter and 1/64 series together
it.each([
  [0.1285, '#30', 0.1285],
  [0.1286, '#29', 0.136],
  [0.1406, '9/64', 0.140625],
  [0.25, 'E', 0.25],
  [0.45, '29/64', 0.453125],
  [0.51, null, null],
])('takes for a hole of %f the drill %s', (diameter, drill, made) => {
  expect(drillAtLeast({ diameter })).toEqual({ drill, diameter: made });
});

it('cleans up holes of which one lies inside the other on the centre of the larger', () => {
  expect(cleanUpHole({ diameter1: 0.159, diameter2: 0.1285, offset: 0.01 })).toMatchObject({
    minimumDiameter: 0.159,
    oneInsideOther: true,
    shift1: 0,
    shift2: 0.01,
    dash: 5,
  });
  expect(cleanUpHole({ diameter1: 0.1285, diameter2: 0.1285, offset: 0 })).toMatchObject({
    shift1: 0,
    shift2: 0,
  });
  expect(cleanUpHole({ diameter1: 0.3, diameter2: 0.1, offset: 0.2 })).toMatchObject({
    dash: null,
    drill: null,
    slack: null,
  });
});

it('finds a clean-up hole that holds both holes and touches them', () => {
  const hole = fc.integer({ min: 60, max: 250 }).map((n) => n / 1000);
  const offset = fc.integer({ min: 0, max: 250 }).map((n) => n / 1000);
  fc.assert(
    fc.property(hole, hole, offset, (diameter1, diameter2, apart) => {
      const found = cleanUpHole({ diameter1, diameter2, offset: apart });
      const half = found.minimumDiameter / 2;
      expect(found.shift1 + diameter1 / 2).toBeLessThanOrEqual(half + 1e-9);
      expect(found.shift2 + diameter2 / 2).toBeLessThanOrEqual(half + 1e-9);
      expect(found.shift1 + found.shift2).toBeCloseTo(apart, 9);
    }),
  );
});

it('goes to the next stocked size, past 7/32 which is none', () => {
  expect([3, 4, 5, 6, 7, 8].map(nextDash)).toEqual([4, 5, 6, 8, 8, null]);
});

describe('strength of a rivet', () => {
  const joint = { thickness: 0.04, dash: 4, edge: 0.25, sheet: '2024-T3 clad' };

  it('has no bearing below 1.5 D, and so no strength to speak of', () => {
    expect(rivetStrength({ ...joint, edge: 0.1875 - HAIR })).toMatchObject({
      bearing: null,
      allowable: null,
    });
    expect(rivetStrength({ ...joint, edge: 0.1875 }).bearingStress).toBeCloseTo(97, 9);
    expect(groupStrength({ count: 4, fromDash: 4, toDash: 5, ...joint, edge: 0.2 })).toMatchObject({
      after: null,
      percent: null,
      verdict: 'unknown',
    });
  });

  // S27: 121 ksi from 0.010, 125 from 0.063, 127 from 0.129
  it.each([
    [0.062, 121],
    [0.0625, 121],
    [0.063, 125],
    [0.128, 125],
    [0.129, 127],
    [0.249, 127],
  ])('takes a sheet of %f from the range with %f ksi', (thickness, stress) => {
    expect(rivetStrength({ ...joint, thickness }).bearingStress).toBe(stress);
  });

  // S9: bearing is tabulated from t/D 0.18 up
  it('says where the sheet is too thin for tabulated bearing', () => {
    expect(rivetStrength({ ...joint, thickness: 0.0225 }).tabulated).toBe(true);
    expect(rivetStrength({ ...joint, thickness: 0.0225 - HAIR }).tabulated).toBe(false);
  });

  it('loses a share for every rivet left out', () => {
    const group = { count: 4, fromDash: 4, toDash: 4, changed: 0, missing: 1, ...joint };
    expect(groupStrength(group)).toMatchObject({ percent: 75, verdict: 'outside' });
  });
});

// AC 43.13-1B Tables 4-9 (S4), 4-10 (S5), 4-11 (S6): the formula that reproduces every cell of AD rivets
const SPLICE_FORMULAS = { '4-9': [1.6, 0.4], '4-10': [1.6, 0.5], '4-11': [1.65, 0.7] } as const;
const SIZE_OF = { '3/32': 3, '1/8': 4, '5/32': 5, '3/16': 6, '1/4': 8 } as const;
it.each(SPLICE_TABLES)('recomputes every cell of Table %s to within 0.13 rivets per inch', (table) => {
  const [bearing, shear] = SPLICE_FORMULAS[table];
  const cells = SPLICES[table].rows.flatMap(({ thickness, perInch }) =>
    SPLICE_DIAMETERS.filter((diameter) => perInch[diameter] !== null).map((diameter) => {
      const hole = holeForRivet({ dash: SIZE_OF[diameter] }).nominalHole;
      const recomputed = Math.max(1 / (bearing * hole), thickness / (shear * (Math.PI / 4) * hole ** 2));
      return Math.abs(perInch[diameter]! - recomputed);
    }),
  );
  expect(cells.length).toBeGreaterThan(35);
  expect(Math.max(...cells)).toBeLessThanOrEqual(0.13);
});

it('takes a sheet between two rows of a splice table as the thicker one', () => {
  const splice = { table: '4-10', diameter: '1/8', width: 1 } as const;
  expect(spliceRivets({ ...splice, thickness: 0.05 }).perInch).toBe(
    spliceRivets({ ...splice, thickness: 0.051 }).perInch,
  );
  expect(spliceRivets({ ...splice, thickness: 0.063 }).perInch).toBe(9.9);
});

// Worked by hand: S46 with c 1.5; 0.025 clad dimpled AD3 at 1.250; one rivet left out doubles the spacing
it('keeps a quarter of the buckling stress when a rivet is left out, whatever the fixity', () => {
  const sheet = { thickness: 0.025, modulus: 10_700_000 };
  const whole = interRivetBuckling({ ...sheet, fixity: RIVET_FIXITY.dimpled, spacing: 1.25 });
  const gap = interRivetBuckling({ ...sheet, fixity: RIVET_FIXITY.dimpled, spacing: 2.5 });
  expect([whole.stress, gap.stress].map(Math.round)).toEqual([5280, 1320]);
  expect(gap.stress / whole.stress).toBeCloseTo(0.25, 12);
  const halfway = interRivetBuckling({ ...sheet, fixity: RIVET_FIXITY.dimpled, spacing: 1.875 });
  expect(Math.round((100 * halfway.stress) / whole.stress)).toBe(44);
});

it('caps the buckling stress at the yield and says where it is no longer elastic', () => {
  const thick = { fixity: 2.37, thickness: 0.063, modulus: 10_700_000 };
  expect(interRivetBuckling({ ...thick, spacing: 0.5 })).toEqual({ stress: 36_000, elastic: false });
  expect(interRivetBuckling({ ...thick, spacing: 4 }).elastic).toBe(true);
});

describe('refuses what cannot be, by the name of the field', () => {
  it.each<[string, () => unknown]>([
    ['layers', () => rivetLength({ layers: [], dash: 4 })],
    ['layers.1', () => rivetLength({ layers: [0.04, -0.04], dash: 4 })],
    ['dash', () => rivetLength({ layers: [0.04], dash: -4 })],
    ['edge', () => edgeDistance({ edge: 0, dash: 4, head: 'universal' })],
    ['head', () => edgeDistance({ edge: 0.3, dash: 4, head: 'round' as 'flush' })],
    ['pitch', () => rivetPitch({ pitch: Number.NaN, dash: 4 })],
    ['neighbourDash', () => rivetPitch({ pitch: 0.5, dash: 4, neighbourDash: 0 })],
    ['dash', () => holeForRivet({ dash: 7 })],
    ['diameter', () => drillAtLeast({ diameter: Infinity })],
    ['offset', () => cleanUpHole({ diameter1: 0.1, diameter2: 0.1, offset: -0.01 })],
    ['diameter2', () => cleanUpHole({ diameter1: 0.1, diameter2: 0, offset: 0.01 })],
    ['sheet', () => rivetStrength({ thickness: 0.04, dash: 4, edge: 0.3, sheet: 'tin' })],
    ['thickness', () => rivetStrength({ thickness: 0.3, dash: 4, edge: 0.3, sheet: '2024-T3 clad' })],
    [
      'rivet',
      () => rivetStrength({ thickness: 0.04, dash: 4, edge: 0.3, sheet: '2024-T3 clad', rivet: 'A' }),
    ],
    [
      'count',
      () => groupStrength({ count: 0, fromDash: 4, toDash: 5, thickness: 0.04, edge: 0.3, sheet: '2024-T3' }),
    ],
    [
      'changed',
      () =>
        groupStrength({
          count: 1,
          fromDash: 4,
          toDash: 5,
          changed: 2,
          thickness: 0.04,
          edge: 0.3,
          sheet: '2024-T3',
        }),
    ],
    [
      'fromDash',
      () => groupStrength({ count: 1, fromDash: 0, toDash: 5, thickness: 0.04, edge: 0.3, sheet: '2024-T3' }),
    ],
    ['table', () => spliceRivets({ table: '4-12' as '4-9', thickness: 0.04, diameter: '1/8', width: 1 })],
    ['diameter', () => spliceRivets({ table: '4-9', thickness: 0.081, diameter: '1/8', width: 1 })],
    ['thickness', () => spliceRivets({ table: '4-9', thickness: 0.2, diameter: '1/4', width: 1 })],
    ['spacing', () => interRivetBuckling({ fixity: 1, thickness: 0.025, spacing: 0, modulus: 1e7 })],
    ['dash', () => countersinkCheck({ thickness: 0.05, dash: 7 })],
    ['height', () => drivenHead({ width: 0.2, height: -1, dash: 4 })],
    ['angle', () => bend({ angle: 180, radius: 0.1, thickness: 0.04 })],
    ['radius', () => bend({ angle: 90, radius: -0.1, thickness: 0.04 })],
    ['thread', () => boltTorque({ thread: '11-32', nut: 'shear' })],
    ['nut', () => boltTorque({ thread: '10-32', nut: 'wing' as 'shear' })],
    ['drag', () => boltTorque({ thread: '10-32', nut: 'shear', drag: -1 })],
    ['thread', () => tapDrill({ thread: '3-48' })],
    ['drillDiameter', () => threadEngagement({ thread: '4-40', drillDiameter: 0 })],
    ['count', () => oversizeAllowed(2.5)],
  ])('%s', (field, sum) => {
    expect(sum).toThrow(RangeError);
    expect(sum).toThrow(new RegExp(`^${field}: `));
  });
});
