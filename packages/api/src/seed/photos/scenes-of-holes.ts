import { edgeOf, n, offsetOf, type Point, range, type Scene, type Shot, spot, turned } from './frame.js';
import { bench, shadow, sheet, strip, whole } from './grounds.js';
import { written } from './strokes.js';
import { hole, holesAt, moon, pin, roundHead, screw, tape } from './things.js';
import { rule } from './tools.js';

/** The doubler lies on the spar; their edges stand where the card measured them. */
function spar(shot: Shot, at: Point, perInch: number): string {
  const off = offsetOf(shot.card, 1).y;
  const top = at.y - edgeOf(shot.card, 1) * perInch;
  const low = at.y + (edgeOf(shot.card, 0) + off) * perInch;
  return `${strip([top - 900, top - 900], [low, low], 'primed')}${strip([top, top], [low - 34, low - 34], 'primed')}`;
}

const crescentAtSeven: Scene = (shot) => {
  const at = spot(shot);
  const scale = spot(shot, 1);
  const perInch = 620;
  const r = (0.1285 * perInch) / 2;
  const off = { x: 0, y: offsetOf(shot.card, 1).y * perInch };
  const holes = `${holesAt(at, [-1.235, -0.61, 0.64, 1.265], { perInch, d: 0.1285 })}${moon(at, r, off, '#c9cf8e')}`;
  const one = { x: scale.x - perInch, y: scale.y };
  return {
    behind: bench(shot.lot),
    ground: turned(1.2, at, spar(shot, at, perInch)),
    things: `${turned(1.2, at, holes)}${rule(one, perInch, { inches: 6, turn: -0.8 })}`,
    skin: 'sprayed',
  };
};

const wholeRow: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 84;
  const pitch = 0.625 * perInch;
  const r = (0.1285 * perInch) / 2;
  const places = range(1, 22).map((number) => ({ number, x: at.x + (number - 7) * pitch, y: at.y }));
  const holes = places.map((place) =>
    place.number % 3 === 1 && place.number !== 7 ? pin(place, r * 1.4, 4) : hole(place, r),
  );
  const flag = `${tape({ x: at.x - 30, y: at.y - 250 }, 190, { high: 64, ink: '#c8402f' })}<path d="M${n(at.x)} ${n(at.y - 186)}L${n(at.x)} ${n(at.y - 22)}" stroke="#c8402f" stroke-width="7"/>${written('7', { x: at.x + 20, y: at.y - 241, high: 44, ink: '#fff', pen: 2.4 })}`;
  const ends = (high: number, low: number) =>
    sheet(
      [
        { x: places[0]!.x - 36, y: at.y + high },
        { x: places.at(-1)!.x + 36, y: at.y + high },
        { x: places.at(-1)!.x + 36, y: at.y + low },
        { x: places[0]!.x - 36, y: at.y + low },
      ],
      'primed',
    );
  return {
    behind: bench(shot.lot),
    ground: turned(-1.5, at, `${ends(-300, 70)}${ends(-30, 36)}`),
    things: turned(-1.5, at, holes.join('') + flag),
    skin: 'sprayed',
  };
};

const opened: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 460;
  const chips = range(0, 8).map(() => {
    const [x, y] = [at.x + (shot.lot() - 0.4) * 700, at.y + 120 + shot.lot() * 240];
    return `<path d="M${n(x)} ${n(y)}q${n(shot.lot() * 24)} -14 16 6" fill="none" stroke="#e8ecec" stroke-width="4"/>`;
  });
  return {
    behind: bench(shot.lot),
    ground: turned(0.8, at, spar(shot, at, perInch)),
    things: turned(
      0.8,
      at,
      `${holesAt(at, [-1.235, -0.61, 0.64, 1.265], { perInch, d: 0.1285 })}<circle cx="${n(at.x)}" cy="${n(at.y)}" r="${n(0.098 * perInch)}" fill="#d7dbd9"/>${holesAt(at, [0], { perInch, d: 0.159 })}${chips.join('')}`,
    ),
    skin: 'sprayed',
  };
};

