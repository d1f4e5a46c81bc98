import { type ReactNode, type SVGProps, useId } from 'react';
import classes from './plan.module.css';

export type RegionFill = 'none' | 'chosen' | 'waits' | 'held' | 'todo' | 'pinned' | 'driven';
export interface PlanRegion {
  readonly label: string;
  readonly fill: RegionFill;
  /** Questions that wait there. */
  readonly count?: number;
  /** Chosen, where the fill has something else to tell: outlined. */
  readonly isChosen?: boolean;
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
  pinned: 'pinned',
  driven: 'driven',
};

/** What a reader hears of a region. */
function wordsOf({ label, fill, count = 0 }: PlanRegion): string {
  const waiting = count > 0 ? `${count} ${count === 1 ? 'question' : 'questions'} open` : '';
  return [label, FILL_WORDS[fill], waiting].filter(Boolean).join(', ');
}

/** One stop of the keyboard for a left and a right side, or several shapes, that mean the same. */
function firstShapes(
  shapes: Readonly<Record<string, string>>,
  regions: DrawnKitProps['regions'],
): Set<string> {
  const byLabel = new Map<string, string>();
  for (const region of Object.keys(shapes)) {
    const label = regions[region]?.label;
    if (label !== undefined && !byLabel.has(label)) byLabel.set(label, region);
  }
  return new Set(byLabel.values());
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
  const first = firstShapes(shapes, regions);
  return (
    <svg className={classes['plan']} viewBox={box} role={onChoose ? 'group' : 'img'} aria-label={name}>
      <Hatches id={id} />
      {Object.entries(shapes).map(([region, shape]) => {
        const drawn = regions[region];
        const fill = region === chosen ? 'chosen' : (drawn?.fill ?? 'none');
        const isChosen = fill === 'chosen' || drawn?.isChosen === true;
        const look = {
          d: shape,
          className: classes['region'],
          'data-fill': fill,
          'data-chosen': isChosen || undefined,
          style: hatchOf(id, fill),
        };
        if (!drawn || !onChoose) return <path key={region} {...look} />;
        const words = wordsOf({ ...drawn, fill });
        const choose = () => onChoose(region);
        const pressed = { words, isChosen, isFirst: first.has(region), onChoose: choose };
        return (
          <path key={region} {...look} {...buttonOf(pressed)}>
            <title>{words}</title>
          </path>
        );
      })}
      {children}
    </svg>
  );
}

interface Pressed {
  readonly words: string;
  readonly isChosen: boolean;
  readonly isFirst: boolean;
  readonly onChoose: () => void;
}

function buttonOf({ words, isChosen, isFirst, onChoose }: Pressed): SVGProps<SVGPathElement> {
  return {
    role: 'button',
    tabIndex: isFirst ? 0 : -1,
    'aria-hidden': isFirst ? undefined : true,
    'aria-pressed': isChosen,
    'aria-label': words,
    onClick: onChoose,
    onKeyDown: (event) => {
      if (event.key !== 'Enter' && event.key !== ' ') return;
      event.preventDefault();
      onChoose();
    },
  };
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
