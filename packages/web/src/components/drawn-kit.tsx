import { type KeyboardEvent, type ReactNode, useId } from 'react';
import classes from './plan.module.css';

export type RegionFill = 'none' | 'chosen' | 'waits' | 'held' | 'todo' | 'pinned' | 'driven';
export interface PlanRegion {
  readonly label: string;
  readonly fill: RegionFill;
  /** Questions that wait there. */
  readonly count?: number;
}
export interface DrawnKitProps {
  /** What the drawing as a whole is for. */
  readonly name: string;
  readonly regions: Readonly<Record<string, PlanRegion>>;
  readonly chosen?: string | null;
  readonly onChoose?: (region: string) => void;
}

const FILL_WORDS: Readonly<Record<RegionFill, string>> = {
  none: '',
  chosen: 'chosen',
  waits: 'a question waits',
  held: 'held or under review',
  todo: 'to do',
  pinned: 'begun',
  driven: 'driven',
};

/** What a reader hears of a region. */
function wordsOf({ label, fill, count = 0 }: PlanRegion): string {
  const waiting = count > 0 ? `${count} ${count === 1 ? 'question' : 'questions'} open` : '';
  return [label, FILL_WORDS[fill], waiting].filter(Boolean).join(', ');
}

interface DrawingProps extends DrawnKitProps {
  readonly shapes: Readonly<Record<string, string>>;
  readonly box: string;
  readonly children: ReactNode;
}

/** One of the two views: shapes to look at, and to tap or press where something can be chosen. */
export function DrawnKit({
  name,
  regions,
  chosen,
  onChoose,
  shapes,
  box,
  children,
}: DrawingProps): ReactNode {
  const id = useId();
  const names = Object.keys(shapes).filter((region) => regions[region]);
  return (
    <svg className={classes['plan']} viewBox={box} role={onChoose ? 'group' : 'img'} aria-label={name}>
      <Hatches id={id} />
      {Object.entries(shapes).map(([region, shape]) => {
        const drawn = regions[region];
        const fill = region === chosen ? 'chosen' : (drawn?.fill ?? 'none');
        const look = { d: shape, className: classes['region'], 'data-fill': fill, style: hatchOf(id, fill) };
        if (!drawn || !onChoose) return <path key={region} {...look} />;
        // One stop of the keyboard for a left and a right side that mean the same.
        const isSecond = names.some(
          (other) =>
            other !== region &&
            regions[other]!.label === drawn.label &&
            names.indexOf(other) < names.indexOf(region),
        );
        const press = (event: KeyboardEvent) => {
          if (event.key !== 'Enter' && event.key !== ' ') return;
          event.preventDefault();
          onChoose(region);
        };
        return (
          <path
            key={region}
            {...look}
            role="button"
            tabIndex={isSecond ? -1 : 0}
            aria-hidden={isSecond || undefined}
            aria-pressed={fill === 'chosen'}
            aria-label={wordsOf({ ...drawn, fill })}
            onClick={() => onChoose(region)}
            onKeyDown={press}
          >
            <title>{wordsOf({ ...drawn, fill })}</title>
          </path>
        );
      })}
      {children}
    </svg>
  );
}

function hatchOf(id: string, fill: RegionFill): { fill: string } | undefined {
  if (fill === 'waits') return { fill: `url(#${id}waits)` };
  return fill === 'held' ? { fill: `url(#${id}held)` } : undefined;
}

/** Told apart by their lines, not by their colours alone. */
function Hatches({ id }: { readonly id: string }): ReactNode {
  const square = {
    width: 7,
    height: 7,
    patternUnits: 'userSpaceOnUse',
    patternTransform: 'rotate(45)',
  } as const;
  return (
    <defs>
      <pattern id={`${id}waits`} {...square}>
        <rect width="7" height="7" className={classes['ground']} />
        <path d="M0 0V7" className={classes['waits']} />
      </pattern>
      <pattern id={`${id}held`} {...square}>
        <rect width="7" height="7" className={classes['ground']} />
        <path d="M0 0V7M0 0H7" className={classes['held']} />
      </pattern>
    </defs>
  );
}
