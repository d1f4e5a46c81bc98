import { MESSAGE_MAX, type Photo } from '@rivetside/shared';
import { type KeyboardEvent, type ReactNode, type SyntheticEvent, useCallback, useState } from 'react';
import { useDraft } from '../../lib/drafts';
import classes from './talk.module.css';

/** A photo beside a line that is being written. */
export interface AttachedPhoto {
  readonly key: string;
  readonly name: string;
  readonly file: Blob;
  readonly caption: string;
  readonly sent: Photo | null;
}
type Update = (photos: readonly AttachedPhoto[]) => readonly AttachedPhoto[];
/** Photos are added by another feature: whoever composes the page hands it in. */
export type PhotoSlot = (props: {
  readonly photos: readonly AttachedPhoto[];
  readonly onChange: (update: Update) => void;
}) => ReactNode;

interface Typed {
  readonly body: string;
  readonly photos: readonly AttachedPhoto[];
}
const NOTHING: Typed = { body: '', photos: [] };

interface SayFormProps {
  readonly questionId: string;
  readonly onSay: (body: string, photos: readonly Photo[]) => void;
  readonly onWriting: (on: boolean) => void;
  readonly photoSlot: PhotoSlot;
}

/** The line that one writes to the bench; kept on the device while it is written. */
export function SayForm({ questionId, onSay, onWriting, photoSlot }: SayFormProps): ReactNode {
  const { value, set, loaded, drop } = useDraft(`talk:${questionId}`, NOTHING);
  const [fault, setFault] = useState<string | null>(null);
  const [withPhotos, setWithPhotos] = useState(false);
  const changePhotos = useCallback(
    (update: Update) => set((old) => ({ ...old, photos: update(old.photos) })),
    [set],
  );
  const { body, photos } = value;

  function say(event?: SyntheticEvent) {
    event?.preventDefault();
    const sent = photos.flatMap((photo) => photo.sent ?? []);
    if (body.trim() === '') return setFault('Write a line first.');
    if (sent.length < photos.length) return setFault('A photo is still on its way. It goes with the line.');
    setFault(null);
    onSay(body.trim(), sent);
    onWriting(false);
    setWithPhotos(false);
    set(NOTHING);
    void drop();
  }
  /** Enter sends, as on a phone; Shift and Enter begins a new line. */
  function handleKey(event: KeyboardEvent) {
    if (event.key !== 'Enter' || event.shiftKey || event.nativeEvent.isComposing) return;
    say(event);
  }

  return (
    <form className={classes['say']} onSubmit={say} noValidate>
      <label className="unseen" htmlFor="say">
        Write to the bench
      </label>
      <textarea
        id="say"
        rows={1}
        placeholder="Write to the bench…"
        maxLength={MESSAGE_MAX}
        readOnly={!loaded}
        aria-invalid={fault ? true : undefined}
        aria-describedby={fault ? 'say-fault' : undefined}
        value={body}
        onKeyDown={handleKey}
        onBlur={() => onWriting(false)}
        onChange={(event) => {
          const { value: typed } = event.currentTarget;
          set((old) => ({ ...old, body: typed }));
          setFault(null);
          onWriting(typed !== '');
        }}
      />
      <button
        type="button"
        className="btn plain"
        aria-expanded={withPhotos}
        onClick={() => setWithPhotos(!withPhotos)}
      >
        Add photo
      </button>
      <button type="submit" className="btn">
        Send
      </button>
      {fault && (
        <p id="say-fault" role="alert" className={classes['fault']}>
          {fault}
        </p>
      )}
      {(withPhotos || photos.length > 0) && (
        <div className={classes['photos']}>{photoSlot({ photos, onChange: changePhotos })}</div>
      )}
    </form>
  );
}
