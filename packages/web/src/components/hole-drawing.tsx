import {
  describeHoleDrawing,
  holeDrawing,
  type DrawnHandle,
  type FitCheck,
  type Frame,
  type HoleCard,
  type Point,
  type RemedyKind,
  type Units,
} from '@rivetside/shared';
import { useId, useMemo, useRef, useState, type ReactNode } from 'react';
import classes from './hole-drawing.module.css';
import { Handles } from './hole-drawing-handles';
import { movePoint } from './hole-drawing-move';
import { Legend, Paint, Shape, type PaintIds } from './hole-drawing-shapes';
import { useWidth } from './use-width';

const USUAL_WIDTH = 620;
const NARROW = 460;

/** A phone's column is narrow: there the drawing is nearly square, so that it stays large. */
function heightFor(width: number): number {
  return Math.round(width < NARROW ? width * 0.76 : Math.min(width * 0.55, 372));
}

function usePaintIds(): PaintIds {
  const id = useId();
  return { arrow: `${id}arrow`, grid: `${id}grid`, hatch: `${id}hatch` };
}

export interface HoleDrawingProps {
  readonly card: HoleCard;
  readonly check: FitCheck | null;
  readonly units: Units;
  /** The remedy to draw; unsaid, the foremost. */
  readonly remedy?: RemedyKind | undefined;
  /** Given, points can be dragged and moved by keys; it gets the card with the point elsewhere. */
  readonly onChange?: ((card: HoleCard, handle: DrawnHandle) => void) | undefined;
}

/** The hole card drawn to scale, with its legend, and the same in words for whoever does not see it. */
export function HoleDrawing({ card, check, units, remedy, onChange }: HoleDrawingProps): ReactNode {
  const paper = useRef<HTMLDivElement>(null);
  const paint = usePaintIds();
  const width = useWidth(paper, USUAL_WIDTH);
  const height = heightFor(width);
  const [frame, setFrame] = useState<Frame | undefined>();
  const start = useRef<HoleCard | null>(null);
  const drawing = useMemo(
    () => holeDrawing(card, check, { units, width, height, frame, ...(remedy ? { remedy } : {}) }),
    [card, check, units, width, height, frame, remedy],
  );
  const words = useMemo(() => describeHoleDrawing(card, check, units), [card, check, units]);

  function handleMove(handle: DrawnHandle, to: Point) {
    onChange?.(movePoint(start.current ?? card, handle, to, units), handle);
  }
  function handleHold() {
    start.current = card;
    setFrame(drawing.frame);
  }
  function handleRelease() {
    start.current = null;
    setFrame(undefined);
  }

  return (
    <figure className={classes['figureBox']}>
      <div ref={paper}>
        <svg
          className={classes['paper']}
          viewBox={`0 0 ${drawing.frame.width} ${drawing.frame.height}`}
          role={onChange ? 'group' : 'img'}
          aria-label="Hole card, drawn to scale"
        >
          <Paint frame={drawing.frame} grid={drawing.grid} paint={paint} />
          <rect width="100%" height="100%" fill={`url(#${paint.grid})`} />
          {drawing.shapes.map((shape, index) => (
            <Shape key={index} shape={shape} frame={drawing.frame} paint={paint} />
          ))}
          {onChange && (
            <Handles
              handles={drawing.handles}
              frame={drawing.frame}
              units={units}
              onHold={handleHold}
              onMove={handleMove}
              onRelease={handleRelease}
            />
          )}
        </svg>
      </div>
      <Legend items={drawing.legend} gridText={drawing.gridText} />
      {drawing.beyond.length > 0 && (
        <p className={classes['beyond']}>Too far off to be drawn: {drawing.beyond.join('; ')}.</p>
      )}
      <details className={classes['words']}>
        <summary>The drawing in words</summary>
        <ul>
          {words.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </ul>
      </details>
    </figure>
  );
}
