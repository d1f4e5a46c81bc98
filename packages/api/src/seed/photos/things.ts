import { type Lot, n, type Point, range } from './frame.js';

const shade = (x: number, y: number, r: number) =>
  `<circle cx="${n(x + r * 0.28)}" cy="${n(y + r * 0.38)}" r="${n(r * 1.45)}" fill="url(#shade)"/>`;

/** A drilled hole: its wall on the lamp's far side, the bright ring of a broken edge. */
export function hole({ x, y }: Point, r: number): string {
  return `<circle cx="${n(x)}" cy="${n(y)}" r="${n(r * 1.07)}" fill="#f4f6f6" opacity="0.55"/>
    <circle cx="${n(x - r * 0.03)}" cy="${n(y - r * 0.05)}" r="${n(r * 1.02)}" fill="#2a2e30"/>
    <circle cx="${n(x)}" cy="${n(y)}" r="${n(r)}" fill="#8d9396"/>
    <circle cx="${n(x - r * 0.07)}" cy="${n(y - r * 0.1)}" r="${n(r * 0.93)}" fill="url(#deep)"/>`;
}

/** Holes of one size at so many inches right of the point. */
export const holesAt = (
  { x, y }: Point,
  inches: readonly number[],
  { perInch, d }: { perInch: number; d: number },
) => inches.map((far) => hole({ x: x + far * perInch, y }, (d * perInch) / 2)).join('');

/** Through the upper hole one sees the sheet below, whose own hole lies off by so much. */
export function moon({ x, y }: Point, r: number, off: Point, below = '#d9dddd'): string {
  const id = `moon${x.toFixed()}-${y.toFixed()}`;
  const under = { x: x + off.x, y: y + off.y };
  return `<circle cx="${n(x)}" cy="${n(y)}" r="${n(r * 1.07)}" fill="#f4f6f6" opacity="0.55"/>
    <clipPath id="${id}"><circle cx="${n(x)}" cy="${n(y)}" r="${n(r)}"/></clipPath>
    <g clip-path="url(#${id})"><circle cx="${n(x)}" cy="${n(y)}" r="${n(r)}" fill="${below}"/>
    <circle cx="${n(under.x)}" cy="${n(under.y)}" r="${n(r)}" fill="#6a7073"/>
    <circle cx="${n(under.x - r * 0.04)}" cy="${n(under.y - r * 0.06)}" r="${n(r * 0.95)}" fill="url(#deep)"/>
    <circle cx="${n(x + r * 0.1)}" cy="${n(y + r * 0.14)}" r="${n(r * 1.06)}" fill="none" stroke="#000" stroke-opacity="0.5" stroke-width="${n(r * 0.2)}"/></g>`;
}

/** A universal head, twice the shank across, low and round. */
export function roundHead({ x, y }: Point, shank: number): string {
  const r = shank;
  return `${shade(x, y, r)}<circle cx="${n(x)}" cy="${n(y)}" r="${n(r)}" fill="#596064"/>
    <circle cx="${n(x - 1)}" cy="${n(y - 1)}" r="${n(r * 0.97)}" fill="url(#dome)"/>
    <ellipse cx="${n(x - r * 0.3)}" cy="${n(y - r * 0.36)}" rx="${n(r * 0.2)}" ry="${n(r * 0.13)}" fill="#fff" opacity="0.9"/>`;
}

/** A flush head: a ring no wider than a hair, polished by the set. */
export function flushHead({ x, y }: Point, r: number): string {
  return `<circle cx="${n(x)}" cy="${n(y)}" r="${n(r)}" fill="url(#flat)" opacity="0.9"/>
    <circle cx="${n(x)}" cy="${n(y)}" r="${n(r)}" fill="none" stroke="#2b3033" stroke-opacity="0.75" stroke-width="${n(Math.max(1.4, r * 0.07))}"/>
    <path d="M${n(x - r * 0.75)} ${n(y - r * 0.5)}a${n(r * 0.9)} ${n(r * 0.9)} 0 0 1 ${n(r * 1.1)} ${n(-r * 0.3)}" fill="none" stroke="#fff" stroke-opacity="0.7" stroke-width="${n(r * 0.08)}"/>`;
}

