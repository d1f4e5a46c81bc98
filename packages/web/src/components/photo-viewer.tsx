import type { Photo } from '@rivetside/shared';
import { useEffect, useRef, type KeyboardEvent, type ReactNode } from 'react';
import { PhotoMarks } from './photo-marks';
import classes from './photo-strip.module.css';

interface PhotoViewerProps {
  readonly photos: readonly Photo[];
  readonly index: number;
  readonly onTurn: (index: number) => void;
  readonly onClose: () => void;
}

const TURNS: Readonly<Record<string, (index: number, count: number) => number>> = {
  ArrowRight: (index, count) => Math.min(index + 1, count - 1),
  ArrowLeft: (index) => Math.max(index - 1, 0),
  Home: () => 0,
  End: (_index, count) => count - 1,
};

/** One photo as large as the window lets it be. The dialog keeps the focus and closes by Esc of itself. */
export function PhotoViewer({ photos, index, onTurn, onClose }: PhotoViewerProps): ReactNode {
  const dialog = useRef<HTMLDialogElement>(null);
  const photo = photos[index]!;
  const name = photo.caption ?? `Photo ${index + 1}`;

  useEffect(() => {
    const element = dialog.current!;
    // Showing twice throws, and StrictMode runs every effect twice.
    if (!element.open) element.showModal();
    return () => element.close();
  }, []);

  function handleKey(event: KeyboardEvent) {
    const turn = TURNS[event.key];
    if (!turn) return;
    event.preventDefault();
    onTurn(turn(index, photos.length));
  }

  return (
    // Arrow keys turn the pages wherever the focus is in the dialog.
    <dialog
      ref={dialog}
      className={classes['viewer']}
      aria-label={name}
      onKeyDown={handleKey}
      onCancel={onClose}
      onClick={(event) => event.target === event.currentTarget && onClose()}
    >
      <div className={classes['viewerBar']}>
        <span aria-live="polite">
          {index + 1} of {photos.length}
        </span>
        <a href={photo.urls.full} target="_blank" rel="noreferrer">
          Full size
        </a>
        <button type="button" onClick={onClose} autoFocus>
          Close
        </button>
      </div>
      <div className={classes['large']}>
        <img src={photo.urls.screen} width={photo.width} height={photo.height} alt={name} />
        <PhotoMarks marks={photo.marks} withLabels />
      </div>
      <p className={classes['viewerCaption']}>{photo.caption}</p>
      {photos.length > 1 && (
        <div className={classes['turns']}>
          <button type="button" disabled={index === 0} onClick={() => onTurn(index - 1)}>
            Previous
          </button>
          <button type="button" disabled={index === photos.length - 1} onClick={() => onTurn(index + 1)}>
            Next
          </button>
        </div>
      )}
    </dialog>
  );
}
