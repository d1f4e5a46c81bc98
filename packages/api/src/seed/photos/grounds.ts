import { HIGH, n, type Point, WIDE } from './frame.js';

/** Light, middle and dark of a surface under a lamp from the upper left. */
export const METALS = {
  clad: ['#e4e8ea', '#b9bfc3', '#8b9297'],
  formed: ['#d3d6d4', '#a9adac', '#7c8182'],
  primed: ['#b5bb72', '#919a57', '#6c743f'],
  machined: ['#cfd4d8', '#a5abb1', '#787f86'],
  stainless: ['#dcdfdd', '#a8aba8', '#6d7170'],
  bench: ['#8a6a48', '#6b4f35', '#463322'],
  grey: ['#8f969b', '#6f767b', '#50565b'],
} as const;
export type Metal = keyof typeof METALS;

/** Gradients that all pictures share. */
export const DEFS = `<defs>${Object.entries(METALS)
  .map(
    ([name, [light, middle, dark]]) =>
      `<linearGradient id="${name}" gradientUnits="userSpaceOnUse" x1="0" y1="0" x2="${WIDE}" y2="${HIGH}"><stop offset="0" stop-color="${middle}"/><stop offset="0.34" stop-color="${light}"/><stop offset="0.62" stop-color="${middle}"/><stop offset="1" stop-color="${dark}"/></linearGradient>`,
  )
  .join('')}
<linearGradient id="steel" x1="0" y1="0" x2="0" y2="1"><stop offset="0" stop-color="#f1f3f3"/><stop offset="0.18" stop-color="#d5dadb"/><stop offset="0.8" stop-color="#b4babd"/><stop offset="1" stop-color="#868d91"/></linearGradient>
<linearGradient id="bar" x1="0" y1="0" x2="1" y2="0"><stop offset="0" stop-color="#8d9498"/><stop offset="0.3" stop-color="#eef0f0"/><stop offset="0.7" stop-color="#b9bfc2"/><stop offset="1" stop-color="#72797d"/></linearGradient>
<linearGradient id="tube" x1="0" y1="0" x2="0" y2="1"><stop offset="0" stop-color="#3a3e40"/><stop offset="0.3" stop-color="#9aa0a2"/><stop offset="0.42" stop-color="#b9bfc0"/><stop offset="0.75" stop-color="#4d5254"/><stop offset="1" stop-color="#1f2224"/></linearGradient>
<linearGradient id="fall" x1="0" y1="0" x2="0" y2="1"><stop offset="0" stop-color="#000" stop-opacity="0.55"/><stop offset="1" stop-color="#000" stop-opacity="0"/></linearGradient>
<radialGradient id="shade"><stop offset="0.45" stop-color="#000" stop-opacity="0.6"/><stop offset="0.8" stop-color="#000" stop-opacity="0.18"/><stop offset="1" stop-color="#000" stop-opacity="0"/></radialGradient>
<radialGradient id="dome" cx="0.36" cy="0.3" r="0.78"><stop offset="0" stop-color="#ffffff"/><stop offset="0.2" stop-color="#dfe3e4"/><stop offset="0.6" stop-color="#a2a9ac"/><stop offset="1" stop-color="#555c60"/></radialGradient>
<radialGradient id="flat" cx="0.4" cy="0.35" r="0.75"><stop offset="0" stop-color="#eceeee"/><stop offset="0.75" stop-color="#bcc2c4"/><stop offset="1" stop-color="#858c90"/></radialGradient>
<linearGradient id="pressed" x1="0" y1="0" x2="1" y2="1"><stop offset="0" stop-color="#dde1e2"/><stop offset="0.5" stop-color="#c2c8ca"/><stop offset="1" stop-color="#a5acaf"/></linearGradient>
<radialGradient id="deep" cx="0.55" cy="0.62" r="0.6"><stop offset="0" stop-color="#050606"/><stop offset="0.75" stop-color="#0d0f10"/><stop offset="1" stop-color="#2b2f31"/></radialGradient>
<radialGradient id="glow"><stop offset="0" stop-color="#fff" stop-opacity="0.85"/><stop offset="0.55" stop-color="#fff" stop-opacity="0.4"/><stop offset="1" stop-color="#fff" stop-opacity="0"/></radialGradient>
<linearGradient id="bright"><stop offset="0" stop-color="#fff" stop-opacity="0"/><stop offset="0.5" stop-color="#fff" stop-opacity="0.85"/><stop offset="1" stop-color="#fff" stop-opacity="0"/></linearGradient>
<linearGradient id="gloom"><stop offset="0" stop-color="#3b434a" stop-opacity="0"/><stop offset="0.5" stop-color="#3b434a" stop-opacity="0.8"/><stop offset="1" stop-color="#3b434a" stop-opacity="0"/></linearGradient></defs>`;

