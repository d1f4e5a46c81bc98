import { edgeOf, n, type Point, range, type Scene, type Shot, spot, turned, WIDE } from './frame.js';
import { bench, blot, room, strip, whole } from './grounds.js';
import { written } from './strokes.js';
import { flushHead, roundHead, shopHead } from './things.js';
import { dial, headGauge } from './tools.js';

interface Heads {
  readonly perInch: number;
  readonly pitch: number;
  /** Of a good shop head, inch across. */
  readonly across: number;
  readonly gauge: string;
  /** Of the one in question where it is no good one. */
  readonly squashed?: number;
}

/** Shop heads in a row, the gauge at the one that was marked. */
const headsWithGauge =
  ({ perInch, pitch, across, gauge, squashed }: Heads): Scene =>
  (shot) => {
    const at = spot(shot);
    const r = (across * perInch) / 2;
    const own = squashed ? (squashed * perInch) / 2 : r;
    const others = [-3, -2, -1, 1, 2, 3].map((far) =>
      shopHead({ x: at.x + far * pitch * perInch, y: at.y }, r, shot),
    );
    const low = at.y + 0.375 * perInch;
    return {
      ground: turned(
        1.1,
        at,
        `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1600" fill="#000" opacity="0.18"/>${strip([-300, -300], [low, low], 'primed')}`,
      ),
      things: `${turned(1.1, at, others.join('') + shopHead(at, own, { lot: shot.lot, coin: Boolean(squashed) }))}${headGauge({ x: at.x + own * 1.15, y: at.y + own * 0.9 }, r, { name: gauge, turn: 24 })}`,
      skin: 'sprayed',
    };
  };

const tenShort: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 264;
  const low = at.y + 0.281 * perInch;
  const heads = range(1, 10).map((number) =>
    shopHead({ x: at.x + (number - 3) * 0.5 * perInch, y: at.y }, 0.079 * perInch, shot),
  );
  const body = strip([at.y - 190, at.y - 190], [low, low], 'formed');
  return {
    ground: turned(
      -1.4,
      at,
      `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1600" fill="#000" opacity="0.14"/>${body}`,
    ),
    things: `${turned(-1.4, at, heads.join(''))}${headGauge({ x: at.x + 20, y: at.y + 24 }, 27, { name: '1/8', turn: 58 })}`,
    skin: 'brushed',
  };
};

const depthGauge: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 190;
  const heads = range(-5, 6).map((far) =>
    flushHead({ x: at.x + far * 0.75 * perInch, y: at.y }, 0.11 * perInch),
  );
  const joint = `<path d="M-100 ${n(at.y + 150)}H${WIDE + 100}" stroke="#22272a" stroke-opacity="0.6" stroke-width="4"/>`;
  const number = written('31', { x: at.x - 32, y: at.y + 60, high: 48, ink: '#1b2a6b', pen: 2 });
  return {
    ground: turned(0.9, at, `${whole('clad')}${room(shot.lot, 0.5)}`),
    things: `${turned(0.9, at, joint + heads.join('') + number)}${dial(at, { r: 190, needle: -29, foot: 190 })}`,
    skin: 'brushed',
  };
};

function foam({ x, y }: Point, { lot }: Shot): string {
  const small = range(0, 26).map(() => {
    const [angle, far] = [lot() * 6.28, 62 + lot() * 46];
    const r = 6 + lot() * 17;
    const place = { x: x + Math.cos(angle) * far, y: y + 20 + Math.sin(angle) * far * 0.55 };
    return `<circle cx="${n(place.x)}" cy="${n(place.y)}" r="${n(r)}" fill="#fff" fill-opacity="0.16" stroke="#fff" stroke-opacity="0.6" stroke-width="1.8"/><circle cx="${n(place.x - r * 0.35)}" cy="${n(place.y - r * 0.4)}" r="${n(r * 0.2)}" fill="#fff"/>`;
  });
  const r = 66;
  return `${small.join('')}<circle cx="${n(x + 12)}" cy="${n(y + 18)}" r="${r}" fill="url(#shade)" opacity="0.5"/>
    <radialGradient id="film" cx="0.4" cy="0.36" r="0.66"><stop offset="0" stop-color="#fff" stop-opacity="0.05"/><stop offset="0.7" stop-color="#dff" stop-opacity="0.16"/><stop offset="0.86" stop-color="#f5c6e6" stop-opacity="0.35"/><stop offset="0.94" stop-color="#b8f0e0" stop-opacity="0.5"/><stop offset="1" stop-color="#fff" stop-opacity="0.8"/></radialGradient>
    <circle cx="${n(x)}" cy="${n(y)}" r="${r}" fill="url(#film)"/><path d="M${n(x - 44)} ${n(y - 22)}q14 -32 46 -32" fill="none" stroke="#fff" stroke-width="9" stroke-linecap="round" opacity="0.9"/><circle cx="${n(x + 26)}" cy="${n(y + 36)}" r="6" fill="#fff" opacity="0.8"/>`;
}

