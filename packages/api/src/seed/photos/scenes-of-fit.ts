import { n, type Point, range, type Scene, spot, turned } from './frame.js';
import { bench, farOff, room, shadow, sheet, strip, whole } from './grounds.js';
import { written } from './strokes.js';
import { flushHead, hole, roundHead, screw } from './things.js';
import { dial, level } from './tools.js';

/** Blades of a feeler gauge fanned out, the thinnest in the gap. */
function feeler({ x, y }: Point): string {
  const blades = [34, 22, 11, 0].map((turn, at) => {
    const d = `M0 -13H${520 - at * 8}a13 13 0 0 1 0 26H0a13 13 0 0 1 0 -26z`;
    return `<g transform="translate(${n(x + 500)} ${n(y + 290)}) rotate(${turn - 150})">${shadow(`<path d="${d}"/>`, 7, 12)}<path d="${d}" fill="url(#steel)" stroke="#5d6468" stroke-width="1.5"/></g>`;
  });
  return `${blades.join('')}<circle cx="${n(x + 500)}" cy="${n(y + 290)}" r="30" fill="#6d7377"/><circle cx="${n(x + 497)}" cy="${n(y + 286)}" r="22" fill="url(#dome)"/>`;
}

const daylight: Scene = (shot) => {
  const at = spot(shot);
  const gap = 26;
  const curve = `M-100 ${n(at.y)}Q${n(at.x - 420)} ${n(at.y + 3)} ${n(at.x)} ${n(at.y + gap)}T1600 ${n(at.y + 4)}`;
  const elevator = `${curve}V1200H-100z`;
  const heads = range(-9, 6).map((far) => {
    const dip = Math.max(0, gap - Math.abs(far) * 3.4);
    return flushHead({ x: at.x + far * 112, y: at.y + dip + 44 }, 12);
  });
  const bar = `<rect x="-100" y="${n(at.y - 170)}" width="1700" height="170" fill="url(#steel)"/><path d="M-100 ${n(at.y - 46)}H1600" stroke="#fff" stroke-opacity="0.6" stroke-width="4"/><path d="M-100 ${n(at.y - 2)}H1600" stroke="#3c4245" stroke-width="4"/>`;
  const light = `<path d="M-100 ${n(at.y - 1)}H1600V${n(at.y + 44)}H-100z" fill="#fff8e0"/>`;
  const number = written('16', { x: at.x - 30, y: at.y + 100, high: 52, ink: '#1b2a6b', pen: 2 });
  return {
    behind: bench(shot.lot),
    ground: turned(
      -0.7,
      at,
      `${light}<path d="${elevator}" fill="url(#clad)"/><path d="${curve}" fill="none" stroke="#3c4245" stroke-width="4"/><path d="M-100 ${n(at.y + 300)}H1600V1200H-100z" fill="url(#fall)" opacity="0.5"/>`,
    ),
    things: turned(-0.7, at, `${bar}${heads.join('')}${number}`) + feeler({ x: at.x - 70, y: at.y + 8 }),
    skin: 'brushed',
  };
};

const attachAngles: Scene = (shot) => {
  const at = spot(shot);
  const pitch = 320;
  const angles = range(-3, 4).map((far) => {
    const x = at.x + far * pitch;
    const body = [
      { x: x - 92, y: at.y - 120 },
      { x: x + 92, y: at.y - 120 },
      { x: x + 92, y: at.y + 118 },
      { x: x - 92, y: at.y + 118 },
    ];
    return {
      x,
      far,
      ground: `${sheet(body, 'machined')}<rect x="${n(x - 92)}" y="${n(at.y + 84)}" width="184" height="40" fill="#3b4143" opacity="0.6"/>`,
    };
  });
  const screws = angles.map(({ x, far }) =>
    screw({ x, y: at.y }, 36, far === 0 ? { lean: 0.4, turn: 8 } : { turn: 30 + far * 25 }),
  );
  const rivets = angles.flatMap(({ x }) =>
    [-56, 56].map((side) => flushHead({ x: x + side, y: at.y - 74 }, 11)),
  );
  const numbers = angles.map(({ x, far }) =>
    written(String(4 + far), { x: x - 18, y: at.y - 220, high: 58, ink: '#1b2a6b', pen: 2 }),
  );
  const scuffs = range(0, 9).map(
    (far) =>
      `<path d="M${n(at.x - 50 + far * 11)} ${n(at.y - 52)}a60 60 0 0 1 ${n(30 + shot.lot() * 20)} ${n(8 + shot.lot() * 10)}" fill="none" stroke="#fff" stroke-opacity="0.6" stroke-width="2"/>`,
  );
  return {
    ground: turned(
      2.4,
      at,
      `${whole('primed')}<rect x="-200" y="-200" width="1900" height="1600" fill="#000" opacity="0.15"/>${strip([at.y + 126, at.y + 126], [1500, 1500], 'clad')}${angles.map(({ ground }) => ground).join('')}`,
    ),
    things: turned(
      2.4,
      at,
      `${rivets.join('')}${scuffs.join('')}${screws.join('')}${numbers.filter((_, number) => number > 0).join('')}`,
    ),
    skin: 'brushed',
  };
};

