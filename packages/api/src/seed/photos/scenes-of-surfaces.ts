import { HIGH, n, type Point, range, type Scene, spot, turned, WIDE } from './frame.js';
import { bench, blot, farOff, room, shadow, sheet, strip, whole } from './grounds.js';
import { widthOf, written } from './strokes.js';
import { flushHead, hairline, hole, screw } from './things.js';

function bead(from: Point, to: Point, lot: () => number): string {
  return range(0, 34)
    .map((at) => {
      const part = at / 34;
      const [x, y] = [from.x + (to.x - from.x) * part, from.y + (to.y - from.y) * part + lot() * 5];
      return `<ellipse cx="${n(x)}" cy="${n(y)}" rx="34" ry="46" fill="#5c6163"/><path d="M${n(x - 22)} ${n(y - 30)}q44 26 10 72" fill="none" stroke="#c7ccce" stroke-opacity="0.55" stroke-width="5"/><path d="M${n(x + 8)} ${n(y - 36)}q34 36 0 76" fill="none" stroke="#1d2022" stroke-opacity="0.7" stroke-width="5"/>`;
    })
    .join('');
}

const weldToe: Scene = (shot) => {
  const { lot } = shot;
  const at = spot(shot);
  const seam = at.y + 60;
  const freckles = range(0, 110).map(() => {
    const [x, y] = [at.x + (lot() + lot() - 1) * 330, at.y - 20 + (lot() + lot() - 1) * 80];
    const r = 1.5 + lot() * lot() * 9;
    return `<ellipse cx="${n(x)}" cy="${n(y)}" rx="${n(r * 1.2)}" ry="${n(r)}" fill="${lot() > 0.5 ? '#8a4a1f' : '#b5652c'}" opacity="${n(0.45 + lot() * 0.5)}"/>`;
  });
  const stain = blot(at, [400, 130], '#9a5a2a');
  const heat = `<linearGradient id="heat" x1="0" y1="0" x2="0" y2="1"><stop offset="0" stop-color="#a58a4c" stop-opacity="0"/><stop offset="0.35" stop-color="#a58a4c" stop-opacity="0.5"/><stop offset="0.6" stop-color="#5a5f8e" stop-opacity="0.55"/><stop offset="1" stop-color="#30384e" stop-opacity="0.5"/></linearGradient><rect x="-200" y="${n(seam - 190)}" width="1900" height="180" fill="url(#heat)"/>`;
  return {
    ground: `${whole('grey')}${turned(-3, at, `<rect x="-200" y="${n(seam)}" width="1900" height="470" fill="url(#tube)"/>${heat}`)}`,
    things: turned(
      -3,
      at,
      `${bead({ x: -80, y: seam }, { x: WIDE + 80, y: seam }, lot)}${stain}${freckles.join('')}`,
    ),
    skin: 'brushed',
  };
};

/** A control horn: a plate with an arm, its bolt hole at the end. */
function horn({ x, y }: Point, turn: number): string {
  const d = 'M-110 330V60Q-110 -40 -60 -170L-34 -300A52 52 0 0 1 66 -300L90 -150Q120 -40 120 60V330z';
  return `<g transform="translate(${n(x)} ${n(y)}) rotate(${turn})">${shadow(`<path d="${d}"/>`, 24, 32)}<path d="${d}" transform="translate(5 9)" fill="#4f5630"/><path d="${d}" fill="url(#primed)" stroke="#eef0c4" stroke-opacity="0.5" stroke-width="3"/>
    <rect x="-150" y="250" width="310" height="130" rx="60" fill="#899250"/><rect x="-150" y="262" width="310" height="34" rx="17" fill="#fff" opacity="0.22"/>${hole({ x: 16, y: -292 }, 20)}${hole({ x: -40, y: 120 }, 14)}${hole({ x: 50, y: 120 }, 14)}</g>`;
}

