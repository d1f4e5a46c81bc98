import { n, type Point, range, turned } from './frame.js';
import { shadow } from './grounds.js';
import { widthOf, written } from './strokes.js';

const cast = (shape: string, far = 10) => shadow(shape, far * 0.8, far * 1.3);

const TICKS = [46, 16, 24, 16, 32, 16, 24, 16];

/** A steel rule in eighths and inches, to the scale of the picture. */
export function rule(
  { x, y }: Point,
  perInch: number,
  { inches, turn }: { inches: number; turn: number },
): string {
  const body = `<rect x="${n(x - 40)}" y="${n(y)}" width="${n(inches * perInch + 70)}" height="132" rx="3"`;
  const ticks = range(0, inches * 8).map(
    (at) =>
      `<path d="M${n(x + (at * perInch) / 8)} ${n(y + 2)}v${TICKS[at % 8]}" stroke="#1c2022" stroke-width="${at % 8 === 0 ? 3.4 : 2.2}"/>`,
  );
  const numbers = range(1, inches).map((inch) =>
    written(String(inch), { x: x + inch * perInch + 9, y: y + 52, high: 40, pen: 2 }),
  );
  return turned(
    turn,
    { x: 720, y },
    `${cast(`${body}/>`)}${body} fill="url(#steel)"/>${ticks.join('')}${numbers.join('')}`,
  );
}

/** A sheet-steel gauge with a notch that a good shop head just fills, named by its rivet. */
export function headGauge(
  { x, y }: Point,
  r: number,
  { name, turn }: { name: string; turn: number },
): string {
  const long = r * 7.5;
  const high = r * 3.1;
  const [left, top] = [x - r * 0.1, y - high / 2];
  const d = `M${n(left)} ${n(top)}h${n(long)}a14 14 0 0 1 14 14v${n(high - 28)}a14 14 0 0 1 -14 14h${n(-long)}v${n(-(high / 2 - r * 1.06))}a${n(r * 1.06)} ${n(r * 1.06)} 0 0 0 0 ${n(-r * 2.12)}z`;
  const eye = { x: left + long - r * 1.2, y };
  return turned(
    turn,
    { x, y },
    `${cast(`<path d="${d}"/>`, 8)}<path d="${d}" fill="url(#steel)" stroke="#6c7377" stroke-width="2"/>
    <circle cx="${n(eye.x)}" cy="${n(eye.y)}" r="${n(r * 0.55)}" fill="#1f2426" stroke="#6c7377" stroke-width="2"/>
    ${written(name, { x: left + (long - widthOf(name, r * 0.8)) / 2 - r * 0.1, y: y - r * 0.4, high: r * 0.8, ink: '#3a4145' })}`,
  );
}

/** Both measuring jaws of a caliper that comes up from below: one in the hole on its rim, one at the edge. */
export function jaws(rim: Point, edge: Point): string {
  const jaw = (x: number, y: number, side: 1 | -1) =>
    `M${n(x)} ${n(y - 40)}l${side * 34} -14 l${side * 52} 210 l0 900h${side * -86}z`;
  const left = `<path d="${jaw(rim.x, rim.y, -1)}"`;
  const right = `<path d="${jaw(edge.x, edge.y, 1)}"`;
  const shine = (x: number, y: number, side: 1 | -1) =>
    `<path d="M${n(x + side * 5)} ${n(y)}v900" stroke="#fff" stroke-opacity="0.8" stroke-width="5"/>`;
  const beam = `<rect x="${n(rim.x - 420)}" y="${n(rim.y + 440)}" width="1500" height="190" rx="8"`;
  return `${cast(`${left}/>${right}/>${beam}/>`, 14)}${left} fill="url(#bar)"/>${right} fill="url(#bar)"/>
    ${shine(rim.x, rim.y, -1)}${shine(edge.x, edge.y, 1)}${beam} fill="url(#steel)"/>
    ${range(0, 52)
      .map(
        (at) =>
          `<path d="M${n(rim.x - 400 + at * 28)} ${n(rim.y + 442)}v${at % 5 === 0 ? 54 : 30}" stroke="#1c2022" stroke-width="3"/>`,
      )
      .join('')}`;
}