const dialOnEye: Scene = (shot) => {
  const at = spot(shot);
  const eye = { x: at.x, y: at.y + 118 };
  const arm = `M${n(eye.x - 118)} ${n(eye.y)}A118 118 0 0 1 ${n(eye.x + 118)} ${n(eye.y)}L${n(eye.x + 190)} ${n(eye.y + 420)}V1200H${n(eye.x - 330)}V${n(eye.y + 430)}z`;
  const bush = `<circle cx="${n(eye.x)}" cy="${n(eye.y)}" r="76" fill="#b58a3c"/><circle cx="${n(eye.x - 3)}" cy="${n(eye.y - 4)}" r="72" fill="#d9b566"/>${hole(eye, 50)}`;
  const rivets = [-230, -110, 10, 130].flatMap((x) =>
    [540].map((y) => roundHead({ x: eye.x + x, y: eye.y + y - 40 }, 22)),
  );
  return {
    behind: farOff(
      '<rect x="-50" y="-50" width="620" height="760" fill="#2f2a26"/><rect x="900" y="-40" width="600" height="420" fill="#a7adb0"/><rect x="-50" y="720" width="1600" height="460" fill="#6d4f34"/>',
    ),
    ground: `${shadow(`<path d="${arm}"/>`, 18, 24)}<path d="${arm}" transform="translate(5 9)" fill="#54595c"/><path d="${arm}" fill="url(#machined)" stroke="#fff" stroke-opacity="0.5" stroke-width="3"/>`,
    things: `${bush}${rivets.join('')}${dial(at, { r: 170, needle: 43, foot: 0 })}<rect x="${n(at.x + 150)}" y="${n(at.y - 366)}" width="700" height="34" rx="6" fill="url(#steel)"/>`,
    skin: 'brushed',
  };
};

const levelOnBoard: Scene = (shot) => {
  const at = spot(shot);
  const grain = range(0, 34).map(() => {
    const y = at.y + 100 + shot.lot() * 190;
    return `<path d="M-100 ${n(y)}q400 ${n(shot.lot() * 14 - 7)} 800 0t900 0" fill="none" stroke="#a98455" stroke-opacity="0.5" stroke-width="${n(1 + shot.lot() * 2)}"/>`;
  });
  const board = `${shadow(`<path d="M-100 ${n(at.y + 104)}H1600v190H-100z"/>`, 10, 26)}<path d="M-100 ${n(at.y + 96)}H1600v196H-100z" fill="#d3ae78"/>${grain.join('')}<path d="M-100 ${n(at.y + 292)}H1600v18H-100z" fill="#8b6739"/>`;
  const stabiliser = `<path d="M-100 ${n(at.y + 360)}Q500 ${n(at.y + 300)} 1600 ${n(at.y + 390)}V1300H-100z" fill="url(#clad)"/><path d="M-100 ${n(at.y + 362)}Q500 ${n(at.y + 302)} 1600 ${n(at.y + 392)}" fill="none" stroke="#fff" stroke-opacity="0.8" stroke-width="6"/>`;
  const heads = range(0, 14).map((far) => flushHead({ x: 20 + far * 108, y: at.y + 480 + far * 3 }, 12));
  return {
    behind: farOff(
      '<rect x="-50" y="-50" width="1600" height="330" fill="#8f8a80"/><rect x="200" y="-50" width="260" height="420" fill="#d8d6cc"/><rect x="1000" y="40" width="380" height="400" fill="#4a3f36"/>',
    ),
    ground: `${stabiliser}${room(shot.lot, 0.12)}${turned(1.6, at, board)}`,
    things: `${heads.join('')}${turned(1.6, at, level(at, '-1.6°'))}`,
    skin: 'plain',
  };
};

export const FIT_SCENES: Readonly<Record<string, Scene>> = {
  'ELV-Q-001/1': daylight,
  'TNK-Q-003/1': attachAngles,
  'FLP-Q-002/1': dialOnEye,
  'AFT-Q-002/1': levelOnBoard,
};
