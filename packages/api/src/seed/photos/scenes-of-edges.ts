import { edgeOf, HIGH, n, type Point, range, type Scene, type Shot, spot, turned, WIDE } from './frame.js';
import { bench, farOff, room, shadow, sheet, strip, whole } from './grounds.js';
import { written } from './strokes.js';
import { cross, hole, holesAt, pin } from './things.js';
import { jaws } from './tools.js';

/** Seen close: the jaws take the way from the rim to the edge, so the picture's scale follows from the marks. */
const rimToEdge: Scene = (shot) => {
  const rim = spot(shot);
  const edge = spot(shot, 1);
  const perInch = (edge.x - rim.x) / (edgeOf(shot.card, 0) - 0.098 / 2);
  const r = (0.098 * perInch) / 2;
  const corners = [
    { x: -150, y: -150 },
    { x: edge.x + 12, y: -150 },
    { x: edge.x - 14, y: HIGH + 150 },
    { x: -150, y: HIGH + 150 },
  ];
  return {
    behind: farOff(
      '<rect x="900" y="-100" width="700" height="500" fill="#3a342d"/><rect x="1050" y="600" width="500" height="600" fill="#a9adb0"/>',
    ),
    ground: sheet(corners, 'formed', 14),
    things: `${hole({ x: rim.x - r, y: rim.y }, r)}${jaws({ x: rim.x, y: rim.y + 26 }, { x: edge.x, y: edge.y + 40 })}`,
    skin: 'brushed',
  };
};

/** Hinge loops in a row, every other one the mate's, on one pin. */
function knuckles(y: number, perInch: number): string {
  const wide = 0.5 * perInch;
  return range(-2, Math.ceil(WIDE / wide) + 1)
    .map((at) => {
      const dark = at % 2 === 0 ? 0 : 0.16;
      return `<rect x="${n(at * wide)}" y="${n(y - 32)}" width="${n(wide - 4)}" height="64" rx="7" fill="url(#tube)"/><rect x="${n(at * wide)}" y="${n(y - 32)}" width="${n(wide - 4)}" height="64" rx="7" fill="#e8ecee" opacity="${n(0.5 - dark)}"/>`;
    })
    .join('');
}

function hingeLeaf(shot: Shot, perInch: number, edge: number): string {
  const at = spot(shot);
  const low = at.y + edge * perInch;
  return `${whole('clad')}${room(shot.lot, 0.35)}${strip([at.y - 240, at.y - 240], [low, low], 'formed')}`;
}

const hingeHoles: Scene = (shot) => {
  const [first, last] = [spot(shot), spot(shot, 1)];
  const perInch = (last.x - first.x) / 2.25;
  // How far each stands inboard of the worst one, from 21 to 25; the others run true.
  const wander: Readonly<Record<number, number>> = { 21: 0.025, 22: 0.01, 23: 0, 24: 0.002, 25: 0.008 };
  const holes = range(18, 28).map((number) => {
    const x = first.x + (number - 22) * 0.75 * perInch;
    return hole({ x, y: first.y - (wander[number] ?? 0.025) * perInch }, (0.098 * perInch) / 2);
  });
  const marks = [22, 23, 24, 25].map((number) =>
    written(String(number), {
      x: first.x + (number - 22) * 0.75 * perInch - 20,
      y: first.y - 100,
      high: 42,
      ink: '#1b2a6b',
      pen: 2,
    }),
  );
  return {
    ground: turned(-0.4, first, hingeLeaf(shot, perInch, edgeOf(shot.card, 0))),
    things: turned(-0.4, first, `${knuckles(first.y - 260, perInch)}${holes.join('')}${marks.join('')}`),
    skin: 'brushed',
  };
};

