import type { ReactNode } from 'react';
import classes from './welcome.module.css';

const OUTLINE =
  'M62 230C62 208 84 199 132 198L208 194L312 197L540 221L540 239L312 263L208 266L132 262C84 261 62 252 62 230ZM132 198V262M208 194V266M312 197V263' +
  'M214 196V128L227 44L240 26L266 22L274 44L282 128V196M236 196V128M215 128H282M227 44H274M282 190V118H306V190ZM282 114L275 48H293L304 114Z' +
  'M214 264V332L227 416L240 434L266 438L274 416L282 332V264M236 264V332M215 332H282M227 416H274M282 270V342H306V270ZM282 346L275 412H293L304 346Z' +
  'M520 222L536 150H562L566 222M566 214L562 150H584L592 214ZM566 246L562 310H584L592 246Z' +
  'M500 227L596 226L616 230L596 234L500 233Z';
const CHOSEN = 'M520 238L536 310H562L566 238Z';

/** The plan of a kit with one place picked, and what a question there looks like from near. Says nothing by itself. */
export function KitDrawing(): ReactNode {
  return (
    <svg className={classes['drawing']} viewBox="40 8 780 444" aria-hidden>
      <path d="M60 176Q52 230 60 284" className={classes['thin']} />
      <path d={OUTLINE} className={classes['part']} />
      <path d="M222 206Q264 200 296 210V250Q264 260 222 254Z" className={classes['glass']} />
      <path d={CHOSEN} className={classes['chosen']} />
      <path d="M40 230H628" className={classes['centre']} />
      <path d="M552 290L640 340" className={classes['lead']} />
      <Near />
    </svg>
  );
}

function Near(): ReactNode {
  return (
    <g transform="translate(706 330)">
      <circle r="104" className={classes['near']} />
      <path d="M-87 -58H87" className={classes['edge']} />
      {[-66, 66].map((x) => (
        <g key={x}>
          <circle cx={x} r="15" className={classes['hole']} />
          <path d={`M${x - 21} 0H${x + 21}M${x} -21V21`} className={classes['thin']} />
        </g>
      ))}
      <circle r="15" className={classes['hole']} />
      <circle cy="-7" r="15" className={classes['other']} />
      <path d="M0 -58V-7M-66 30V58M0 30V58M66 30V58M-66 52H66" className={classes['dimension']} />
      <path d="M11 -18L34 -34H62" className={classes['dimension']} />
      <text x="8" y="84" className={classes['figure']} textAnchor="middle">
        hole 7 of 22
      </text>
      <text x="34" y="-39" className={classes['figure']}>
        off
      </text>
    </g>
  );
}
