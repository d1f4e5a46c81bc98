import type { Photo } from '@rivetside/shared';
import { useRef, useState, type ReactNode } from 'react';
import { PhotoMarks } from './photo-marks';
import classes from './photo-strip.module.css';
import { PhotoViewer } from './photo-viewer';

/** Photos in their order with what was marked on them; each opens large. */
export function PhotoStrip({
  photos,
  label = 'Photos',
}: {
  photos: readonly Photo[];
  label?: string;
}): ReactNode {
  const [shown, setShown] = useState<number | null>(null);
  const thumbs = useRef<(HTMLButtonElement | null)[]>([]);
  if (photos.length === 0) return null;

  function handleClose() {
    thumbs.current[shown!]?.focus();
    setShown(null);
  }

  return (
    <>
      <ul className={classes['strip']} aria-label={label}>
        {photos.map((photo, index) => (
          <li key={photo.id}>
            <button
              type="button"
              ref={(element) => {
                thumbs.current[index] = element;
              }}
              className={classes['thumb']}
              aria-label={`Open large: ${photo.caption ?? `photo ${index + 1}`}`}
              onClick={() => setShown(index)}
            >
              <img
                src={photo.urls.thumb}
                width={photo.width}
                height={photo.height}
                alt=""
                loading="lazy"
                decoding="async"
              />
              <PhotoMarks marks={photo.marks} withLabels={false} />
            </button>
            {photo.caption && <span className={classes['caption']}>{photo.caption}</span>}
          </li>
        ))}
      </ul>
      {shown !== null && (
        <PhotoViewer photos={photos} index={shown} onTurn={setShown} onClose={handleClose} />
      )}
    </>
  );
}