export const whole = (metal: Metal) =>
  `<rect x="-200" y="-200" width="${WIDE + 400}" height="${HIGH + 400}" fill="url(#${metal})"/>`;

/** Boards of the bench, with the grain of the wood. */
export function bench(lot: () => number): { drawn: string; far: boolean } {
  const grain = Array.from({ length: 46 }, () => {
    const y = lot() * (HIGH + 300) - 150;
    return `<path d="M-200 ${n(y)}q500 ${n(lot() * 30 - 15)} 900 0t1000 ${n(lot() * 20)}" fill="none" stroke="#2c1e12" stroke-opacity="${n(0.1 + lot() * 0.3)}" stroke-width="${n(1 + lot() * 5)}"/>`;
  });
  return { drawn: `${whole('bench')}${grain.join('')}`, far: false };
}

/** Laid in steps: a blur of this size costs more than all of the picture. */
const SHADOW_STEPS = [34, 29, 24, 19, 14, 10, 6, 1];

/** The soft shadow of a shape that brings no colours of its own, so far right and down. */
export function shadow(shape: string, right: number, down: number): string {
  const steps = SHADOW_STEPS.map((wide) => `<g stroke-width="${wide}" opacity="0.075">${shape}</g>`);
  return `<g transform="translate(${n(right)} ${n(down)})" fill="#000" stroke="#000" stroke-linejoin="round">${steps.join('')}</g>`;
}

/** So far off that the lens draws it without any outline. */
export const farOff = (drawn: string) => ({ drawn: `${whole('grey')}${drawn}`, far: true });

/** A sheet that lies on what was drawn before: its shadow, its body, the bright cut edge on the lamp's side. */
export function sheet(corners: readonly Point[], metal: Metal, thick = 7): string {
  const points = corners.map(({ x, y }) => `${n(x)} ${n(y)}`).join(' ');
  return `${shadow(`<polygon points="${points}"/>`, thick * 1.4, thick * 2)}
    <polygon points="${points}" transform="translate(${n(thick * 0.25)} ${n(thick * 0.7)})" fill="#5d6366"/>
    <polygon points="${points}" fill="url(#${metal})"/>
    <polygon points="${points}" fill="none" stroke="#fff" stroke-opacity="0.55" stroke-width="2"/>`;
}

/** All of the frame between two heights at its left and right side. */
export function strip(top: readonly [number, number], low: readonly [number, number], metal: Metal): string {
  return sheet(
    [
      { x: -150, y: top[0] },
      { x: WIDE + 150, y: top[1] },
      { x: WIDE + 150, y: low[1] },
      { x: -150, y: low[0] },
    ],
    metal,
  );
}

/** What a shiny sheet shows of the room: tubes on the ceiling, a dark doorway. */
export function room(lot: () => number, strength = 0.5): string {
  const bands = Array.from({ length: 4 }, (_, at) => {
    const x = (at * WIDE) / 3 + lot() * 200;
    const ink = at % 2 === 0 ? 'bright' : 'gloom';
    return `<rect x="${n(x)}" y="-150" width="${n(240 + lot() * 240)}" height="1400" fill="url(#${ink})" opacity="${n(strength * (0.6 + lot() * 0.5))}"/>`;
  });
  return `<g transform="skewX(-14)">${bands.join('')}</g>`;
}

/** A spot of light or stain without a rim. */
export function blot({ x, y }: Point, [rx, ry]: readonly [number, number], ink: string): string {
  const id = `blot${x.toFixed()}-${y.toFixed()}-${rx.toFixed()}`;
  return `<radialGradient id="${id}"><stop offset="0" stop-color="${ink}" stop-opacity="0.6"/><stop offset="0.5" stop-color="${ink}" stop-opacity="0.36"/><stop offset="1" stop-color="${ink}" stop-opacity="0"/></radialGradient><ellipse cx="${n(x)}" cy="${n(y)}" rx="${n(rx)}" ry="${n(ry)}" fill="url(#${id})"/>`;
}
