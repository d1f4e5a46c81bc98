/** The drawn kit from above, nose left, in a box of 640 by 460; right-hand shapes are mirrored about the centreline. */
export const PLAN_BOX = '40 8 600 444';
const CENTRE = 460;

type Points = readonly (readonly [number, number])[];

const closed = (points: Points) => `M${points.map((point) => point.join(' ')).join('L')}Z`;
const mirrored = (points: Points): Points => points.map(([x, y]) => [x, CENTRE - y] as const);

const HANDED: Readonly<Record<string, Points>> = {
  tank: [
    [214, 196],
    [214, 128],
    [236, 128],
    [236, 196],
  ],
  inner: [
    [236, 196],
    [236, 128],
    [282, 128],
    [282, 196],
  ],
  outer: [
    [215, 128],
    [227, 44],
    [274, 44],
    [282, 128],
  ],
  tip: [
    [227, 44],
    [240, 26],
    [266, 22],
    [274, 44],
  ],
  flap: [
    [282, 190],
    [282, 118],
    [306, 118],
    [306, 190],
  ],
  aileron: [
    [282, 114],
    [275, 48],
    [293, 48],
    [304, 114],
  ],
  stab: [
    [520, 222],
    [536, 150],
    [562, 150],
    [566, 222],
  ],
  elev: [
    [566, 214],
    [562, 150],
    [584, 150],
    [592, 214],
  ],
};

export const PLAN_SHAPES: Readonly<Record<string, string>> = {
  cowl: 'M62 230C62 208 84 199 132 198L132 262C84 261 62 252 62 230Z',
  fwd: 'M132 198L208 194L208 266L132 262Z',
  cabin: 'M208 194L312 197L312 263L208 266Z',
  tailcone: 'M312 197L540 221L540 239L312 263Z',
  ...Object.fromEntries(
    Object.entries(HANDED).flatMap(([name, points]) => [
      [`L-${name}`, closed(mirrored(points))],
      [`R-${name}`, closed(points)],
    ]),
  ),
  fin: 'M500 227L596 226L616 230L596 234L500 233Z',
};

export const PLAN_DETAILS = {
  propeller: 'M60 176Q52 230 60 284',
  canopy: 'M222 206Q264 200 296 210L296 250Q264 260 222 254Z',
} as const;

/** From the side, nose left, in a box of 640 by 230; the wing is seen at its root. */
export const SIDE_BOX = '30 20 600 190';
export const SIDE_SHAPES: Readonly<Record<string, string>> = {
  cowl: 'M60 116C62 96 84 88 132 86L132 150C88 150 62 138 60 116Z',
  // The canopy is one with the firewall in the kit's sections, the gear with the centre fuselage.
  fwd: 'M132 86L208 84L208 156L132 150Z M186 85Q222 44 280 56Q306 64 312 92L208 84Z',
  cabin:
    'M208 84L312 92L312 154L208 156Z M174 153H179L166 186H161Z M230 156H237L241 186H235Z ' +
    'M148 192a14 14 0 1 0 28 0a14 14 0 1 0-28 0Z M225 192a14 14 0 1 0 28 0a14 14 0 1 0-28 0Z',
  tailcone: 'M312 92L546 104L546 124L312 154Z',
  'L-tank': 'M196 150L236 148L236 160L198 160Z',
  'L-inner': 'M236 148L286 150L286 160L236 160Z',
  'L-flap': 'M286 150L316 155L286 160Z',
  'L-stab': 'M516 108L566 106L566 114L516 114Z',
  'L-elev': 'M566 106L596 109L566 114Z',
  fin: 'M506 102L544 40L582 40L572 104Z M574 100L584 42L606 46L600 124L574 122Z',
};
export const SIDE_DETAILS = {
  canopy: 'M186 85Q222 44 280 56Q306 64 312 92L208 84Z',
} as const;
