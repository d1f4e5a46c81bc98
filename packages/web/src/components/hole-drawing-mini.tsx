import { holeDrawing, type DrawnShape, type Frame, type HoleCard } from '@rivetside/shared';
import { useId, useMemo, type ReactNode } from 'react';
import { Shape } from './hole-drawing-shapes';
import classes from './hole-drawing.module.css';

/** One scale for all, so that a strip of them can be compared by eye; pixels per inch. */
const MINI_SCALE = 84;
const MINI_SIZE = { width: 168, height: 72 };
const MINI_FRAME: Frame = { ...MINI_SIZE, scale: MINI_SCALE, centre: { x: 0, y: 0 } };
const SHOWN: readonly string[] = ['hole', 'neighbour', 'edge', 'bend'];

function isShown(shape: DrawnShape): boolean {
  return shape.kind !== 'label' && shape.kind !== 'dimension' && SHOWN.includes(shape.role);
}

/** A hole card at a glance, beside its words: holes, neighbours and edges, every one drawn to the same scale. */
export function HoleDrawingMini({ card, label }: { card: HoleCard; label: string }): ReactNode {
  const id = useId();
  const paint = { arrow: `${id}a`, grid: `${id}g`, hatch: `${id}h` };
  const shapes = useMemo(
    () => holeDrawing(card, null, { ...MINI_SIZE, frame: MINI_FRAME }).shapes.filter(isShown),
    [card],
  );
  return (
    <svg
      className={classes['mini']}
      {...MINI_SIZE}
      viewBox={`0 0 ${MINI_SIZE.width} ${MINI_SIZE.height}`}
      role="img"
      aria-label={label}
    >
      {shapes.map((shape, index) => (
        <Shape key={index} shape={shape} frame={MINI_FRAME} paint={paint} />
      ))}
    </svg>
  );
}
