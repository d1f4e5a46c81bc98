import { doublerCard } from '../testing/worked-cards.js';
import { asDoneCheck } from './as-done-check.js';
import type { HoleCard } from './card-fields.js';
import { fitCheck } from './fit-check.js';
import { asDoneCheckSchema } from './hole-card.schema.js';
import type { AsDone } from '../questions/completion.schema.js';

const planned = fitCheck(doublerCard()).remedies.find(({ kind }) => kind === 'nextSize')!;
const WELL_DONE: AsDone = {
  finalDrill: '#21',
  edgeDistances: [0.42, 0.336],
  shopHead: { width: 0.234, height: 0.078 },
  rivetLengthDash: 5.5,
};
const line = (asDone: AsDone, id: string, card: HoleCard = doublerCard()) =>
  asDoneCheck(card, asDone, planned).checks.find((one) => one.id === id)!;

it('looks at everything that was done again', () => {
  const check = asDoneCheck(doublerCard(), WELL_DONE, planned);
  expect(asDoneCheckSchema.parse(check)).toEqual(check);
  expect(check).toMatchObject({ verdict: 'marginal', rivetDash: 5, missing: [] });
  expect(check.checks.filter(({ verdict }) => verdict !== 'inside').map(({ id }) => id)).toEqual(['pitch:0']);
  expect(line(WELL_DONE, 'edge:1:0').value).toBeCloseTo(0.336 / 0.15625, 9);
});

// House: 0.164 at most for an AD5, 0.132 for an AD4
it.each([
  ['#21', 5, 'inside', 'ok'],
  ['0.161', 5, 'inside', 'ok'],
  ['4.1 mm', 5, 'inside', 'ok'],
  ['#30', 4, 'inside', 'ok'],
  ['11/64', null, 'outside', 'over_hole_maximum'],
  ['#40', 3, 'inside', 'ok'],
  ['#50', null, 'outside', 'no_rivet'],
])('takes a hole of %s for the rivet %s', (finalDrill, dash, ...[verdict, code]) => {
  const done = { ...WELL_DONE, finalDrill };
  expect(asDoneCheck(doublerCard(), done, planned).rivetDash).toBe(dash);
  expect(line(done, 'finalHole')).toMatchObject({ verdict, code });
});

it('says where the drilled hole does not clean up both', () => {
  expect(line({ finalDrill: '#30' }, 'cleanUp')).toMatchObject({ verdict: 'outside', code: 'not_cleaned' });
  expect(line({ finalDrill: '#21' }, 'cleanUp')).toMatchObject({ verdict: 'inside', code: 'ok' });
  expect(asDoneCheck(doublerCard(), { finalDrill: '#21' }).checks.some(({ id }) => id === 'cleanUp')).toBe(
    false,
  );
});

// S7: 2 D of an AD5 is 0.3125
it.each([
  [0.3124, 'outside', 'below_minimum'],
  [0.3125, 'inside', 'ok'],
])('takes a measured edge of %f as %s', (edge, verdict, code) => {
  expect(line({ ...WELL_DONE, edgeDistances: [0.42, edge] }, 'edge:1:0')).toMatchObject({ verdict, code });
});

// S9: 1.3 D by 0.3 D of an AD5 is 0.203 by 0.047
it.each([
  [0.2031, 0.078, 'outside', 'shopHead:width'],
  [0.2032, 0.078, 'marginal', 'shopHead:width'],
  [0.234, 0.0468, 'outside', 'shopHead:height'],
  [0.234, 0.0469, 'marginal', 'shopHead:height'],
])('takes a head of %f by %f as %s', (width, height, verdict, id) => {
  expect(line({ ...WELL_DONE, shopHead: { width, height } }, id).verdict).toBe(verdict);
});

it('takes the kit maker’s own head limits instead where the card has them', () => {
  const card = doublerCard();
  card.limits = { shopHeadMinimumHeightD: 0.55, source: 'drawing 7' };
  expect(line(WELL_DONE, 'shopHead:height', card)).toMatchObject({
    verdict: 'outside',
    limit: 0.55,
    source: 'drawing 7',
  });
});

// S3, S10: L = 0.103 + 0.234375 = 0.337375; S1 half sizes; S12 next up
it.each([
  [5, 'outside', 'short_rivet'],
  [5.5, 'inside', 'ok'],
  [6.5, 'inside', 'ok'],
  [7, 'marginal', 'long_rivet'],
])('takes a rivet of length -%f as %s', (rivetLengthDash, verdict, code) => {
  expect(line({ ...WELL_DONE, rivetLengthDash }, 'length')).toMatchObject({ verdict, code });
});

it('takes the nearest half size, a hair short, as marginal', () => {
  const card = doublerCard();
  card.layers[0]!.thickness = 0.05;
  expect(line({ ...WELL_DONE, rivetLengthDash: 5.5 }, 'length', card)).toMatchObject({
    verdict: 'marginal',
    code: 'short_rivet',
  });
});

it('names what was not measured again and does not judge it', () => {
  const check = asDoneCheck(doublerCard(), {}, planned);
  expect(check.verdict).toBe('unknown');
  expect(check.missing.join('; ')).toMatch(
    /drill that was run last.*edges near the hole in spar.*driven head/,
  );
});

it('keeps what was typed as a drill, and calls it not known where it is none', () => {
  expect(line({ finalDrill: 'the big one' }, 'finalHole')).toMatchObject({ verdict: 'unknown' });
});