const hornsPrimed: Scene = (shot) => ({
  ground: `<rect x="-50" y="-50" width="1600" height="1250" fill="#cbb994"/>${range(0, 5)
    .map((at) => {
      const x = shot.lot() * WIDE;
      return `<path d="M${n(x)} -50l${n(shot.lot() * 90 - 45)} 1250" stroke="#8d7c5a" stroke-opacity="0.35" stroke-width="${3 + at}"/>`;
    })
    .join('')}${[450, 1010].map((x) => blot({ x, y: 560 }, [420, 520], '#8f9658')).join('')}`,
  things: horn({ x: 440, y: 560 }, -7) + horn({ x: 1000, y: 550 }, 5),
  skin: 'sprayed',
});

/** Light across the sheet from one side, so that every mark stands out. */
const RAKE = `<linearGradient id="rake" x1="0" y1="0" x2="1" y2="0.15"><stop offset="0" stop-color="#fff" stop-opacity="0.75"/><stop offset="0.35" stop-color="#fff" stop-opacity="0.12"/><stop offset="0.6" stop-color="#000" stop-opacity="0.25"/><stop offset="1" stop-color="#000" stop-opacity="0.72"/></linearGradient><rect width="${WIDE}" height="${HIGH}" fill="url(#rake)"/>`;

function webRow(at: Point, perInch: number): string {
  return range(-4, 5)
    .map((far) => hole({ x: at.x + far * 0.75 * perInch, y: 170 }, (0.159 * perInch) / 2))
    .join('');
}

const scratch: Scene = (shot) => {
  const [from, to] = [spot(shot), spot(shot, 1)];
  // 40 mm from start to end give the scale.
  const perInch = (to.x - from.x) / (40 / 25.4);
  const { lot } = shot;
  return {
    ground: `${whole('clad')}${RAKE}`,
    things: `${webRow(from, perInch)}${hairline(from, to, { lot, wide: 5, stray: 5 })}${hairline({ x: from.x + 60, y: from.y + 12 }, { x: from.x + 210, y: from.y + 6 }, { lot, wide: 2, stray: 3 })}`,
    skin: 'brushed',
  };
};

const blended: Scene = (shot) => {
  const at = spot(shot);
  const strokes = range(0, 150).map(() => {
    const [x, y] = [at.x + (shot.lot() + shot.lot() - 1) * 300, at.y + (shot.lot() + shot.lot() - 1) * 74];
    return `<path d="M${n(x - 60)} ${n(y + 4)}L${n(x + 60 + shot.lot() * 60)} ${n(y - 3)}" stroke="${shot.lot() > 0.45 ? '#fff' : '#596064'}" stroke-opacity="${n(0.1 + shot.lot() * 0.3)}" stroke-width="2"/>`;
  });
  return {
    ground: `${whole('clad')}${room(shot.lot, 0.4)}<ellipse cx="${n(at.x)}" cy="${n(at.y)}" rx="430" ry="130" fill="url(#glow)" opacity="0.75"/>`,
    things: `${webRow(at, 348)}${turned(-1.5, at, strokes.join(''))}`,
    skin: 'brushed',
  };
};

/** Tubes of the ceiling in the skin: straight where it is flat, drawn in where it pops. */
const tinLid: Scene = (shot) => {
  const at = spot(shot);
  const lamps = [-360, -170, 30, 250].map((far, number) => {
    const pull = far * -0.55;
    const x = at.x + far;
    return `<path d="M${n(x)} -60C${n(x)} ${n(at.y - 260)} ${n(x + pull)} ${n(at.y - 150)} ${n(x + pull)} ${n(at.y)}S${n(x - 30)} ${n(at.y + 300)} ${n(x - 40)} 1160" fill="none" stroke="#fff" stroke-opacity="${number % 2 === 0 ? 0.2 : 0.11}"`;
  });
  const lights = [78, 60, 44, 30, 16].flatMap((wide) =>
    lamps.map((lamp) => `${lamp} stroke-width="${wide}"/>`),
  );
  const dish = `${blot({ x: at.x + 70, y: at.y + 80 }, [430, 360], '#252b2f')}${blot({ x: at.x - 80, y: at.y - 80 }, [270, 220], '#fff')}`;
  const frames = [120, WIDE - 150].flatMap((x) =>
    range(0, 12).map((far) => flushHead({ x: x + far * 0.8, y: 20 + far * 92 }, 13)),
  );
  return {
    ground: `${whole('clad')}${lights.join('')}${dish}`,
    things: frames.join(''),
    skin: 'brushed',
  };
};

