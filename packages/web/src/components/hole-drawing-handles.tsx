import { KEY_STEPS } from './hole-drawing-move';
import {
  formatLengthUnit,
  toPixels,
  type DrawnHandle,
  type Frame,
  type Point,
  type Units,
} from '@rivetside/shared';
import { useRef, type KeyboardEvent, type PointerEvent, type ReactNode } from 'react';
import classes from './hole-drawing.module.css';

/** Half of the 44 px that a finger needs. */
const TOUCH_RADIUS = 22;
const KEY_WAYS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowRight: [1, 0],
  ArrowLeft: [-1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

interface Held {
  readonly handle: DrawnHandle;
  readonly pointerId: number;
  readonly from: Point;
}

interface HandlesProps {
  readonly handles: readonly DrawnHandle[];
  readonly frame: Frame;
  readonly units: Units;
  /** A drag begins, so that everything is reckoned from here and nothing adds up. */
  readonly onHold: () => void;
  readonly onMove: (handle: DrawnHandle, to: Point) => void;
  readonly onRelease: () => void;
}

/** The way a key moves a point: along its own direction where it has but one, outward for up and right. */
function keyTarget({ at, along }: DrawnHandle, [x, y]: readonly [number, number], step: number): Point {
  if (along === null) return { x: at.x + x * step, y: at.y + y * step };
  const rad = (along * Math.PI) / 180;
  const straight = x * Math.cos(rad) + y * Math.sin(rad);
  const outward = (Math.abs(straight) < 0.3 ? x + y : Math.sign(straight)) * step;
  return { x: at.x + Math.cos(rad) * outward, y: at.y + Math.sin(rad) * outward };
}

function saidPlace({ at, measured, along }: DrawnHandle, units: Units): string {
  const length = formatLengthUnit(measured, units);
  if (along !== null) return `${length} from the hole`;
  return `${formatLengthUnit(at.x, units)} along, ${formatLengthUnit(at.y, units)} across`;
}

/** The points of the drawing that may be dragged, or moved by the arrow keys, ten times as far with Shift. */
export function Handles({ handles, frame, units, onHold, onMove, onRelease }: HandlesProps): ReactNode {
  const held = useRef<Held | null>(null);

  function handlePress(handle: DrawnHandle, event: PointerEvent<SVGGElement>) {
    event.preventDefault();
    event.currentTarget.focus();
    event.currentTarget.setPointerCapture?.(event.pointerId);
    held.current = { handle, pointerId: event.pointerId, from: { x: event.clientX, y: event.clientY } };
    onHold();
  }
  function handleDrag(event: PointerEvent<SVGGElement>) {
    const hold = held.current;
    if (!hold || hold.pointerId !== event.pointerId) return;
    const { at } = hold.handle;
    const x = at.x + (event.clientX - hold.from.x) / frame.scale;
    const y = at.y - (event.clientY - hold.from.y) / frame.scale;
    onMove(hold.handle, { x, y });
  }
  function handleLetGo() {
    if (!held.current) return;
    held.current = null;
    onRelease();
  }
  function handleKey(handle: DrawnHandle, event: KeyboardEvent<SVGGElement>) {
    const way = KEY_WAYS[event.key];
    if (!way) return;
    event.preventDefault();
    const { fine, coarse } = KEY_STEPS[units];
    onMove(handle, keyTarget(handle, way, event.shiftKey ? coarse : fine));
  }

  return handles.map((handle) => {
    const { x, y } = toPixels(frame, handle.at);
    return (
      <g
        key={handle.path}
        role="slider"
        tabIndex={0}
        className={classes['handle']}
        aria-label={`${handle.label}: move by arrow keys`}
        aria-valuenow={Math.round(handle.measured * 1000) / 1000}
        aria-valuetext={saidPlace(handle, units)}
        onPointerDown={(event) => handlePress(handle, event)}
        onPointerMove={handleDrag}
        onPointerUp={handleLetGo}
        onPointerCancel={handleLetGo}
        onKeyDown={(event) => handleKey(handle, event)}
      >
        <circle cx={x} cy={y} r={TOUCH_RADIUS} className={classes['grip']} />
        <circle cx={x} cy={y} r={handle.along === null ? 3 : 5} className={classes['gripMark']} />
      </g>
    );
  });
}