/** A dial indicator whose stem comes down on the point. */
export function dial(
  { x, y }: Point,
  { r, needle, foot }: { r: number; needle: number; foot: number },
): string {
  const up = y - r * 2.05;
  const ticks = range(0, 49).map((at) => {
    const long = at % 5 === 0 ? 0.14 : 0.07;
    return `<path transform="rotate(${n(at * 7.2)})" d="M0 ${n(-r * 0.82)}v${n(r * long)}" stroke="#17191a" stroke-width="${at % 5 === 0 ? 3.5 : 2}"/>`;
  });
  const numbers = range(0, 9).map((at) => {
    const angle = (at * Math.PI) / 5;
    const high = r * 0.12;
    const place = { x: Math.sin(angle) * r * 0.56, y: -Math.cos(angle) * r * 0.56 };
    const text = String(at * 10);
    return written(text, { x: place.x - widthOf(text, high) / 2, y: place.y - high / 2, high });
  });
  const stem = `<path d="M${n(x - r * 0.11)} ${n(up + r * 0.9)}h${n(r * 0.22)}v${n(r * 0.55)}h${n(-r * 0.06)}v${n(r * 0.5)}l${n(-r * 0.05)} ${n(r * 0.1)} ${n(-r * 0.05)} ${n(-r * 0.1)}v${n(-r * 0.5)}h${n(-r * 0.06)}z"`;
  const base =
    foot > 0
      ? `<rect x="${n(x - foot)}" y="${n(y - r * 0.42)}" width="${n(2 * foot)}" height="${n(r * 0.3)}" rx="6"`
      : '';
  const solid = (fill: string) => (base ? `${base} ${fill}/>` : '');
  return `${cast(`<circle cx="${n(x)}" cy="${n(up)}" r="${n(r)}"/>${stem}/>${solid('')}`, 22)}
    ${solid('fill="url(#steel)" stroke="#666d71"')}${stem} fill="url(#bar)" stroke="#666d71"/>
    <g transform="translate(${n(x)} ${n(up)})"><circle r="${n(r)}" fill="#3a3f42"/><circle r="${n(r)}" fill="none" stroke="#9aa1a4" stroke-width="${n(r * 0.1)}" stroke-dasharray="5 4"/>
    <circle r="${n(r * 0.9)}" fill="#f2f0e6"/>${ticks.join('')}${numbers.join('')}
    <path transform="rotate(${n(needle)})" d="M${n(-r * 0.025)} ${n(r * 0.18)}L0 ${n(-r * 0.74)}L${n(r * 0.025)} ${n(r * 0.18)}z" fill="#16181a"/><circle r="${n(r * 0.08)}" fill="#16181a"/>
    <path d="M${n(-r * 0.7)} ${n(-r * 0.45)}Q${n(-r * 0.3)} ${n(-r * 0.85)} ${n(r * 0.3)} ${n(-r * 0.8)}Q${n(-r * 0.25)} ${n(-r * 0.55)} ${n(-r * 0.7)} ${n(-r * 0.45)}z" fill="#fff" opacity="0.5"/></g>`;
}

/** A level with a window of figures. */
export function level({ x, y }: Point, shown: string): string {
  const body = `<rect x="${n(x - 560)}" y="${n(y - 92)}" width="1120" height="184" rx="14"`;
  const segments = written(shown, {
    x: x - widthOf(shown, 74) / 2,
    y: y - 38,
    high: 74,
    ink: '#1a2115',
    pen: 2,
  });
  return `${cast(`${body}/>`, 16)}${body} fill="#2c3032"/><rect x="${n(x - 560)}" y="${n(y - 92)}" width="1120" height="26" rx="12" fill="#f0b62f"/><rect x="${n(x - 560)}" y="${n(y + 70)}" width="1120" height="22" fill="url(#steel)"/>
    <rect x="${n(x - 190)}" y="${n(y - 56)}" width="380" height="114" rx="8" fill="#0e1011"/><rect x="${n(x - 178)}" y="${n(y - 48)}" width="356" height="98" rx="4" fill="#a9b694"/>${segments}
    <path d="M${n(x - 178)} ${n(y - 48)}h150l-60 98h-90z" fill="#fff" opacity="0.16"/>
    ${[300, 370, 440].map((far) => `<circle cx="${n(x + far)}" cy="${n(y)}" r="24" fill="#4a5053" stroke="#15181a" stroke-width="3"/>`).join('')}
    <rect x="${n(x - 480)}" y="${n(y - 30)}" width="180" height="60" rx="28" fill="#c7e06a"/><ellipse cx="${n(x - 372)}" cy="${n(y)}" rx="36" ry="23" fill="#f5ffd9" stroke="#7d9136" stroke-width="2"/><path d="M${n(x - 420)} ${n(y - 30)}v60M${n(x - 360)} ${n(y - 30)}v60" stroke="#27301a" stroke-width="3"/>`;
}