const bendTenTimes: Scene = (shot) => {
  const at = spot(shot);
  const bend = `<linearGradient id="bend" x1="0" y1="0" x2="0" y2="1"><stop offset="0" stop-color="#a9aeae"/><stop offset="0.3" stop-color="#c9cdcc"/><stop offset="0.5" stop-color="#f5f6f4"/><stop offset="0.66" stop-color="#9aa0a0"/><stop offset="1" stop-color="#4d5354"/></linearGradient><rect x="-100" y="${n(at.y - 260)}" width="1700" height="520" fill="url(#bend)"/><rect x="-100" y="-100" width="1700" height="${n(at.y - 158)}" fill="#a9aeae"/><rect x="-100" y="${n(at.y + 259)}" width="1700" height="900" fill="#4d5354"/>`;
  const dies = range(0, 60).map(() => {
    const [x, y] = [shot.lot() * WIDE, at.y - 240 + shot.lot() * 480];
    return `<path d="M${n(x)} ${n(y)}l${n(shot.lot() * 30 - 15)} ${n(30 + shot.lot() * 70)}" stroke="#2e3435" stroke-opacity="0.16" stroke-width="3"/>`;
  });
  const crack = hairline(
    { x: at.x - 190, y: at.y + 8 },
    { x: at.x + 200, y: at.y - 6 },
    { lot: shot.lot, wide: 6, stray: 11 },
  );
  const glass = `<radialGradient id="loupe" gradientUnits="userSpaceOnUse" cx="${n(at.x + 30)}" cy="${n(at.y + 40)}" r="560"><stop offset="0.86" stop-color="#000" stop-opacity="0"/><stop offset="0.93" stop-color="#0a0b0b" stop-opacity="0.85"/><stop offset="1" stop-color="#050505"/></radialGradient><rect width="${WIDE}" height="${HIGH}" fill="url(#loupe)"/>`;
  return {
    ground: turned(-4, at, bend + dies.join('')),
    things: turned(-4, at, crack) + glass,
    skin: 'brushed',
  };
};

const bagLabel: Scene = (shot) => {
  const { lot, photo } = shot;
  const at = spot(shot);
  const text = photo.marks[0]?.label ?? '';
  const folds = range(0, 16).map(() => {
    const [x, y] = [lot() * WIDE, lot() * HIGH];
    return `<path d="M${n(x)} ${n(y)}q${n(lot() * 300 - 150)} ${n(lot() * 200)} ${n(lot() * 500 - 250)} ${n(lot() * 260 - 60)}" fill="none" stroke="#fff" stroke-opacity="${n(0.15 + lot() * 0.4)}" stroke-width="${n(3 + lot() * 12)}"/>`;
  });
  const ribs = range(0, 3).map((far) =>
    sheet(
      [
        { x: 60, y: 190 + far * 240 },
        { x: WIDE - 90, y: 150 + far * 240 },
        { x: WIDE - 130, y: 300 + far * 240 },
        { x: 110, y: 350 + far * 240 },
      ],
      'formed',
    ),
  );
  const bars = range(0, 40).map(
    (far) =>
      `<rect x="${n(-330 + far * 12)}" y="104" width="${n(2 + lot() * 6)}" height="70" fill="#24272a"/>`,
  );
  const label = `<g transform="translate(${n(at.x)} ${n(at.y)}) rotate(-5)">${shadow(`<rect x="-372" y="-214" width="760" height="440"/>`, 0, 0)}<rect x="-380" y="-225" width="760" height="450" rx="10" fill="#f1eee3"/><rect x="-380" y="-225" width="760" height="70" rx="10" fill="#2d4b73"/>
    ${written('RIB', { x: -340, y: -212, high: 42, ink: '#f1eee3', pen: 2.4 })}${written(text, { x: -widthOf(text, 150) / 2, y: -110, high: 150, ink: '#1d2022', pen: 1.9 })}
    <path d="M-340 76H340" stroke="#8b8778" stroke-width="3"/>${bars.join('')}${written('RB-02', { x: 180, y: 112, high: 46, pen: 1.8 })}</g>`;
  return {
    behind: bench(lot),
    ground: ribs.join(''),
    things: `<rect width="${WIDE}" height="${HIGH}" fill="#dfe8ee" opacity="0.2"/>${folds.join('')}${label}${room(lot, 0.22)}`,
    skin: 'brushed',
  };
};