/** What the bar made of the shank: a drum with a flat top. A coin is wide, thin and torn at its rim. */
export function shopHead(
  { x, y }: Point,
  r: number,
  { lot, coin = false }: { lot: Lot; coin?: boolean },
): string {
  const tall = coin ? r * 0.16 : r * 0.5;
  const rim = range(0, 35).map((at) => {
    const out = r * (1 + (lot() - 0.5) * (coin ? 0.09 : 0.018));
    const angle = (at * Math.PI) / 18;
    return `${n(out * Math.cos(angle))} ${n(out * Math.sin(angle))}`;
  });
  const body = `<polygon points="${rim.join(' ')}"`;
  const cracks = coin
    ? range(0, 4).map((at) => {
        const angle = at * 1.3 + lot();
        const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
        return `<path d="M${n(cos * r)} ${n(sin * r)}L${n(cos * r * 0.78)} ${n(sin * r * 0.8)}" stroke="#2c3133" stroke-width="2.5"/>`;
      })
    : [];
  return `${shade(x, y, r)}<g transform="translate(${n(x)} ${n(y)})">
    ${body} fill="#4d5356" transform="translate(${n(tall * 0.5)} ${n(tall * 0.7)})"/>
    ${body} fill="#8b9295" transform="translate(${n(tall * 0.25)} ${n(tall * 0.35)})"/>
    ${body} fill="url(#pressed)" stroke="#f6f8f8" stroke-opacity="0.8" stroke-width="${n(r * 0.035)}"/>
    <circle r="${n(r * 0.8)}" fill="none" stroke="#5f666a" stroke-opacity="0.35" stroke-width="${n(r * 0.04)}"/>
    <path d="M${n(-r * 0.5)} ${n(r * 0.2)}q${n(r * 0.4)} ${n(-r * 0.5)} ${n(r)} ${n(-r * 0.4)}M${n(-r * 0.3)} ${n(r * 0.5)}q${n(r * 0.4)} ${n(-r * 0.4)} ${n(r * 0.9)} ${n(-r * 0.3)}" fill="none" stroke="#fff" stroke-opacity="0.35" stroke-width="${n(r * 0.05)}"/>${cracks.join('')}</g>`;
}

/** A sheet holder by the colour of its size, seen from above and a little from the side. */
export const PIN_INKS = { 3: '#c3c8ca', 4: '#b4683a', 5: '#34383b', 6: '#b8963f' } as const;

export function pin({ x, y }: Point, r: number, size: keyof typeof PIN_INKS): string {
  const ink = PIN_INKS[size];
  const [top, left] = [y - r * 2.3, x - r * 0.5];
  return `<ellipse cx="${n(x + r * 1.3)}" cy="${n(y + r * 1.1)}" rx="${n(r * 2.6)}" ry="${n(r * 1.3)}" fill="url(#shade)" opacity="0.8"/>
    <path d="M${n(x - r)} ${n(y)}L${n(left - r)} ${n(top)}h${n(2 * r)}L${n(x + r)} ${n(y)}z" fill="${ink}"/>
    <path d="M${n(x - r * 0.55)} ${n(y)}L${n(left - r * 0.6)} ${n(top)}h${n(r * 0.5)}L${n(x - r * 0.05)} ${n(y)}z" fill="#fff" opacity="0.4"/>
    <path d="M${n(x + r * 0.45)} ${n(y)}L${n(left + r * 0.45)} ${n(top)}h${n(r * 0.55)}L${n(x + r)} ${n(y)}z" fill="#000" opacity="0.35"/>
    <ellipse cx="${n(x)}" cy="${n(y)}" rx="${n(r)}" ry="${n(r * 0.45)}" fill="#000" opacity="0.35"/>
    <ellipse cx="${n(left)}" cy="${n(top)}" rx="${n(r)}" ry="${n(r * 0.62)}" fill="${ink}"/>
    <ellipse cx="${n(left)}" cy="${n(top)}" rx="${n(r)}" ry="${n(r * 0.62)}" fill="#fff" opacity="0.25"/>
    <ellipse cx="${n(left)}" cy="${n(top - r * 0.35)}" rx="${n(r * 0.45)}" ry="${n(r * 0.3)}" fill="#e9eceb"/>`;
}

