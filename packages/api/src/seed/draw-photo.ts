import { createHash } from 'node:crypto';
import sharp from 'sharp';
import type { SeedPhoto } from './seed.schema.js';

const WIDE = 1_440;
const HIGH = 1_080;

export interface Scene {
  readonly photo: SeedPhoto;
  /** Of the outer sheet, where the question says. */
  readonly primed: boolean;
}

type Lot = () => number;

/** The same picture at every start: drawn from the photo's own name. */
function lotsOf(name: string): Lot {
  let state = createHash('sha256').update(name).digest().readUInt32LE(0);
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 4_294_967_296;
  };
}

const has = (caption: string, ...words: string[]) =>
  words.some((word) => caption.toLowerCase().includes(word));

const METALS = {
  bare: { light: '#d3d6d6', mid: '#aab0b2', dark: '#83898c', inside: '#15181a' },
  primed: { light: '#b9b878', mid: '#8f9152', dark: '#6b6d3a', inside: '#1a1b10' },
} as const;
type Metal = (typeof METALS)[keyof typeof METALS];

function brushed(lot: Lot, strength: number): string {
  return Array.from({ length: 170 }, () => {
    const y = (lot() * HIGH * 1.2 - HIGH * 0.1).toFixed(1);
    const x = (lot() * WIDE).toFixed(0);
    const ink = lot() > 0.5 ? '#ffffff' : '#30363a';
    return `<path d="M${x} ${y} h${(200 + lot() * 900).toFixed(0)}" stroke="${ink}" stroke-opacity="${(lot() * strength).toFixed(3)}" stroke-width="${(0.6 + lot() * 1.6).toFixed(1)}"/>`;
  }).join('');
}

function hole(x: number, y: number, r: number, metal: Metal): string {
  return `<circle cx="${x + 2}" cy="${y + 3}" r="${r + 3}" fill="${metal.dark}" opacity="0.6"/>
    <circle cx="${x}" cy="${y}" r="${r}" fill="${metal.inside}"/>
    <path d="M${x - r} ${y} a${r} ${r} 0 0 0 ${2 * r} 0" fill="none" stroke="${metal.light}" stroke-width="3" opacity="0.8"/>`;
}

/** The layer below shows as a bright moon where its hole lies off. */
function crescent(x: number, y: number, r: number, metal: Metal): string {
  const id = `c${Math.round(x)}-${Math.round(y)}`;
  return `${hole(x, y, r, metal)}<clipPath id="${id}"><circle cx="${x}" cy="${y}" r="${r - 1}"/></clipPath>
    <g clip-path="url(#${id})"><rect x="${x - r}" y="${y - r}" width="${2 * r}" height="${2 * r}" fill="#c6cacb"/>
    <circle cx="${x + r * 0.1}" cy="${y - r * 0.55}" r="${r}" fill="${metal.inside}"/></g>`;
}

function head(x: number, y: number, r: number): string {
  return `<ellipse cx="${x + r * 0.16}" cy="${y + r * 0.22}" rx="${r * 1.08}" ry="${r * 1.05}" fill="#202428" opacity="0.45"/>
    <circle cx="${x}" cy="${y}" r="${r}" fill="url(#dome)"/>
    <circle cx="${x}" cy="${y}" r="${r * 0.7}" fill="none" stroke="#ffffff" stroke-opacity="0.25" stroke-width="2"/>`;
}

function rule(lot: Lot, y: number): string {
  const ticks = Array.from({ length: 61 }, (_, at) => {
    const long = at % 10 === 0 ? 44 : at % 5 === 0 ? 30 : 18;
    return `<path d="M${60 + at * 22} ${y} v${long}" stroke="#22262a" stroke-width="2.4"/>`;
  }).join('');
  const inches = Array.from(
    { length: 6 },
    (_, at) =>
      `<text x="${66 + at * 220}" y="${y + 76}" font-family="monospace" font-size="30" fill="#22262a">${at}</text>`,
  ).join('');
  return `<g transform="rotate(${(lot() * 3 - 1.5).toFixed(2)} ${WIDE / 2} ${y})"><rect x="30" y="${y + 8}" width="${WIDE - 60}" height="104" fill="#101315" opacity="0.35"/>
    <rect x="24" y="${y}" width="${WIDE - 60}" height="98" fill="url(#steel)"/>${ticks}${inches}</g>`;
}

function gauge(x: number, y: number, r: number): string {
  return `<g transform="translate(${x} ${y}) rotate(-8)"><rect x="6" y="-4" width="380" height="150" rx="8" fill="#0f1214" opacity="0.35"/>
    <path d="M${r * 0.9} -12 h370 a8 8 0 0 1 8 8 v130 a8 8 0 0 1 -8 8 h-370 v-44 a${r * 1.05} ${r * 1.05} 0 0 0 0 -58 z" fill="url(#steel)" stroke="#5a6063"/>
    <text x="200" y="70" font-family="monospace" font-size="34" fill="#2b3033">1/8 .5D</text></g>`;
}

