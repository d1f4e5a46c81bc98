import { fitCheck, holeDrawing, type HoleCard, type HoleLine } from '@rivetside/shared';
import { movePoint } from '../../components/hole-drawing-move';
import { fieldsOfCard } from './fields-of-card';
import { fieldsOfHoleLine } from './fields-of-hole-line';
import { blankEdge, blankHoleCard, type HoleCardFields, type TypedLength } from './hole-card-fields';
import { moveField } from './move-field';
import { readHoleCard } from './read-hole-card';
import { understood } from './typed-length';

/** A doubler whose hole lies 0.027 above the spar's. */
function doublerCard(): HoleCard {
  return {
    layers: [
      {
        name: 'spar',
        partId: null,
        alloy: '2024-T3 clad',
        thickness: 0.04,
        hole: { shape: 'round', diameter: 0.1285 },
        offset: { x: 0, y: 0 },
        edges: [{ distance: { value: 0.41, u: 0.005 }, angle: 270, minimumD: null }],
        bends: [],
        finish: 'primed',
      },
      {
        name: 'doubler',
        partId: null,
        alloy: '2024-T3 clad',
        thickness: 0.063,
        hole: { shape: 'oblong', width: 0.1285, length: { value: 0.131, u: 0.002 }, angle: 90 },
        offset: { x: 0, y: { value: 0.027, u: 0.002 } },
        edges: [{ distance: { value: 0.322, u: 0.003 }, angle: 90, minimumD: 1.75 }],
        bends: [{ distance: 0.31, angle: 270, side: null }],
        finish: null,
      },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [
      { x: { value: -0.61, u: 0.005 }, y: 0, dash: 4, head: null },
      { x: 0.64, y: 0.2, dash: 4, head: null },
    ],
    group: { count: 22, oversize: 0, adjacentOversize: null },
    flags: {
      critical: false,
      controlSurface: true,
      fuelWet: false,
      pressurised: false,
      crack: false,
      hingeOrEngineMount: false,
    },
    access: 'both',
    shopHead: null,
    drawn: { pitch: 0.625, edge: 0.41 },
    limits: { edgeMinimumD: 2, source: 'drawing 3, revision B' },
  };
}

type Change = (fields: HoleCardFields) => HoleCardFields;
const typed = (text: string, tool: TypedLength['tool'] = 'none', units: TypedLength['units'] = 'inch') => ({
  typed: text,
  units,
  tool,
});
const ofLayer =
  (index: number, change: Partial<HoleCardFields['layers'][number]>): Change =>
  (fields) => ({
    ...fields,
    layers: fields.layers.map((layer, at) => (at === index ? { ...layer, ...change } : layer)),
  });
const read = (...changes: Change[]) =>
  readHoleCard(
    changes.reduce((fields, change) => change(fields), { ...blankHoleCard('inch'), rivet: '470 AD4' }),
    'inch',
  );

it.each(['inch', 'mm'] as const)(
  'gives the same card again that it was filled from, typed in %s',
  (units) => {
    const { card, errors } = readHoleCard(fieldsOfCard(doublerCard(), 'inch'), units);
    expect(errors).toEqual({});
    expect(card).toEqual(doublerCard());
  },
);

it('gives the same card again through millimetres, to a thousandth of one', () => {
  const { card } = readHoleCard(fieldsOfCard(doublerCard(), 'mm'), 'mm');
  const edge = card!.layers[1]!.edges![0]!.distance as { value: number; u: number };
  expect(edge.value * 25.4).toBeCloseTo(0.322 * 25.4, 3);
  expect(edge.u * 25.4).toBeCloseTo(0.003 * 25.4, 3);
});

it('is blank, and asks for nothing, until something is filled in', () => {
  const reading = readHoleCard(blankHoleCard('inch'), 'inch');
  expect(reading).toMatchObject({ card: null, isBlank: true, errors: {} });
});

it('asks for the rivet as soon as anything was measured', () => {
  const reading = read((fields) => ({ ...fields, rivet: '' }), ofLayer(0, { largest: typed('#30') }));
  expect(reading.card).toBeNull();
  expect(reading.errors['rivet']).toMatch(/^Give the rivet as drawn/);
});

it('understands inch, fraction, drill and millimetre in one card, and keeps a bare number in the unit it was typed in', () => {
  const { card } = read(
    ofLayer(0, { largest: typed('#30', 'pins'), thickness: typed('1 mm') }),
    ofLayer(1, { largest: typed('5/32'), thickness: typed('1.6', 'none', 'mm') }),
  );
  expect(card!.layers[0]).toMatchObject({ hole: { shape: 'round', diameter: 0.1285 }, thickness: 1 / 25.4 });
  expect(card!.layers[1]).toMatchObject({
    hole: { shape: 'round', diameter: 0.15625 },
    thickness: 1.6 / 25.4,
  });
});

it('gives a length its tool’s error, and what was typed after ± above it', () => {
  const { card } = read(
    ofLayer(0, { edges: [{ ...blankEdge('inch', '270'), distance: typed('.41', 'rule') }] }),
    ofLayer(1, { edges: [{ ...blankEdge('inch'), distance: typed('.322 ± .003', 'rule') }] }),
  );
  expect(card!.layers[0]!.edges).toMatchObject([{ distance: { value: 0.41, u: 0.01 }, angle: 270 }]);
  expect(card!.layers[1]!.edges).toMatchObject([{ distance: { value: 0.322, u: 0.003 }, angle: 90 }]);
});

it('turns a rim reading into one from the centre and says so: 0.158 + 0.049 = 0.207', () => {
  const { card, notes } = read(
    ofLayer(0, {
      largest: typed('0.098'),
      edges: [{ ...blankEdge('inch'), from: 'rim', distance: typed('0.158') }],
    }),
  );
  expect(card!.layers[0]!.edges![0]!.distance).toBe(0.207);
  expect(notes['layers.0.edges.0.distance']).toBe(
    '0.158 from the rim + 0.049 half the hole = 0.207 from the centre',
  );
});

it('combines the errors of rim and hole as the root of the sum of squares', () => {
  const { card } = read(
    ofLayer(0, {
      largest: typed('0.1 ± 0.008'),
      edges: [{ ...blankEdge('inch'), from: 'rim', distance: typed('0.2 ± 0.003') }],
    }),
  );
  expect(card!.layers[0]!.edges![0]!.distance).toEqual({ value: 0.25, u: 0.005 });
});

it('takes half of both holes off a reading over pins', () => {
  const { card, notes } = read(
    ofLayer(0, { largest: typed('0.1285') }),
    ofLayer(1, {
      largest: typed('0.1285'),
      offset: { ...blankHoleCard('inch').layers[1]!.offset, over: 'pins', away: typed('0.1555', 'pins') },
    }),
  );
  expect(card!.layers[1]!.offset).toEqual({ x: 0, y: { value: 0.027, u: 0.002 } });
  expect(notes['layers.1.offset']).toMatch(/half of both = 0\.027 between centres$/);
});

it('needs the hole before it turns a rim reading round, and says which field', () => {
  const { card, errors } = read(
    ofLayer(0, { edges: [{ ...blankEdge('inch'), from: 'rim', distance: typed('0.158') }] }),
  );
  expect(errors['layers.0.edges.0.distance']).toMatch(/give the hole’s largest across first/);
  expect(card!.layers[0]!.edges).toBeNull();
});

it('adds half of both holes to a gap between rims: 0.4715 + 0.1285 = 0.600', () => {
  const { card } = read(ofLayer(0, { largest: typed('0.1285') }), (fields) => ({
    ...fields,
    neighbours: [{ ...fields.neighbours[0]!, from: 'rim', away: typed('0.4715') }],
  }));
  expect(card!.neighbours).toEqual([{ x: -0.6, y: 0, dash: 4, head: null }]);
});

it('puts a fault at the row that it was typed in, though blank rows are left out', () => {
  const reading = read(
    ofLayer(1, {
      largest: typed('0.1285'),
      edges: [blankEdge('inch'), { ...blankEdge('inch'), distance: typed('0.03') }],
    }),
  );
  expect(reading.card).toBeNull();
  expect(reading.errors['layers.1.edges.1.distance']).toMatch(/^edge 0\.03 is less than half the hole/);
  expect(reading.fieldOf('layers.1.edges.0.distance.value')).toBe('layers.1.edges.1.distance');
});

it('tells "nothing near" from "nobody looked"', () => {
  const { card } = read(ofLayer(0, { noEdge: true, noBend: true }), (fields) => ({
    ...fields,
    noNeighbour: true,
  }));
  expect(card!.layers[0]).toMatchObject({ edges: [], bends: [] });
  expect(card!.layers[1]).toMatchObject({ edges: null, bends: null });
  expect(card!.neighbours).toEqual([]);
});

it('keeps the rest of the card while one number is not understood', () => {
  const { card, errors } = read(ofLayer(0, { largest: typed('about 3'), thickness: typed('0.04') }));
  expect(errors['layers.0.largest']).toMatch(/is not understood/);
  expect(card!.layers[0]).toMatchObject({ hole: null, thickness: 0.04 });
});

const holeLine: HoleLine = {
  id: '019b0000-0000-7000-8000-000000000001',
  sectionId: 's',
  stepId: null,
  code: 'HL-STB-3',
  title: 'doubler to rear spar',
  stack: [
    { partId: 'p1', number: 'STB/sp-02', name: 'rear spar', alloy: '2024-T3 clad', thickness: 0.04 },
    { partId: 'p2', number: 'STB/dr-03', name: 'doubler', alloy: '2024-T3 clad', thickness: 0.063 },
  ],
  rivet: { head: 'universal', alloy: 'AD', dash: 4, lengthDash: 4.5 },
  callOut: '470 AD4-4.5',
  drill: '#30',
  holeDiameter: 0.1285,
  pitch: 0.625,
  edge: 0.41,
  count: 22,
  repeats: 1,
  drive: null,
  revision: 'B',
  limits: {
    edgeMinimumD: 1.75,
    pitchMinimumD: 3,
    holeMaximum: 0.132,
    shopHeadMinimumWidthD: null,
    shopHeadMinimumHeightD: null,
    source: 'drawing 3, revision B',
  },
  questionCount: 0,
};

it('starts from a hole line with what the drawing tells and nothing that nobody measured', () => {
  const { card, errors } = readHoleCard(fieldsOfHoleLine(holeLine, { critical: true }, 'mm'), 'mm');
  expect(errors).toEqual({});
  expect(card).toMatchObject({
    layers: [
      { name: 'rear spar', partId: 'p1', alloy: '2024-T3 clad', hole: null, edges: null },
      { name: 'doubler', partId: 'p2', hole: null },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: null,
    group: { count: 22 },
    flags: { critical: true },
    drawn: { pitch: 0.625, edge: 0.41 },
    limits: { edgeMinimumD: 1.75, holeMaximum: 0.132, source: 'drawing 3, revision B' },
  });
  expect(card!.layers[1]!.thickness).toBeCloseTo(0.063, 4);
});

it('writes a point moved on the drawing into the field that it stands for', () => {
  const fields = ofLayer(1, {
    edges: [blankEdge('inch'), ...fieldsOfCard(doublerCard(), 'inch').layers[1]!.edges],
  })(fieldsOfCard(doublerCard(), 'inch'));
  const { card, fieldOf } = readHoleCard(fields, 'inch');
  const { handles } = holeDrawing(card!, fitCheck(card!));
  const edge = handles.find(({ path }) => path === 'layers.1.edges.0.distance')!;
  const moved = movePoint(card!, edge, { x: 5, y: edge.at.y + 0.0104 }, 'inch');
  const after = moveField(fields, { handle: edge, card: moved, fieldOf }, 'inch');
  expect(after.layers[1]!.edges[0]!.distance.typed).toBe('');
  expect(after.layers[1]!.edges[1]!.distance.typed).toBe('0.332 ± 0.003');

  const hole = handles.find(({ path }) => path === 'layers.1.offset')!;
  const beside = movePoint(card!, hole, { x: 0.01, y: 0.027 }, 'inch');
  const offset = moveField(fields, { handle: hole, card: beside, fieldOf }, 'inch').layers[1]!.offset;
  expect(offset).toMatchObject({
    by: 'xy',
    x: { typed: '0.010', tool: 'pins' },
    y: { typed: '0.027', tool: 'pins' },
  });
});

it.each([
  ['#30', '0.128 · #30'],
  ['0.1285', '0.128 · #30 ± 0.002'],
  ['3.26 mm', '0.128 · #30 ± 0.002'],
  ['0.131', '0.131 ± 0.002'],
  ['', ''],
  ['0.12.3', ''],
])('says beside a hole typed as %s what it understood', (text, shown) => {
  expect(understood(typed(text, 'pins'), 'inch', true)).toBe(shown);
});
