import type { ReactNode } from 'react';
import classes from './stop.module.css';

/** Small drawings beside the words that say the same; for whoever listens there are only the words. */
function Small({ children }: { readonly children: ReactNode }): ReactNode {
  return (
    <svg viewBox="0 0 132 92" className={classes['drawing']} aria-hidden>
      {children}
    </svg>
  );
}

const LINE = { sheet: classes['sheet'], hole: classes['hole'], other: classes['other'], dim: classes['dim'] };
const TICK = 5;

/** A dimension along x or y with a tick at each end. */
function Dim({
  from,
  to,
}: {
  readonly from: readonly [number, number];
  readonly to: readonly [number, number];
}): ReactNode {
  const [x1, y1] = from;
  const [x2, y2] = to;
  const isFlat = y1 === y2;
  const tick = (x: number, y: number) =>
    isFlat ? `M${x} ${y - TICK}V${y + TICK}` : `M${x - TICK} ${y}H${x + TICK}`;
  return <path d={`M${x1} ${y1}L${x2} ${y2}${tick(x1, y1)}${tick(x2, y2)}`} className={LINE.dim} />;
}

export function Across(): ReactNode {
  return (
    <Small>
      <rect x="2" y="2" width="128" height="88" className={LINE.sheet} />
      <ellipse cx="66" cy="40" rx="30" ry="23" className={LINE.hole} />
      <Dim from={[36, 80]} to={[96, 80]} />
      <Dim from={[116, 17]} to={[116, 63]} />
    </Small>
  );
}

export function Apart(): ReactNode {
  return (
    <Small>
      <rect x="2" y="2" width="128" height="88" className={LINE.sheet} />
      <circle cx="54" cy="46" r="24" className={LINE.hole} />
      <circle cx="76" cy="46" r="24" className={LINE.other} />
      <path d="M54 22V84M76 22V84" className={classes['thin']} />
      <Dim from={[54, 80]} to={[76, 80]} />
    </Small>
  );
}

export function Edge(): ReactNode {
  return (
    <Small>
      <path d="M2 16H130V90H2Z" className={LINE.sheet} />
      <path d="M2 16H130" className={classes['edge']} />
      <circle cx="58" cy="62" r="16" className={LINE.hole} />
      <path d="M58 62H104" className={classes['thin']} />
      <Dim from={[98, 16]} to={[98, 62]} />
    </Small>
  );
}

export function Pitch(): ReactNode {
  return (
    <Small>
      <rect x="2" y="2" width="128" height="88" className={LINE.sheet} />
      {[20, 66, 114].map((x) => (
        <g key={x}>
          <circle cx={x} cy="36" r="12" className={LINE.hole} />
          <path d={`M${x} 36V82`} className={classes['thin']} />
        </g>
      ))}
      <Dim from={[20, 76]} to={[66, 76]} />
      <Dim from={[66, 76]} to={[114, 76]} />
    </Small>
  );
}

export function Stack(): ReactNode {
  return (
    <Small>
      <rect x="8" y="26" width="94" height="14" className={LINE.sheet} />
      <rect x="8" y="40" width="94" height="22" className={LINE.sheet} />
      <path d="M44 18V70M64 18V70" className={classes['thin']} />
      <Dim from={[114, 26]} to={[114, 40]} />
      <Dim from={[114, 40]} to={[114, 62]} />
    </Small>
  );
}

/** How a photo has to stand to the sheet, and how not. */
export function SquareOn(): ReactNode {
  return (
    <Small>
      <path d="M16 84H116" className={classes['edge']} />
      <rect x="52" y="8" width="28" height="18" rx="3" className={LINE.hole} />
      <path d="M58 26L34 82M74 26L98 82" className={LINE.dim} />
    </Small>
  );
}

export function ScaleIn(): ReactNode {
  return (
    <Small>
      <rect x="2" y="2" width="128" height="88" className={LINE.sheet} />
      <circle cx="66" cy="30" r="12" className={LINE.hole} />
      <rect x="14" y="58" width="104" height="20" className={LINE.hole} />
      <path
        d="M24 58v8M34 58v5M44 58v8M54 58v5M64 58v8M74 58v5M84 58v8M94 58v5M104 58v8"
        className={LINE.dim}
      />
    </Small>
  );
}

export function WholeRow(): ReactNode {
  return (
    <Small>
      <rect x="2" y="14" width="128" height="62" className={LINE.sheet} />
      {[14, 35, 56, 77, 98, 119].map((x) => (
        <circle key={x} cx={x} cy="44" r="5" className={x === 77 ? LINE.other : LINE.hole} />
      ))}
    </Small>
  );
}

export function CloseUp(): ReactNode {
  return (
    <Small>
      <rect x="2" y="2" width="128" height="88" className={LINE.sheet} />
      <circle cx="62" cy="46" r="36" className={LINE.hole} />
      <circle cx="70" cy="46" r="36" className={LINE.other} />
    </Small>
  );
}