function caliper(x: number, y: number): string {
  return `<g transform="translate(${x} ${y})"><path d="M-40 -420 h52 l0 380 -52 60 z" fill="url(#steel)" stroke="#60666a"/>
    <path d="M150 -420 h52 v440 l-52 -60 z" fill="url(#steel)" stroke="#60666a"/><rect x="-70" y="-520" width="520" height="110" fill="url(#steel)" stroke="#60666a"/></g>`;
}

function line(x: number, y: number, to: number, lot: Lot): string {
  const steps = Array.from(
    { length: 9 },
    (_, at) => `${(x + ((to - x) * (at + 1)) / 9).toFixed(0)} ${(y + lot() * 16 - 8).toFixed(0)}`,
  );
  return `<path d="M${x} ${y} L${steps.join(' L')}" fill="none" stroke="#f4f6f6" stroke-width="5" opacity="0.8"/>
    <path d="M${x} ${y + 4} L${steps.join(' L')}" fill="none" stroke="#24282a" stroke-width="2.5" opacity="0.85"/>`;
}

const isClose = (caption: string) =>
  has(caption, 'shop head', 'crescent', 'depth gauge', 'stray', 'hole 5', 'opened');
const isDriven = (caption: string) => has(caption, 'shop head', 'rivet', 'ten', 'gauge on', 'bay', 'bubble');

/** A row through what was marked first, in a pitch that suits how near the camera is. */
function row(lot: Lot, { photo }: Scene, metal: Metal): string {
  const { caption, marks } = photo;
  const y = (marks[0]?.y ?? 0.5) * HIGH;
  const at = (marks[0]?.x ?? 0.5) * WIDE;
  const [pitch, r] = isClose(caption) ? [360, 62] : [150, 27];
  const wander = () => (lot() - 0.5) * 2;
  return Array.from({ length: 21 }, (_, number) => at + (number - 10) * pitch)
    .filter((x) => x > -80 && x < WIDE + 80)
    .map((x) => {
      const [px, py] = [x + wander(), y + wander()];
      return isDriven(caption) ? head(px, py, r * (x === at ? 1.16 : 1)) : hole(px, py, r, metal);
    })
    .join('');
}

function crescents(lot: Lot, scene: Scene, metal: Metal): string {
  const { caption, marks } = scene.photo;
  const r = isClose(caption) ? 66 : 34;
  const off = marks.filter(({ label }) => !/rule|flag/.test(label));
  return (
    row(lot, scene, metal) + off.map((mark) => crescent(mark.x * WIDE, mark.y * HIGH, r, metal)).join('')
  );
}

interface Spot {
  readonly x: number;
  readonly y: number;
  readonly toX: number;
  readonly label: string;
}
type Draw = (lot: Lot, scene: Scene, metal: Metal, spot: Spot) => string;

function freckles(lot: Lot, { x, y }: Spot): string {
  const spots = Array.from({ length: 60 }, () => {
    const [cx, cy] = [x + (lot() - 0.5) * 420, y + (lot() - 0.5) * 160];
    return `<circle cx="${cx.toFixed(0)}" cy="${cy.toFixed(0)}" r="${(2 + lot() * 7).toFixed(1)}" fill="#7a4a2a" opacity="0.8"/>`;
  });
  const bead = `M-20 ${y + 70} q${WIDE / 4} -90 ${WIDE / 2} -20 t${WIDE} -40 v150 q-400 60 -700 10 t-900 40 z`;
  return `<path d="${bead}" fill="#7e8486"/>${spots.join('')}`;
}

/** What a caption speaks of, the more telling word first; a plain row where none is named. */
const SCENES: readonly (readonly [words: readonly string[], draw: Draw])[] = [
  [['scratch'], (lot, _, __, { x, y, toX }) => line(x, y, toX, lot)],
  [
    ['blended'],
    (_, __, ___, { x, y }) =>
      `<ellipse cx="${x}" cy="${y}" rx="380" ry="120" fill="#eef1f1" opacity="0.75"/><ellipse cx="${x}" cy="${y}" rx="300" ry="70" fill="#fff" opacity="0.5"/>`,
  ],
  [['crack', 'bend'], (lot, scene, metal, { x, y }) => row(lot, scene, metal) + line(x, y, x + 250, lot)],
  [['freckles', 'weld'], (lot, _, __, spot) => freckles(lot, spot)],
  [
    ['bubble'],
    (lot, scene, metal, { x, y }) =>
      `${row(lot, scene, metal)}<circle cx="${x}" cy="${y - 30}" r="58" fill="#fff" fill-opacity="0.35" stroke="#fff" stroke-width="4"/><circle cx="${x - 18}" cy="${y - 50}" r="14" fill="#fff" opacity="0.9"/>`,
  ],
  [
    ['label'],
    (_, __, ___, { x, y, label }) =>
      `<g transform="rotate(-4 ${x} ${y})"><rect x="${x - 330}" y="${y - 190}" width="660" height="380" fill="#efe9d6"/><text x="${x}" y="${y + 30}" text-anchor="middle" font-family="monospace" font-size="120" fill="#2a2a2a">${label}</text></g>`,
  ],
  [
    ['level'],
    (_, __, ___, { x, y }) =>
      `<rect x="160" y="${y - 70}" width="1120" height="140" rx="12" fill="#b3372c"/><rect x="${x - 130}" y="${y - 38}" width="260" height="76" rx="36" fill="#c9e26a"/><ellipse cx="${x - 46}" cy="${y}" rx="46" ry="27" fill="#f4ffd2"/>`,
  ],
  [['crescent', 'half-moons'], (lot, scene, metal) => crescents(lot, scene, metal)],
  [['stray'], (lot, scene, metal, { x, y }) => row(lot, scene, metal) + hole(x + 150, y + 6, 40, metal)],
];