const weeping: Scene = (shot) => {
  const at = spot(shot);
  const heads = range(-8, 8).map((far) => flushHead({ x: at.x + far * 142, y: at.y }, 22));
  const wet = `<path d="M${n(at.x - 470)} ${n(at.y - 60)}q200 -70 480 -36t460 20q60 90 -120 130t-520 30t-300 -144z" fill="#fff" opacity="0.2"/><path d="M${n(at.x + 30)} ${n(at.y + 90)}q12 180 -6 340q-16 40 -26 0q-14 -180 4 -340z" fill="#fff" opacity="0.22"/>`;
  return {
    ground: turned(-2, at, `${whole('clad')}${room(shot.lot, 0.6)}${wet}`),
    things: turned(-2, at, heads.join('')) + foam(at, shot),
    skin: 'brushed',
  };
};

const halfMoons: Scene = (shot) => {
  const [second, third, fifth, sixth] = [0, 1, 2, 3].map((at) => spot(shot, at)) as [
    Point,
    Point,
    Point,
    Point,
  ];
  const pitch = third.x - second.x;
  const y = second.y;
  const xs = [
    second.x - pitch,
    second.x,
    third.x,
    (third.x + fifth.x) / 2,
    fifth.x,
    sixth.x,
    sixth.x + pitch,
    sixth.x + 2 * pitch,
  ];
  const shank = 0.159 * 205;
  const heads = xs.map((x) => roundHead({ x, y }, shank));
  const marks = [second, third, fifth, sixth].map(({ x }, at) => {
    const r = shank * (1.12 + at * 0.02);
    const d = `M${n(x - r * 0.2)} ${n(y + r)}A${n(r)} ${n(r)} 0 0 0 ${n(x + r)} ${n(y - r * 0.05)}`;
    return `<path d="${d}" fill="none" stroke="#fff" stroke-width="6" opacity="0.9" transform="translate(2 3)"/><path d="${d}" fill="none" stroke="#24292b" stroke-width="5" opacity="0.8"/>`;
  });
  const low = y + 0.344 * 205;
  return {
    behind: bench(shot.lot),
    ground: turned(
      1.4,
      second,
      `${strip([-300, -300], [y + 330, y + 330], 'clad')}${strip([y - 80, y - 80], [low, low], 'machined')}`,
    ),
    things: turned(1.4, second, heads.join('') + marks.join('')),
    skin: 'brushed',
  };
};

/** Where two angles meet there is no way in for a bar. */
const corner: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 230;
  const inset = edgeOf(shot.card, 1) * perInch;
  const along = range(0, 6).map((far) => ({ x: at.x + far * perInch + 40, y: at.y }));
  const up = range(1, 4).map((far) => ({ x: at.x - 40, y: at.y - far * perInch }));
  const holes = [...along, ...up].map(({ x, y }, number) =>
    number < 3 || (number > 6 && number < 9)
      ? `<circle cx="${n(x)}" cy="${n(y)}" r="17" fill="#f2f4f3" opacity="0.5"/><circle cx="${n(x)}" cy="${n(y)}" r="15" fill="url(#deep)"/>`
      : roundHead({ x, y }, 29),
  );
  const [floor, wall] = [at.y + inset, at.x - 40 - inset];
  const flanges = `<path d="M${n(wall - 6)} -100V${n(floor)}H1600v600H-200V-100z" fill="#15181a"/><path d="M${n(wall - 70)} -100V${n(floor + 60)}H1600v30H${n(wall - 100)}V-100z" fill="url(#formed)"/><path d="M${n(wall)} -100V${n(floor)}H1600" fill="none" stroke="#fff" stroke-opacity="0.7" stroke-width="4"/>${[44, 30, 16].map((wide) => `<path d="M${n(wall + 10)} -100V${n(floor - 12)}H1600" fill="none" stroke="#000" stroke-opacity="0.16" stroke-width="${wide}"/>`).join('')}`;
  const beads = `<path d="M${n(wall + 220)} -100V${n(floor - 200)}H1600" fill="none" stroke="#fff" stroke-opacity="0.3" stroke-width="16"/><path d="M${n(wall + 232)} -100V${n(floor - 212)}H1600" fill="none" stroke="#000" stroke-opacity="0.3" stroke-width="12"/>`;
  return {
    ground: turned(-3, at, `${whole('stainless')}${room(shot.lot, 0.5)}${beads}${flanges}`),
    things: `${turned(-3, at, holes.join(''))}${blot({ x: 0, y: 700 }, [760, 800], '#000')}`,
    skin: 'brushed',
  };
};

export const RIVET_SCENES: Readonly<Record<string, Scene>> = {
  'STB-Q-001/4': headsWithGauge({ perInch: 420, pitch: 0.625, across: 0.235, gauge: '5/32' }),
  'WSP-Q-002/1': headsWithGauge({ perInch: 430, pitch: 0.75, across: 0.235, gauge: '5/32', squashed: 0.262 }),
  'WSP-Q-002/2': headsWithGauge({ perInch: 430, pitch: 0.75, across: 0.235, gauge: '5/32' }),
  'WBX-Q-002/1': depthGauge,
  'TNK-Q-002/1': weeping,
  'FIN-Q-001/1': tenShort,
  'STB-Q-002/1': halfMoons,
  'CNP-Q-002/1': corner,
};
