import { toPixels, type DrawnShape, type Frame, type LegendItem, type Point } from '@rivetside/shared';
import type { ReactNode } from 'react';
import classes from './hole-drawing.module.css';

/** Paint that a drawing keeps to itself: two drawings on one page must not share ids. */
export interface PaintIds {
  readonly arrow: string;
  readonly grid: string;
  readonly hatch: string;
}

const LAYER_CLASSES = [
  classes['layer0'],
  classes['layer1'],
  classes['layer2'],
  classes['layer3'],
  classes['layer4'],
];

function layerClass(layer: number | null): string {
  return layer === null ? '' : (LAYER_CLASSES[layer] ?? '');
}

const named = (...names: (string | undefined)[]) => names.filter(Boolean).join(' ');
const pathOf = (points: readonly Point[]) =>
  points.map(({ x, y }) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L');

interface Drawn<S> {
  readonly shape: S;
  readonly frame: Frame;
  readonly paint: PaintIds;
}
type Of<K extends DrawnShape['kind']> = Extract<DrawnShape, { kind: K }>;

function Area({ shape, frame, paint }: Drawn<Of<'area'>>): ReactNode {
  const d = `M${pathOf(shape.points.map((point) => toPixels(frame, point)))}Z`;
  if (shape.role === 'overlap') return <path d={d} className={classes['overlap']} />;
  return <path d={d} className={classes['tooClose']} fill={`url(#${paint.hatch})`} />;
}

function Line({ shape, frame }: Drawn<Of<'line'>>): ReactNode {
  const [from, to] = [toPixels(frame, shape.from), toPixels(frame, shape.to)];
  const edge = shape.role === 'edge' && shape.layer === 0 ? classes['hidden'] : undefined;
  return <line x1={from.x} y1={from.y} x2={to.x} y2={to.y} className={named(classes[shape.role], edge)} />;
}

function Circle({ shape, frame, paint }: Drawn<Of<'circle'>>): ReactNode {
  const { x, y } = toPixels(frame, shape.centre);
  const isHatched = shape.role === 'tooClose';
  return (
    <circle
      cx={x}
      cy={y}
      r={shape.radius * frame.scale}
      className={named(classes[shape.role], layerClass(shape.layer))}
      fill={isHatched ? `url(#${paint.hatch})` : undefined}
    />
  );
}

function Slot({ shape, frame }: Drawn<Of<'slot'>>): ReactNode {
  const { x, y } = toPixels(frame, shape.centre);
  const [width, length] = [shape.width * frame.scale, shape.length * frame.scale];
  return (
    <rect
      x={x - length / 2}
      y={y - width / 2}
      width={length}
      height={width}
      rx={width / 2}
      transform={`rotate(${-shape.angle} ${x} ${y})`}
      className={named(classes['hole'], layerClass(shape.layer))}
    />
  );
}

function Dimension({ shape, frame, paint }: Drawn<Of<'dimension'>>): ReactNode {
  const [from, to] = [toPixels(frame, shape.from), toPixels(frame, shape.to)];
  const arrow = `url(#${paint.arrow})`;
  return (
    <line
      x1={from.x}
      y1={from.y}
      x2={to.x}
      y2={to.y}
      className={classes['dimension']}
      markerStart={arrow}
      markerEnd={arrow}
    />
  );
}

function Leader({ shape, frame, paint }: Drawn<Of<'leader'>>): ReactNode {
  const d = `M${pathOf(shape.points.map((point) => toPixels(frame, point)))}`;
  return <path d={d} className={classes['leader']} markerStart={`url(#${paint.arrow})`} />;
}

function Label({ shape, frame }: Drawn<Of<'label'>>): ReactNode {
  const { x, y } = toPixels(frame, shape.at);
  const face = shape.isMono ? classes['figure'] : classes['name'];
  return (
    <text x={x} y={y} textAnchor={shape.anchor} className={named(face, classes[`${shape.role}Label`])}>
      {shape.text}
    </text>
  );
}

/** One shape of the drawing; role and layer give its line, so that colour never stands alone. */
export function Shape({ shape, frame, paint }: Drawn<DrawnShape>): ReactNode {
  switch (shape.kind) {
    case 'area':
      return <Area shape={shape} frame={frame} paint={paint} />;
    case 'line':
      return <Line shape={shape} frame={frame} paint={paint} />;
    case 'circle':
      return <Circle shape={shape} frame={frame} paint={paint} />;
    case 'slot':
      return <Slot shape={shape} frame={frame} paint={paint} />;
    case 'dimension':
      return <Dimension shape={shape} frame={frame} paint={paint} />;
    case 'leader':
      return <Leader shape={shape} frame={frame} paint={paint} />;
    case 'label':
      return <Label shape={shape} frame={frame} paint={paint} />;
  }
}

/** Grid, arrow heads and hatching. The grid runs through the centre of the first hole. */
export function Paint({ frame, grid, paint }: { frame: Frame; grid: number; paint: PaintIds }): ReactNode {
  const step = grid * frame.scale;
  const origin = toPixels(frame, { x: 0, y: 0 });
  return (
    <defs>
      <pattern
        id={paint.grid}
        x={origin.x}
        y={origin.y}
        width={step}
        height={step}
        patternUnits="userSpaceOnUse"
      >
        <path d={`M${step} 0H0V${step}`} className={classes['gridLine']} />
      </pattern>
      <pattern
        id={paint.hatch}
        width="6"
        height="6"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <path d="M0 0V6" className={classes['hatchLine']} />
      </pattern>
      <marker
        id={paint.arrow}
        viewBox="0 0 10 10"
        refX="9"
        refY="5"
        markerWidth="7"
        markerHeight="7"
        orient="auto-start-reverse"
      >
        <path d="M0 1.5L9 5L0 8.5" className={classes['arrow']} />
      </marker>
    </defs>
  );
}

/** What each line of the drawing stands for. */
export function Legend({ items, gridText }: { items: readonly LegendItem[]; gridText: string }): ReactNode {
  return (
    <ul className={classes['legend']}>
      {items.map(({ role, layer, text }) => (
        <li key={`${role}-${layer}`}>
          <svg width="18" height="18" viewBox="0 0 18 18" aria-hidden="true">
            {role === 'tooClose' ? (
              <path d="M2 16L16 2M2 9L9 2M9 16L16 9" className={classes['hatchLine']} />
            ) : (
              <circle cx="9" cy="9" r="6.5" className={named(classes[role], layerClass(layer))} />
            )}
          </svg>
          {text}
        </li>
      ))}
      <li className={classes['gridText']}>{gridText}</li>
    </ul>
  );
}