function happening(lot: Lot, scene: Scene, metal: Metal): string {
  const { caption, marks } = scene.photo;
  const { x = 0.5, y = 0.5, label = '' } = marks[0] ?? {};
  const spot = { x: x * WIDE, y: y * HIGH, toX: (marks.at(-1)?.x ?? 0.7) * WIDE, label };
  const draw = SCENES.find(([words]) => has(caption, ...words))?.[1] ?? row;
  return draw(lot, scene, metal, spot);
}

function tools(lot: Lot, { photo: { caption, marks } }: Scene): string {
  const x = (marks[0]?.x ?? 0.5) * WIDE;
  const y = (marks[0]?.y ?? 0.5) * HIGH;
  const shown = [];
  if (has(caption, 'gauge')) shown.push(gauge(x + 40, y - 60, 62));
  if (has(caption, 'caliper', 'straight-edge', 'dial')) shown.push(caliper(x, y));
  shown.push(rule(lot, has(caption, 'rule') ? HIGH * 0.76 : HIGH * 0.84));
  return shown.join('');
}

function drawing(scene: Scene): string {
  const lot = lotsOf(scene.photo.key);
  const metal = METALS[scene.primed && lot() > 0.35 ? 'primed' : 'bare'];
  const turn = (lot() * 4 - 2).toFixed(2);
  const lamp = (0.2 + lot() * 0.5).toFixed(2);
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDE}" height="${HIGH}" viewBox="0 0 ${WIDE} ${HIGH}"><defs>
    <linearGradient id="sheet" x1="0" y1="0" x2="1" y2="1"><stop offset="0" stop-color="${metal.mid}"/><stop offset="${lamp}" stop-color="${metal.light}"/><stop offset="1" stop-color="${metal.dark}"/></linearGradient>
    <radialGradient id="dome" cx="0.38" cy="0.32" r="0.75"><stop offset="0" stop-color="#f6f8f8"/><stop offset="0.45" stop-color="#b3b9bb"/><stop offset="1" stop-color="#5d6366"/></radialGradient>
    <linearGradient id="steel" x1="0" y1="0" x2="0" y2="1"><stop offset="0" stop-color="#eceeee"/><stop offset="0.5" stop-color="#c3c8ca"/><stop offset="1" stop-color="#9da3a6"/></linearGradient>
    <radialGradient id="edge" cx="0.5" cy="0.48" r="0.75"><stop offset="0.55" stop-color="#000" stop-opacity="0"/><stop offset="1" stop-color="#000" stop-opacity="0.55"/></radialGradient></defs>
    <rect width="${WIDE}" height="${HIGH}" fill="#4b3a2a"/>
    <g transform="rotate(${turn} ${WIDE / 2} ${HIGH / 2})"><rect x="-120" y="60" width="${WIDE + 240}" height="${HIGH * 0.78}" fill="url(#sheet)"/>
    ${brushed(lot, metal === METALS.primed ? 0.07 : 0.2)}
    <path d="M-120 ${HIGH * 0.84} h${WIDE + 240}" stroke="#22262a" stroke-opacity="0.6" stroke-width="5"/>
    ${happening(lot, scene, metal)}</g>${tools(lot, scene)}
    <rect width="${WIDE}" height="${HIGH}" fill="url(#edge)"/></svg>`;
}

/** A picture of the shop as a phone takes it: light from one side, a little out of true, with grain. */
export async function drawPhoto(scene: Scene): Promise<Buffer> {
  const grain = await sharp({
    create: {
      width: WIDE / 2,
      height: HIGH / 2,
      channels: 3,
      background: '#808080',
      noise: { type: 'gaussian', mean: 128, sigma: 14 },
    },
  })
    .resize(WIDE, HIGH)
    .png({ compressionLevel: 0 })
    .toBuffer();
  return sharp(Buffer.from(drawing(scene)))
    .composite([{ input: grain, blend: 'soft-light' }])
    .blur(0.8)
    .jpeg({ quality: 86 })
    .toBuffer();
}