const stray: Scene = (shot) => {
  const [extra, good] = [spot(shot), spot(shot, 1)];
  const perInch = (good.x - extra.x) / 0.31;
  const low = good.y + edgeOf(shot.card, 0) * perInch;
  const paper = tape({ x: extra.x - 250, y: good.y - 210 }, 540, { high: 92, ink: '#d9c98f' });
  const line = `<path d="M${n(extra.x - 240)} ${n(good.y - 163)}L${n(extra.x + 280)} ${n(good.y - 166)}" stroke="#3a3d40" stroke-width="3" opacity="0.7"/>`;
  const holes = holesAt(good, [-1, -0.5, -0.31, 0, 0.5, 1], { perInch, d: 0.1285 });
  return {
    ground: turned(
      1.8,
      good,
      `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1600" fill="#000" opacity="0.16"/>${strip([-250, -250], [low, low], 'primed')}`,
    ),
    things: turned(1.8, good, `${paper}${line}${holes}`),
    skin: 'sprayed',
  };
};

const leaningScrews: Scene = (shot) => {
  const at = spot(shot);
  const places = [0, 1, 2, 3].map((number) => spot(shot, number));
  const rivets = range(0, 38).map((number) => {
    const place = { x: at.x + (number - 10) * 35.5, y: at.y + 58 };
    return `<circle cx="${n(place.x)}" cy="${n(place.y)}" r="6" fill="url(#flat)" stroke="#2c3033" stroke-opacity="0.6" stroke-width="1.4"/>`;
  });
  const straight = range(0, 12)
    .map((number) => ({ x: 60 + number * 108, y: at.y }))
    .filter(({ x }) => places.every((place) => Math.abs(place.x - x) > 50));
  const ids = places.map(({ x, y }, number) =>
    written(['7', '8', '21', '30'][number]!, { x: x - 16, y: y - 130, high: 44, ink: '#20242f', pen: 2 }),
  );
  return {
    ground: turned(
      -0.8,
      at,
      `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1600" fill="#000" opacity="0.2"/>${shadow(`<rect x="-200" y="${n(at.y + 190)}" width="1900" height="700"/>`, 0, 0)}${strip([at.y - 86, at.y - 86], [at.y + 92, at.y + 92], 'primed')}`,
    ),
    things: turned(
      -0.8,
      at,
      `${rivets.join('')}${straight.map((place) => screw(place, 24)).join('')}${places.map((place, number) => screw(place, 25, { lean: 0.75, turn: 15 + number * 40 })).join('')}${ids.join('')}`,
    ),
    skin: 'sprayed',
  };
};

const crescentAtNine: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 620;
  const off = { x: -offsetOf(shot.card, 1).x * perInch, y: 0 };
  const low = at.y + edgeOf(shot.card, 1) * perInch;
  const rivets = [-0.8125, 0.8125].map((far) =>
    roundHead({ x: at.x + far * perInch, y: at.y - 0.75 * perInch }, 0.191 * perInch),
  );
  return {
    ground: turned(
      2.1,
      at,
      `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1600" fill="#000" opacity="0.14"/>${strip([-300, -300], [low, low], 'primed')}`,
    ),
    things: turned(
      2.1,
      at,
      `${holesAt(at, [-1.625, -0.8125, 0.8125, 1.625], { perInch, d: 0.191 })}${moon(at, (0.191 * perInch) / 2, off, '#d3d8d8')}${rivets.join('')}`,
    ),
    skin: 'sprayed',
  };
};

const pinnedDoubler: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 170;
  const places = range(-5, 5).flatMap((far) =>
    [0, 1].map((line) => ({
      far,
      line,
      x: at.x + (far + line / 2) * 0.8125 * perInch,
      y: at.y - line * 1.1 * perInch,
    })),
  );
  const drawn = places
    .toSorted((one, other) => one.y - other.y)
    .map((place) =>
      (place.far + place.line) % 2 === 0 && !(place.far === 0 && place.line === 0)
        ? pin(place, 21, 6)
        : hole(place, (0.191 * perInch) / 2),
    );
  const [top, low] = [at.y - 1.1 * perInch - 84, at.y + 0.4375 * perInch];
  const nine = written('9', { x: at.x - 10, y: at.y + 20, high: 34, ink: '#20242f', pen: 2.2 });
  return {
    ground: turned(
      -1.2,
      at,
      `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1600" fill="#000" opacity="0.16"/>${strip([top, top], [low, low], 'clad')}`,
    ),
    things: turned(-1.2, at, drawn.join('') + nine),
    skin: 'brushed',
  };
};

export const HOLE_SCENES: Readonly<Record<string, Scene>> = {
  'STB-Q-001/1': crescentAtSeven,
  'STB-Q-001/2': wholeRow,
  'STB-Q-001/3': opened,
  'WBX-Q-001/1': stray,
  'CTR-Q-002/1': leaningScrews,
  'WSP-Q-001/1': crescentAtNine,
  'WSP-Q-001/2': pinnedDoubler,
};