/** A cross-recess screw; one that leans shows the side of its head. */
export function screw({ x, y }: Point, r: number, { lean = 0, turn = 20 } = {}): string {
  const [dx, dy] = [r * lean * 0.5, -r * lean * 0.9];
  return `${shade(x, y, r)}<circle cx="${n(x)}" cy="${n(y)}" r="${n(r)}" fill="#474d51"/>
    <g transform="translate(${n(x + dx)} ${n(y + dy)}) rotate(${turn}) scale(1 ${n(1 - lean * 0.4)})"><circle r="${n(r * 0.97)}" fill="url(#dome)"/>
    <path d="M${n(-r * 0.55)} 0H${n(r * 0.55)}M0 ${n(-r * 0.55)}V${n(r * 0.55)}" stroke="#23282b" stroke-width="${n(r * 0.24)}" stroke-linecap="round"/></g>`;
}

/** A felt pen's cross. */
export const cross = ({ x, y }: Point, arm: number, ink = '#1b2a6b') =>
  `<path d="M${n(x - arm)} ${n(y + 2)}L${n(x + arm)} ${n(y - 1)}M${n(x - 1)} ${n(y - arm)}L${n(x + 2)} ${n(y + arm)}" stroke="${ink}" stroke-width="5" stroke-linecap="round" opacity="0.85"/>`;

/** Paper tape with torn ends. */
export function tape({ x, y }: Point, wide: number, { high, ink }: { high: number; ink: string }): string {
  return `<path d="M${n(x + 4)} ${n(y + 7)}h${n(wide)}v${n(high)}h${n(-wide)}z" fill="#000" opacity="0.25"/>
    <path d="M${n(x)} ${n(y)}h${n(wide)}l-9 ${n(high * 0.3)} 7 ${n(high * 0.3)} -6 ${n(high * 0.4)}h${n(-wide)}l8 ${n(-high * 0.35)} -8 ${n(-high * 0.3)}z" fill="${ink}" opacity="0.93"/>
    <path d="M${n(x)} ${n(y + 4)}h${n(wide)}" stroke="#fff" stroke-opacity="0.35" stroke-width="4"/>`;
}

/** A wandering line as a crack or a scratch makes it, its far lip catching the lamp. */
export function hairline(
  from: Point,
  to: Point,
  { lot, wide, stray }: { lot: Lot; wide: number; stray: number },
): string {
  const way = range(1, 12).map((at) => {
    const part = at / 12;
    const off = at === 12 ? 0 : (lot() - 0.5) * 2 * stray;
    return `L${n(from.x + (to.x - from.x) * part + off * 0.3)} ${n(from.y + (to.y - from.y) * part + off)}`;
  });
  const d = `M${n(from.x)} ${n(from.y)}${way.join('')}`;
  return `<path d="${d}" transform="translate(${n(wide * 0.5)} ${n(wide * 0.8)})" fill="none" stroke="#fff" stroke-opacity="0.85" stroke-width="${n(wide)}" stroke-linejoin="round"/>
    <path d="${d}" fill="none" stroke="#16191a" stroke-opacity="0.9" stroke-width="${n(wide)}" stroke-linejoin="round"/>`;
}