const canopyCrack: Scene = (shot) => {
  const { lot } = shot;
  const tip = spot(shot);
  // 0.60 in from the hole to the tip give the scale.
  const at = { x: tip.x - 24, y: tip.y + 245 };
  const screws = [-2, -1, 1, 2].map((far) => screw({ x: at.x + far * 330, y: at.y }, 38, { turn: far * 33 }));
  const washer = `<circle cx="${n(at.x)}" cy="${n(at.y)}" r="52" fill="#e6e9e4" opacity="0.35"/>`;
  const crack = hairline({ x: at.x + 4, y: at.y - 34 }, tip, { lot, wide: 4, stray: 9 });
  const flash = `<path d="M${n(at.x + 4)} ${n(at.y - 34)}L${n(tip.x)} ${n(tip.y)}L${n(tip.x + 34)} ${n(tip.y + 30)}L${n(at.x + 30)} ${n(at.y - 26)}z" fill="#fff" opacity="0.5"/>`;
  const shop =
    '<rect x="-50" y="-50" width="1560" height="1200" fill="#5f6d75"/><rect x="120" y="-60" width="300" height="560" fill="#c9d6da"/><rect x="620" y="160" width="420" height="260" fill="#3b2f26"/><rect x="1130" y="-40" width="240" height="700" fill="#8b5a3a"/><ellipse cx="420" cy="760" rx="360" ry="160" fill="#78858b"/>';
  const frame = strip([at.y - 70, at.y - 70], [at.y + 320, at.y + 320], 'formed');
  const pane = `<rect x="-100" y="-100" width="1700" height="${n(at.y + 196)}" fill="#cfe3ea" opacity="0.26"/><path d="M-100 ${n(at.y + 96)}H1600" stroke="#f3fbff" stroke-width="9" opacity="0.85"/><path d="M-100 ${n(at.y + 104)}H1600" stroke="#2b3f47" stroke-width="5" opacity="0.6"/><path d="M180 -50L520 ${n(at.y)}M260 -50L600 ${n(at.y)}" stroke="#fff" stroke-opacity="0.12" stroke-width="30"/><path d="M180 -50L520 ${n(at.y)}" stroke="#fff" stroke-opacity="0.14" stroke-width="14"/>`;
  return {
    behind: farOff(shop),
    ground: turned(1.5, at, frame),
    things: turned(1.5, at, `${pane}${screws.join('')}${washer}${hole(at, 30)}`) + flash + crack,
    skin: 'plain',
  };
};

export const SURFACE_SCENES: Readonly<Record<string, Scene>> = {
  'ELV-Q-002/1': weldToe,
  'ELV-Q-002/2': hornsPrimed,
  'WSP-Q-003/1': scratch,
  'WSP-Q-003/2': blended,
  'AFT-Q-001/1': tinLid,
  'WBX-Q-003/1': bendTenTimes,
  'WBX-Q-003/2': bagLabel,
  'CNP-Q-001/1': canopyCrack,
};