const fence: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 240;
  const edge = 0.252 * perInch;
  const holes = range(-3, 5).map((number) => {
    const place = { x: at.x + number * 0.75 * perInch, y: at.y };
    return number === -2 || number === 2 ? pin(place, 14, 3) : hole(place, (0.098 * perInch) / 2);
  });
  const bar = `${shadow(`<rect x="-100" y="${n(at.y + edge)}" width="1700" height="120"/>`, 0, 0)}<rect x="-100" y="${n(at.y + edge)}" width="1700" height="104" fill="url(#steel)"/><path d="M-100 ${n(at.y + edge + 3)}h1700" stroke="#fff" stroke-width="4" opacity="0.8"/>`;
  const clamp = [150, 1150]
    .map((x) => {
      const arm = `M${x} ${n(at.y + 420)}v-560q0 -40 40 -40h40q40 0 40 40v40h-50v-20h-30v540z`;
      return `${shadow(`<path d="${arm}"/>`, 16, 20)}<path d="${arm}" fill="#a8322a"/><rect x="${x + 26}" y="${n(at.y + 20)}" width="72" height="70" rx="10" fill="url(#bar)"/><path d="M${x + 8} ${n(at.y + 420)}v-550" stroke="#fff" stroke-opacity="0.35" stroke-width="6"/>`;
    })
    .join('');
  return {
    ground: turned(0.6, at, hingeLeaf(shot, perInch, 0.252)),
    things: turned(0.6, at, `${knuckles(at.y - 270, perInch)}${holes.join('')}${bar}${clamp}`),
    skin: 'brushed',
  };
};

const markedCentres: Scene = (shot) => {
  const marks = [0, 1, 2].map((number) => spot(shot, number));
  const [first, , last] = marks as [Point, Point, Point];
  const perInch = (last.x - first.x) / 1.75;
  // The line of holes drifts to the edge: 0.262 in at the first, as the card has it at the last.
  const [from, to] = [
    first.y + (edgeOf(shot.card, 1) + 0.018) * perInch,
    last.y + edgeOf(shot.card, 1) * perInch,
  ];
  const slope = (to - from) / (last.x - first.x);
  const edgeAt = (x: number) => from + (x - first.x) * slope;
  const numbers = marks.map(({ x, y }, at) =>
    written(String(14 + at), { x: x - 26, y: y - 110, high: 58, ink: '#1b2a6b', pen: 1.9 }),
  );
  const line = `<path d="M-50 ${n(first.y - (first.x + 50) * 0.075)}L${WIDE + 50} ${n(last.y + (WIDE - last.x) * 0.075)}" stroke="#4b5a9a" stroke-width="2.5" opacity="0.6"/>`;
  return {
    behind: bench(shot.lot),
    ground: `${strip([-200, -200], [edgeAt(-150), edgeAt(WIDE + 150)], 'clad')}`,
    things: `${line}${marks.map((place) => cross(place, 26)).join('')}${numbers.join('')}`,
    skin: 'brushed',
  };
};

const bracket: Scene = (shot) => {
  const at = spot(shot);
  const perInch = 380;
  const low = at.y + edgeOf(shot.card, 0) * perInch;
  const body = `M-100 ${n(at.y - 330)}H${n(at.x + 430)}q70 0 70 70V${n(low - 70)}q0 70 -70 70H-100z`;
  const drawnBody = `${shadow(`<path d="${body}"/>`, 16, 24)}<path d="${body}" transform="translate(5 12)" fill="#4f5630"/><path d="${body}" fill="url(#primed)" stroke="#e9edc0" stroke-opacity="0.6" stroke-width="3"/><path d="M-100 ${n(at.y - 240)}H${n(at.x + 500)}" stroke="#3c4224" stroke-opacity="0.25" stroke-width="22"/><path d="M-100 ${n(at.y - 236)}H${n(at.x + 500)}" stroke="#eef0c4" stroke-opacity="0.25" stroke-width="10"/>`;
  const five = written('5', { x: at.x - 22, y: at.y - 150, high: 64, ink: '#20242f', pen: 2 });
  const holes = [-2.25, -1.5, -0.75, 0, 0.75].map((far) =>
    holesAt({ x: at.x, y: at.y - (far === 0 ? 0 : 0.018 * perInch) }, [far], { perInch, d: 0.191 }),
  );
  return {
    ground: turned(
      -1.6,
      at,
      `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1500" fill="#000" opacity="0.12"/>${drawnBody}`,
    ),
    things: turned(-1.6, at, holes.join('') + five),
    skin: 'sprayed',
  };
};

export const EDGE_SCENES: Readonly<Record<string, Scene>> = {
  'STB-Q-003/1': rimToEdge,
  'FLP-Q-001/1': hingeHoles,
  'FLP-Q-001/2': fence,
  'AFT-Q-003/1': markedCentres,
  'CTR-Q-001/1': bracket,
};
