import { PHOTOS_PER_ENTRY } from '@rivetside/shared';
import { useEffect, useRef, useState, type ReactNode } from 'react';
import { movedPhoto, refusedFile, type DraftPhoto } from './draft-photo';
import { DropZone } from './drop-zone';
import { PhotoRow } from './photo-row';
import classes from './photos.module.css';
import type { PhotoSending } from './use-photo-sending';

type Update = (photos: readonly DraftPhoto[]) => readonly DraftPhoto[];

interface PhotoAdderProps {
  readonly photos: readonly DraftPhoto[];
  readonly onChange: (update: Update) => void;
  readonly sending: PhotoSending;
  readonly isOnline: boolean;
  readonly newKey: () => string;
  readonly error?: string | undefined;
}

function pastedFiles(event: ClipboardEvent): File[] {
  return [...(event.clipboardData?.files ?? [])].filter(({ type }) => type.startsWith('image/'));
}

/** Photos to go with what is being written: dropped, pasted, chosen or taken; captioned and put in order. */
export function PhotoAdder({
  photos,
  onChange,
  sending,
  isOnline,
  newKey,
  error,
}: PhotoAdderProps): ReactNode {
  const [refused, setRefused] = useState<readonly string[]>([]);

  function handleFiles(files: readonly File[]) {
    const room = Math.max(PHOTOS_PER_ENTRY - photos.length, 0);
    const judged = files.map((file) => ({ file, reason: refusedFile(file) }));
    const good = judged.filter(({ reason }) => reason === null).map(({ file }) => file);
    const left =
      good.length > room ? [`At most ${PHOTOS_PER_ENTRY} photos: ${good.length - room} left out.`] : [];
    setRefused([...judged.flatMap(({ reason }) => reason ?? []), ...left]);
    const added = good.slice(0, room).map((file) => ({
      key: newKey(),
      name: file.name,
      file,
      caption: '',
      sent: null,
    }));
    if (added.length > 0) onChange((old) => [...old, ...added]);
  }

  const latest = useRef(handleFiles);
  useEffect(() => {
    latest.current = handleFiles;
  });
  useEffect(() => {
    function handlePaste(event: ClipboardEvent) {
      const files = pastedFiles(event);
      if (files.length > 0) latest.current(files);
    }
    document.addEventListener('paste', handlePaste);
    return () => document.removeEventListener('paste', handlePaste);
  }, []);

  const replace = (photo: DraftPhoto) =>
    onChange((old) => old.map((one) => (one.key === photo.key ? photo : one)));

  return (
    <div>
      <DropZone onFiles={handleFiles} />
      {[...refused, ...(error ? [error] : [])].map((reason) => (
        <p key={reason} className={classes['failed']} role="alert">
          {reason}
        </p>
      ))}
      <ul className={classes['photos']} aria-label="Your photos">
        {photos.map((photo, index) => (
          <PhotoRow
            key={photo.key}
            photo={photo}
            index={index}
            count={photos.length}
            sending={sending.of(photo.key)}
            isOnline={isOnline}
            onChange={replace}
            onMove={(by) => onChange((old) => movedPhoto(old, index, by))}
            onRemove={() => onChange((old) => old.filter(({ key }) => key !== photo.key))}
            onCancel={() => sending.cancel(photo.key)}
            onRetry={() => sending.retry(photo.key)}
          />
        ))}
      </ul>
    </div>
  );
}
