import { useRef, type ReactNode } from 'react';
import { useDropzone } from 'react-dropzone';
import classes from './photos.module.css';

const PICTURES = 'image/jpeg,image/png,image/webp,image/heic,image/heif,.heic,.heif';

/** Where photos come in: dropped, chosen, or taken with the phone. */
export function DropZone({ onFiles }: { onFiles: (files: readonly File[]) => void }): ReactNode {
  const chooser = useRef<HTMLInputElement>(null);
  const camera = useRef<HTMLInputElement>(null);
  const { getRootProps, isDragActive } = useDropzone({
    noClick: true,
    noKeyboard: true,
    // Nothing is refused by the zone itself: a reason belongs beside the file's name.
    onDrop: (accepted) => onFiles(accepted),
  });
  const chosen = (input: HTMLInputElement) => {
    onFiles([...(input.files ?? [])]);
    // The same file may be chosen again after it was taken out.
    input.value = '';
  };
  return (
    <div
      {...getRootProps({ className: classes['zone'], role: 'group', 'aria-label': 'Add photos' })}
      data-over={isDragActive}
    >
      <p>Drop photos, paste one, or take one with the phone.</p>
      <p className={classes['promise']}>The place a photo was taken is removed before it is stored.</p>
      <div className={classes['ways']}>
        <button type="button" data-field="photoIds" onClick={() => chooser.current?.click()}>
          Choose photos
        </button>
        <button type="button" className={classes['camera']} onClick={() => camera.current?.click()}>
          Take a photo
        </button>
      </div>
      <input
        ref={chooser}
        type="file"
        multiple
        accept={PICTURES}
        hidden
        aria-label="Choose photos"
        onChange={(event) => chosen(event.currentTarget)}
      />
      <input
        ref={camera}
        type="file"
        accept="image/*"
        capture="environment"
        hidden
        aria-label="Take a photo"
        onChange={(event) => chosen(event.currentTarget)}
      />
    </div>
  );
}
